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

    public static Option<MessageForm> Messages() => new("--messages")
    {
        Description = "How diagnostics are printed: full, lines (one each) or json",
        HelpName = "full|lines|json",
    };

    public static LoadOptions LoadOptions(this ParseResult parsed, Option<bool> allowOutside) =>
        new() { AllowOutsidePaths = parsed.GetValue(allowOutside) };
}
