using System.Globalization;
using System.Numerics;
using System.Text;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Spectra;
using Boltup.Files;
using Boltup.Files.UniversalFile;

namespace Boltup.Tests.Files.UniversalFile;

public class UniversalFileWriterTests
{
    private static readonly FrequencyAxis Even = FrequencyAxis.Even(20, 2.5, 23);
    private static readonly FrequencyAxis Uneven = FrequencyAxis.FromHertz([1, 2, 4, 8, 16.5]);

    /// <summary>Digits of ASCII: half a unit of the sixth digit; double has thirteen.</summary>
    private const double SingleText = 5.1e-6;
    private const double DoubleText = 5.1e-13;

    public static TheoryData<bool, bool, bool, bool, bool> Combinations()
    {
        var data = new TheoryData<bool, bool, bool, bool, bool>();
        for (int bits = 0; bits < 32; bits++)
        {
            data.Add((bits & 1) != 0, (bits & 2) != 0, (bits & 4) != 0, (bits & 8) != 0, (bits & 16) != 0);
        }

        return data;
    }

    [Theory]
    [MemberData(nameof(Combinations))]
    public void WriteFunction_EveryStorage_ComesBack(bool isBinary, bool isBigEndian, bool isDouble, bool isComplex, bool isEven)
    {
        var storage = new UniversalFileStorage(isBinary, isBigEndian, isDouble, isComplex);
        Curve curve = Accelerance(isEven ? Even : Uneven);
        Complex[] values = Values(curve.Axis.Count, isDouble, isComplex);
        ReadFile read = ReadFile.Of(Write(writer => writer.WriteFunction(curve, values, storage)));

        Curve found = Assert.Single(read.Curves);
        Assert.Equal(curve with { Span = found.Span, Axis = found.Axis, IsDouble = isDouble, IsComplex = isComplex }, found);
        Assert.Equal(curve.Axis.Hz, found.Axis.Hz);
        AssertValues(values, read[0], isBinary ? 0 : isDouble ? DoubleText : SingleText);
        Assert.Equal(isComplex ? 0 : 1, read.Diagnostics.Count); // a real FRF draws a note
    }

    [Fact]
    public void WriteFunction_TwoCurves_ShareTheirAxis()
    {
        ReadFile read = ReadFile.Of(Write(writer =>
        {
            writer.WriteFunction(Accelerance(Even), Values(23, true, true), new UniversalFileStorage());
            writer.WriteFunction(Accelerance(Even), Values(23, true, true), new UniversalFileStorage(IsBinary: false));
        }));
        Assert.Same(read.Curves[0].Axis, read.Curves[1].Axis);
    }

    [Fact]
    public void WriteFunction_StepOfManyDigits_IsStoredUneven()
    {
        FrequencyAxis axis = FrequencyAxis.Even(20, 1.0 / 3, 10);
        ReadFile read = ReadFile.Of(Write(writer =>
            writer.WriteFunction(Accelerance(axis), Values(10, true, true), new UniversalFileStorage())));
        Assert.Equal(axis.Hz, read.Curves[0].Axis.Hz);
    }

    [Fact]
    public void WritePoints_BothDatasets_ComeBackInMetres()
    {
        MeasuredPoint[] points = [new("101", 0.092, -0.061, 1.0 / 3), new("7", 0, 1e-20, -123456)];
        ReadFile read = ReadFile.Of(Write(writer =>
        {
            writer.WriteHeader("Compressor, invented", "Boltup");
            writer.WriteUnits();
            writer.WritePoints(points);
            writer.WriteRoundedPoints(points);
            writer.WriteFunction(Accelerance(Even), Values(23, true, true), new UniversalFileStorage());
        }));
        Assert.Equal(points, read.Points.Take(2));
        Assert.Equal(points[0].Z, read.Points[2].Z, SingleText);
        Assert.Equal(-123456, read.Points[3].Z);
        Assert.Empty(read.Diagnostics);
    }

    [Fact]
    public void WriteFunction_DecimalComma_WritesAndReadsTheSameBytes()
    {
        Curve curve = Accelerance(Uneven);
        var storage = new UniversalFileStorage(IsBinary: false);
        byte[] expected = Write(writer => writer.WriteFunction(curve, Values(5, true, true), storage));
        CultureInfo before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo("de-DE");
            byte[] bytes = Write(writer => writer.WriteFunction(curve, Values(5, true, true), storage));
            Assert.Equal(expected, bytes);
            AssertValues(Values(5, true, true), ReadFile.Of(bytes)[0], DoubleText);
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void WriteFunction_Ascii_StandsInTheColumnsOfTheFormat()
    {
        string text = Encoding.ASCII.GetString(
            Write(writer => writer.WriteFunction(Accelerance(Even), Values(23, true, true), new UniversalFileStorage(IsBinary: false))));
        string[] lines = text.Split('\n');
        Assert.Equal("    58", lines[1]);
        Assert.Equal("    4         0    1         0 NONE             101   3 NONE             102   1", lines[7]);
        Assert.Equal("         6        23         1  2.00000E+01  2.50000E+00  0.00000E+00", lines[8]);
        Assert.All(lines[13..24], line => Assert.Equal(80, line.Length));
    }

    internal static byte[] Write(Action<UniversalFileWriter> write)
    {
        using var stream = new MemoryStream();
        write(new UniversalFileWriter(stream));
        return stream.ToArray();
    }

    internal static Curve Accelerance(FrequencyAxis axis) => new()
    {
        Index = 0,
        Kind = FunctionKind.Frf,
        Response = new Dof("101", Direction.Z),
        Excitation = new Dof("102", Direction.X),
        ResponseQuantity = Quantity.Acceleration,
        ExcitationQuantity = Quantity.Force,
        Axis = axis,
        Title = "Compressor, free",
        Span = new SourceSpan("data", 1),
    };

    /// <summary>Values of many magnitudes that single precision holds where it must.</summary>
    internal static Complex[] Values(int count, bool isDouble, bool isComplex)
    {
        var random = new Random(5);
        double Number()
        {
            double value = (random.NextDouble() - 0.5) * Math.Pow(10, random.Next(-30, 30));
            return isDouble ? value : (float)value;
        }

        return [.. Enumerable.Range(0, count).Select(_ => new Complex(Number(), isComplex ? Number() : 0))];
    }

    private static void AssertValues(Complex[] expected, Complex[] found, double relative)
    {
        Assert.Equal(expected.Length, found.Length);
        foreach ((Complex e, Complex f) in expected.Zip(found))
        {
            Assert.True(Math.Abs(e.Real - f.Real) <= relative * Math.Abs(e.Real), FormattableString.Invariant($"{e} {f}"));
            Assert.True(Math.Abs(e.Imaginary - f.Imaginary) <= relative * Math.Abs(e.Imaginary), FormattableString.Invariant($"{e} {f}"));
        }
    }
}
