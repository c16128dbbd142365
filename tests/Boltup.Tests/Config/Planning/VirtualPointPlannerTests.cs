using Boltup.Config;
using Boltup.Config.Planning;
using Boltup.Engine.Diagnostics;
using Boltup.Tests.Support;

namespace Boltup.Tests.Config.Planning;

public sealed class VirtualPointPlannerTests : IDisposable
{
    private readonly TemporaryFolder _folder = new();
    private readonly DiagnosticBag _diagnostics = new();

    public VirtualPointPlannerTests() => _folder.Write("frf.csv", BenchFolder.FrfTable(["s1.z", "s2.z"], ["h1.z", "h2.z"]));

    public void Dispose() => _folder.Dispose();

    /// <summary>Neither some nor all channels of a virtual point may be absent from the data without a word.</summary>
    [Theory]
    [InlineData("sensors: [s1, s9]", "no FRF moves at its sensor `s9`", 4)]
    [InlineData("sensors: [s9]", "no FRF moves at its sensor `s9`", 4)]
    [InlineData("impacts: [h1, h9]", "no FRF is excited at its impact `h9`", 4)]
    [InlineData("impacts: [s1]", "no FRF is excited at its impact `s1`", 4)]
    public void Check_ChannelThatTheDataLack_IsAnErrorAtItsName(string channels, string message, int line)
    {
        Check(channels);
        Diagnostic error = Assert.Single(_diagnostics.Items);
        Assert.Equal((PlanCodes.ChannelWithoutData, Severity.Error), (error.Code, error.Severity));
        Assert.Contains(message, error.Message, StringComparison.Ordinal);
        Assert.Equal(line, error.Span!.Line);
    }

    [Fact]
    public void Check_TwoChannelsMissing_SaysBoth()
    {
        Check("sensors: [s9], impacts: [h9]");
        Assert.Equal([PlanCodes.ChannelWithoutData, PlanCodes.ChannelWithoutData], _diagnostics.Items.Select(item => item.Code));
    }

    private void Check(string channels)
    {
        const string At = "{ at: [1 mm, 2 mm, 3 mm] }";
        _folder.Write("a.part.yaml", $$"""
            boltup: part/1
            points: { s1: {{At}}, s2: {{At}}, s9: {{At}}, h1: {{At}}, h2: {{At}}, h9: {{At}} }
            virtual_points:
              v: { at: [0 mm, 0 mm, 0 mm], {{channels}} }
            frf: [ { file: frf.csv, quantity: accelerance } ]
            """);
        PartCheck.Run("a.part.yaml", new LoadOptions { WorkingDirectory = _folder.Path }, _diagnostics);
    }
}
