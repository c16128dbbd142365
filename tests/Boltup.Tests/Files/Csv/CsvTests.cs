using System.Globalization;
using System.Numerics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Spectra;
using Boltup.Files;
using Boltup.Files.Csv;
using CsCheck;

namespace Boltup.Tests.Files.Csv;

public class CsvTests
{
    private const string FrfHeader = "response,excitation,frequency_hz,real,imag\n";

    [Fact]
    public void Write_AnyFiniteValues_ReadBackBitForBit() =>
        Gen.Double.Where(double.IsFinite).Array[8].Sample(
            numbers =>
            {
                Complex[] values = [.. numbers.Chunk(2).Select(pair => new Complex(pair[0], pair[1]))];
                AssertSameBits(values, ReadFile.Of(Frfs(values))[0]);
            },
            iter: 100);

    [Fact]
    public void Write_DecimalComma_WritesAndReadsTheSame()
    {
        Complex[] values = [new(1.5, -2.5e-9), new(0, 1), new(1234567.25, 0), new(-0.1, 5e-324)];
        string expected = Frfs(values);
        CultureInfo before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo("de-DE");
            Assert.Equal(expected, Frfs(values));
            AssertSameBits(values, ReadFile.Of(expected)[0]);
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void WriteSpectra_PointWithComma_IsQuotedAndComesBack()
    {
        var dof = new Dof("mount, \"left\"", Direction.RZ);
        using var text = new StringWriter();
        CsvWriter.WriteSpectra(text, FrequencyAxis.FromHertz([20]), [(dof, [new Complex(1, 2)])]);
        Assert.Equal("dof,frequency_hz,real,imag\n\"mount, \"\"left\"\".rz\",20,1,2\n", text.ToString());
        Curve curve = ReadFile.Of(text.ToString()).Curves[0];
        Assert.Equal(dof, curve.Response);
        Assert.Equal(FunctionKind.Spectrum, curve.Kind);
        Assert.Equal(Quantity.Unknown, curve.ResponseQuantity);
    }

    [Fact]
    public void Read_InterleavedCurves_AreSortedOut()
    {
        ReadFile read = ReadFile.Of(FrfHeader + "a.x,b.y,20,1,2\nc.p,d.q,20,3,4\na.x,b.y,25,5,6\nc.p,d.q,25,7,8\n");
        Assert.Equal([new Complex(1, 2), new Complex(5, 6)], read[0]);
        Assert.Equal([new Complex(3, 4), new Complex(7, 8)], read[1]);
        Assert.Same(read.Curves[0].Axis, read.Curves[1].Axis);
        Assert.Equal((Quantity.Unknown, Quantity.Force), (read.Curves[0].ResponseQuantity, read.Curves[0].ExcitationQuantity));
        Assert.Equal((Quantity.Pressure, Quantity.VolumeVelocity), (read.Curves[1].ResponseQuantity, read.Curves[1].ExcitationQuantity));
        Assert.Empty(read.Diagnostics);
    }

    [Fact]
    public void Read_ManyDifferentAxes_TakesWorkInProportion()
    {
        const int curves = 100_000; // comparing each axis with each would take minutes
        var text = new System.Text.StringBuilder("dof,frequency_hz,real,imag\n");
        for (int i = 0; i < curves; i++)
        {
            text.Append(CultureInfo.InvariantCulture, $"p{i}.x,{i % (curves - 1)},1,2\n");
        }

        ReadFile read = ReadFile.Of(text.ToString());
        Assert.Equal(curves, read.Curves.Count);
        Assert.Same(read.Curves[0].Axis, read.Curves[^1].Axis);
        Assert.Equal(1, read.Curves[1].Axis.FirstHz);
    }

    [Fact]
    public void Read_MountTable_HasDirectionsWithoutPoint()
    {
        ReadFile read = ReadFile.Of("\uFEFFdirection,frequency_hz,real,imag\r\nz,10,2e5,3e4\r\n"u8);
        Assert.Equal(FunctionKind.MountStiffness, read.Curves[0].Kind);
        Assert.Equal(new Dof("", Direction.Z), read.Curves[0].Response);
        Assert.Equal(new Complex(2e5, 3e4), read[0][0]);
    }

    [Fact]
    public void Read_FamilyOfTwoPorts_HasConditionAndTerm()
    {
        ReadFile read = ReadFile.Of("at,term,direction,frequency_hz,real,imag\n40 degC,k21,z,10,-2e5,-3e4\n40 degC,k11,z,10,2e5,3e4\n"u8);
        Assert.Equal([("40 degC", "k21"), ("40 degC", "k11")], read.Curves.Select(curve => (curve.At, curve.Term)));
        Assert.All(read.Curves, curve => Assert.Equal(new Dof("", Direction.Z), curve.Response));
        Assert.All(read.Curves, curve => Assert.Null(curve.Excitation));
    }

    [Theory]
    [InlineData("term,direction,frequency_hz,real,imag\nk13,z,10,1,2\n", "data:2:1", "k11, k12, k21 and k22")]
    [InlineData("at,direction,frequency_hz,real,imag\n20 degC,p,10,1,2\n", "data:2:9", "directions are x")]
    [InlineData("at,direction,frequency_hz,real,imag\n,x,10,1,2\n", "data:2:1", "40 degC")]
    public void Read_StiffnessWithAWrongName_SaysWhatTheColumnTakes(string text, string place, string words)
    {
        Diagnostic error = Assert.Single(ReadFile.Of(text).Diagnostics);
        Assert.Equal(("DAT009", place), (error.Code.Code, error.Span!.ToString()));
        Assert.Contains(words, error.Helps[0], StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("a.x,b.y,20,1\n", "DAT009", "data:2:1")]
    [InlineData("a.x,b.y,20,1,2,3\n", "DAT009", "data:2:1")]
    [InlineData("a.w,b.y,20,1,2\n", "DAT009", "data:2:1")]
    [InlineData("a.x,b,20,1,2\n", "DAT009", "data:2:5")]
    [InlineData("a.x,b.y,20,1.5.2,2\n", "DAT005", "data:2:12")]
    [InlineData("a.x,b.y,20,1.5D3,2\n", "DAT005", "data:2:12")]
    [InlineData("a.x,b.y,20,1,\n", "DAT005", "data:2:14")]
    [InlineData("a.x,b.y,20,1,2\na.x,b.y,20,1,2\n", "DAT007", "data:3:9")]
    [InlineData("a.x,b.y,20,1,2\na.x,b.y,19,1,2\n", "DAT007", "data:3:9")]
    [InlineData("a.x,b.y,-1,1,2\n", "DAT007", "data:2:9")]
    [InlineData("a.x,b.y,NaN,1,2\n", "DAT007", "data:2:9")]
    [InlineData("", "DAT010", "data:1:1")]
    public void Read_WrongRow_NamesItsPlace(string rows, string code, string place)
    {
        ReadFile read = ReadFile.Of(FrfHeader + rows);
        Diagnostic error = Assert.Single(read.Diagnostics, item => item.Severity == Severity.Error);
        Assert.Equal(code, error.Code.Code);
        Assert.Equal(place, error.Span!.ToString());
        Assert.Empty(read.Curves);
    }

    [Fact]
    public void Read_ColumnAfterLettersBeyondAscii_CountsCharacters()
    {
        ReadFile read = ReadFile.Of(System.Text.Encoding.UTF8.GetBytes(FrfHeader + "Träger.x,b.y,20,?,2\n"));
        Assert.Equal("data:2:17", Assert.Single(read.Diagnostics).Span!.ToString());
    }

    [Theory]
    [InlineData("response,excitation,frequency,real,imag\n", "response,excitation,frequency_hz,real,imag")]
    [InlineData("Dof,frequency_hz,real,imag\n", "dof,frequency_hz,real,imag")]
    [InlineData("dir,frequency_hz,real,imag,direction\n", "direction,frequency_hz,real,imag")]
    public void Read_WrongHeader_NamesTheNearest(string header, string nearest)
    {
        Diagnostic error = Assert.Single(ReadFile.Of(header + "a.x,20,1,2\n").Diagnostics);
        Assert.Equal(FileCodes.BadCsvHeader, error.Code);
        Assert.Contains($"`{nearest}`", Assert.Single(error.Helps), StringComparison.Ordinal);
    }

    [Fact]
    public void Read_ValueThatIsNotFinite_IsKeptAndNoted()
    {
        ReadFile read = ReadFile.Of("dof,frequency_hz,real,imag\na.x,20,NaN,-Infinity\na.x,21,NaN,0\n");
        Assert.True(double.IsNaN(read[0][0].Real) && double.IsNegativeInfinity(read[0][0].Imaginary));
        Assert.Equal(Severity.Note, Assert.Single(read.Diagnostics).Severity);
    }

    private static string Frfs(Complex[] values)
    {
        using var text = new StringWriter();
        FrequencyAxis axis = FrequencyAxis.Even(20, 0.1, values.Length);
        CsvWriter.WriteFrfs(text, axis, [(new Dof("m1", Direction.X), new Dof("m2", Direction.Z), values)]);
        return text.ToString();
    }

    private static void AssertSameBits(Complex[] expected, Complex[] found) => Assert.Equal(expected.SelectMany(Bits), found.SelectMany(Bits));

    private static long[] Bits(Complex value) => [BitConverter.DoubleToInt64Bits(value.Real), BitConverter.DoubleToInt64Bits(value.Imaginary)];
}
