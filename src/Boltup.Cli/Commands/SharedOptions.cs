using System.CommandLine;
using Boltup.Cli.Terminal;
using Boltup.Config;

namespace Boltup.Cli.Commands;

/// <summary>Options that several commands have.</summary>
internal static class SharedOptions
{
    public static Option<bool> AllowOutside() => new("--allow-outside")
    {
        Description = "Allow data files outside the repository (or the folder of the document)",
    };

    public static Option<string> Output() => new("--output", "-o")
    {
        Description = "Folder for the results; earlier results in it are replaced as a whole",
        DefaultValueFactory = _ => "out",
        HelpName = "DIR",
    };

    public static Option<bool> NoPictures() => new("--no-pictures") { Description = "Write data files only" };

    public static Option<bool> Timing() => new("--timing") { Description = "Say how long each step took" };

    public static Option<MessageForm> Messages() => new("--messages")
    {
        Description = "How diagnostics are printed: full, lines (one each) or json",
        HelpName = "full|lines|json",
    };

    public static LoadOptions LoadOptions(this ParseResult parsed, Option<bool> allowOutside) =>
        new() { AllowOutsidePaths = parsed.GetValue(allowOutside) };
}
