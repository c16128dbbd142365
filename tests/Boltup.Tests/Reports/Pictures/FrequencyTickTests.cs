using Boltup.Reports.Pictures;

namespace Boltup.Tests.Reports.Pictures;

public class FrequencyTickTests
{
    [Theory]
    [InlineData(20, 2000, "20 50 100 200 500 1k 2k")]
    [InlineData(60, 95, "60 70 80 90")]
    [InlineData(210, 409, "250 300 350 400")]
    [InlineData(1000, 1004, "1k 1.001k 1.002k 1.003k 1.004k")]
    public void OfFrequency_LabelsEnoughToReadFrom(double fromHz, double toHz, string expected) =>
        Assert.Equal(expected, string.Join(' ', Ticks.OfFrequency(fromHz, toHz).Where(tick => tick.IsMajor).Select(tick => tick.Label)));
}
