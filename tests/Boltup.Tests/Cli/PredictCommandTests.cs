using System.Globalization;
using System.Text.Json;
using Boltup.Tests.Support;

namespace Boltup.Tests.Cli;

public class PredictCommandTests
{
    private static readonly string Demo = Repository.PathTo("configs", "minibus.assembly.yaml");

    [Fact]
    public void Predict_Demo_WritesResultsAndPictures()
    {
        using var folder = new TemporaryFolder();
        CommandRun run = CommandRun.Of("predict", Demo, "-o", folder.PathTo("out"));
        Assert.Equal((0, ""), (run.ExitCode, run.Error));
        Assert.Contains("driver ear", run.Out, StringComparison.Ordinal);
        string[] files = [.. Directory.EnumerateFiles(folder.PathTo("out")).Select(path => Path.GetFileName(path)!).Order(StringComparer.Ordinal)];
        Assert.Equal(
            [
                ".boltup-files", "5400-rpm-driver-ear-paths.png", "5400-rpm-driver-ear.png", "5400-rpm-floor-paths.png", "5400-rpm-floor.png",
                "5400-rpm-joint-forces.png", "5400-rpm-passenger-ear-paths.png", "5400-rpm-passenger-ear.png", "5400-rpm-seat-rail-paths.png",
                "5400-rpm-seat-rail.png", "5400-rpm-steering-column-paths.png", "5400-rpm-steering-column.png", "bands.csv", "contributions.csv", "joint_forces.csv", "levels.csv", "mount-base.png", "overview.png", "report.html", "responses.csv", "sensitivity.csv", "summary.json", "tones.csv",
            ],
            files);
    }

    [Fact]
    public void Predict_PathLines_WritesEveryContributionAndPrintsTheStrongest()
    {
        using var folder = new TemporaryFolder();
        CommandRun run = CommandRun.Of("predict", Demo, "-o", folder.PathTo("out"), "--no-pictures", "--path-lines");
        Assert.Contains("strongest path", run.Out, StringComparison.Ordinal);
        Assert.Contains("rear left z 59.6", run.Out, StringComparison.Ordinal);

        // A head, then 5 responses of 12 forces and 12 directions of joints at 197 lines.
        Assert.Equal(1 + 5 * 24 * 197, File.ReadLines(folder.PathTo("out", "contribution_lines.csv")).Count());
    }

    [Fact]
    public void Predict_MissedTarget_ExitsWithOneAndSaysWhatWouldMeetIt()
    {
        using var folder = new TemporaryFolder();
        string stricter = folder.Write("a.assembly.yaml", $$"""
            boltup: assembly/1
            based_on: {{Demo}}
            targets: { driver ear overall: { limit: 50 dB } }
            """);
        CommandRun run = CommandRun.Of("predict", stricter, "-o", folder.PathTo("out"), "--no-pictures", "--allow-outside");
        Assert.Equal(1, run.ExitCode);
        Assert.Contains("missed by 5.6 dB", run.Out, StringComparison.Ordinal);
        Assert.Contains("to meet it: all forces 5.6 dB lower", run.Out, StringComparison.Ordinal);
        using JsonDocument summary = JsonDocument.Parse(File.ReadAllText(folder.PathTo("out", "summary.json")));
        JsonElement target = summary.RootElement.GetProperty("targets")[0];
        Assert.Equal("missed", target.GetProperty("verdict").GetString());
        Assert.Equal(-5.64, target.GetProperty("margin_db").GetDouble(), 0.01);
        Assert.Equal(-5.64, target.GetProperty("all_forces_change_db").GetDouble(), 0.01);
        Assert.Contains("Target driver ear overall, 5400 rpm: missed by 5.6 dB", File.ReadAllText(folder.PathTo("out", "report.html")), StringComparison.Ordinal);
    }

    [Fact]
    public void Predict_Demo_ReportsWhatPeopleFeelAndHear()
    {
        using var folder = new TemporaryFolder();
        CommandRun run = CommandRun.Of("predict", Demo, "-o", folder.PathTo("out"), "--no-pictures");
        Assert.Contains("seat rail: Wk-weighted 0.0154 m/s² rms", run.Out, StringComparison.Ordinal);
        Assert.Contains("Directive 2002/44/EC, hand-arm vibration: action value 2.5 m/s², limit value 5 m/s²", run.Out, StringComparison.Ordinal);
        Assert.Contains(File.ReadLines(folder.PathTo("out", "levels.csv")), row => row.StartsWith("5400 rpm,steering column,Wh,20,1000,", StringComparison.Ordinal));
        Assert.Contains(File.ReadLines(folder.PathTo("out", "tones.csv")), row => row.StartsWith("5400 rpm,driver ear,360,", StringComparison.Ordinal));
    }

    [Fact]
    public void Predict_Twice_GivesTheSameBytes()
    {
        using var folder = new TemporaryFolder();
        foreach (string name in new[] { "a", "b" })
        {
            CommandRun.Of("predict", Demo, "-o", folder.PathTo(name));
        }

        foreach (string file in Directory.EnumerateFiles(folder.PathTo("a")))
        {
            Assert.Equal(File.ReadAllBytes(file), File.ReadAllBytes(folder.PathTo("b", Path.GetFileName(file))));
        }
    }

    [Fact]
    public void Predict_SofterMounts_ChangesTheLevels()
    {
        using var folder = new TemporaryFolder();
        string softer = Repository.PathTo("configs", "minibus-softer.assembly.yaml");
        CommandRun.Of("predict", Demo, "-o", folder.PathTo("base"), "--no-pictures");
        CommandRun.Of("predict", softer, "-o", folder.PathTo("softer"), "--no-pictures");
        Assert.True(Math.Abs(OverallDb(folder.PathTo("base")) - OverallDb(folder.PathTo("softer"))) > 0.5);
    }

    [Fact]
    public void Predict_UnderADecimalComma_WritesTheSameBytes()
    {
        using var folder = new TemporaryFolder();
        CommandRun.Of("predict", Demo, "-o", folder.PathTo("a"));
        CultureInfo before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo("de-DE");
            CommandRun run = CommandRun.Of("predict", Demo, "-o", folder.PathTo("b"));
            Assert.Contains("69.1", run.Out, StringComparison.Ordinal);
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }

        Assert.Equal(File.ReadAllBytes(folder.PathTo("a", "responses.csv")), File.ReadAllBytes(folder.PathTo("b", "responses.csv")));
        Assert.Equal(File.ReadAllBytes(folder.PathTo("a", "summary.json")), File.ReadAllBytes(folder.PathTo("b", "summary.json")));
    }

    [Fact]
    public void Predict_MisspeltKey_PointsAtItAndWritesNothing()
    {
        using var folder = new TemporaryFolder();
        string path = folder.Write("a.assembly.yaml", "boltup: assembly/1\nparts: { p: p.part.yaml }\nmounts:\n  front: { stifness: { z: 120 N/mm } }\n");
        folder.Write("p.part.yaml", "boltup: part/1\nlumped: { direction: x, masses: { a: 1 kg } }\n");
        CommandRun run = CommandRun.Of("predict", path, "-o", folder.PathTo("out"));
        Assert.Equal(2, run.ExitCode);
        Assert.Contains("error[CFG012]: unknown key `stifness`", run.Error, StringComparison.Ordinal);
        Assert.Contains(":4:12", run.Error, StringComparison.Ordinal);
        Assert.Contains("help: did you mean `stiffness`?", run.Error, StringComparison.Ordinal);
        Assert.False(Directory.Exists(folder.PathTo("out")));
    }

    [Fact]
    public void Predict_SingularInterface_EndsWithThree()
    {
        using var folder = new TemporaryFolder();
        string path = folder.Write(
            "a.assembly.yaml",
            """
            boltup: assembly/1
            parts: { a: p.part.yaml, b: p.part.yaml }
            joints:
              one: { between: [a.m, b.m], rigid: [x] }
              held: { between: [a.m, ground], rigid: [x] }
              held too: { between: [b.m, ground], rigid: [x] }
            operations:
              run: { amplitude: rms, applied_forces: { file: f.csv, part: a } }
            responses: { r: { at: b.n.x } }
            """);
        folder.Write("p.part.yaml", "boltup: part/1\nlumped: { direction: x, masses: { m: 1 kg, n: 2 kg }, links: [{ between: [m, n], stiffness: 5 N/mm, loss_factor: 0.1 }] }\n");
        folder.Write("f.csv", "dof,frequency_hz,real,imag\nn.x,10,1,0\nn.x,20,1,0\n");
        CommandRun run = CommandRun.Of("predict", path, "-o", folder.PathTo("out"));
        Assert.Equal(3, run.ExitCode);
        Assert.Contains("error[ENG001]: the joints do not determine the joint forces at 10 and 20 Hz", run.Error, StringComparison.Ordinal);
        Assert.Contains("`one x`, `held x`, `held too x`", run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void Predict_Cancelled_LeavesEarlierResults()
    {
        using var folder = new TemporaryFolder();
        CommandRun.Of("predict", Demo, "-o", folder.PathTo("out"), "--no-pictures");
        byte[] before = File.ReadAllBytes(folder.PathTo("out", "responses.csv"));
        using var output = new StringWriter();
        int exitCode = Boltup.Cli.Program.Run(
            ["predict", Demo, "-o", folder.PathTo("out")], new Boltup.Cli.Terminal.Screen(output, output), new CancellationToken(canceled: true));
        Assert.Equal(130, exitCode);
        Assert.Equal(before, File.ReadAllBytes(folder.PathTo("out", "responses.csv")));
    }

    private static double OverallDb(string folder)
    {
        using JsonDocument summary = JsonDocument.Parse(File.ReadAllBytes(Path.Combine(folder, "summary.json")));
        return summary.RootElement.GetProperty("levels")[0].GetProperty("overall_db").GetDouble();
    }
}
