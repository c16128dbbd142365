using Boltup.Reports.Pictures;

namespace Boltup.Tests.Reports.Pictures;

public class ColourMapTests
{
    private static readonly ColourMap Map = new([10, 20, 30, 40], [[1, 5, double.NaN, 2]], 0, 10);

    [Theory]
    [InlineData(5, 45, 5)]
    [InlineData(11, 14, 1)]
    [InlineData(16, 19, 5)]
    [InlineData(50, 60, 2)]
    [InlineData(0, 5, 1)]
    public void Between_TwoPlaces_IsTheLargestThereOrTheNearest(double from, double to, double expected) =>
        Assert.Equal(expected, Map.Between(0, from, to));

    [Fact]
    public void ColourOf_NoNumber_IsTheLowest() => Assert.Equal(Map.ColourOf(-100), Map.ColourOf(double.NaN));

    /// <summary>Grey print shows lightness only: it must fall from step to step, and in steps of about one size.</summary>
    [Fact]
    public void ShadeAt_RisingValues_GetsDarkerEvenly()
    {
        double[] lightness = [.. Enumerable.Range(0, 11).Select(step => LightnessOf(PictureStyle.ShadeAt(step / 10.0)))];
        Assert.All(lightness.Zip(lightness.Skip(1)), pair => Assert.InRange(pair.First - pair.Second, 4, 14));
    }

    /// <summary>L* of CIE 1976.</summary>
    private static double LightnessOf(Rgb colour) =>
        colour.Luminance > 0.008856 ? 116 * Math.Cbrt(colour.Luminance) - 16 : 903.3 * colour.Luminance;
}
