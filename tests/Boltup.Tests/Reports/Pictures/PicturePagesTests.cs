using System.Numerics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Reports.Pictures;

namespace Boltup.Tests.Reports.Pictures;

public class PicturePagesTests
{
    private static readonly OperationResult Idle = TinyResult.Operation("idle", Amplitude.Rms, TinyResult.Ear, TinyResult.Seat);

    [Fact]
    public void Response_TinyResult_ShowsExactlyThis()
    {
        Picture page = Pages(Idle).Response(Idle, 0);
        Panel level = page.Panels[0];
        Panel phase = page.Panels[1];

        Assert.Equal("idle-ear-left", page.Name);
        Assert.Equal("ear, left", page.Title);
        Assert.Equal("idle · overall 108.0 dB re 20 µPa · cabin.ear.p", page.Subtitle);
        Assert.Equal("Tiny µ assembly · provenance", page.Caption);
        Assert.Equal("Level in dB re 20 µPa", level.Y.Label);
        Assert.Equal("Frequency in Hz", phase.X.Label);
        Assert.Equal([20, 50.5, 1000], level.Series[0].X);
        Assert.Equal(20 * Math.Log10(5 / 20e-6), level.Series[0].Y[0], 9);
        Assert.Equal("108.0 dB at 20 Hz", level.Marker!.Text);
        Assert.Equal(Math.Atan2(4, 3) * 180 / Math.PI, phase.Series[0].Y[0], 9);
        Assert.Equal((20, 1000), (level.X.From, level.X.To));
        Assert.True(level.X.IsLogarithmic);
    }

    [Fact]
    public void Response_SilentLine_IsAGap() =>
        Assert.True(double.IsNaN(Pages(Idle).Response(Idle, 0).Panels[0].Series[0].Y[1]));

    [Fact]
    public void Response_PeakAmplitudes_AreShownAsRms()
    {
        OperationResult peak = Idle with { Amplitude = Amplitude.Peak };

        Assert.Equal(
            10 * Math.Log10(2), Pages(Idle).Response(Idle, 0).Panels[0].Series[0].Y[0] - Pages(peak).Response(peak, 0).Panels[0].Series[0].Y[0], 9);
    }

    [Fact]
    public void Response_PhaseThatWraps_IsNotJoinedAcrossThePicture()
    {
        ResponseSpectrum wrapping = TinyResult.Seat with
        {
            Values = [Complex.FromPolarCoordinates(1, 3), Complex.FromPolarCoordinates(1, -3), Complex.FromPolarCoordinates(1, -2)],
        };
        OperationResult operation = TinyResult.Operation("idle", Amplitude.Rms, wrapping);
        IReadOnlyList<double> phase = Pages(operation).Response(operation, 0).Panels[1].Series[0].Y;

        Assert.True(double.IsNaN(phase[1]));
        Assert.True(double.IsFinite(phase[0]) && double.IsFinite(phase[2]));
    }

    [Fact]
    public void JointForces_ThreeDirections_SumsTheirPowers()
    {
        JointForceSpectrum x = TinyResult.Force with { Direction = Direction.X, Values = [3, 0, 0] };
        JointForceSpectrum y = TinyResult.Force with { Direction = Direction.Y, Values = [new Complex(0, 4), 0, 0] };
        JointForceSpectrum turning = TinyResult.Force with { Direction = Direction.RX, Unit = "N·m", Values = [100, 100, 100] };
        OperationResult operation = Idle with { JointForces = [x, y, turning] };
        Series series = Assert.Single(Pages(operation).JointForces(operation).Panels[0].Series);

        Assert.Equal("front", series.Name);
        Assert.Equal(20 * Math.Log10(5), series.Y[0], 9);
    }

    [Fact]
    public void Overview_TwoOperations_HasAPanelPerResponseAndALinePerOperation()
    {
        Picture sheet = Pages(Idle, Idle with { Name = "full" }).Overview();

        Assert.Equal(2, sheet.Panels.Count);
        Assert.All(sheet.Panels, panel => Assert.Equal(["idle", "full"], panel.Series.Select(series => series.Name)));
        Assert.Equal(["idle", "full"], sheet.Legend.Select(entry => entry.Name));
        Assert.Equal(sheet.Panels[1].Series.Select(series => series.Colour), sheet.Legend.Select(entry => entry.Colour));
        Assert.Equal("ear, left · 108.0 dB / 108.0 dB", sheet.Panels[0].Title);
        Assert.Equal("provenance", sheet.Caption);
    }

    [Fact]
    public void Response_OneLine_StandsInTheMiddleOfAnOctave()
    {
        var operation = new OperationResult(
            "idle", FrequencyAxis.FromHertz([60]), Amplitude.Rms, [TinyResult.Seat with { Values = [1] }], []);
        PictureAxis axis = Pages(operation).Response(operation, 0).Panels[0].X;

        Assert.Equal(60, Math.Sqrt(axis.From * axis.To), 9);
        Assert.Equal(2, axis.To / axis.From, 9);
    }

    [Fact]
    public void All_OneOperation_KeepsTheColourOfAResponseOnEveryPage()
    {
        IReadOnlyList<Picture> all = Pages(Idle).All();

        Assert.Equal(["overview", "idle-ear-left", "idle-seat", "idle-joint-forces"], all.Select(picture => picture.Name));
        Assert.Equal(all[0].Panels[1].Series[0].Colour, all[2].Panels[0].Series[0].Colour);
        Assert.NotEqual(all[1].Panels[0].Series[0].Colour, all[2].Panels[0].Series[0].Colour);
    }

    private static PicturePages Pages(params OperationResult[] operations) => new(TinyResult.Of(operations), "provenance");
}
