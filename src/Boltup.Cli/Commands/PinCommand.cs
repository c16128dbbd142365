using System.CommandLine;
using Boltup.Cli.Terminal;
using Boltup.Config.Pinning;
using Boltup.Engine.Diagnostics;

namespace Boltup.Cli.Commands;

/// <summary><c>boltup pin</c>: writes down what the data files of an assembly hold, so that a change of one shows in a review.</summary>
internal sealed class PinCommand(Screen screen)
{
    private readonly Argument<string> _assembly = new("ASSEMBLY") { Description = "An assembly file (*.assembly.yaml)" };
    private readonly Option<bool> _accept = new("--accept") { Description = "Replace pins that differ: the changed data files are meant" };
    private readonly Option<bool> _allowOutside = SharedOptions.AllowOutside();
    private readonly Option<MessageForm> _messages = SharedOptions.Messages();

    public static Command Build(Screen screen)
    {
        var command = new PinCommand(screen);
        var built = new Command(
            "pin",
            "Pin the data files of an assembly by their SHA-256; from then on a changed file is an error.\n\nExample: boltup pin configs/minibus.assembly.yaml")
        {
            command._assembly,
            command._accept,
            command._allowOutside,
            command._messages,
        };
        built.SetAction(command.Run);
        return built;
    }

    private int Run(ParseResult parsed)
    {
        var diagnostics = new DiagnosticBag();
        string assembly = parsed.GetValue(_assembly)!;
        PinChange? change = PinsFile.Write(assembly, parsed.GetValue(_accept), parsed.LoadOptions(_allowOutside), diagnostics);
        screen.Say(diagnostics, parsed.GetValue(_messages));
        if (change is not null)
        {
            Print(change, PinsFile.PathFor(assembly));
        }

        return ExitCode.Of(diagnostics);
    }

    private void Print(PinChange change, string path)
    {
        foreach ((string word, IReadOnlyList<string> files) in new[] { ("changed", change.Changed), ("pinned", change.Added), ("dropped", change.Dropped) })
        {
            foreach (string file in files)
            {
                screen.Out.WriteLine($"{word} {file}");
            }
        }

        screen.Out.WriteLine(change.IsNone ? $"{path} is up to date" : $"wrote {path}; commit it beside the assembly");
    }
}
