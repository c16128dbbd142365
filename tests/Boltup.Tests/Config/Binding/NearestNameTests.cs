using Boltup.Config.Binding;

namespace Boltup.Tests.Config.Binding;

public class NearestNameTests
{
    private static readonly string[] Known = ["stiffness", "loss_factor", "damping", "m1", "z"];

    [Theory]
    [InlineData("stifness", "stiffness")]
    [InlineData("Stiffness", "stiffness")]
    [InlineData("sitffness", "stiffness")]
    [InlineData("lossFactor", "loss_factor")]
    [InlineData("loss-factr", "loss_factor")]
    [InlineData("dampng", "damping")]
    [InlineData("M_1", "m1")]
    [InlineData("m11", "m1")]
    [InlineData("stiff", null)]
    [InlineData("m2", null)]
    [InlineData("", null)]
    [InlineData("x", null)]
    public void Of_Misspelling_FindsTheKnownName(string text, string? expected) => Assert.Equal(expected, NearestName.Of(text, Known));

    [Fact]
    public void Of_SeveralNear_TakesTheNearest() => Assert.Equal("front_left", NearestName.Of("frontleft", ["front_lefts", "front_left"]));

    [Fact]
    public void Of_HugeTexts_IsQuickAndFindsNothing() => Assert.Null(NearestName.Of(new string('a', 1_000_000), [new string('a', 999_999)]));
}
