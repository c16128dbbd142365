using System.Numerics;
using Boltup.Config.Planning;
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

    private static MountLaw? Plan(string law, string others = "")
    {
        using ConfigFolder folder = Folder(law, others);
        using AssemblyPlan? plan = AssemblyPlanner.Plan("a.assembly.yaml", folder.Options with { WorkingDirectory = folder.Root }, folder.Diagnostics);
        Assert.True(plan is not null, string.Join("\n", folder.Diagnostics.Items.Select(item => item.Message)));
        Assert.Equal("law", plan.Assembly.Joints[0].MountName);
        return plan.Assembly.Joints[0].Mount;
    }

    private static ConfigFolder Folder(string law, string others) => new ConfigFolder()
        .With("mass.part.yaml", "boltup: part/1\nlumped: { direction: x, masses: { m: 1 kg } }\n")
        .With("a.assembly.yaml",
            "boltup: assembly/1\nfrequencies: { from: 20 Hz, to: 200 Hz, step: 20 Hz }\nparts: { mass: mass.part.yaml }\n"
            + $"mounts:\n  law: {law}\n  {others}\n"
            + "joints: { foot: { between: [mass.m, ground], through: law } }\n");
}
