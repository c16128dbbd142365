using System.Numerics;
using Boltup.Config.Planning;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Mounts;
using Boltup.Tests.Support;

namespace Boltup.Tests.Config.Planning;

public class MountPlanningTests
{
    [Fact]
    public void Plan_Relaxation_IsTheZenerLawOfEveryDirection()
    {
        MountLaw law = Plan("{ stiffness: { x: 100 N/mm, z: 300 N/mm }, relaxation: { stiffening: 3, time: 2 ms } }")!;
        Complex factor = new Relaxation(3, 0.002, 1).FactorAt(2 * Math.PI * 80);
        Near.Equal(1e5 * factor, MountAt.Entry(law, 80), 1e-15);
        Near.Equal(3e5 * factor, MountAt.Entry(law, 80, 1, 1), 1e-15);
    }

    [Fact]
    public void Plan_RelaxationWithOrder_IsTheFractionalLaw() => Near.Equal(
        1e5 * new Relaxation(3, 0.002, 0.6).FactorAt(2 * Math.PI * 80),
        MountAt.Entry(Plan("{ stiffness: { x: 100 N/mm }, relaxation: { stiffening: 3, time: 2 ms, order: 0.6 } }")!, 80),
        1e-15);

    [Fact]
    public void Plan_ParallelOfSeries_ComposesByName() => Near.Equal(
        new Complex(300e3 + 1 / (1 / 100e3 + 1 / 300e3), 0),
        MountAt.Entry(
            Plan("{ parallel: [pair, hard] }", "pair: { series: [soft, hard] }\n  soft: { stiffness: { x: 100 N/mm } }\n  hard: { stiffness: { x: 300 N/mm } }")!,
            80),
        1e-15);

    [Fact]
    public void Plan_SameMountTwiceInParallel_IsTwiceAsStiff() => Near.Equal(
        new Complex(2e5, 0), MountAt.Entry(Plan("{ parallel: [soft, soft] }", "soft: { stiffness: { x: 100 N/mm } }")!, 80), 1e-15);

    [Theory]
    [InlineData("soft: { stiffness: { x: 1 N/m } }\n  other: { stiffness: { y: 1 N/m } }", "share no direction")]
    [InlineData(
        "soft: { stiffness: { x: 1 N/m } }\n  other: { stiffness_matrix: [[1 N/m, 0, 0], [0, 1 N/m, 0], [0, 0, 1 N/m]] }",
        "do not have the same directions")]
    public void Plan_SeriesThatDoesNotJoin_IsRefused(string others, string words)
    {
        using ConfigFolder folder = Folder("{ series: [soft, other] }", others);
        Assert.Null(AssemblyPlanner.Plan("a.assembly.yaml", folder.Options with { WorkingDirectory = folder.Root }, folder.Diagnostics));
        Assert.Equal("PLN080", Assert.Single(folder.Diagnostics.Items).Code.Code);
        Assert.Contains(words, folder.Diagnostics.Items[0].Message, StringComparison.Ordinal);
        Assert.Equal(5, folder.Diagnostics.Items[0].Span!.Line);
    }

    [Theory]
    [InlineData("40 degC", 2e5)]
    [InlineData("40 °C", 2e5)]
    [InlineData("20 degC", 1e5)]
    public void Plan_TableOfAFamily_IsTheOneThatIsListed(string at, double expected) => Near.Equal(
        new Complex(expected, 1e3), MountAt.Entry(Plan($"{{ table: {{ file: table.csv, at: {at} }} }}", table: Family)!, 80), 1e-15);

    [Theory]
    [InlineData("{ table: { file: table.csv, at: 30 degC } }", Family, "PLN082", "`20 degC`, `40 degC`")]
    [InlineData("{ table: table.csv }", Family, "PLN081", "at: 20 degC")]
    [InlineData("{ table: { file: table.csv, at: 30 degC } }", "direction,frequency_hz,real,imag\nx,20,1,0\nx,200,1,0\n", "PLN082", "remove `at`")]
    [InlineData("{ table: table.csv }", "term,direction,frequency_hz,real,imag\nk11,x,20,1,0\nk21,x,20,1,0\n", "PLN083", "`k11`, `k21`")]
    public void Plan_TableThatDoesNotFit_IsRefused(string law, string table, string code, string words)
    {
        using ConfigFolder folder = Folder(law, "", table);
        Assert.Null(AssemblyPlanner.Plan("a.assembly.yaml", folder.Options with { WorkingDirectory = folder.Root }, folder.Diagnostics));
        Diagnostic error = Assert.Single(folder.Diagnostics.Items);
        Assert.Equal((code, "a.assembly.yaml", 5), (error.Code.Code, error.Span!.File, error.Span.Line));
        Assert.Contains(words, string.Join("\n", [error.Message, .. error.Helps, .. error.Notes]), StringComparison.Ordinal);
    }

    [Fact]
    public void Plan_TableOfATwoPort_HasTheForceOfEachEnd()
    {
        MountLaw law = Plan("{ table: { file: table.csv, at: 1200 N } }", table: TwoPort)!;
        Assert.True(law.IsTwoPort);
        Complex[,] k = MountAt.Matrix(law, 200);
        Assert.Equal([new(9, 1), new(7, 2), new(7, 2), new(8, 3)], k.Cast<Complex>());
    }

    private const string Family =
        "at,direction,frequency_hz,real,imag\n20 degC,x,20,1e5,1e3\n20 degC,x,200,1e5,1e3\n40 degC,x,20,2e5,1e3\n40 degC,x,200,2e5,1e3\n";

    private const string TwoPort =
        "at,term,direction,frequency_hz,real,imag\n1.2 kN,k11,x,20,10,1\n1.2 kN,k11,x,200,9,1\n1.2 kN,k21,x,20,-7,-2\n1.2 kN,k21,x,200,-7,-2\n"
        + "1.2 kN,k22,x,20,9,3\n1.2 kN,k22,x,200,8,3\n";

    private static MountLaw? Plan(string law, string others = "", string table = "")
    {
        using ConfigFolder folder = Folder(law, others, table);
        using AssemblyPlan? plan = AssemblyPlanner.Plan("a.assembly.yaml", folder.Options with { WorkingDirectory = folder.Root }, folder.Diagnostics);
        Assert.True(plan is not null, string.Join("\n", folder.Diagnostics.Items.Select(item => item.Message)));
        Assert.Equal("law", plan.Assembly.Joints[0].MountName);
        return plan.Assembly.Joints[0].Mount;
    }

    private static ConfigFolder Folder(string law, string others, string table = "") => new ConfigFolder()
        .With("table.csv", table)
        .With("mass.part.yaml", "boltup: part/1\nlumped: { direction: x, masses: { m: 1 kg } }\n")
        .With("a.assembly.yaml",
            "boltup: assembly/1\nfrequencies: { from: 20 Hz, to: 200 Hz, step: 20 Hz }\nparts: { mass: mass.part.yaml }\n"
            + $"mounts:\n  law: {law}\n  {others}\n"
            + "joints: { foot: { between: [mass.m, ground], through: law } }\n");
}
