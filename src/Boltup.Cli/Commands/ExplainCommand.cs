using System.CommandLine;
using Boltup.Cli.Terminal;
using Boltup.Config.Binding;
using Boltup.Engine.Diagnostics;
using Boltup.Reports.Diagnostics;

namespace Boltup.Cli.Commands;

/// <summary><c>boltup explain</c>: what a diagnostic means and how to cure it.</summary>
internal static class ExplainCommand
{
    public static Command Build(Screen screen)
    {
        var code = new Argument<string?>("CODE")
        {
            Description = "A code such as CFG012; without it, all codes are listed",
            Arity = ArgumentArity.ZeroOrOne,
        };
        var command = new Command("explain", "Explain a diagnostic.\n\nExample: boltup explain CFG012") { code };
        command.SetAction(parsed => parsed.GetValue(code) is { } wanted ? Explain(wanted, screen) : List(screen));
        return command;
    }

    private static int List(Screen screen)
    {
        foreach (DiagnosticCode code in DiagnosticCatalogue.All)
        {
            screen.Out.WriteLine($"{code.Code}  {code.Title}");
        }

        return ExitCode.Done;
    }

    private static int Explain(string wanted, Screen screen)
    {
        IReadOnlyList<DiagnosticCode> all = DiagnosticCatalogue.All;
        DiagnosticCode? code = all.FirstOrDefault(code => string.Equals(code.Code, wanted, StringComparison.OrdinalIgnoreCase));
        if (code is not null)
        {
            ExplainText.Write(screen.Out, code, screen.Ink);
            return ExitCode.Done;
        }

        var diagnostics = new DiagnosticBag();
        string? help = NearestName.Suggest(wanted.ToUpperInvariant(), all.Select(each => each.Code));
        diagnostics.Error(CliCodes.UnknownCode, $"no diagnostic has the code `{wanted}`", help: help ?? "`boltup explain` lists all codes");
        screen.Say(diagnostics, MessageForm.Full);
        return ExitCode.WrongInput;
    }
}
