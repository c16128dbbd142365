using System.CommandLine;
using Boltup.Cli.Terminal;

namespace Boltup.Cli.Commands;

/// <summary>The whole command model; help and completion are made from it.</summary>
internal static class CommandTree
{
    public static RootCommand Build(Screen screen, CancellationToken cancellation) => new(
        "Predicts what a vibrating source does in an assembly that has not been built.\n\n"
        + "Example: boltup predict configs/minibus.assembly.yaml -o out/minibus")
    {
        PredictCommand.Build(screen, cancellation),
        CompareCommand.Build(screen, cancellation),
        IdentifyCommand.Build(screen),
        MountCommand.Build(screen),
        CheckCommand.Build(screen),
        PinCommand.Build(screen),
        InspectCommand.Build(screen),
        SchemaCommand.Build(screen),
        ExplainCommand.Build(screen),
    };
}
