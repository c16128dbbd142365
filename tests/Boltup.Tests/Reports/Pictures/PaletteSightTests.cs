using Boltup.Reports.Pictures;

namespace Boltup.Tests.Reports.Pictures;

public class PaletteSightTests
{
    /// <summary>CIE 1976 ΔE*ab; 2.3 is about the least that an eye tells apart side by side (Mahy et al. 1994; from memory).</summary>
    private const double FarApart = 20;

    /// <summary>Difference of lightness L* that grey print keeps.</summary>
    private const double GreyStep = 10;

    /// <summary>Linear-light matrices at full severity: Machado, Oliveira, Fernandes, IEEE TVCG 15 (2009); from memory.</summary>
    private static readonly Dictionary<string, double[]> Sights = new()
    {
        ["normal"] = [1, 0, 0, 0, 1, 0, 0, 0, 1],
        ["protanopia"] = [0.152286, 1.052583, -0.204868, 0.114503, 0.786281, 0.099216, -0.003882, -0.048116, 1.051998],
        ["deuteranopia"] = [0.367322, 0.860646, -0.227968, 0.280085, 0.672501, 0.047413, -0.011820, 0.042940, 0.968881],
    };

    [Theory]
    [InlineData("normal")]
    [InlineData("protanopia")]
    [InlineData("deuteranopia")]
    public void Lines_SeenWithOrWithoutAllCones_StayApart(string sight)
    {
        double[][] seen = [.. PictureStyle.Lines.Select(colour => Lab(colour, Sights[sight]))];
        for (int i = 0; i < seen.Length; i++)
        {
            for (int j = 0; j < i; j++)
            {
                double distance = Math.Sqrt(seen[i].Zip(seen[j], (a, b) => (a - b) * (a - b)).Sum());
                Assert.True(distance > FarApart, $"lines {j} and {i} are only {distance:F1} apart");
            }
        }
    }

    [Fact]
    public void Lines_InGreyPrint_NeighboursDiffer()
    {
        double[] lightness = [.. PictureStyle.Lines.Select(colour => Lab(colour, Sights["normal"])[0])];
        Assert.All(lightness.Zip(lightness.Skip(1)), pair => Assert.True(Math.Abs(pair.First - pair.Second) > GreyStep, $"{pair}"));
    }

    [Fact]
    public void Lines_OnPaper_HaveContrast() =>
        Assert.All(PictureStyle.Lines, colour => Assert.InRange(colour.ContrastWith(PictureStyle.Paper), 3, 21));

    /// <summary>4.5:1 is what WCAG 2.2, 1.4.3, asks of text (from memory).</summary>
    [Fact]
    public void Text_OnPaper_HasContrast()
    {
        Assert.InRange(PictureStyle.Text.ContrastWith(PictureStyle.Paper), 4.5, 21);
        Assert.InRange(PictureStyle.Quiet.ContrastWith(PictureStyle.Paper), 4.5, 21);
    }

    /// <summary>CIE L*a*b* for the D65 white of sRGB.</summary>
    private static double[] Lab(Rgb colour, double[] sight)
    {
        double[] light = [Rgb.Linear(colour.Red), Rgb.Linear(colour.Green), Rgb.Linear(colour.Blue)];
        double[] seen = [.. Enumerable.Range(0, 3).Select(row => Math.Clamp(Enumerable.Range(0, 3).Sum(i => sight[3 * row + i] * light[i]), 0, 1))];
        double x = Root((0.4124 * seen[0] + 0.3576 * seen[1] + 0.1805 * seen[2]) / 0.9505);
        double y = Root(0.2126 * seen[0] + 0.7152 * seen[1] + 0.0722 * seen[2]);
        double z = Root((0.0193 * seen[0] + 0.1192 * seen[1] + 0.9505 * seen[2]) / 1.089);
        return [116 * y - 16, 500 * (x - y), 200 * (y - z)];
    }

    private static double Root(double value) => value > 0.008856 ? Math.Cbrt(value) : 7.787 * value + 16.0 / 116;
}
