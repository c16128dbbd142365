using Boltup.Reports.Pictures;

namespace Boltup.Tests.Reports.Pictures;

public class TicksTests
{
    [Theory]
    [InlineData(20, 1000, "20 50 100 200 500 1k")]
    [InlineData(15, 2500, "20 50 100 200 500 1k 2k")]
    [InlineData(0.5, 12, "0.5 1 2 5 10")]
    [InlineData(60, 95, "60 70 80 90")]
    [InlineData(210, 409, "250 300 350 400")]
    [InlineData(1000, 1004, "1k 1.001k 1.002k 1.003k 1.004k")]
    public void OfFrequency_Range_HasPlainNumbers(double fromHz, double toHz, string labels) =>
        Assert.Equal(labels, string.Join(' ', Ticks.OfFrequency(fromHz, toHz).Where(tick => tick.IsMajor).Select(tick => tick.Label)));

    [Fact]
    public void OfFrequency_OneDecade_HasMinorTicksAtTheOtherDigits() =>
        Assert.Equal([30, 40, 60, 70, 80, 90], Ticks.OfFrequency(20, 100).Where(tick => !tick.IsMajor).Select(tick => Math.Round(tick.At, 9)));

    [Theory]
    [InlineData(-50, 30, 8, "−50 −40 −30 −20 −10 0 10 20 30")]
    [InlineData(30, 120, 6, "40 60 80 100 120")]
    public void Even_Range_HasRoundSteps(double from, double to, int wanted, string labels) =>
        Assert.Equal(labels, string.Join(' ', Ticks.Even(from, to, wanted).Select(tick => tick.Label)));
}
