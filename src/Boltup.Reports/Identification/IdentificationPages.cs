using System.Globalization;
using Boltup.Engine.Acoustics;
using Boltup.Engine.Evidence;
using Boltup.Engine.Identification;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Reports.Pictures;
using Boltup.Reports.Results;

namespace Boltup.Reports.Identification;

/// <summary>The pictures of an identification, as data.</summary>
public sealed class IdentificationPages(IdentificationReport report)
{
    private readonly double[] _hz = report.Result.Axis.Hz.ToArray();

    public IReadOnlyList<Picture> All() =>
    [
        .. report.Result.Operations.Select(Forces),
        .. report.Evidence.Validations.Select(Validation),
        SingularValues(),
        .. report.Evidence.Stiffness is { } stiffness ? [Stiffness(stiffness)] : Array.Empty<Picture>(),
        .. report.Result.Coherence is { } coherence ? [Coherence(coherence)] : Array.Empty<Picture>(),
        .. report.Result.Quality.VirtualPoints.Count > 0 ? [VirtualPointPage.Of(report.Result.Quality.VirtualPoints, report.Provenance)] : Array.Empty<Picture>(),
    ];

    /// <summary>Blocked forces of an operation, a panel for each point.</summary>
    public Picture Forces(IdentifiedOperation operation)
    {
        string[] points = [.. report.Result.Interface.Select(dof => dof.Point).Distinct()];
        Direction[] directions = [.. report.Result.Interface.Select(dof => dof.Direction).Distinct()];
        string unit = operation.IsDensity ? "1 N/√Hz" : "1 N";
        Panel[] panels = [.. points.Select((point, i) =>
        {
            Series[] lines = [.. directions.Select((direction, d) => new Series("", _hz, ForceLevel(operation, new Dof(point, direction)), PictureStyle.LineAt(d)))];
            return PanelGrid.Panel(point, i, points.Length, PictureAxes.Frequency(report.Result.Axis, "Frequency in Hz"),
                PictureAxes.Level(lines.Select(line => line.Y), LevelReference.Force with { Text = unit }, 6), lines);
        })];
        return Sheet($"{FileNames.FromName(operation.Name)}-blocked-forces", $"Blocked forces · {operation.Name}", report.Method, panels) with
        {
            Legend = [.. directions.Select((direction, d) => new LegendEntry(Dof.NameOf(direction), PictureStyle.LineAt(d)))],
        };
    }

    /// <summary>What the forces predict at sensors that took no part, over what these measured.</summary>
    public Picture Validation(OperationValidation validation)
    {
        ValidationDof[] shown = [.. validation.Report.Dofs.OrderByDescending(dof => Math.Abs(dof.LevelDifferenceDb)).Take(PanelGrid.Most)];
        double[] hz = validation.Report.Axis.Hz.ToArray();
        Panel[] panels = [.. shown.Select((dof, i) =>
        {
            (Quantity quantity, string unit) = dof.Dof.IsMotion ? (Quantity.Acceleration, dof.Dof.IsRotation ? "rad/s²" : "m/s²") : (Quantity.Pressure, "Pa");
            LevelReference reference = LevelReference.For(quantity, unit);
            Series[] lines =
            [
                new("", hz, [.. dof.Predicted.Select(value => Gap(reference.Decibels(value.Magnitude)))], PictureStyle.LineAt(0)),
                new("", hz, [.. dof.Measured.Select(value => Gap(reference.Decibels(value.Magnitude)))], PictureStyle.LineAt(1), Thin: true),
            ];
            string title = $"{dof.Dof} · {SignedText.Of(dof.LevelDifferenceDb, 2)} dB";
            return PanelGrid.Panel(title, i, shown.Length, PictureAxes.Frequency(validation.Report.Axis, "Frequency in Hz"),
                PictureAxes.Level(lines.Select(line => line.Y), reference, 6), lines);
        })];
        string check = validation.Report.Check == ValidationCheck.OnBoard ? "on-board" : "transfer";
        return Sheet($"{FileNames.FromName(validation.Operation)}-{check}-validation", $"{Capital(check)} validation · {validation.Operation}", ValidationText.Of(validation), panels) with
        {
            Legend = [new LegendEntry("predicted", PictureStyle.LineAt(0)), new LegendEntry("measured", PictureStyle.LineAt(1))],
        };
    }

    /// <summary>Singular values of the indicator FRFs, and their condition number.</summary>
    public Picture SingularValues()
    {
        SingularSpectrum singular = report.Result.SingularValues;
        double largest = singular.Values[0].Max();
        Series[] values = [.. singular.Values.Select((value, i) => new Series(
            "", _hz, [.. value.Select(each => Gap(20 * Math.Log10(each / largest)))], PictureStyle.LineAt(0), Thin: i > 0 && i < singular.Values.Count - 1))];
        double[] condition = [.. _hz.Select((_, line) => Gap(Math.Log10(singular.Condition(line))))];
        double top = Math.Ceiling(condition.Where(double.IsFinite).DefaultIfEmpty(1).Max());
        PictureAxis frequency = PictureAxes.Frequency(report.Result.Axis, "Frequency in Hz");
        Panel upper = new("", frequency with { Label = "" }, PictureAxes.Level(values.Select(line => line.Y), new LevelReference(1, "the largest of all lines"), 6), values, (0, 0, 1, 0.6));
        Panel lower = new("", frequency, new PictureAxis("lg condition number", 0, top, false, Ticks.Even(0, top, 4)),
            [new Series("", _hz, condition, PictureStyle.LineAt(1))], (0, 0.6, 1, 0.4));
        string subtitle = string.Create(CultureInfo.InvariantCulture, $"{report.Result.Indicators.Count} indicator dofs, {report.Result.Interface.Count} forces · median condition number {singular.MedianCondition():G3}");
        return Page("singular-values", "Singular values of the indicator FRFs", subtitle, [upper, lower]);
    }

    /// <summary>How far contact forces on this bench are from blocked forces.</summary>
    public Picture Stiffness(BenchStiffness stiffness)
    {
        double[] hz = stiffness.Axis.Hz.ToArray();
        Series[] lines =
        [
            .. stiffness.Dofs.Select(dof => new Series("", hz, [.. dof.RatioDb.Select(Gap)], PictureStyle.Quiet, Thin: true)),
            new("", hz, [.. stiffness.OverallRatioDb.Select(Gap)], PictureStyle.LineAt(0)),
            .. BenchStiffness.LimitsDb.SelectMany(limit => new[] { Flat(hz, limit), Flat(hz, -limit) }),
        ];
        string reach = string.Join(", ", stiffness.Agreement.Select(limit => limit.UpToHz is { } hertz
            ? string.Create(CultureInfo.InvariantCulture, $"within {limit.LimitDb} dB up to {hertz:G4} Hz")
            : string.Create(CultureInfo.InvariantCulture, $"never within {limit.LimitDb} dB")));
        var axis = new PictureAxis("Contact over blocked force in dB", -60, 30, false, Ticks.Even(-60, 30, 9));
        return Page("bench-stiffness", "Is the bench stiff enough?", $"all forces together: {reach}",
            [new Panel("", PictureAxes.Frequency(stiffness.Axis, "Frequency in Hz"), axis, lines, (0, 0, 1, 1))]) with
        {
            Legend = [new LegendEntry("all", PictureStyle.LineAt(0)), new LegendEntry("single dofs", PictureStyle.Quiet), new LegendEntry("±1, 3, 10 dB", PictureStyle.LineAt(1))],
        };
    }

    /// <summary>Mean and least coherence of the installed FRFs.</summary>
    public Picture Coherence(CoherenceReport coherence)
    {
        double[] hz = coherence.Axis.Hz.ToArray();
        Series[] lines =
        [
            new("", hz, [.. coherence.Mean.Select(Gap)], PictureStyle.LineAt(0)),
            new("", hz, [.. coherence.Least.Select(Gap)], PictureStyle.LineAt(1), Thin: true),
        ];
        return Page("coherence", "Coherence of the installed FRFs", FormattableString.Invariant($"{coherence.Averages} averages"),
            [new Panel("", PictureAxes.Frequency(coherence.Axis, "Frequency in Hz"), new PictureAxis("Coherence", 0, 1.05, false, Ticks.Even(0, 1, 5)), lines, (0, 0, 1, 1))]) with
        {
            Legend = [new LegendEntry("mean", PictureStyle.LineAt(0)), new LegendEntry("least", PictureStyle.LineAt(1))],
        };
    }

    private double[] ForceLevel(IdentifiedOperation operation, Dof dof)
    {
        int index = report.Result.Interface.ToList().IndexOf(dof);
        double toRms = operation.Amplitude == Amplitude.Peak ? Math.Sqrt(0.5) : 1;
        return [.. operation.Magnitudes(index).Select(value => Gap(LevelReference.Force.Decibels(toRms * value)))];
    }

    private static Series Flat(double[] hz, double level) => new("", [hz[0], hz[^1]], [level, level], PictureStyle.LineAt(1), Thin: true);

    private static double Gap(double value) => double.IsFinite(value) ? value : double.NaN;

    private static string Capital(string text) => char.ToUpperInvariant(text[0]) + text[1..];

    private Picture Page(string name, string title, string subtitle, IReadOnlyList<Panel> panels) =>
        new(name, title, subtitle, report.Provenance, PictureStyle.PageWidth, PictureStyle.PageHeight, panels);

    private Picture Sheet(string name, string title, string subtitle, IReadOnlyList<Panel> panels) =>
        new(name, title, subtitle, report.Provenance, PictureStyle.SheetWidth, PictureStyle.SheetHeight, panels);
}
