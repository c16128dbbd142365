using System.Globalization;
using System.Numerics;
using Boltup.Engine.Acoustics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Reports.Results;

namespace Boltup.Reports.Pictures;

/// <summary>The pictures of a prediction.</summary>
/// <param name="provenance">Closes every caption: program version and fingerprint of the inputs.</param>
public sealed class PicturePages(PredictionResult result, string provenance)
{
    /// <summary>The overview sheet, then a page per response, one for its paths and one for the joints of each operation, then one per mount.</summary>
    public IReadOnlyList<Picture> All()
    {
        var pictures = new List<Picture>();
        if (result.Operations.Any(operation => operation.Responses.Count > 0))
        {
            pictures.Add(Overview());
        }

        foreach (OperationResult operation in result.Operations)
        {
            pictures.AddRange(operation.Responses.Select((_, i) => Response(operation, i)));
            pictures.AddRange(operation.Responses.Select((_, i) => PathPages.Of(operation, i, $"{result.Title} · {provenance}")).OfType<Picture>());
            if (operation.JointForces.Count > 0)
            {
                pictures.Add(JointForces(operation));
            }
        }

        pictures.AddRange(result.Mounts.Select(mount => MountPages.Of(mount, result.Axis, $"{result.Title} · {provenance}")));
        return PictureNames.MakeDistinct(pictures);
    }

    /// <summary>Level and phase of one response in one operation.</summary>
    public Picture Response(OperationResult operation, int index)
    {
        ResponseSpectrum response = operation.Responses[index];
        OverallLevel overall = OverallLevel.Of(response, operation.Axis, operation.Amplitude);
        Rgb colour = PictureStyle.LineAt(index);
        double[] hz = operation.Axis.Hz.ToArray();
        double[] level = Level(response.Values, operation.Amplitude, overall.Reference);
        double[] phase = Phase(response.Values);
        string subtitle = $"{operation.Name} · overall {overall.Text} re {overall.Reference.Text} · {response.Dof}";
        var levels = new Panel("", PictureAxes.Frequency(operation.Axis, ""), PictureAxes.Level([level], overall.Reference, 8), [new Series("", hz, level, colour)], (0, 0, 1, 0.7))
        {
            Marker = MarkerOf(overall),
        };
        var phases = new Panel("", PictureAxes.Frequency(operation.Axis, "Frequency in Hz"), PhaseAxis, [new Series("", hz, phase, colour, Thin: true)], (0, 0.7, 1, 0.3));
        return Page($"{FileNames.FromName(operation.Name)}-{FileNames.FromName(response.Name)}", response.Name, subtitle, [levels, phases]);
    }

    /// <summary>Every response, its operations in one diagram; made for one slide.</summary>
    public Picture Overview()
    {
        int count = result.Operations.Max(operation => operation.Responses.Count);
        Panel[] panels = [.. Enumerable.Range(0, count).Select(i => OverviewPanel(i, PanelGrid.PlaceOf(i, count)))];
        string operations = AreSeveral ? $"{result.Operations.Count} operations" : result.Operations[0].Name;
        return new Picture(
            "overview", result.Title, $"Responses in {operations}", provenance, PictureStyle.SheetWidth, PictureStyle.SheetHeight, panels)
        {
            Legend = AreSeveral ? [.. result.Operations.Select((operation, i) => new LegendEntry(operation.Name, PictureStyle.LineAt(i)))] : [],
        };
    }

    /// <summary>What each joint carries: the root of the summed powers of its forces.</summary>
    public Picture JointForces(OperationResult operation)
    {
        double[] hz = operation.Axis.Hz.ToArray();
        Series[] series = [.. operation.JointForces
            .Where(force => force.Direction <= Direction.Z)
            .GroupBy(force => force.Joint)
            .Select((joint, i) => new Series(joint.Key, hz, JointLevel([.. joint], operation.Amplitude), PictureStyle.LineAt(i)))];
        var panel = new Panel(
            "", PictureAxes.Frequency(operation.Axis, "Frequency in Hz"), PictureAxes.Level(series.Select(line => line.Y), LevelReference.Force, 8), series, (0, 0, 1, 1));
        return Page(
            $"{FileNames.FromName(operation.Name)}-joint-forces",
            "Forces through the joints",
            $"{operation.Name} · root of the summed powers of the directions",
            [panel]) with
        { Legend = [.. series.Select(line => new LegendEntry(line.Name, line.Colour))] };
    }

    private static PictureAxis PhaseAxis => new(
        "Phase in °", -190, 190, false, [new(-180, "−180"), new(-90, ""), new(0, "0"), new(90, ""), new(180, "180")]);

    private bool AreSeveral => result.Operations.Count > 1;

    private Picture Page(string name, string title, string subtitle, IReadOnlyList<Panel> panels) =>
        new(name, title, subtitle, $"{result.Title} · {provenance}", PictureStyle.PageWidth, PictureStyle.PageHeight, panels);

    private Panel OverviewPanel(int index, (double, double, double, double) place)
    {
        ResponseSpectrum first = result.Operations[0].Responses[index];
        LevelReference reference = LevelReference.For(first.Quantity, first.Unit);
        Series[] series = [.. result.Operations.Select((operation, i) => new Series(
            operation.Name,
            operation.Axis.Hz.ToArray(),
            Level(operation.Responses[index].Values, operation.Amplitude, reference),
            PictureStyle.LineAt(AreSeveral ? i : index)))];
        string levels = string.Join(" / ", result.Operations.Select(operation => OverallLevel
            .Of(operation.Responses[index], operation.Axis, operation.Amplitude).Text));
        return new Panel(
            $"{first.Name} · {levels}",
            PictureAxes.Frequency(result.Axis, "Frequency in Hz"),
            PictureAxes.Level(series.Select(line => line.Y), reference, 6),
            series,
            place);
    }

    private static Marker? MarkerOf(OverallLevel level) => double.IsFinite(level.PeakDecibels) && level.PeakHz > 0
        ? new Marker(level.PeakHz, level.PeakDecibels, string.Create(CultureInfo.InvariantCulture, $"{level.PeakDecibels:F1} dB at {level.PeakHz:G5} Hz"))
        : null;

    private static double[] Level(IReadOnlyList<Complex> values, Amplitude amplitude, LevelReference reference)
    {
        double toRms = amplitude == Amplitude.Peak ? Math.Sqrt(0.5) : 1;
        return [.. values.Select(value => Finite(reference.Decibels(toRms * Complex.Abs(value))))];
    }

    private static double[] Phase(IReadOnlyList<Complex> values)
    {
        // A jump from −180° to 180° is no line: the gap hides it. Zero has no phase.
        double[] phase = [.. values.Select(value => value == Complex.Zero ? double.NaN : value.Phase * 180 / Math.PI)];
        double[] shown = [.. phase];
        for (int i = 1; i < phase.Length; i++)
        {
            shown[i] = Math.Abs(phase[i] - phase[i - 1]) > 270 ? double.NaN : phase[i];
        }

        return shown;
    }

    private static double[] JointLevel(JointForceSpectrum[] forces, Amplitude amplitude)
    {
        double toRms = amplitude == Amplitude.Peak ? Math.Sqrt(0.5) : 1;
        return [.. Enumerable.Range(0, forces[0].Values.Count).Select(line => Finite(LevelReference.Force.Decibels(
            toRms * Math.Sqrt(forces.Sum(force => Math.Pow(Complex.Abs(force.Values[line]), 2))))))];
    }

    private static double Finite(double decibels) => double.IsFinite(decibels) ? decibels : double.NaN;
}
