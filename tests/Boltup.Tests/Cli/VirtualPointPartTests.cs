using Boltup.Tests.Support;

namespace Boltup.Tests.Cli;

/// <summary>
/// Virtual points from files: the feet of the free compressor taken as channels around one point. They do not belong to a rigid piece above
/// its first resonances, so the point is a test of the way through the files and of the warning, not of the compressor.
/// </summary>
public sealed class VirtualPointPartTests : IDisposable
{
    private readonly TemporaryFolder _folder = new();

    public void Dispose() => _folder.Dispose();

    [Fact]
    public void Check_PartWithVirtualPoint_ReportsItsFigures()
    {
        CommandRun run = CommandRun.Of("check", Write("feet: { at: [0 mm, 0 mm, 20 mm], sensors: [m1, m2, m3, m4], impacts: [m1, m2, m3, m4] }"), "--allow-outside");
        Assert.Equal(0, run.ExitCode);
        Assert.Contains("virtual point `feet`, 12 sensor channels: consistency", run.Error, StringComparison.Ordinal);
        Assert.Contains("virtual point `feet`, 12 impacts: consistency", run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void Check_SensorsOnOneLine_IsRefusedWithTheMotionThatIsMissing()
    {
        CommandRun run = CommandRun.Of("check", Write("feet: { at: [0 mm, -70 mm, 0 mm], sensors: [m1, m2], impacts: [m1, m2, m3, m4] }"), "--allow-outside");
        Assert.Equal(3, run.ExitCode);
        Assert.Contains("its 6 sensor channels do not see the rotation about x", run.Error, StringComparison.Ordinal);
    }

    /// <summary>At 20 Hz the free compressor is rigid: the six-dof point moves like mass and inertia, 9.122 kg by the independent model.</summary>
    [Fact]
    public void Predict_SourceJoinedByItsVirtualPoint_MovesAsARigidBodyAtLowFrequency()
    {
        Write("feet: { at: [0 mm, 0 mm, 0 mm], sensors: [m1, m2, m3, m4], impacts: [m1, m2, m3, m4] }");
        _folder.Write("push.csv", "dof,frequency_hz,real,imag\nfeet.x,20,1,0\nfeet.x,25,1,0\n");
        string assembly = _folder.Write("a.assembly.yaml", """
            boltup: assembly/1
            parts: { compressor: a.part.yaml }
            operations: { push: { amplitude: rms, applied_forces: { file: push.csv, part: compressor } } }
            responses:
              straight: { at: compressor.feet.x }
              turning: { at: compressor.feet.ry }
            """);
        CommandRun run = CommandRun.Of("predict", assembly, "-o", _folder.PathTo("out"), "--no-pictures", "--allow-outside");
        Assert.True(run.ExitCode == 0, run.Error);
        double acceleration = CsvSpectra.Read(_folder.PathTo("out", "responses.csv"), "response")["straight"][0].Magnitude;
        // The centre of mass is above the feet, so that the push also turns the body: at the feet it moves more than 1/m.
        Assert.InRange(acceleration, 1 / 9.122, 4 / 9.122);
    }

    private string Write(string virtualPoint)
    {
        string part = File.ReadAllText(Repository.PathTo("configs", "parts", "compressor.part.yaml"));
        part = part.Replace("../../examples", Repository.PathTo("examples"), StringComparison.Ordinal)
            .Replace("frf:", $"virtual_points:\n  {virtualPoint}\nfrf:", StringComparison.Ordinal);
        return _folder.Write("a.part.yaml", part);
    }
}
