using System.Numerics;
using System.Text;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Files.Text;

namespace Boltup.Files.UniversalFile;

/// <summary>Walks from dataset to dataset and keeps what can be used. Text between datasets is comment.</summary>
internal sealed partial class DatasetWalker
{
    /// <summary>Beyond this the file is not what it says, and more messages help nobody.</summary>
    private const int MaximumWarnings = 50;

    /// <summary>Room for the header of a function.</summary>
    private const int HeaderWindow = 2048;

    private readonly ByteSource _source;
    private readonly LineReader _lines;
    private readonly string _displayPath;
    private readonly DiagnosticBag _diagnostics;
    private readonly Liberties _liberties;
    private readonly FunctionBuilder _builder;
    private readonly SkippedDatasets _skipped = new();
    private readonly List<Curve> _curves = [];
    private readonly List<FunctionRecord> _records = [];
    private readonly List<MeasuredPoint> _points = [];
    private NumberForms _forms;
    private bool _hasBinary;
    private int _leftOut;
    private UnitSystem _units = UnitSystem.Si;
    private Amplitude? _amplitude;

    public DatasetWalker(ByteSource source, string displayPath, DiagnosticBag diagnostics)
    {
        (_source, _displayPath, _diagnostics) = (source, displayPath, diagnostics);
        _lines = new LineReader(source, HeaderWindow);
        _liberties = new Liberties(displayPath);
        _builder = new FunctionBuilder(_liberties);
    }

    public IReadOnlyList<Curve> Curves => _curves;

    /// <summary>For each curve how to read it.</summary>
    public IReadOnlyList<FunctionRecord> Records => _records;

    public IReadOnlyList<MeasuredPoint> Points => _points;

    /// <summary>Whether a line opens or closes a dataset: −1 in the first six columns and nothing else.</summary>
    public static bool IsDelimiter(ReadOnlySpan<byte> line) =>
        line.Length >= 2 && line.Length <= 80 && line.IndexOf((byte)'-') <= 4 && Blanks.Trim(line).SequenceEqual("-1"u8);

    public void Walk()
    {
        while (_lines.TryRead(out ReadOnlySpan<byte> line))
        {
            if (IsDelimiter(line))
            {
                ReadDataset();
            }
        }

        _skipped.SayAll(_displayPath, _diagnostics);
        if (_leftOut > MaximumWarnings)
        {
            _diagnostics.Warning(
                FileCodes.BadHeader, $"{_leftOut - MaximumWarnings} more records or points were left out", new SourceSpan(_displayPath));
        }

        if (BitOperations.PopCount((uint)_lines.Ends) > 1)
        {
            _liberties.Place = new SourceSpan(_displayPath);
            _liberties.Take(Liberty.MixedLineEnds);
        }

        _liberties.SayAll(_diagnostics);
    }

    private void ReadDataset()
    {
        long offset;
        ReadOnlySpan<byte> idLine;
        do
        {
            offset = _lines.Position;
            if (!_lines.TryRead(out idLine))
            {
                return;
            }
        }
        while (IsDelimiter(idLine)); // of two delimiters in a row, the first closed a dataset that a damaged one left open

        string id = Encoding.Latin1.GetString(idLine);
        if (!FixedColumns.TryInteger(id, 0, 6, out int number))
        {
            SkipDataset();
            return;
        }

        switch (number)
        {
            case 58:
                ReadFunction(id, offset);
                _amplitude = null;
                break;
            case 15 or 2411:
                ReadPoints(number);
                break;
            case 164:
                ReadUnits();
                break;
            case 1858:
                ReadQualifiers();
                break;
            case 151 or 82:
                SkipDataset();
                break;
            default:
                _skipped.Add(number);
                SkipDataset();
                break;
        }
    }

    private void SkipDataset()
    {
        while (TryReadInside(out _))
        {
        }
    }

    /// <summary>Reads a line of the dataset; false at its end, with the delimiter passed.</summary>
    private bool TryReadInside(out ReadOnlySpan<byte> line) => _lines.TryRead(out line) && !IsDelimiter(line);

    private void ReadFunction(string id, long offset)
    {
        int idLineNumber = _lines.LineNumber;
        bool isBinary = id.Length > 6 && id[6] is 'b' or 'B';
        _hasBinary |= isBinary;
        SourceSpan Place(int line = 0) => _hasBinary
            ? new SourceSpan(_displayPath, ByteOffset: offset)
            : new SourceSpan(_displayPath, idLineNumber + line);
        _liberties.Place = Place();
        var headerLines = new List<string>(FunctionHeaderParser.LineCount);
        while (headerLines.Count < FunctionHeaderParser.LineCount && _lines.TryRead(out ReadOnlySpan<byte> line))
        {
            headerLines.Add(FixedColumns.Decode(line, _liberties));
        }

        if (headerLines.Count < FunctionHeaderParser.LineCount)
        {
            LeaveOut(FileCodes.Truncated, "the file ends within the header of a function", Place());
            return;
        }

        if (FunctionHeaderParser.Parse(headerLines, _liberties, out int badLine, out string reason) is not { } header)
        {
            LeaveOut(FileCodes.BadHeader, $"line {badLine + 1} of a function's header cannot be understood", Place(badLine + 1), reason);
            SkipDataset();
            return;
        }

        DataLayout? layout = isBinary ? FindBinary(id, header, Place()) : FindAscii(header, Place());
        if (layout is not null)
        {
            AddFunction(header, layout, Place());
        }
    }

    private void AddFunction(FunctionHeader header, DataLayout layout, SourceSpan place)
    {
        if (header.Abscissa.DataType != DataTypes.Frequency && !_builder.ImpliesFrequency(header))
        {
            _liberties.Note(FileCodes.SkippedFunction, $"a function over data type {header.Abscissa.DataType}, which is not frequency, was skipped");
            return;
        }

        if (ReadAxis(header, layout, place) is { } axis)
        {
            (Curve curve, FunctionRecord record) = _builder.Build(header, layout, axis, _units, _amplitude, _curves.Count, place);
            _curves.Add(curve);
            _records.Add(record);
        }
    }

    private FrequencyAxis? ReadAxis(FunctionHeader header, DataLayout layout, SourceSpan place)
    {
        FrequencyAxis? axis = header.IsEven
            ? _builder.EvenAxis(header.First, header.Step, layout.Points)
            : ReadUnevenAxis(layout);
        if (axis is null)
        {
            LeaveOut(FileCodes.BadAxis, "the frequencies of a function are not increasing from 0 on", place);
        }

        return axis;
    }

    private FrequencyAxis? ReadUnevenAxis(DataLayout layout)
    {
        long next = _lines.Position;
        int lines = _lines.LineNumber;
        var numbers = new double[layout.Points * layout.NumbersPerPoint];
        bool complete = layout.IsBinary
            ? new BinaryData(_source).Read(layout, numbers)
            : AsciiData.Read(_lines, layout, numbers, _displayPath, _diagnostics, ref _forms);
        _lines.MoveTo(next, lines - _lines.LineNumber);
        double[] hz = [.. Enumerable.Range(0, layout.Points).Select(i => numbers[i * layout.NumbersPerPoint])];
        return complete ? _builder.UnevenAxis(hz) : null;
    }

    private void LeaveOut(DiagnosticCode code, string message, SourceSpan place, params string[] notes)
    {
        if (++_leftOut <= MaximumWarnings)
        {
            _diagnostics.Warning(code, message + "; it was left out", place, null, notes);
        }
    }
}
