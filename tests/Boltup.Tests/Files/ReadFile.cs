using System.Numerics;
using Boltup.Engine.Diagnostics;
using Boltup.Files;

namespace Boltup.Tests.Files;

/// <summary>Everything that a data file says: curves, values (null where they are refused) and diagnostics.</summary>
internal sealed record ReadFile(
    IReadOnlyList<Curve> Curves, IReadOnlyList<MeasuredPoint> Points, IReadOnlyList<Complex[]?> Values, IReadOnlyList<Diagnostic> Diagnostics)
{
    public Complex[] this[int curve] => Values[curve] ?? throw new InvalidOperationException("the values were refused");

    public IEnumerable<string> Messages => Diagnostics.Select(item => $"{item.Severity} {item.Code} {item.Message}");

    public static ReadFile At(string path)
    {
        var diagnostics = new DiagnosticBag();
        using DataFile? file = DataFile.Open(path, "data", diagnostics);
        Complex[]?[] values = [.. (file?.Curves ?? []).Select(curve => ValuesOf(file!, curve, diagnostics))];
        return new ReadFile([.. file?.Curves ?? []], [.. file?.Points ?? []], values, [.. diagnostics.Items]);
    }

    public static ReadFile Of(string text)
    {
        using var file = new TemporaryFile(text);
        return At(file.Path);
    }

    public static ReadFile Of(ReadOnlySpan<byte> bytes)
    {
        using var file = new TemporaryFile(bytes);
        return At(file.Path);
    }

    public void HasNote(string fragment) =>
        Assert.Contains(Diagnostics, item => item.Severity == Severity.Note && item.Message.Contains(fragment, StringComparison.Ordinal));

    private static Complex[]? ValuesOf(DataFile file, Curve curve, DiagnosticBag diagnostics)
    {
        var values = new Complex[curve.Axis.Count];
        return file.ReadSpectrum(curve, values, diagnostics) ? values : null;
    }
}
