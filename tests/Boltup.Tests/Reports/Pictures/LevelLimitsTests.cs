using Boltup.Reports.Pictures;

namespace Boltup.Tests.Reports.Pictures;

public class LevelLimitsTests
{
    [Fact]
    public void Of_OneDeepNotch_IsNotRuledByIt()
    {
        double[] decibels = [.. Enumerable.Range(0, 200).Select(i => 40.0 + i % 41), -200];

        Assert.Equal((30, 90), LevelLimits.Of(decibels));
    }

    [Fact]
    public void Of_GapsAndSilence_AreLeftOut() =>
        Assert.Equal((30, 90), LevelLimits.Of([double.NaN, double.NegativeInfinity, 40, 60, 80]));

    [Fact]
    public void Of_Nothing_IsStillAnAxis() => Assert.Equal((0, 30), LevelLimits.Of([]));

    [Fact]
    public void Of_FlatLine_HasRoomAround() => Assert.Equal((30, 60), LevelLimits.Of([50, 50, 50]));
}
