using Boltup.Cli.Terminal;
using Boltup.Engine.Spectra;
using Boltup.Files;

namespace Boltup.Cli.Commands;

/// <summary>Prints what a data file holds: functions of one kind, quantity and axis together.</summary>
internal static class InspectText
{
    private const int Shown = 12;

    public static void Write(Screen screen, DataFile file, bool everyCurve)
    {
        screen.Out.WriteLine(screen.Ink.Strong($"{file.DisplayPath}: {file.Format}, {Count(file.Curves.Count, "function")}"));
        foreach (var group in file.Curves.GroupBy(curve => (curve.Kind, curve.ResponseQuantity, curve.ExcitationQuantity, curve.Axis, curve.IsComplex, curve.IsDouble)))
        {
            WriteGroup(screen.Out, [.. group]);
        }

        if (file.Points.Count > 0)
        {
            screen.Out.WriteLine($"  {Count(file.Points.Count, "point")} with positions: {Shorten(file.Points.Select(point => point.Node))}");
        }

        if (everyCurve)
        {
            WriteCurves(screen.Out, file);
        }

        screen.Out.WriteLine();
    }

    private static void WriteGroup(TextWriter output, Curve[] curves)
    {
        Curve first = curves[0];
        string storage = $"{(first.IsComplex ? "complex" : "real")} {(first.IsDouble ? "double" : "single")}";
        output.WriteLine($"  {curves.Length} × {Words(first.Kind)}, {QuantityOf(first)}, {storage}");
        output.WriteLine($"      frequencies  {first.Axis}");
        output.WriteLine($"      responses    {Shorten(Names(curves.Select(curve => curve.Response)))}");
        if (curves.Any(curve => curve.Excitation is not null))
        {
            output.WriteLine($"      excitations  {Shorten(Names(curves.Select(curve => curve.Excitation)))}");
        }
    }

    private static void WriteCurves(TextWriter output, DataFile file)
    {
        foreach (Curve curve in file.Curves)
        {
            string pair = curve.Excitation is null ? $"{curve.Response}" : $"{curve.Response} / {curve.Excitation}";
            output.WriteLine($"  {curve.Index + 1,5}  {Words(curve.Kind),-16} {pair,-24} {curve.Span}  {curve.Title}");
        }
    }

    private static string Words(FunctionKind kind) => kind switch
    {
        FunctionKind.Frf => "FRF",
        FunctionKind.AutoSpectrum => "auto-spectrum",
        FunctionKind.CrossSpectrum => "cross-spectrum",
        FunctionKind.PowerSpectralDensity => "PSD",
        FunctionKind.MountStiffness => "dynamic stiffness",
        _ => kind.ToString().ToLowerInvariant(),
    };

    private static string QuantityOf(Curve curve) => curve.Kind == FunctionKind.Frf
        ? (curve.ResponseQuantity, curve.ExcitationQuantity) switch
        {
            (Quantity.Displacement, Quantity.Force) => "receptance",
            (Quantity.Velocity, Quantity.Force) => "mobility",
            (Quantity.Acceleration, Quantity.Force) => "accelerance",
            (Quantity.Unknown, _) => "quantity not stated",
            _ => $"{Words(curve.ResponseQuantity)} per {Words(curve.ExcitationQuantity)}",
        }
        : Words(curve.ResponseQuantity);

    private static string Words(Quantity quantity) => quantity switch
    {
        Quantity.VolumeVelocity => "volume velocity",
        Quantity.Dimensionless => "ratio",
        Quantity.Unknown => "quantity not stated",
        _ => quantity.ToString().ToLowerInvariant(),
    };

    private static IEnumerable<string> Names(IEnumerable<Dof?> dofs) => dofs.Select(dof => dof?.ToString() ?? "not stated").Distinct();

    private static string Shorten(IEnumerable<string> names)
    {
        string[] all = [.. names];
        return string.Join(" ", all.Take(Shown)) + (all.Length > Shown ? $" … {all.Length} in all" : "");
    }

    private static string Count(int count, string word) => $"{count} {word}{(count == 1 ? "" : "s")}";
}
