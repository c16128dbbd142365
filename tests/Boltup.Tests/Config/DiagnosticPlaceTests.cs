using Boltup.Config;
using Boltup.Engine.Diagnostics;

namespace Boltup.Tests.Config;

public class DiagnosticPlaceTests
{
    private const string SourcePart = "boltup: part/1\nlumped: { direction: x, masses: { m1: 1 kg, m2: 2 kg } }\n";
    private const string BodyPart = "boltup: part/1\nfrf: [ { file: compressor.uff } ]\n";
    private const string Base = "boltup: assembly/1\nparts: { source: source.part.yaml, body: body.part.yaml }\n"
        + "mounts: { soft: { stiffness: { x: 90 N/mm } } }\n";

    private static readonly DiagnosticCase ShortPin = new(
        "CFG120", "boltup: pins/1\nassembly: a.assembly.yaml\nfiles: [ { file: compressor.uff, sha256: «3f2a» } ]\n", "expected 64 hexadecimal digits");

    public static TheoryData<int> PartIndexes => [.. Enumerable.Range(0, PartCases.All.Length)];

    public static TheoryData<int> AssemblyIndexes => [.. Enumerable.Range(0, AssemblyCases.All.Length)];

    [Theory]
    [MemberData(nameof(PartIndexes))]
    public void LoadPart_WrongDocument_SaysWhatAndWhere(int index) => Check(PartCases.All[index], "a.part.yaml");

    [Theory]
    [MemberData(nameof(AssemblyIndexes))]
    public void LoadAssembly_WrongDocument_SaysWhatAndWhere(int index) => Check(AssemblyCases.All[index], "a.assembly.yaml");

    public static TheoryData<int> BenchIndexes => [.. Enumerable.Range(0, BenchCases.All.Length)];

    [Theory]
    [MemberData(nameof(BenchIndexes))]
    public void LoadBench_WrongDocument_SaysWhatAndWhere(int index) => Check(BenchCases.All[index], "a.bench.yaml");

    public static TheoryData<int> HandoverIndexes => [.. Enumerable.Range(0, BenchCases.Handovers.Length)];

    [Theory]
    [MemberData(nameof(HandoverIndexes))]
    public void LoadAssembly_WrongHandover_SaysWhatAndWhere(int index) => Check(BenchCases.Handovers[index], "a.assembly.yaml");

    [Fact]
    public void LoadPins_ShortDigest_SaysWhatAndWhere() => Check(ShortPin, "a.pins.yaml");

    [Fact]
    public void Cases_EveryCode_IsDrawn()
    {
        IEnumerable<string> drawn = PartCases.All.Concat(AssemblyCases.All).Concat(BenchCases.All).Concat(BenchCases.Handovers).Append(ShortPin).Select(item => item.Code);
        Assert.Empty(ConfigCodes.All.Select(code => code.Code).Except(drawn));
    }

    [Fact]
    public void Codes_AllTexts_AreWholeSentences()
    {
        Assert.Equal(ConfigCodes.All.Count, ConfigCodes.All.DistinctBy(code => code.Code).Count());
        Assert.All(ConfigCodes.All, code =>
        {
            Assert.EndsWith(".", code.Meaning, StringComparison.Ordinal);
            Assert.EndsWith(".", code.Cure, StringComparison.Ordinal);
            Assert.NotEmpty(code.Example);
            Assert.Equal(char.ToLowerInvariant(code.Title[0]), code.Title[0] is 'U' or 'Y' ? code.Title[0] : char.ToLowerInvariant(code.Title[0]));
        });
    }

    private static void Check(DiagnosticCase expected, string name)
    {
        bool hasPlace = expected.Marked.Contains('«', StringComparison.Ordinal);
        MarkedText marked = hasPlace ? MarkedText.Parse(expected.Marked) : new MarkedText(expected.Marked, 0, 0, 1);
        using ConfigFolder folder = new ConfigFolder { Options = new LoadOptions { MaximumDataBytes = 1000 } }
            .With("source.part.yaml", SourcePart).With("body.part.yaml", BodyPart).With("base.assembly.yaml", Base)
            .With("compressor.uff", "").With("large.csv", new string('0', 1001)).With("folder/inner.csv", "").With("source.forces.yaml", BenchCases.Handover).With(name, marked.Text);

        object? document = folder.Load(name);

        Diagnostic found = Assert.Single(folder.Diagnostics.Items);
        Assert.Equal(expected.Code, found.Code.Code);
        Assert.Equal((name, marked.Line, marked.Column, marked.Length), (found.Span!.File, found.Span.Line, found.Span.Column, found.Span.Length));
        Assert.Contains(expected.Words, string.Join("\n", [found.Message, .. found.Helps, .. found.Notes]), StringComparison.Ordinal);
        Assert.Equal(found.Severity != Severity.Error, document is not null);
    }
}
