using System.Numerics;
using System.Text;
using Boltup.Engine.Diagnostics;
using Boltup.Files.Text;

namespace Boltup.Files.Csv;

/// <summary>
/// Reads the CSV tables of Boltup: one row per line of a curve, curves in any order and even interleaved. Text is read once, as a
/// stream; the values are kept.
/// </summary>
internal sealed class CsvReader : IDataReader
{
    private readonly List<Complex[]> _values;

    private CsvReader(string format, IReadOnlyList<Curve> curves, List<Complex[]> values) =>
        (Format, Curves, _values) = (format, curves, values);

    public string Format { get; }

    public IReadOnlyList<Curve> Curves { get; }

    public IReadOnlyList<MeasuredPoint> Points => [];

    /// <summary>Whether a file that begins so is meant to be one of the tables: its first line names `real` and `imag`.</summary>
    public static bool Recognises(ReadOnlySpan<byte> head)
    {
        int end = head.IndexOfAny((byte)'\n', (byte)'\r');
        string first = Encoding.UTF8.GetString(end < 0 ? head : head[..end]).ToLowerInvariant();
        return first.Contains(',', StringComparison.Ordinal) && first.Contains("real", StringComparison.Ordinal)
            && first.Contains("imag", StringComparison.Ordinal);
    }

    /// <summary>Reads a whole table; the source is closed at once.</summary>
    public static CsvReader? Open(ByteSource source, string displayPath, DiagnosticBag diagnostics)
    {
        using (source)
        {
            var lines = new LineReader(source);
            lines.TryRead(out ReadOnlySpan<byte> first);
            if (FindHeader(first, displayPath, diagnostics) is not { } header)
            {
                return null;
            }

            var table = new CsvTable(header, displayPath, diagnostics);
            while (lines.TryRead(out ReadOnlySpan<byte> row))
            {
                table.Add(row, lines.LineNumber);
            }

            if (!lines.LineIsEnded)
            {
                diagnostics.Note(
                    FileCodes.Liberty,
                    "the last row has no line end: it was read, but the file may have been cut off",
                    new SourceSpan(displayPath, lines.LineNumber));
            }

            return table.Finish() is { } curves ? new CsvReader(header.Format, curves, table.Values) : null;
        }
    }

    public bool Read(Curve curve, Span<Complex> values, DiagnosticBag diagnostics)
    {
        _values[curve.Index].CopyTo(values);
        return true;
    }

    public void Dispose()
    {
    }

    private static CsvHeader? FindHeader(ReadOnlySpan<byte> first, string displayPath, DiagnosticBag diagnostics)
    {
        string text = Encoding.UTF8.GetString(first).TrimStart('\uFEFF').TrimEnd();
        foreach (CsvHeader header in CsvHeader.All)
        {
            if (header.Text == text)
            {
                return header;
            }
        }

        diagnostics.Error(
            FileCodes.BadCsvHeader,
            $"unknown columns `{text}`",
            new SourceSpan(displayPath, 1, 1, text.Length),
            $"did you mean `{CsvHeader.Nearest(text).Text}`?",
            $"known headers: {CsvHeader.KnownText}");
        return null;
    }
}
