using System.Numerics;
using System.Runtime.InteropServices;
using Boltup.Engine.Diagnostics;
using Boltup.Files.Text;

namespace Boltup.Files.UniversalFile;

/// <summary>
/// Reads Universal Files: functions (58 and 58b), points (15, 2411), units (164) and qualifiers (1858). Opening walks over the headers;
/// values are read from their place when they are asked for.
/// </summary>
internal sealed class UniversalFileReader : IDataReader
{
    private readonly ByteSource _source;
    private readonly string _displayPath;
    private readonly IReadOnlyList<FunctionRecord> _records;
    private readonly LineReader _lines;
    private readonly BinaryData _binary;
    private double[] _numbers = [];
    private NumberForms _saidForms;

    private UniversalFileReader(ByteSource source, string displayPath, DatasetWalker walker)
    {
        (_source, _displayPath) = (source, displayPath);
        (Curves, Points, _records) = (walker.Curves, walker.Points, walker.Records);
        _lines = new LineReader(source);
        _binary = new BinaryData(source);
        Format = _records.Any(record => record.Layout.IsBinary) ? "Universal File 58b" : "Universal File 58";
    }

    public string Format { get; }

    public IReadOnlyList<Curve> Curves { get; }

    public IReadOnlyList<MeasuredPoint> Points { get; }

    /// <summary>Whether a delimiter line stands near the beginning; comments may come before it.</summary>
    public static bool Recognises(ByteSource source)
    {
        var lines = new LineReader(source);
        for (int i = 0; i < 100 && lines.TryRead(out ReadOnlySpan<byte> line); i++)
        {
            if (DatasetWalker.IsDelimiter(line))
            {
                return true;
            }
        }

        return false;
    }

    /// <summary>Finds out what the file holds.</summary>
    public static UniversalFileReader? Open(ByteSource source, string displayPath, DiagnosticBag diagnostics)
    {
        var walker = new DatasetWalker(source, displayPath, diagnostics);
        walker.Walk();
        if (walker.Curves.Count > 0)
        {
            return new UniversalFileReader(source, displayPath, walker);
        }

        diagnostics.Error(FileCodes.NothingThere, $"`{displayPath}` holds no function over frequency", new SourceSpan(displayPath));
        return null;
    }

    public bool Read(Curve curve, Span<Complex> values, DiagnosticBag diagnostics)
    {
        FunctionRecord record = _records[curve.Index];
        int needed = values.Length * record.Layout.NumbersPerPoint;
        if (_numbers.Length < needed)
        {
            _numbers = new double[needed];
        }

        Span<double> numbers = _numbers.AsSpan(0, needed);
        if (!ReadNumbers(record, numbers, curve, diagnostics))
        {
            return false;
        }

        Compose(record, numbers, values);
        return true;
    }

    public void Dispose() => _source.Dispose();

    private bool ReadNumbers(FunctionRecord record, Span<double> numbers, Curve curve, DiagnosticBag diagnostics)
    {
        NumberForms forms = NumberForms.Plain;
        bool complete = record.Layout.IsBinary
            ? ReadBinary(record, numbers, curve, diagnostics, ref forms)
            : AsciiData.Read(_lines, record.Layout, numbers, _displayPath, diagnostics, ref forms);
        SayForms(forms, curve, diagnostics);
        return complete;
    }

    private bool ReadBinary(FunctionRecord record, Span<double> numbers, Curve curve, DiagnosticBag diagnostics, ref NumberForms forms)
    {
        bool complete = _binary.Read(record.Layout, numbers);
        if (!complete)
        {
            diagnostics.Error(FileCodes.Truncated, "the file has become shorter while it was read", curve.Span);
        }

        forms |= FiniteCheck.AreFinite(numbers) ? NumberForms.Plain : NumberForms.NotFinite;
        return complete;
    }

    /// <summary>Notes each form of number once per file.</summary>
    private void SayForms(NumberForms forms, Curve curve, DiagnosticBag diagnostics)
    {
        if ((forms & ~_saidForms) != 0)
        {
            var liberties = new Liberties(_displayPath) { Place = curve.Span };
            liberties.Take(forms & ~_saidForms);
            liberties.SayAll(diagnostics);
            _saidForms |= forms;
        }
    }

    private static void Compose(FunctionRecord record, ReadOnlySpan<double> numbers, Span<Complex> values)
    {
        DataLayout layout = record.Layout;
        bool hasImaginary = layout.Parts == 2 && record.KeepsImaginary;
        Span<double> parts = MemoryMarshal.Cast<Complex, double>(values);
        if (hasImaginary && !layout.HasAbscissa && record.Factor == 1)
        {
            numbers.CopyTo(parts);
            return;
        }

        int at = layout.HasAbscissa ? 1 : 0;
        for (int i = 0; i < parts.Length; i += 2)
        {
            parts[i] = record.Factor * numbers[at];
            parts[i + 1] = hasImaginary ? record.Factor * numbers[at + 1] : 0;
            at += layout.NumbersPerPoint;
        }
    }
}
