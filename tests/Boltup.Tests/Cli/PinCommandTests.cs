using Boltup.Tests.Support;

namespace Boltup.Tests.Cli;

public class PinCommandTests
{
    private const string Assembly = "boltup: assembly/1\nfrequencies: { from: 10 Hz, to: 20 Hz, step: 10 Hz }\nparts: { a: a.part.yaml }\n"
        + "operations: { run: { amplitude: rms, applied_forces: { file: f.csv, part: a } } }\nresponses: { r: { at: a.m.x } }\n";

    [Fact]
    public void Pin_ThenAChangedFile_StopsPredictAndCheckAndCompareUntilAccepted()
    {
        using TemporaryFolder folder = Folder(out string assembly);
        Assert.Equal(0, CommandRun.Of("pin", assembly).ExitCode);
        Assert.Contains("up to date", CommandRun.Of("pin", assembly).Out, StringComparison.Ordinal);
        folder.Write("f.csv", "dof,frequency_hz,real,imag\nm.x,10,3,0\nm.x,20,1,0\n");
        foreach (string[] command in new[] { ["predict", assembly, "-o", folder.PathTo("out")], ["check", assembly], new[] { "compare", assembly, assembly } })
        {
            CommandRun run = CommandRun.Of(command);
            Assert.Equal(2, run.ExitCode);
            Assert.Contains("error[PLN090]", run.Error, StringComparison.Ordinal);
        }

        CommandRun refused = CommandRun.Of("pin", assembly);
        Assert.Equal(2, refused.ExitCode);
        Assert.Contains("changed: `f.csv`", refused.Error, StringComparison.Ordinal);
        Assert.Contains("changed f.csv", CommandRun.Of("pin", assembly, "--accept").Out, StringComparison.Ordinal);
        Assert.Equal(0, CommandRun.Of("check", assembly).ExitCode);
    }

    [Fact]
    public void Pin_AssemblyWithErrors_WritesNothing()
    {
        using TemporaryFolder folder = Folder(out string assembly);
        File.Delete(folder.PathTo("f.csv"));
        Assert.Equal(2, CommandRun.Of("pin", assembly).ExitCode);
        Assert.False(File.Exists(folder.PathTo("a.pins.yaml")));
    }

    [Fact]
    public void Check_PinsFile_IsADocumentOfItsOwn()
    {
        using TemporaryFolder folder = Folder(out string assembly);
        CommandRun.Of("pin", assembly);
        Assert.Equal(0, CommandRun.Of("check", folder.PathTo("a.pins.yaml")).ExitCode);
    }

    private static TemporaryFolder Folder(out string assembly)
    {
        var folder = new TemporaryFolder();
        folder.Write("a.part.yaml", "boltup: part/1\nlumped: { direction: x, masses: { m: 1 kg } }\n");
        folder.Write("f.csv", "dof,frequency_hz,real,imag\nm.x,10,1,0\nm.x,20,1,0\n");
        assembly = folder.Write("a.assembly.yaml", Assembly);
        return folder;
    }
}
