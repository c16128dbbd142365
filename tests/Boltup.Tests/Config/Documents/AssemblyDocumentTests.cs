using Boltup.Config.Documents;
using Boltup.Config.Units;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Geometry;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Tests.Config.Documents;

public class AssemblyDocumentTests
{
    [Fact]
    public void LoadAssembly_CompleteDocument_HoldsEveryValueInSi()
    {
        using ConfigFolder folder = Samples.Folder();
        AssemblyDocument assembly = folder.LoadAssembly().Document!;

        Assert.Empty(folder.Diagnostics.Items);
        Assert.Equal("Minibus with compressor on the base mounts", assembly.Title!.Value);
        Assert.Equal(1981, assembly.Frequencies!.ToAxis().Count);
        Assert.Equal(2000, assembly.Frequencies.ToAxis().LastHz);
        Assert.Equal(["compressor", "body"], assembly.Parts.Select(part => part.Name.Value));
        PlacedPartDocument body = assembly.FindPart("body")!;
        Assert.Equal(new Vector3d(0, 0, 1), body.Turned!.About.Value);
        Assert.Equal(Math.PI / 2, body.Turned.AngleRad.Value, 15);
        Assert.Equal(new Vector3d(1.2, 0, 0.3), body.Moved!.Value);
        Assert.IsType<LumpedModelDocument>(body.Document!.Model);
        Assert.Equal(0.008, assembly.JointGapM);
    }

    [Fact]
    public void LoadAssembly_Mounts_FollowLikeAndScale()
    {
        using ConfigFolder folder = Samples.Folder();
        AssemblyDocument assembly = folder.LoadAssembly().Document!;

        ScaledLaw softest = assembly.LawOf("softest");
        var law = Assert.IsType<DirectionalLawDocument>(softest.Law);
        Assert.Equal(0.8 * 0.5, softest.Scale);
        Assert.Equal((90e3, 140e3), (law.Stiffness[Direction.X].Value, law.Stiffness[Direction.Z].Value));
        Assert.Equal((0.12, 12), (law.LossFactor, law.Damping[Direction.Z].Value));
        Assert.Equal(new SourceSpan("a.assembly.yaml", 8, 27, 7), law.Stiffness[Direction.X].Span);
        Assert.EndsWith("mounts/tabled.csv", Assert.IsType<TableLawDocument>(assembly.LawOf("tabled").Law).File.FullPath, StringComparison.Ordinal);
        Assert.Equal(new double[,] { { 90e3, 1e3, 0 }, { 1e3, 90e3, 0 }, { 0, 0, 140e3 } },
            Assert.IsType<MatrixLawDocument>(assembly.LawOf("full").Law).Stiffness.Value);
    }

    [Fact]
    public void LoadAssembly_JointsOperationsResponses_AreTyped()
    {
        using ConfigFolder folder = Samples.Folder();
        AssemblyDocument assembly = folder.LoadAssembly().Document!;

        Assert.Equal(("compressor.m1", "body.s1", "soft"),
            (assembly.Joints[0].First.ToString(), assembly.Joints[0].Second.ToString(), assembly.Joints[0].Mount!.Value));
        Assert.True(assembly.Joints[1].Second.IsGround);
        Assert.Equal([Direction.X, Direction.Y, Direction.Z], assembly.Joints[1].Rigid.Select(direction => direction.Value));
        OperationDocument idle = assembly.Operations[0];
        Assert.Equal((ForceSum.Energy, Amplitude.Peak, ForceKind.Blocked), (idle.Sum, idle.Amplitude!.Value, idle.Forces[0].Kind));
        OperationDocument shaker = assembly.Operations[1];
        Assert.Null(shaker.Amplitude);
        Assert.Equal([ForceKind.Applied, ForceKind.Applied], shaker.Forces.Select(force => force.Kind));
        Assert.Equal([Quantity.Pressure, Quantity.Velocity, Quantity.Acceleration], assembly.Responses.Select(response => response.Quantity));
        Assert.Equal("body.s2.p", assembly.Responses[0].At.Value.ToString());
    }

    [Fact]
    public void LoadAssembly_CompleteDocument_ListsEveryYamlFileOnce()
    {
        using ConfigFolder folder = Samples.Folder();
        Assert.Equal(["a.assembly.yaml", "parts/compressor.part.yaml", "parts/body.part.yaml"],
            folder.LoadAssembly().FilesRead.Select(file => file.DisplayPath));
    }

    [Fact]
    public void LoadAssembly_SixBySixMatrix_HasUnitsByPosition()
    {
        string row(int i) => "[" + string.Join(", ", Enumerable.Range(0, 6).Select(j => i == j ? i < 3 ? "90 N/mm" : "5 N·m/rad" : (i, j) is (0, 4) or (4, 0) ? "2 N/rad" : "0")) + "]";
        using ConfigFolder folder = Samples.Folder().With("a.assembly.yaml",
            "boltup: assembly/1\nparts: { body: parts/body.part.yaml }\nmounts: { full: { stiffness_matrix: ["
            + string.Join(", ", Enumerable.Range(0, 6).Select(row)) + "], loss_factor: 0.1 } }\n");

        var law = (MatrixLawDocument)folder.LoadAssembly().Document!.LawOf("full").Law;

        Assert.Equal((90e3, 5, 2, 2), (law.Stiffness.Value[2, 2], law.Stiffness.Value[3, 3], law.Stiffness.Value[0, 4], law.Stiffness.Value[4, 0]));
        Assert.Equal(0.1, law.LossFactor);
    }

    [Fact]
    public void LoadAssembly_ErrorsInSeveralFiles_AreAllReported()
    {
        using ConfigFolder folder = Samples.Folder()
            .With("parts/compressor.part.yaml", "boltup: part/1\nfrf: [ { fle: a.uff } ]\n")
            .With("parts/body.part.yaml", "boltup: part/1\nlumped: { direction: x, masses: { s1: 1 } }\n")
            .With("a.assembly.yaml", Samples.Assembly.Replace("through: soft", "through: sotf", StringComparison.Ordinal));

        Assert.Null(folder.LoadAssembly().Document);

        Assert.Equal(
            [("CFG050", "a.assembly.yaml"), ("CFG012", "parts/compressor.part.yaml"), ("CFG030", "parts/body.part.yaml")],
            folder.Diagnostics.Items.Select(item => (item.Code.Code, item.Span!.File)));
    }

    [Fact]
    public void LoadAssembly_LikeCircleOfTwo_NamesBoth()
    {
        using ConfigFolder folder = Samples.Folder().With("a.assembly.yaml",
            "boltup: assembly/1\nparts: { body: parts/body.part.yaml }\nmounts: { a: { like: b }, b: { like: a }, c: { like: a } }\n");
        Assert.Null(folder.LoadAssembly().Document);
        Assert.Equal(["mount `a` is like itself", "mount `b` is like itself"], folder.Diagnostics.Items.Select(item => item.Message));
    }

    [Fact]
    public void LoadAssembly_GroundInEitherPlace_IsAccepted()
    {
        using ConfigFolder folder = Samples.Folder().With("a.assembly.yaml",
            "boltup: assembly/1\nparts: { body: parts/body.part.yaml }\n"
            + "joints: { a: { between: [ground, body.s1], rigid: [x] }, b: { between: [body.s2, ground], rigid: [x] } }\n");
        AssemblyDocument assembly = folder.LoadAssembly().Document!;
        Assert.Equal((true, "body.s1", "body.s2", true),
            (assembly.Joints[0].First.IsGround, assembly.Joints[0].Second.ToString(), assembly.Joints[1].First.ToString(), assembly.Joints[1].Second.IsGround));
    }

    [Fact]
    public void LoadAssembly_ThousandsOfMistakes_StopsAfterAHundred()
    {
        string mounts = string.Join(", ", Enumerable.Range(0, 20_000).Select(i => $"m{i}: {{ stifness{i}: 1 }}"));
        using ConfigFolder folder = Samples.Folder().With("a.assembly.yaml", "boltup: assembly/1\nparts: { body: parts/body.part.yaml }\nmounts: { " + mounts + " }\n");
        Assert.Null(folder.LoadAssembly().Document);
        Assert.InRange(folder.Diagnostics.Items.Count, 100, 110);
        Assert.Equal("CFG003", folder.Diagnostics.Items[^1].Code.Code);
    }

    [Fact]
    public void LoadAssembly_LongChainOfLike_LoadsAndMultipliesTheScales()
    {
        const int count = 20_000;
        string mounts = string.Join(", ", Enumerable.Range(1, count).Select(i => $"m{i}: {{ like: m{i - 1}, scale: {(i % 2 == 0 ? "2" : "0.5")} }}"));
        using ConfigFolder folder = Samples.Folder().With("a.assembly.yaml",
            "boltup: assembly/1\nparts: { body: parts/body.part.yaml }\nmounts: { m0: { stiffness: { x: 1 N/m } }, " + mounts + " }\n");
        AssemblyDocument assembly = folder.LoadAssembly().Document!;
        Assert.Equal(0.5, assembly.LawOf("m21").Scale);
    }

    [Theory]
    [InlineData("20 Hz", "1 kHz", "0.1 Hz", 9801)]
    [InlineData("0.1 Hz", "0.3 Hz", "0.1 Hz", 3)]
    [InlineData("20 Hz", "29 Hz", "2 Hz", 5)]
    [InlineData("20 Hz", "20 Hz", "1 Hz", 1)]
    [InlineData("0 Hz", "100.5 kHz", "1 Hz", 100_501)]
    [InlineData("0 Hz", "100.4999 kHz", "1 Hz", 100_500)]
    public void Frequencies_AnyRange_EndAtTheLastLineInside(string from, string to, string step, int count)
    {
        using ConfigFolder folder = Samples.Folder().With("a.assembly.yaml",
            $"boltup: assembly/1\nparts: {{ body: parts/body.part.yaml }}\nfrequencies: {{ from: {from}, to: {to}, step: {step} }}\n");
        AssemblyDocument assembly = folder.LoadAssembly().Document!;
        Assert.Equal(count, assembly.Frequencies!.Count);
        Assert.InRange(assembly.Frequencies.ToAxis().LastHz, 0, QuantityParser.Parse(to, Dimension.Frequency).Si);
    }
}
