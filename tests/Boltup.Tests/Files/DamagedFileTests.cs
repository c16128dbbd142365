using System.IO.Pipes;
using System.Numerics;
using System.Text;
using Boltup.Engine.Diagnostics;
using Boltup.Files;
using Boltup.Tests.Support;

namespace Boltup.Tests.Files;

/// <summary>Damaged files give diagnostics or right values, never an exception, a hang or much memory.</summary>
public class DamagedFileTests
{
    /// <summary>Windows of the readers, decoding and text of messages; declared sizes must not show.</summary>
    private const long AllocationBound = 8 << 20;

    public static TheoryData<string> Samples() =>
    [
        "plain", "binary", "binary_single_abscissa", "wrong_byte_count", "millimetres", "rms_qualifier", "touching_numbers", "padded_last_row",
    ];

    [Theory]
    [MemberData(nameof(Samples))]
    public void Read_TruncatedAnywhere_GivesRightValuesOrADiagnostic(string name)
    {
        byte[] whole = Bytes(name);
        Complex[] expected = ReadFile.Of(whole)[0];
        for (int length = 0; length < whole.Length; length++)
        {
            ReadFile read = ReadBounded(whole.AsSpan(0, length));
            Assert.True(read.Diagnostics.Count > 0 || (read.Values is [{ } complete] && complete.SequenceEqual(expected)), $"length {length}");
            if (read.Values is [{ } values])
            {
                Assert.Equal(expected.Take(values.Length), values);
            }
        }
    }

    /// <summary>Every file of the dialect corpus.</summary>
    public static TheoryData<string> Corpus() =>
        [.. Directory.EnumerateFiles(Repository.Data("files", "dialects"), "*.uff").Select(path => Path.GetFileNameWithoutExtension(path)).Order(StringComparer.Ordinal)];

    [Theory]
    [MemberData(nameof(Corpus))]
    public void Read_AnyDialectTruncatedAnywhere_NeverThrowsNorTakesMuchMemory(string name)
    {
        byte[] whole = Bytes(name);
        for (int length = 0; length < whole.Length; length++)
        {
            ReadBounded(whole.AsSpan(0, length));
        }
    }

    [Theory]
    [MemberData(nameof(Corpus))]
    public void Read_FlippedBytes_NeverThrowsNorTakesMuchMemory(string name)
    {
        byte[] whole = Bytes(name);
        var random = new Random(20);
        for (int i = 0; i < 1000; i++)
        {
            byte[] damaged = [.. whole];
            damaged[random.Next(damaged.Length)] ^= (byte)(1 << random.Next(8));
            ReadFile read = ReadBounded(damaged);
            Assert.True(read.Curves.Count > 0 || read.Diagnostics.Count > 0);
        }
    }

    [Fact]
    public void Read_CsvTruncatedAnywhere_GivesWholeRowsOrADiagnostic()
    {
        byte[] whole = "dof,frequency_hz,real,imag\nm1.x,20,1.5,-2.25\nm1.x,25,1.25e-3,0.125\n"u8.ToArray();
        Complex[] expected = ReadFile.Of(whole)[0];
        for (int length = 0; length < whole.Length; length++)
        {
            ReadFile read = ReadBounded(whole.AsSpan(0, length));
            Assert.True(read.Diagnostics.Count > 0 || expected.Take(read[0].Length).SequenceEqual(read[0]), $"length {length}");
        }
    }

    [Fact]
    public void Read_FlippedBytesOfCsv_NeverThrowsNorTakesMuchMemory()
    {
        byte[] whole = "response,excitation,frequency_hz,real,imag\nm1.x,m2.x,20,1.5,-2\nm1.x,m2.x,25,1.25e-3,0\nm1.p,m2.x,20,7,8\n"u8.ToArray();
        var random = new Random(21);
        for (int i = 0; i < 1000; i++)
        {
            byte[] damaged = [.. whole];
            damaged[random.Next(damaged.Length)] ^= (byte)(1 << random.Next(8));
            ReadFile read = ReadBounded(damaged);
            Assert.True(read.Curves.Count > 0 || read.Diagnostics.Count > 0);
        }
    }

    [Fact]
    public void Read_RunOfDelimiters_DoesNotExhaustTheStack()
    {
        var text = new StringBuilder();
        for (int i = 0; i < 200_000; i++)
        {
            text.Append("    -1\n");
        }

        Assert.Single(ReadFile.Of(text.ToString()).Diagnostics, item => item.Severity == Severity.Error);
    }

    [Theory]
    [InlineData("x")]
    [InlineData("")]
    public void Read_PointsOfSenselessLines_GiveNoPointsAndFewWarnings(string line)
    {
        ReadFile read = ReadFile.Of(DatasetOf("    15", line));
        Assert.Single(read.Curves);
        Assert.Empty(read.Points);
        Assert.InRange(read.Diagnostics.Count, 0, 51);
    }

    [Fact]
    public void Read_UnitsOfManyLines_AreNotKept() => Assert.Single(ReadBounded(DatasetOf("   164", new string('y', 64))).Curves);

    [Fact]
    public void Read_ManyKindsOfUnknownDatasets_NamesSome()
    {
        var text = new StringBuilder();
        for (int number = 3000; number < 5000; number++)
        {
            text.Append("    -1\n  ").Append(number).Append("\n    -1\n");
        }

        ReadFile read = ReadFile.Of(text.Append(Encoding.Latin1.GetString(Bytes("plain"))).ToString());
        Assert.Equal(21, read.Diagnostics.Count);
        read.HasNote("1980 more numbers");
    }

    [Theory]
    [InlineData("         6 999999999         1  2.00000E+01  5.00000E+00  0.00000E+00")]
    [InlineData("         6         4         1  1.00000E+09  1.00000E-07  0.00000E+00")]
    [InlineData("         6         4         1  2.00000E+01  1.0000E+308  0.00000E+00")]
    [InlineData("         6         4         1          NaN          NaN  0.00000E+00")]
    [InlineData("         6         4         1 -2.00000E+01  5.00000E+00  0.00000E+00")]
    [InlineData("         6         4         1  2.00000E+01  0.00000E+00  0.00000E+00")]
    [InlineData("         9         4         1  2.00000E+01  5.00000E+00  0.00000E+00")]
    public void Read_HeaderThatCannotBe_DrawsADiagnostic(string seventhLine)
    {
        string[] lines = Encoding.Latin1.GetString(Bytes("plain")).Split('\n');
        lines[8] = seventhLine;
        ReadFile read = ReadBounded(Encoding.Latin1.GetBytes(string.Join('\n', lines)));
        Assert.NotEmpty(read.Diagnostics);
    }

    [Fact]
    public void Read_NumberThatIsNone_NamesItsPlace()
    {
        string text = Encoding.Latin1.GetString(Bytes("plain")).Replace(" -2.50000E+00", " -2.5oo00E+00", StringComparison.Ordinal);
        ReadFile read = ReadFile.Of(text);
        Diagnostic error = Assert.Single(read.Diagnostics);
        Assert.Equal(FileCodes.BadNumber, error.Code);
        Assert.Equal("data:14:14", error.Span!.ToString());
        Assert.Null(read.Values[0]);
    }

    [Fact]
    public void Open_MissingFile_IsADiagnostic()
    {
        ReadFile read = ReadFile.At(Path.Combine(Path.GetTempPath(), "no such folder", "none.uff"));
        Assert.Equal(FileCodes.CannotRead, Assert.Single(read.Diagnostics).Code);
    }

    [Fact]
    public void Open_Folder_IsADiagnostic() => Assert.Equal(FileCodes.CannotRead, Assert.Single(ReadFile.At(Path.GetTempPath()).Diagnostics).Code);

    [Theory]
    [InlineData("")]
    [InlineData("a\0b")]
    public void Open_PathThatCannotBe_IsADiagnostic(string path) => Assert.Equal(FileCodes.CannotRead, Assert.Single(ReadFile.At(path).Diagnostics).Code);

    [Fact]
    public void Open_Pipe_IsADiagnostic()
    {
        using var pipe = new AnonymousPipeServerStream(PipeDirection.Out);
        string path = $"/dev/fd/{pipe.GetClientHandleAsString()}";
        if (File.Exists(path))
        {
            Diagnostic error = Assert.Single(ReadFile.At(path).Diagnostics);
            Assert.Equal(FileCodes.CannotRead, error.Code);
            Assert.Contains("pipe", error.Message, StringComparison.Ordinal);
        }
    }

    [Fact]
    public void Open_UnknownFormat_NamesTheKnownOnes()
    {
        Diagnostic error = Assert.Single(ReadFile.Of("PK and other bytes").Diagnostics);
        Assert.Equal(FileCodes.UnknownFormat, error.Code);
        Assert.Contains(error.Notes, note => note.Contains("dof,frequency_hz,real,imag", StringComparison.Ordinal));
    }

    [Theory]
    [InlineData("plain")]
    [InlineData("binary")]
    public void ReadSpectrum_AgainAndAgain_AllocatesNothing(string name)
    {
        var diagnostics = new DiagnosticBag();
        using DataFile file = DataFile.Open(Repository.Data("files", "dialects", name + ".uff"), name, diagnostics)!;
        Curve curve = file.Curves[0];
        var values = new Complex[curve.Axis.Count];
        file.ReadSpectrum(curve, values, diagnostics);
        file.ReadSpectrum(curve, values, diagnostics);
        long before = GC.GetAllocatedBytesForCurrentThread();
        for (int i = 0; i < 100; i++)
        {
            file.ReadSpectrum(curve, values, diagnostics);
        }

        Assert.InRange(GC.GetAllocatedBytesForCurrentThread() - before, 0, 2048); // the runtime may compile a method meanwhile
    }

    private static byte[] Bytes(string name) => File.ReadAllBytes(Repository.Data("files", "dialects", name + ".uff"));

    /// <summary>A dataset of many equal lines, and a function behind it.</summary>
    private static byte[] DatasetOf(string number, string line)
    {
        string lines = string.Concat(Enumerable.Repeat(line + "\n", 100_000));
        return Encoding.Latin1.GetBytes($"    -1\n{number}\n{lines}    -1\n{Encoding.Latin1.GetString(Bytes("plain"))}");
    }

    private static ReadFile ReadBounded(ReadOnlySpan<byte> bytes)
    {
        long before = GC.GetAllocatedBytesForCurrentThread();
        ReadFile read = ReadFile.Of(bytes);
        Assert.InRange(GC.GetAllocatedBytesForCurrentThread() - before, 0, AllocationBound);
        return read;
    }
}
