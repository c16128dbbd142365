using System.CommandLine;
using System.Runtime.InteropServices;
using Boltup.Cli.Commands;
using Boltup.Cli.Terminal;
using Boltup.Config;
using Boltup.Engine.Kernels;

namespace Boltup.Cli;

internal static class Program
{
    private static int Main(string[] args)
    {
        // The YAML reader and the kernels take longest to get ready; they do so while the command line and the headers are read.
        _ = Task.Run(() =>
        {
            WarmUp.Run();
            KernelWarmUp.Run();
        });
        using var cancellation = new CancellationTokenSource();
        using PosixSignalRegistration interrupt = PosixSignalRegistration.Create(PosixSignal.SIGINT, signal =>
        {
            signal.Cancel = true;
            cancellation.Cancel();
        });
        return Run(args, new Screen(Console.Out, Console.Error), cancellation.Token);
    }

    /// <summary>Runs a command line; what it prints goes to the screen.</summary>
    internal static int Run(string[] args, Screen screen, CancellationToken cancellation)
    {
        try
        {
            RootCommand root = CommandTree.Build(screen, cancellation);
            return root.Parse(args).Invoke(new InvocationConfiguration
            {
                EnableDefaultExceptionHandler = false,
                Output = screen.Out,
                Error = screen.Error,
            });
        }
        catch (OperationCanceledException)
        {
            screen.Error.WriteLine("cancelled; earlier results are as they were");
            return ExitCode.Cancelled;
        }
        catch (Exception exception)
        {
            string log = CrashLog.Write(exception);
            screen.Error.WriteLine($"boltup has a defect: {exception.GetType().Name}: {exception.Message}; details are in {log}");
            return ExitCode.Defect;
        }
    }
}
