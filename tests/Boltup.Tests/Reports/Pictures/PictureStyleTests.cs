using Boltup.Reports.Pictures;

namespace Boltup.Tests.Reports.Pictures;

public class PictureStyleTests
{
    /// <summary>Smallest distance of two line colours, in CIE Lab units; some ten times what the eye just tells apart.</summary>
    private const double SmallestDistance = 20;

    /// <summary>3:1 is what WCAG 2.2, 1.4.11, asks of graphics (from memory).</summary>
    [Fact]
    public void Lines_OnPaper_HaveAContrastOfThree() =>
        Assert.All(PictureStyle.Lines, colour => Assert.InRange(colour.ContrastWith(PictureStyle.Paper), 3, 21));

    [Fact]
    public void Text_OnPaper_HasAContrastOfFourAndAHalf()
    {
        Assert.InRange(PictureStyle.Text.ContrastWith(PictureStyle.Paper), 4.5, 21);
        Assert.InRange(PictureStyle.Quiet.ContrastWith(PictureStyle.Paper), 4.5, 21);
    }

    [Theory]
    [InlineData(ColourVision.Full)]
    [InlineData(ColourVision.Deutan)]
    [InlineData(ColourVision.Protan)]
    public void Lines_SeenByAnyEye_StayApart(ColourVision vision)
    {
        double[][] seen = [.. PictureStyle.Lines.Select(colour => ColourSight.Lab(colour, vision))];
        for (int i = 0; i < seen.Length; i++)
        {
            for (int j = 0; j < i; j++)
            {
                double distance = ColourSight.Distance(seen[i], seen[j]);
                Assert.True(distance >= SmallestDistance, $"lines {j} and {i} are {distance:F1} apart for {vision}");
            }
        }
    }

    /// <summary>Neighbours in the order of use differ by at least 10 in lightness, so that grey print tells them apart.</summary>
    [Fact]
    public void Lines_Neighbours_DifferInLightness()
    {
        double[] lightness = [.. PictureStyle.Lines.Select(colour => ColourSight.Lab(colour, ColourVision.Full)[0])];

        Assert.All(lightness.Zip(lightness.Skip(1)), pair => Assert.True(Math.Abs(pair.First - pair.Second) >= 10, $"{pair}"));
    }
}
