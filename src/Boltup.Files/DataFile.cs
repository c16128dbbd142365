using System.Numerics;
using Boltup.Engine.Diagnostics;
using Boltup.Files.Csv;
using Boltup.Files.Text;
using Boltup.Files.UniversalFile;

namespace Boltup.Files;

/// <summary>
/// A file of spectra. Opening it finds out what it holds; values are read curve by curve, so that no file is ever in memory as a whole.
/// One thread at a time.
/// </summary>
public sealed class DataFile : IDisposable
{
    private readonly IDataReader _reader;

    private DataFile(string displayPath, IDataReader reader) => (DisplayPath, _reader) = (displayPath, reader);

    /// <summary>Path as messages name it.</summary>
    public string DisplayPath { get; }

    /// <summary>Name of the format.</summary>
    public string Format => _reader.Format;

    public IReadOnlyList<Curve> Curves => _reader.Curves;

    /// <summary>Points with their places, where the file gives them.</summary>
    public IReadOnlyList<MeasuredPoint> Points => _reader.Points;

    /// <summary>Opens a file; its format is told by its first line.</summary>
    /// <returns>The file, or null after an error in <paramref name="diagnostics"/>.</returns>
    public static DataFile? Open(string path, string displayPath, DiagnosticBag diagnostics)
    {
        ByteSource source;
        try
        {
            source = ByteSource.Open(path);
        }
        catch (Exception exception) when (exception is IOException or UnauthorizedAccessException or ArgumentException)
        {
            diagnostics.Error(FileCodes.CannotRead, $"`{displayPath}` cannot be read", new SourceSpan(displayPath), notes: exception.Message);
            return null;
        }
        catch (NotSupportedException)
        {
            diagnostics.Error(
                FileCodes.CannotRead, $"`{displayPath}` is a pipe or device", new SourceSpan(displayPath), "save the data as a file, which can be read at any place");
            return null;
        }

        IDataReader? reader = ReaderFor(source, displayPath, diagnostics);
        if (reader is not null)
        {
            return new DataFile(displayPath, reader);
        }

        source.Dispose();
        return null;
    }

    /// <summary>Reads the values of a curve in SI units.</summary>
    /// <param name="values">One value per line of the curve's axis.</param>
    /// <returns>False after an error in <paramref name="diagnostics"/>.</returns>
    public bool ReadSpectrum(Curve curve, Span<Complex> values, DiagnosticBag diagnostics)
    {
        if (values.Length != curve.Axis.Count)
        {
            throw new ArgumentException($"{curve.Axis.Count} values are needed, not {values.Length}", nameof(values));
        }

        return _reader.Read(curve, values, diagnostics);
    }

    public void Dispose() => _reader.Dispose();

    private static IDataReader? ReaderFor(ByteSource source, string displayPath, DiagnosticBag diagnostics)
    {
        Span<byte> start = stackalloc byte[512];
        ReadOnlySpan<byte> head = start[..source.ReadAt(0, start)];
        if (CsvReader.Recognises(head))
        {
            return CsvReader.Open(source, displayPath, diagnostics);
        }

        if (UniversalFileReader.Recognises(source))
        {
            return UniversalFileReader.Open(source, displayPath, diagnostics);
        }

        diagnostics.Error(
            FileCodes.UnknownFormat,
            $"`{displayPath}` is in no format that is known",
            new SourceSpan(displayPath),
            "expected a Universal File (datasets between lines of `    -1`) or a CSV with one of the headers in the note",
            CsvHeader.KnownText);
        return null;
    }
}
