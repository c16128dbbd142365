using Boltup.Engine.Spectra;

namespace Boltup.Tests.Engine.Spectra;

public class FrequencyAxisTests
{
    [Fact]
    public void Even_DecimalStep_GivesTheDecimalsThatAreMeant() =>
        Assert.Equal([20, 20.1, 20.2, 20.3], FrequencyAxis.Even(20, 0.1, 4).Hz.ToArray());

    [Theory]
    [InlineData(new double[0])]
    [InlineData(new double[] { -1, 2 })]
    [InlineData(new double[] { 1, 1 })]
    [InlineData(new double[] { 2, 1 })]
    [InlineData(new double[] { 1, double.NaN })]
    [InlineData(new double[] { 1, double.NaN, 2 })]
    [InlineData(new double[] { 1, double.PositiveInfinity })]
    public void FromHertz_NotIncreasingAndFinite_IsRefused(double[] hz) =>
        Assert.Throws<ArgumentException>(() => FrequencyAxis.FromHertz(hz));

    /// <summary>Six digits of text: 1/3 Hz read as 0.333333 is off by 1e-6 in every line.</summary>
    [Fact]
    public void Matches_StepReadFromSixDigits_IsTheSameAxis()
    {
        FrequencyAxis exact = FrequencyAxis.Even(0, 1.0 / 3, 3000);
        FrequencyAxis text = FrequencyAxis.Even(0, 0.333333, 3000);
        Assert.True(exact.Matches(text));
        Assert.Equal(2999, exact.IndexOf(text[2999]));
    }

    [Fact]
    public void Matches_AxisShiftedByATenthOfAStep_IsAnother() =>
        Assert.False(FrequencyAxis.Even(20, 1, 5).Matches(FrequencyAxis.Even(20.11, 1, 5)));

    [Fact]
    public void SharedWith_OverlappingAxes_KeepsTheCommonLines()
    {
        FrequencyAxis? shared = FrequencyAxis.Even(20, 2, 10).SharedWith(FrequencyAxis.Even(21, 3, 10));
        Assert.Equal([24, 30, 36], shared!.Hz.ToArray());
        Assert.Null(FrequencyAxis.Even(20, 2, 10).SharedWith(FrequencyAxis.Even(21, 2, 10)));
    }

    [Fact]
    public void Within_Band_IncludesItsEnds() =>
        Assert.Equal([30, 40, 50], FrequencyAxis.Even(10, 10, 10).Within(30, 50)!.Hz.ToArray());

    [Fact]
    public void ToString_EvenAxis_NamesBandStepAndCount() =>
        Assert.Equal("20 to 1000 Hz by 5 Hz, 197 lines", FrequencyAxis.Even(20, 5, 197).ToString());
}
