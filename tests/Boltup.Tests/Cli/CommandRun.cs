using Boltup.Cli;
using Boltup.Cli.Terminal;

namespace Boltup.Tests.Cli;

/// <summary>One run of the program inside the test process.</summary>
internal sealed record CommandRun(int ExitCode, string Out, string Error)
{
    public static CommandRun Of(params string[] args)
    {
        using var output = new StringWriter { NewLine = "\n" };
        using var error = new StringWriter { NewLine = "\n" };
        int exitCode = Program.Run(args, new Screen(output, error), CancellationToken.None);
        return new CommandRun(exitCode, output.ToString(), error.ToString());
    }
}
