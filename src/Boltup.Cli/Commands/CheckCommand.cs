using System.CommandLine;
using Boltup.Cli.Terminal;
using Boltup.Config;
using Boltup.Config.Planning;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Prediction;
using Boltup.Reports.Diagnostics;

namespace Boltup.Cli.Commands;

/// <summary><c>boltup check</c>: everything that can be said about documents and their data without computing.</summary>
internal sealed class CheckCommand(Screen screen)
{
    private readonly Argument<string[]> _files = new("FILE")
    {
        Description = "Part, assembly, bench and forces files",
        Arity = ArgumentArity.OneOrMore,
    };

    private readonly Option<bool> _allowOutside = SharedOptions.AllowOutside();
    private readonly Option<MessageForm> _messages = SharedOptions.Messages();

    public static Command Build(Screen screen)
    {
        var command = new CheckCommand(screen);
        var built = new Command("check", "Check documents and their data without computing.\n\nExample: boltup check configs/*.assembly.yaml")
        {
            command._files,
            command._allowOutside,
            command._messages,
        };
        built.SetAction(command.Run);
        return built;
    }

    private int Run(ParseResult parsed)
    {
        var diagnostics = new DiagnosticBag();
        LoadOptions options = parsed.LoadOptions(_allowOutside);
        string[] files = parsed.GetValue(_files)!;
        foreach (string file in files)
        {
            Check(file, options, diagnostics);
        }

        screen.Say(diagnostics, parsed.GetValue(_messages));
        string verdict = DiagnosticText.Count(diagnostics.Items) ?? "no errors, no warnings";
        screen.Out.WriteLine($"{files.Length} file{(files.Length == 1 ? "" : "s")} checked: {verdict}");
        return ExitCode.Of(diagnostics);
    }

    private static void Check(string file, LoadOptions options, DiagnosticBag diagnostics)
    {
        switch (ConfigLoader.KindOf(file, options, diagnostics))
        {
            case DocumentKind.Part:
                PartCheck.Run(file, options, diagnostics);
                break;
            case DocumentKind.Bench:
                BenchPlanner.Plan(file, options, diagnostics)?.Dispose();
                break;
            case DocumentKind.Forces:
                ConfigLoader.LoadForces(file, options, diagnostics);
                break;
            case DocumentKind.Pins:
                ConfigLoader.LoadPins(file, options, diagnostics);
                break;
            case DocumentKind.Assembly:
                using (AssemblyPlan? plan = AssemblyPlanner.Plan(file, options, diagnostics))
                {
                    if (plan is not null)
                    {
                        Predictor.Check(plan.Assembly, diagnostics);
                    }
                }

                break;
        }
    }
}
