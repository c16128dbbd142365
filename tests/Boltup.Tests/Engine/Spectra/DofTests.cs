using Boltup.Engine.Spectra;

namespace Boltup.Tests.Engine.Spectra;

public class DofTests
{
    [Theory]
    [InlineData("m1.z", "m1", Direction.Z)]
    [InlineData("101.rx", "101", Direction.RX)]
    [InlineData("a.b.p", "a.b", Direction.P)]
    public void TryParse_PointAndDirection_SplitsAtTheLastStop(string text, string point, Direction direction)
    {
        Assert.True(Dof.TryParse(text, out Dof? dof));
        Assert.Equal(new Dof(point, direction), dof);
        Assert.Equal(text, dof.ToString());
    }

    [Theory]
    [InlineData("")]
    [InlineData(".x")]
    [InlineData("m1")]
    [InlineData("m1.")]
    [InlineData("m1.w")]
    [InlineData("m1.X")]
    public void TryParse_AnythingElse_Fails(string text) => Assert.False(Dof.TryParse(text, out _));
}
