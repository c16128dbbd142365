using System.Numerics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Files;
using Boltup.Tests.Support;

namespace Boltup.Tests.Files.UniversalFile;

/// <summary>One small file for each departure from the format that is met in the wild; all but the named ones hold the same FRF.</summary>
public class DialectTests
{
    private static readonly Complex[] Plain = [new(1.5, -2.5), new(0.25, 4), new(-0.125, 6), new(7e-3, -8e2)];

    [Theory]
    [InlineData("plain")]
    [InlineData("binary")]
    [InlineData("binary_big_endian")]
    [InlineData("binary_single_abscissa")]
    public void Read_WithinTheFormat_NotesNothing(string name)
    {
        ReadFile read = Dialect(name);
        Assert.Empty(read.Messages);
        AssertPlain(read);
    }

    [Theory]
    [InlineData("touching_numbers", "without a blank")]
    [InlineData("letter_d", "exponents are written with a D")]
    [InlineData("narrow_line_7", "narrower columns")]
    [InlineData("narrow_line_7_touching", "narrower columns")]
    [InlineData("padded_last_row", "padded")]
    [InlineData("too_many_values", "more values than it declares")]
    [InlineData("too_few_values", "declares more values than it holds")]
    [InlineData("latin1_header", "Latin-1")]
    [InlineData("utf8_header", "UTF-8")]
    [InlineData("blank_ids", "identification lines")]
    [InlineData("no_final_delimiter", "not closed by `    -1`")]
    [InlineData("mixed_line_ends", "lines end in different ways")]
    [InlineData("line_end_before_delimiter", "line ends stand between")]
    [InlineData("wrong_byte_count", "wrong byte count")]
    [InlineData("wrong_count_and_bytes", "declares more values than it holds")]
    [InlineData("unknown_datasets", "2 datasets 2412 were skipped")]
    [InlineData("unknown_datasets", "1 dataset 2420 was skipped")]
    [InlineData("no_abscissa_type", "does not say that its abscissa is frequency")]
    public void Read_Dialect_GivesTheSameFrfAndNamesTheRule(string name, string rule)
    {
        ReadFile read = Dialect(name);
        read.HasNote(rule);
        Assert.All(read.Diagnostics, item => Assert.Equal(Severity.Note, item.Severity));
        AssertPlain(read);
    }

    [Fact]
    public void Read_ThreeDigitExponentsWithoutLetter_AreRead()
    {
        ReadFile read = Dialect("three_digit_exponents");
        Assert.Equal(new Complex(1.5e-101, -2.5e101), read[0][0]);
        read.HasNote("three digits");
    }

    [Fact]
    public void Read_RowThatIsOnlyMinusOne_IsNoDelimiter()
    {
        ReadFile read = Dialect("data_begin_with_minus_one");
        Assert.Equal([-1, -2.5, 0.25, 4, -0.125, 6, -1], read[0].Select(value => value.Real));
    }

    [Theory]
    [InlineData("latin1_header")]
    [InlineData("utf8_header")]
    public void Read_TitleBeyondAscii_IsDecoded(string name) => Assert.Equal("Träger", Dialect(name).Curves[0].Title);

    [Fact]
    public void Read_TruncatedLastRecord_KeepsTheCompleteOnesAndNamesThePlace()
    {
        ReadFile read = Dialect("truncated_last_record");
        Assert.Equal(Plain, read[0]);
        Assert.Single(read.Curves);
        Diagnostic refusal = Assert.Single(read.Diagnostics, item => item.Code == FileCodes.Truncated);
        Assert.Equal(18, refusal.Span!.Line);
    }

    [Theory]
    [InlineData("vms_floats", "float format 1")]
    [InlineData("ibm_floats", "float format 3")]
    public void Read_FloatsOfOldMachines_AreRefusedAndTheRestIsRead(string name, string reason)
    {
        ReadFile read = Dialect(name);
        Diagnostic refusal = Assert.Single(read.Diagnostics, item => item.Code == FileCodes.UnsupportedFloats);
        Assert.Contains(reason, refusal.Message, StringComparison.Ordinal);
        Assert.Equal(7, refusal.Span!.ByteOffset);
        AssertPlain(read);
    }

    [Fact]
    public void Read_TextBehindBinary_IsPlacedByItsOffset()
    {
        byte[] binary = File.ReadAllBytes(Repository.Data("files", "dialects", "binary.uff"));
        byte[] text = File.ReadAllBytes(Repository.Data("files", "dialects", "plain.uff"));
        ReadFile read = ReadFile.Of([.. binary, .. text]);
        Assert.Equal(binary.Length + 7, read.Curves[1].Span.ByteOffset);
        Assert.Equal(Plain, read[1]);
    }

    [Theory]
    [InlineData("dof_in_name")]
    [InlineData("dof_in_id_line")]
    public void Read_NodeAndDirectionZero_TakesTheDofFromTheName(string name)
    {
        ReadFile read = Dialect(name);
        Assert.Equal(new Dof("m1", Direction.Z), read.Curves[0].Response);
        Assert.Equal(new Dof("m2", Direction.X), read.Curves[0].Excitation);
        read.HasNote("the name was taken");
    }

    [Fact]
    public void Read_PressureWithDirection_IsScalar()
    {
        ReadFile read = Dialect("pressure_with_direction");
        Assert.Equal(new Dof("101", Direction.P), read.Curves[0].Response);
        Assert.Equal(Quantity.Pressure, read.Curves[0].ResponseQuantity);
        read.HasNote("read as scalar");
    }

    [Fact]
    public void Read_AutoSpectrumStoredComplex_IsReal()
    {
        ReadFile read = Dialect("complex_auto_spectrum");
        Assert.Equal(FunctionKind.AutoSpectrum, read.Curves[0].Kind);
        Assert.Equal([1.5, 0.25, -0.125, 7e-3], read[0].Select(value => value.Real));
        Assert.All(read[0], value => Assert.Equal(0, value.Imaginary));
        read.HasNote("stored complex");
    }

    [Fact]
    public void Read_ValuesThatAreNotFinite_AreKeptAndNoted()
    {
        ReadFile read = Dialect("not_finite");
        Assert.True(double.IsNaN(read[0][0].Real) && double.IsPositiveInfinity(read[0][0].Imaginary));
        Assert.True(double.IsNegativeInfinity(read[0][3].Real));
        read.HasNote("no finite numbers");
    }

    [Fact]
    public void Read_NegativeDirection_TurnsTheSign()
    {
        ReadFile read = Dialect("negative_directions");
        Assert.Equal(new Dof("101", Direction.Z), read.Curves[0].Response);
        Assert.Equal(Plain.Select(value => -value), read[0]);
        read.HasNote("negative directions");
    }

    [Fact]
    public void Read_AccelerationInG_IsConverted()
    {
        ReadFile read = Dialect("unit_g");
        Near.Equal([.. Plain.Select(value => 9.80665 * value)], read[0], 1e-15);
        read.HasNote("in g were converted");
    }

    [Fact]
    public void Read_AutoSpectrumInG_IsConvertedBySquare() =>
        Assert.Equal(1.5 * 9.80665 * 9.80665, Dialect("unit_g_auto_spectrum")[0][0].Real, 1e-12);

    [Theory]
    [InlineData("millimetres_auto_spectrum")]
    [InlineData("millimetres_auto_spectrum_exponents")]
    [InlineData("millimetres_auto_spectrum_power_exponents")]
    public void Read_AutoSpectrumInMillimetres_IsConvertedBySquare(string name) => Assert.Equal(1.5e-6, Dialect(name)[0][0].Real, 1e-18);

    [Fact]
    public void Read_CoherenceInG_IsNotConverted()
    {
        string text = File.ReadAllText(Repository.Data("files", "dialects", "unit_g_auto_spectrum.uff"));
        ReadFile read = ReadFile.Of(text.Replace("    2         0    1", "    6         0    1", StringComparison.Ordinal));
        Assert.Equal(FunctionKind.Coherence, read.Curves[0].Kind);
        Assert.Equal(1.5, read[0][0].Real);
        Assert.Empty(read.Diagnostics);
    }

    [Fact]
    public void Read_BlankLinesAndPlacesInPoints_AreNoPoints()
    {
        ReadFile read = Dialect("blank_lines_in_points");
        Assert.Equal([new MeasuredPoint("101", 0.092, -0.061, 0)], read.Points);
        Diagnostic refusal = Assert.Single(read.Diagnostics);
        Assert.Equal((Severity.Warning, FileCodes.BadHeader, 7), (refusal.Severity, refusal.Code, refusal.Span!.Line));
        AssertPlain(read);
    }

    [Fact]
    public void Read_QualifierThatEndsEarly_TakesNoFunctionAway()
    {
        ReadFile read = Dialect("short_qualifier");
        AssertPlain(read);
        Assert.Null(read.Curves[0].Amplitude);
    }

    [Fact]
    public void Read_UnitsOfMillimetres_GovernPointsAndValues()
    {
        ReadFile read = Dialect("millimetres");
        Near.Equal([.. Plain.Select(value => 1e-3 * value)], read[0], 1e-15);
        Assert.Equal(0.092, read.Points[0].X, 1e-15);
        Assert.Equal("101", read.Points[0].Node);
        read.HasNote("units of dataset 164");
    }

    [Fact]
    public void Read_QualifierOfRms_IsKnown() => Assert.Equal(Amplitude.Rms, Dialect("rms_qualifier").Curves[0].Amplitude);

    [Fact]
    public void Read_ReactionForce_IsAForceWithANote()
    {
        ReadFile read = Dialect("reaction_force");
        Assert.Equal(Quantity.Force, read.Curves[0].ResponseQuantity);
        read.HasNote("reaction force");
    }

    [Fact]
    public void Read_RealFrf_HasNoImaginaryPart()
    {
        ReadFile read = Dialect("real_frf");
        Assert.Equal([1.5, -2.5, 0.25, 4, -0.125, 6, 7e-3, -8e2], read[0].Select(value => value.Real));
        read.HasNote("stored real");
    }

    internal static ReadFile Dialect(string name) => ReadFile.At(Repository.Data("files", "dialects", name + ".uff"));

    private static void AssertPlain(ReadFile read)
    {
        Curve curve = Assert.Single(read.Curves);
        Assert.Equal([20.0, 25, 30, 35], curve.Axis.Hz.ToArray());
        Assert.Equal(new Dof("101", Direction.Z), curve.Response);
        Assert.Equal(new Dof("102", Direction.X), curve.Excitation);
        Assert.Equal(Plain.Select(Single), read[0].Select(Single));
    }

    private static Complex Single(Complex value) => new((float)value.Real, (float)value.Imaginary);
}
