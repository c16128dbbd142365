using System.Numerics;
using System.Text.Json;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.MountIdentification;
using Boltup.Engine.Spectra;
using Boltup.Files;
using Boltup.Files.Csv;
using Boltup.Tests.Support;

namespace Boltup.Tests.Cli;

public class MountCommandTests
{
    [Fact]
    public void Mount_InstalledChain_WritesATableThatReadsBack()
    {
        using TemporaryFolder folder = Installed();
        CommandRun run = CommandRun.Of("mount", folder.PathTo("installed.part.yaml"), "--between", "top,foot", "-o", folder.PathTo("out"));
        Assert.Equal(0, run.ExitCode);
        Assert.Contains("ENG124", run.Error, StringComparison.Ordinal);
        Assert.Contains("top to foot", run.Out, StringComparison.Ordinal);
        Assert.Contains("301.5 N/mm", run.Out, StringComparison.Ordinal);
        Assert.Equal(
            [".boltup-files", "mount-top-to-foot.csv", "mount-top-to-foot.png", "summary.json"],
            Directory.EnumerateFiles(folder.PathTo("out")).Select(path => Path.GetFileName(path)!).Order(StringComparer.Ordinal));
        AssertTable(folder.PathTo("out/mount-top-to-foot.csv"));
        using JsonDocument summary = JsonDocument.Parse(File.ReadAllText(folder.PathTo("out/summary.json")));
        Assert.Equal("mount/1", summary.RootElement.GetProperty("boltup").GetString());
        JsonElement direction = summary.RootElement.GetProperty("mounts")[0].GetProperty("directions")[0];
        Assert.Equal(0.1, direction.GetProperty("median_loss_factor").GetDouble(), 1e-8);
        Assert.Equal(JsonValueKind.Null, direction.GetProperty("other_mounts").ValueKind);
    }

    [Theory]
    [InlineData("top", "PLN085")]
    [InlineData("top,fot", "PLN085")]
    [InlineData("top,top", "PLN085")]
    [InlineData("top,idle", "PLN086")]
    public void Mount_EndsThatDoNotServe_AreRefused(string between, string code)
    {
        using TemporaryFolder folder = Installed();
        CommandRun run = CommandRun.Of("mount", folder.PathTo("installed.part.yaml"), "--between", between, "-o", folder.PathTo("out"));
        Assert.Equal(2, run.ExitCode);
        Assert.Contains(code, run.Error, StringComparison.Ordinal);
        Assert.False(Directory.Exists(folder.PathTo("out")));
    }

    [Fact]
    public void Mount_LumpedPart_IsRefused()
    {
        using var folder = new TemporaryFolder();
        File.WriteAllText(folder.PathTo("a.part.yaml"), "boltup: part/1\nlumped: { direction: x, masses: { a: 1 kg, b: 1 kg } }\n");
        Assert.Contains("PLN087", CommandRun.Of("mount", folder.PathTo("a.part.yaml"), "--between", "a,b", "-o", folder.PathTo("out")).Error, StringComparison.Ordinal);
    }

    private static void AssertTable(string path)
    {
        var diagnostics = new DiagnosticBag();
        using DataFile file = DataFile.Open(path, path, diagnostics)!;
        Curve curve = Assert.Single(file.Curves);
        var values = new Complex[curve.Axis.Count];
        file.ReadSpectrum(curve, values, diagnostics);
        Assert.Equal(FunctionKind.MountStiffness, curve.Kind);
        Near.Equal([.. values.Select(_ => new Complex(3e5, 3e4))], values, 1e-9);
    }

    /// <summary>A part file of receptances at both ends of one mount, and a point that was excited only.</summary>
    private static TemporaryFolder Installed()
    {
        InstalledMounts installed = ChainInstallation.Measure(Chain.Mount(3e5, 0.1));
        var folder = new TemporaryFolder();
        using (StreamWriter csv = File.CreateText(folder.PathTo("installed.csv")))
        {
            CsvWriter.WriteFrfs(csv, installed.Axis, [
                .. Enumerable.Range(0, 4).Select(i => (installed.Dofs[i / 2], installed.Dofs[i % 2], installed.Receptance.GatherSpectrum(i / 2, i % 2))),
                (installed.Dofs[0], Dof.Parse("idle.x"), installed.Receptance.GatherSpectrum(0, 0)),
            ]);
        }

        File.WriteAllText(
            folder.PathTo("installed.part.yaml"), "boltup: part/1\ntitle: Invented installation\nfrf: [{ file: installed.csv, quantity: receptance }]\n");
        return folder;
    }
}
