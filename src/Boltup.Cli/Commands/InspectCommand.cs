using System.CommandLine;
using Boltup.Cli.Terminal;
using Boltup.Engine.Diagnostics;
using Boltup.Files;

namespace Boltup.Cli.Commands;

/// <summary><c>boltup inspect</c>: what a data file holds.</summary>
internal sealed class InspectCommand(Screen screen)
{
    private readonly Argument<string[]> _files = new("DATA") { Description = "Universal Files or CSV tables", Arity = ArgumentArity.OneOrMore };
    private readonly Option<bool> _curves = new("--curves") { Description = "List every function" };
    private readonly Option<MessageForm> _messages = SharedOptions.Messages();

    public static Command Build(Screen screen)
    {
        var command = new InspectCommand(screen);
        var built = new Command("inspect", "Show what data files hold.\n\nExample: boltup inspect examples/minibus/body.unv")
        {
            command._files,
            command._curves,
            command._messages,
        };
        built.SetAction(command.Run);
        return built;
    }

    private int Run(ParseResult parsed)
    {
        var diagnostics = new DiagnosticBag();
        foreach (string path in parsed.GetValue(_files)!)
        {
            using DataFile? file = DataFile.Open(path, path, diagnostics);
            if (file is not null)
            {
                InspectText.Write(screen, file, parsed.GetValue(_curves));
            }
        }

        screen.Say(diagnostics, parsed.GetValue(_messages));
        return ExitCode.Of(diagnostics);
    }
}
