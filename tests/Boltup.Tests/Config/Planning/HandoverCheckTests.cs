using Boltup.Config;
using Boltup.Config.Planning;
using Boltup.Engine.Diagnostics;
using Boltup.Tests.Support;

namespace Boltup.Tests.Config.Planning;

/// <summary>Blocked forces applied where they were not identified: each case is a physical mistake that the message must name.</summary>
public sealed class HandoverCheckTests : IDisposable
{
    private const string Handover = """
        boltup: forces/1
        mounts_belong_to: receiver
        points: { m1: { at: [0 mm, 0 mm, 0 mm] }, m2: { at: [100 mm, 0 mm, 0 mm] } }
        directions: [x]
        holds: { from: 20 Hz, to: 300 Hz, because: 'the shaker ends there' }
        operations:
          run: { file: forces.csv, phase: common, amplitude: rms }
        """;

    private const string Source = """
        boltup: part/1
        points: { m1: { at: [0 mm, 0 mm, 0 mm] }, m2: { at: [100 mm, 0 mm, 0 mm] } }
        lumped: { direction: x, masses: { m1: 1 kg, m2: 2 kg }, links: [{ between: [m1, m2], stiffness: 1 kN/mm, loss_factor: 0.01 }] }
        """;

    private const string Assembly = """
        boltup: assembly/1
        frequencies: { from: 100 Hz, to: 200 Hz, step: 100 Hz }
        parts: { source: source.part.yaml }
        mounts: { soft: { stiffness: { x: 100 N/mm }, loss_factor: 0.1 } }
        joints:
          one: { between: [source.m1, ground], through: soft }
          two: { between: [source.m2, ground], through: soft }
        operations:
          run: { blocked_forces: { file: source.forces.yaml, operation: run, part: source } }
        """;

    private readonly TemporaryFolder _folder = new();
    private readonly DiagnosticBag _diagnostics = new();

    public void Dispose() => _folder.Dispose();

    [Fact]
    public void Plan_ForcesWhereTheyBelong_SaysNothing()
    {
        Plan(Handover, Source, Assembly);
        Assert.Empty(_diagnostics.Items);
    }

    [Fact]
    public void Plan_OnePointElsewhere_IsAnErrorAboutTheLeverArm() => Expect(
        Severity.Error, PlanCodes.ForcesElsewhere, "another lever arm", Handover.Replace("[100 mm", "[130 mm", StringComparison.Ordinal));

    [Fact]
    public void Plan_AllPointsMovedAlike_IsAWarningAboutTheOrigin() => Expect(
        Severity.Warning, PlanCodes.ForcesElsewhere, "origins",
        Handover.Replace("0 mm, 0 mm] }", "0 mm, -40 mm] }", StringComparison.Ordinal));

    [Fact]
    public void Plan_TurnedAxes_AreAnError() => Expect(
        Severity.Error, PlanCodes.ForcesElsewhere, "another direction",
        Handover.Replace("m2: { at: [100 mm, 0 mm, 0 mm]", "m2: { at: [100 mm, 0 mm, 0 mm], axes: { x: [0, 1, 0], y: [-1, 0, 0] }", StringComparison.Ordinal));

    [Fact]
    public void Plan_UnknownPoint_IsAnError() => Expect(
        Severity.Error, PlanCodes.ForcesElsewhere, "no such point", Handover.Replace("m2:", "m9:", StringComparison.Ordinal));

    [Fact]
    public void Plan_MountsTwice_IsAWarning() => Expect(
        Severity.Warning, PlanCodes.ForcesElsewhere, "twice", Handover.Replace("belong_to: receiver", "belong_to: source", StringComparison.Ordinal));

    [Fact]
    public void Plan_MountsMissing_IsAWarning()
    {
        Plan(Handover, Source, Assembly.Replace("ground], through: soft }\noperations", "ground], rigid: [x] }\noperations", StringComparison.Ordinal));
        Diagnostic warning = Assert.Single(_diagnostics.Items);
        Assert.Equal((PlanCodes.ForcesElsewhere, Severity.Warning), (warning.Code, warning.Severity));
        Assert.Contains("the mounts are missing", warning.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Plan_OutsideTheBand_IsAWarningWithTheSuppliersReason()
    {
        Plan(Handover.Replace("300 Hz", "150 Hz", StringComparison.Ordinal), Source, Assembly);
        Diagnostic warning = Assert.Single(_diagnostics.Items);
        Assert.Equal(PlanCodes.OutsideForceBand, warning.Code);
        Assert.Contains("the shaker ends there", warning.Notes[0], StringComparison.Ordinal);
    }

    private void Expect(Severity severity, DiagnosticCode code, string words, string handover)
    {
        Plan(handover, Source, Assembly);
        Assert.Contains(_diagnostics.Items, item => item.Code == code && item.Severity == severity
            && $"{item.Message} {string.Join(' ', item.Helps)}".Contains(words, StringComparison.Ordinal));
        Assert.All(_diagnostics.Items, item => Assert.Equal(code, item.Code));
    }

    private void Plan(string handover, string source, string assembly)
    {
        _folder.Write("source.forces.yaml", handover);
        _folder.Write("source.part.yaml", source);
        _folder.Write("a.assembly.yaml", assembly);
        _folder.Write("forces.csv", "dof,frequency_hz,real,imag\nm1.x,100,1,0\nm1.x,200,1,0\nm2.x,100,1,0\nm2.x,200,1,0\n");
        AssemblyPlanner.Plan("a.assembly.yaml", new LoadOptions { WorkingDirectory = _folder.Path }, _diagnostics)?.Dispose();
    }
}
