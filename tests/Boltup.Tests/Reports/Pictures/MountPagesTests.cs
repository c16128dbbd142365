using System.Numerics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Reports.Pictures;

namespace Boltup.Tests.Reports.Pictures;

public class MountPagesTests
{
    private static readonly FrequencyAxis Axis = FrequencyAxis.FromHertz([20, 200, 2000]);

    [Fact]
    public void Of_Mount_ShowsMagnitudeInCustomaryUnitAndLossFactor()
    {
        Picture picture = MountPages.Of(
            new MountSpectrum("Rear, left", [new MountTerm(Direction.Z, "", [new(3e5, 4e5), new(1e6, 1e5), Complex.Zero])]), Axis, "invented");
        Assert.Equal(("mount-rear-left", "Mount Rear, left", "invented"), (picture.Name, picture.Title, picture.Caption));
        Assert.Equal([Math.Log10(500), Math.Log10(Math.Sqrt(1e6 + 1e4)), double.NaN], picture.Panels[0].Series[0].Y);
        Assert.Equal([4.0 / 3, 0.1, double.NaN], picture.Panels[1].Series[0].Y);
        Assert.Equal("|k| in N/mm", picture.Panels[0].Y.Label);
    }

    [Fact]
    public void Of_RotationsBesideTranslations_HaveTheirOwnPanelAndKeepTheirColour()
    {
        Picture picture = MountPages.Of(
            new MountSpectrum("full", [Term(Direction.X, ""), Term(Direction.RZ, "")]), Axis, "");
        Assert.Equal(["|k| in N/mm", "|k| in N·m/rad", "Loss factor"], picture.Panels.Select(panel => panel.Y.Label));
        Assert.Equal(picture.Panels[2].Series[1].Colour, picture.Panels[1].Series[0].Colour);
        Assert.Equal(["x", "rz"], picture.Legend.Select(entry => entry.Name));
    }

    [Fact]
    public void Of_TwoPortAlikeAtBothEnds_HasOneLineForThem() => Assert.Equal(
        ["x k11 = k22", "x −k21", "y k11", "y −k21", "y k22"],
        MountPages.Of(
            new MountSpectrum(
                "rod",
                [
                    Term(Direction.X, "k11"), Term(Direction.X, "−k21", 2), Term(Direction.X, "k22"),
                    Term(Direction.Y, "k11"), Term(Direction.Y, "−k21"), Term(Direction.Y, "k22", 3),
                ]),
            Axis,
            "").Legend.Select(entry => entry.Name));

    [Fact]
    public void Of_PoleOfTheLossFactor_IsAGapAndTheAxisStaysReadable()
    {
        Picture picture = MountPages.Of(
            new MountSpectrum("pole", [new MountTerm(Direction.X, "", [new(1e5, 1e4), new(1, 1e4), new(-1e5, 1e4)])]), Axis, "");
        Assert.Equal([0.1, double.NaN, -0.1], picture.Panels[1].Series[0].Y);
        Assert.InRange(picture.Panels[1].Y.From, -0.2, -0.1);
    }

    private static MountTerm Term(Direction direction, string name, double scale = 1) =>
        new(direction, name, [.. Enumerable.Repeat(scale * new Complex(1e5, 1e4), 3)]);
}
