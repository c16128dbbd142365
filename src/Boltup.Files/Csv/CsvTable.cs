using System.Numerics;
using System.Runtime.InteropServices;
using System.Text;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Spectra;
using Boltup.Files.Text;

namespace Boltup.Files.Csv;

/// <summary>Collects the rows of a table into curves.</summary>
internal sealed class CsvTable(CsvHeader header, string displayPath, DiagnosticBag diagnostics)
{
    /// <summary>Beyond this the file is not what it says, and more messages help nobody.</summary>
    private const int MaximumErrors = 20;

    private readonly Dictionary<string, CsvCurve> _byName = new(StringComparer.Ordinal);
    private readonly List<CsvCurve> _curves = [];
    private readonly AxisPool _axes = new();
    private byte[] _lastName = [];
    private CsvCurve? _last;
    private int _errors;
    private bool _hasNotFinite;

    /// <summary>Values of the finished curves.</summary>
    public List<Complex[]> Values { get; } = [];

    /// <summary>Takes a row; blank rows are passed over.</summary>
    public void Add(ReadOnlySpan<byte> row, int line)
    {
        if (_errors > MaximumErrors || Blanks.Trim(row).IsEmpty)
        {
            return;
        }

        Span<Range> fields = stackalloc Range[6];
        int found = CsvRow.Split(row, fields);
        if (found != header.Columns)
        {
            Error(FileCodes.BadCsvRow, $"{found} fields, expected {header.Columns}", line, 1, row.Length, $"columns: `{header.Text}`");
            return;
        }

        int names = header.NameColumns;
        if (TryNumber(row, fields[names], line, out double hz)
            && TryNumber(row, fields[names + 1], line, out double real)
            && TryNumber(row, fields[names + 2], line, out double imaginary)
            && CurveOf(row, fields, line) is { } curve)
        {
            AddLine(curve, hz, new Complex(real, imaginary), row, fields[names], line);
        }
    }

    /// <summary>The curves, or null after errors.</summary>
    public IReadOnlyList<Curve>? Finish()
    {
        if (_errors == 0 && _curves.Count == 0)
        {
            Error(FileCodes.NothingThere, "the table has no rows", 1, 1, 1, null);
        }

        return _errors > 0 ? null : [.. _curves.Select(Finish)];
    }

    private Curve Finish(CsvCurve curve, int index)
    {
        Values.Add([.. curve.Values]);
        bool isStiffness = header.Kind == FunctionKind.MountStiffness;
        Dof first = DofOf(curve.Names[isStiffness ? ^1 : 0]);
        Dof? second = header.Kind is FunctionKind.Frf or FunctionKind.CrossSpectrum ? DofOf(curve.Names[1]) : null;
        return new Curve
        {
            Index = index,
            Kind = header.Kind,
            Response = first,
            Excitation = second,
            ResponseQuantity = first.Direction == Direction.P ? Quantity.Pressure : Quantity.Unknown,
            ExcitationQuantity = second is null ? Quantity.Unknown : second.Direction == Direction.Q ? Quantity.VolumeVelocity : Quantity.Force,
            Axis = _axes.Share(CollectionsMarshal.AsSpan(curve.Hz))!, // rows were checked to increase
            At = Named(curve, CsvName.At),
            Term = Named(curve, CsvName.Term),
            Title = string.Join(" / ", curve.Names),
            Span = curve.Span,
        };
    }

    private string? Named(CsvCurve curve, string column) =>
        curve.Names.Where((_, i) => header.Names[i].Column == column).FirstOrDefault();

    private Dof DofOf(string name)
    {
        bool isDirection = header.Kind == FunctionKind.MountStiffness & Dof.TryParseDirection(name, out Direction direction);
        return isDirection ? new Dof("", direction) : Dof.Parse(name);
    }

    private CsvCurve? CurveOf(ReadOnlySpan<byte> row, ReadOnlySpan<Range> fields, int line)
    {
        ReadOnlySpan<byte> name = row[..fields[header.NameColumns - 1].End.Value];
        if (_last is not null && name.SequenceEqual(_lastName))
        {
            return _last;
        }

        var names = new string[header.NameColumns];
        for (int i = 0; i < names.Length; i++)
        {
            names[i] = Encoding.UTF8.GetString(row[fields[i]]).Replace("\"\"", "\"", StringComparison.Ordinal).Trim();
            if (!header.Names[i].Takes(names[i]))
            {
                Error(
                    FileCodes.BadCsvRow,
                    $"`{names[i]}` is not {header.Names[i].Expected}",
                    line,
                    ColumnOf(row, fields[i]),
                    names[i].Length,
                    header.Names[i].Choices);
                return null;
            }
        }

        _last = FindOrAdd(names, line);
        _lastName = name.ToArray();
        return _last;
    }

    private CsvCurve FindOrAdd(string[] names, int line)
    {
        string key = string.Join('\n', names);
        if (!_byName.TryGetValue(key, out CsvCurve? curve))
        {
            curve = new CsvCurve(names, new SourceSpan(displayPath, line));
            _byName.Add(key, curve);
            _curves.Add(curve);
        }

        return curve;
    }

    private void AddLine(CsvCurve curve, double hz, Complex value, ReadOnlySpan<byte> row, Range field, int line)
    {
        bool follows = hz >= 0 && double.IsFinite(hz) && (curve.Hz.Count == 0 || hz > curve.Hz[^1]);
        if (!follows)
        {
            string last = curve.Hz.Count == 0 ? "" : FormattableString.Invariant($" after {curve.Hz[^1]} Hz");
            Error(
                FileCodes.BadAxis,
                $"frequency {Encoding.UTF8.GetString(row[field])}{last} in `{string.Join(" / ", curve.Names)}`, expected increasing frequencies from 0 on",
                line,
                ColumnOf(row, field),
                field.End.Value - field.Start.Value,
                null);
            return;
        }

        curve.Hz.Add(hz);
        curve.Values.Add(value);
    }

    private bool TryNumber(ReadOnlySpan<byte> row, Range field, int line, out double value)
    {
        ReadOnlySpan<byte> text = row[field];
        NumberForms forms = NumberForms.Plain;
        if (NumberParser.TryParse(Blanks.Trim(text), out value, ref forms) && (forms & ~NumberForms.NotFinite) == 0)
        {
            NoteNotFinite(forms, line, ColumnOf(row, field));
            return true;
        }

        Error(
            FileCodes.BadNumber,
            $"`{Encoding.UTF8.GetString(text)}` is no number",
            line,
            ColumnOf(row, field),
            text.Length,
            "write numbers with a decimal point, such as 1.25e-3");
        return false;
    }

    private static int ColumnOf(ReadOnlySpan<byte> row, Range field) => Encoding.UTF8.GetCharCount(row[..field.Start.Value]) + 1;

    private void NoteNotFinite(NumberForms forms, int line, int column)
    {
        if (forms == NumberForms.NotFinite && !_hasNotFinite)
        {
            _hasNotFinite = true;
            diagnostics.Note(
                FileCodes.Liberty, "a row holds a value that is no finite number: such values were kept", new SourceSpan(displayPath, line, column));
        }
    }

    private void Error(DiagnosticCode code, string message, int line, int column, int length, string? help)
    {
        _errors++;
        if (_errors <= MaximumErrors)
        {
            diagnostics.Error(code, message, new SourceSpan(displayPath, line, column, Math.Max(length, 1)), help);
        }
    }
}
