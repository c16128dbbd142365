using System.CommandLine;
using System.Text;
using Boltup.Cli.Terminal;
using Boltup.Config;
using Boltup.Config.Comparing;
using Boltup.Config.Planning;
using Boltup.Engine.Comparing;
using Boltup.Engine.Diagnostics;
using Boltup.Reports.Comparing;
using Boltup.Reports.Results;

namespace Boltup.Cli.Commands;

/// <summary><c>boltup compare</c>: what differs between two assemblies, and what it does to every response.</summary>
internal sealed class CompareCommand(Screen screen, CancellationToken cancellation)
{
    private const double UsualToleranceDb = 0.5;

    private readonly Argument<string> _base = new("BASE") { Description = "An assembly file, or a folder that holds one" };
    private readonly Argument<string> _changed = new("CHANGED") { Description = "The assembly to compare with it" };
    private readonly Option<double> _tolerance = new("--tolerance")
    {
        Description = "By how many dB an overall level may rise before the exit code is 1",
        DefaultValueFactory = _ => UsualToleranceDb,
        HelpName = "DB",
    };

    private readonly Option<bool> _full = new("--full") { Description = "Print third octaves, edits and paths of every response" };
    private readonly Option<bool> _json = new("--json") { Description = "Print JSON" };
    private readonly Option<bool> _markdown = new("--markdown") { Description = "Print Markdown, for a pull request" };
    private readonly Option<string?> _output = new("--output", "-o")
    {
        Description = "Folder for comparison.json, comparison.md and pictures; earlier results in it are replaced as a whole",
        HelpName = "DIR",
    };

    private readonly Option<bool> _noPictures = SharedOptions.NoPictures();
    private readonly Option<bool> _timing = SharedOptions.Timing();
    private readonly Option<bool> _allowOutside = SharedOptions.AllowOutside();
    private readonly Option<MessageForm> _messages = SharedOptions.Messages();

    public static Command Build(Screen screen, CancellationToken cancellation)
    {
        var command = new CompareCommand(screen, cancellation);
        var built = new Command(
            "compare",
            "Compare two assemblies: which inputs differ, and what that does to every response. Exit code 1 when a level rises beyond the tolerance.\n\n"
            + "Example: boltup compare configs/minibus.assembly.yaml configs/minibus-softer.assembly.yaml")
        {
            command._base,
            command._changed,
            command._tolerance,
            command._full,
            command._json,
            command._markdown,
            command._output,
            command._noPictures,
            command._timing,
            command._allowOutside,
            command._messages,
        };
        built.SetAction(command.Run);
        return built;
    }

    private int Run(ParseResult parsed)
    {
        var stages = new StageClock();
        var diagnostics = new DiagnosticBag();
        KernelRequest.Check(diagnostics);
        ComparisonReport? report = Compare(parsed, stages, diagnostics);
        IReadOnlyList<string>? files = report is not null && parsed.GetValue(_output) is { } folder
            ? ComparisonWriter.Write(report, folder, !parsed.GetValue(_noPictures), diagnostics)
            : [];
        stages.End("write");
        screen.Say(diagnostics, parsed.GetValue(_messages));
        if (report is not null && files is not null)
        {
            Print(report, FormOf(parsed), files);
        }

        if (parsed.GetValue(_timing))
        {
            stages.Print(screen.Error);
        }

        return diagnostics.HasErrors || report is null ? ExitCode.Of(diagnostics)
            : report.IsWorse ? ExitCode.Regressed
            : ExitCode.Done;
    }

    private ComparisonReport? Compare(ParseResult parsed, StageClock stages, DiagnosticBag diagnostics)
    {
        double tolerance = parsed.GetValue(_tolerance);
        string? basePath = ComparisonTarget.Find(parsed.GetValue(_base)!, diagnostics);
        string? changedPath = ComparisonTarget.Find(parsed.GetValue(_changed)!, diagnostics);
        if (!(tolerance >= 0) || double.IsInfinity(tolerance))
        {
            diagnostics.Error(CliCodes.BadTolerance, "the tolerance is no number of dB from 0 upwards", help: "write `--tolerance 0.5`");
            return null;
        }

        if (basePath is null || changedPath is null)
        {
            return null;
        }

        using ComparisonPlan? plan = ComparisonPlan.Plan(basePath, changedPath, parsed.LoadOptions(_allowOutside), diagnostics);
        stages.End("load and plan");
        return plan is null ? null : Report(plan, tolerance, stages, diagnostics);
    }

    private ComparisonReport? Report(ComparisonPlan plan, double tolerance, StageClock stages, DiagnosticBag diagnostics)
    {
        ComparedPredictions? effect = null;
        if (plan.Differences.MatterToResults)
        {
            effect = AssemblyComparer.Compare(plan.Base.Assembly, plan.ChangedAssembly, diagnostics, cancellation);
            stages.End("read and couple");
            if (effect is null)
            {
                return null;
            }

            SayWhatIsMissing(effect, diagnostics);
        }

        return new ComparisonReport(
            plan.Base.Document.Source.DisplayPath,
            plan.Changed.Document.Source.DisplayPath,
            plan.Differences.Items,
            effect,
            tolerance,
            Fingerprints(plan.Base),
            Fingerprints(plan.Changed),
            ProgramVersion.Text);
    }

    private static void SayWhatIsMissing(ComparedPredictions effect, DiagnosticBag diagnostics)
    {
        foreach (string line in effect.NotCompared)
        {
            diagnostics.Warning(CliCodes.NotCompared, line);
        }
    }

    private static InputFingerprint[] Fingerprints(AssemblyPlan plan) =>
        [.. plan.Inputs.Select(input => InputFingerprint.Of(input.FullPath, input.DisplayPath))];

    private ComparisonForm FormOf(ParseResult parsed) => parsed.GetValue(_json) ? ComparisonForm.Json
        : parsed.GetValue(_markdown) ? ComparisonForm.Markdown
        : parsed.GetValue(_full) ? ComparisonForm.Full
        : ComparisonForm.Concise;

    private void Print(ComparisonReport report, ComparisonForm form, IReadOnlyList<string> files)
    {
        switch (form)
        {
            case ComparisonForm.Json:
                using (var bytes = new MemoryStream())
                {
                    ComparisonJson.Write(bytes, report);
                    screen.Out.WriteLine(Encoding.UTF8.GetString(bytes.ToArray()));
                }

                break;
            case ComparisonForm.Markdown:
                screen.Out.Write(ComparisonMarkdown.Of(report, [.. files.Where(file => file.EndsWith(".png", StringComparison.Ordinal))]));
                break;
            default:
                ComparisonText.Print(screen, report, form == ComparisonForm.Full);
                break;
        }
    }
}
