using System.Buffers.Binary;
using System.Globalization;
using System.Numerics;
using System.Text;
using Boltup.Engine.Spectra;

namespace Boltup.Files.UniversalFile;

/// <summary>Writes Universal Files: header (151), units (164), points (2411) and functions (58 or 58b), in SI units.</summary>
public sealed class UniversalFileWriter(Stream output)
{
    private const string Delimiter = "    -1";
    private const string NoDate = "NONE";
    private const int LineWidth = 80;
    private const int EntityWidth = 10;

    /// <summary>Dataset 151: what the file is and which program wrote it; without a date, so that equal data give equal bytes.</summary>
    public void WriteHeader(string title, string program) => WriteDataset(
        151, title, title, program, Line($"{NoDate,-10}{NoDate,-10}{0,10}{0,10}{0,10}"), NoDate, program, NoDate);

    /// <summary>Dataset 164 with SI factors.</summary>
    public void WriteUnits() => WriteDataset(
        164,
        $"{1,10}{"SI: m, N",-20}{2,10}",
        Line($"{D(1)}{D(1)}{D(1)}"),
        Line($"{D(273.15)}"));

    /// <summary>Dataset 15, coordinates with six digits, for readers that do not know 2411.</summary>
    /// <param name="points">Points whose node is a number.</param>
    public void WriteRoundedPoints(IEnumerable<MeasuredPoint> points) => WriteDataset(
        15,
        [.. points.Select(point => Line(
            $"{NodeOf(point),10}{0,10}{0,10}{0,10}{Single(point.X)}{Single(point.Y)}{Single(point.Z)}"))]);

    /// <summary>Dataset 2411.</summary>
    /// <param name="points">Points whose node is a number.</param>
    public void WritePoints(IEnumerable<MeasuredPoint> points) => WriteDataset(
        2411,
        [.. points.SelectMany(point => new[]
        {
            Line($"{NodeOf(point),10}{0,10}{0,10}{0,10}"),
            Line($"{D(point.X)}{D(point.Y)}{D(point.Z)}"),
        })]);

    /// <summary>Writes one function.</summary>
    /// <param name="curve">Kind, dofs (nodes as text), quantities and axis; storage flags of the curve are ignored.</param>
    /// <param name="values">One value per line.</param>
    public void WriteFunction(Curve curve, ReadOnlySpan<Complex> values, UniversalFileStorage storage)
    {
        bool isEven = IsEvenInSixDigits(curve.Axis);
        double[] numbers = Flatten(curve.Axis, values, isEven, storage.IsComplex);
        int bytes = numbers.Length * (storage.IsDouble ? 8 : 4);
        WriteLine(Delimiter);
        WriteLine(storage.IsBinary
            ? Line($"{58,6}b{(storage.IsBigEndian ? 2 : 1),6}{2,6}{11,12}{bytes,12}{0,6}{0,6}{0,12}{0,12}")
            : Line($"{58,6}"));
        foreach (string line in Header(curve, isEven, storage))
        {
            WriteLine(line);
        }

        if (storage.IsBinary)
        {
            WriteBinary(numbers, storage);
        }
        else
        {
            WriteAscii(numbers, isEven, storage);
        }

        WriteLine(Delimiter);
    }

    private static string Line(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);

    private static int NodeOf(MeasuredPoint point) => int.Parse(point.Node, CultureInfo.InvariantCulture);

    private static string D(double value) => value.ToString("E16", CultureInfo.InvariantCulture).Replace('E', 'D').PadLeft(25);

    private static double[] Flatten(FrequencyAxis axis, ReadOnlySpan<Complex> values, bool isEven, bool isComplex)
    {
        var numbers = new List<double>();
        for (int line = 0; line < values.Length; line++)
        {
            if (!isEven)
            {
                numbers.Add(axis[line]);
            }

            numbers.Add(values[line].Real);
            if (isComplex)
            {
                numbers.Add(values[line].Imaginary);
            }
        }

        return [.. numbers];
    }

    private static string[] Header(Curve curve, bool isEven, UniversalFileStorage storage)
    {
        int type = (storage.IsComplex ? 4 : 0) + (storage.IsDouble ? (storage.IsComplex ? 2 : 4) : storage.IsComplex ? 1 : 2);
        double step = isEven ? StepOf(curve.Axis) : 0;
        return
        [
            curve.Title[..Math.Min(LineWidth, curve.Title.Length)],
            $"{curve.Response} / {curve.Excitation}",
            NoDate,
            NoDate,
            NoDate,
            Line($"{FunctionTypeOf(curve.Kind),5}{0,10}{1,5}{0,10} {Channel(curve.Response)} {Channel(curve.Excitation)}"),
            Line($"{type,10}{curve.Axis.Count,10}{(isEven ? 1 : 0),10}{Single(curve.Axis.FirstHz)}{Single(step)}{Single(0)}"),
            Axis(DataTypes.Frequency, "Frequency", "Hz"),
            AxisOf(curve.ResponseQuantity),
            AxisOf(curve.ExcitationQuantity),
            Axis(0, "NONE", "NONE"),
        ];
    }

    private static double StepOf(FrequencyAxis axis) => axis.Count > 1 ? (axis.LastHz - axis.FirstHz) / (axis.Count - 1) : 0;

    /// <summary>Whether the axis comes back exactly from the six digits that a header has for its first line and step.</summary>
    private static bool IsEvenInSixDigits(FrequencyAxis axis)
    {
        double first = double.Parse(Single(axis.FirstHz), CultureInfo.InvariantCulture);
        double step = double.Parse(Single(StepOf(axis)), CultureInfo.InvariantCulture);
        return axis.IsEven && FunctionBuilder.RebuildEven(first, step, axis.Count) is { } rebuilt && rebuilt.Hz.SequenceEqual(axis.Hz);
    }

    private static string Single(double value) => Number(value, 5).PadLeft(13);

    private static int FunctionTypeOf(FunctionKind kind) => kind switch
    {
        FunctionKind.AutoSpectrum => 2,
        FunctionKind.CrossSpectrum => 3,
        FunctionKind.Frf => 4,
        FunctionKind.Transmissibility => 5,
        FunctionKind.Coherence => 6,
        FunctionKind.PowerSpectralDensity => 9,
        FunctionKind.Spectrum => 12,
        FunctionKind.Order => 27,
        _ => 0,
    };

    private static string Channel(Dof? dof)
    {
        int node = dof is { } named && int.TryParse(named.Point, NumberStyles.None, CultureInfo.InvariantCulture, out int number) ? number : 0;
        int direction = dof is { IsMotion: true } moving ? (int)moving.Direction + 1 : 0;
        string name = dof is not null && node == 0 ? dof.ToString() : "NONE";
        string entity = name.Length <= EntityWidth ? name : "NONE"; // a name cut off could read as another dof
        return Line($"{entity,-EntityWidth}{node,10}{direction,4}");
    }

    private static string AxisOf(Quantity quantity) => quantity switch
    {
        Quantity.Displacement => Axis(8, "Displacement", "m"),
        Quantity.Velocity => Axis(11, "Velocity", "m/s"),
        Quantity.Acceleration => Axis(12, "Acceleration", "m/s^2"),
        Quantity.Force => Axis(13, "Force", "N"),
        Quantity.Pressure => Axis(15, "Pressure", "Pa"),
        Quantity.VolumeVelocity => Axis(1, "Volume velocity", "m^3/s"),
        _ => Axis(0, "NONE", "NONE"),
    };

    private static string Axis(int type, string label, string unit) => Line($"{type,10}{0,5}{0,5}{0,5} {label,-20} {unit,-20}");

    private void WriteDataset(int number, params string[] lines)
    {
        WriteLine(Delimiter);
        WriteLine(Line($"{number,6}"));
        foreach (string line in lines)
        {
            WriteLine(line);
        }

        WriteLine(Delimiter);
    }

    private void WriteLine(string line)
    {
        output.Write(Encoding.UTF8.GetBytes(line));
        output.WriteByte((byte)'\n');
    }

    private void WriteBinary(double[] numbers, UniversalFileStorage storage)
    {
        int size = storage.IsDouble ? 8 : 4;
        var bytes = new byte[numbers.Length * size];
        for (int i = 0; i < numbers.Length; i++)
        {
            WriteOne(bytes.AsSpan(i * size), numbers[i], storage);
        }

        output.Write(bytes);
    }

    private static void WriteOne(Span<byte> target, double value, UniversalFileStorage storage)
    {
        switch (storage.IsDouble, storage.IsBigEndian)
        {
            case (true, false):
                BinaryPrimitives.WriteDoubleLittleEndian(target, value);
                break;
            case (true, true):
                BinaryPrimitives.WriteDoubleBigEndian(target, value);
                break;
            case (false, false):
                BinaryPrimitives.WriteSingleLittleEndian(target, (float)value);
                break;
            default:
                BinaryPrimitives.WriteSingleBigEndian(target, (float)value);
                break;
        }
    }

    private void WriteAscii(double[] numbers, bool isEven, UniversalFileStorage storage)
    {
        int[] widths = new DataLayout(0, 0, 0, false, false, !isEven, storage.IsComplex ? 2 : 1, storage.IsDouble).RowWidths;
        var row = new StringBuilder();
        for (int i = 0; i < numbers.Length; i++)
        {
            int width = widths[i % widths.Length];
            row.Append(Number(numbers[i], width == 20 ? 12 : 5).PadLeft(width));
            if (i % widths.Length == widths.Length - 1 || i == numbers.Length - 1)
            {
                WriteLine(row.ToString());
                row.Clear();
            }
        }
    }

    /// <summary>Scientific notation with an exponent of two digits where that is enough, as Fortran writes it.</summary>
    private static string Number(double value, int decimals)
    {
        string text = value.ToString(decimals == 12 ? "E12" : "E5", CultureInfo.InvariantCulture);
        int exponent = text.IndexOf('E', StringComparison.Ordinal);
        return exponent >= 0 && text[exponent + 2] == '0' ? text.Remove(exponent + 2, 1) : text;
    }
}
