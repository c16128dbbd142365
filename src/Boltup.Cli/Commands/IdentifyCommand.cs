using System.CommandLine;
using Boltup.Cli.Terminal;
using Boltup.Config.Documents;
using Boltup.Config.Planning;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Identification;
using Boltup.Files.UniversalFile;
using Boltup.Reports.Identification;
using Boltup.Reports.Results;

namespace Boltup.Cli.Commands;

/// <summary><c>boltup identify</c>: blocked forces from a bench, with the evidence of how good they are.</summary>
internal sealed class IdentifyCommand(Screen screen)
{
    private readonly Argument<string> _bench = new("BENCH") { Description = "A bench file (*.bench.yaml)" };
    private readonly Option<string> _output = SharedOptions.Output();
    private readonly Option<bool> _noPictures = SharedOptions.NoPictures();
    private readonly Option<bool> _universal = new("--uff") { Description = "Write the forces as Universal Files too" };
    private readonly Option<bool> _timing = SharedOptions.Timing();
    private readonly Option<bool> _allowOutside = SharedOptions.AllowOutside();
    private readonly Option<MessageForm> _messages = SharedOptions.Messages();

    public static Command Build(Screen screen)
    {
        var command = new IdentifyCommand(screen);
        var built = new Command(
            "identify", "Identify blocked forces from a bench.\n\nExample: boltup identify configs/supplier.bench.yaml -o out/supplier")
        {
            command._bench,
            command._output,
            command._noPictures,
            command._universal,
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
        using BenchPlan? plan = BenchPlanner.Plan(parsed.GetValue(_bench)!, parsed.LoadOptions(_allowOutside), diagnostics);
        stages.End("load and plan");
        IdentificationResult? result = plan is null ? null : Identifier.Run(plan.Bench, diagnostics);
        stages.End("read and identify");
        IdentificationReport? report = result is null ? null : Report(plan!, result, diagnostics);
        stages.End("evidence");
        string folder = parsed.GetValue(_output)!;
        IReadOnlyList<string>? files = report is null || diagnostics.HasErrors
            ? null
            : IdentificationWriter.Write(report, folder, !parsed.GetValue(_noPictures), parsed.GetValue(_universal) ? UniversalFiles(plan!, result!) : [], diagnostics);
        stages.End("write");
        screen.Say(diagnostics, parsed.GetValue(_messages));
        if (files is not null)
        {
            IdentificationText.Print(screen, report!, folder, files);
        }

        if (parsed.GetValue(_timing))
        {
            stages.Print(screen.Error);
        }

        return ExitCode.Of(diagnostics);
    }

    private static IdentificationReport Report(BenchPlan plan, IdentificationResult result, DiagnosticBag diagnostics)
    {
        BenchEvidence evidence = new EvidenceCollector(result, diagnostics).Collect(plan.Extras.Second, plan.Extras.Installed, plan.Extras.Routes);
        return new IdentificationReport(
            result with { Diagnostics = [.. diagnostics.Items] },
            evidence,
            ForceBand.Of(result.Axis, evidence.Validations),
            Describe(plan.Document),
            [.. plan.Inputs.Select(input => InputFingerprint.Of(input.FullPath, input.DisplayPath))],
            ProgramVersion.Text);
    }

    private static SourceDescription Describe(BenchDocument bench) => new(
        bench.MountsBelongToSource,
        [.. bench.Interface.Select(name => bench.FindPoint(name.Value)!)
            .Select(point => (point.Name.Value, point.Node?.Value, point.At?.Value, point.Axes?.Value))]);

    /// <summary>Points without a node are numbered in their order.</summary>
    private static (string, Action<Stream>)[] UniversalFiles(BenchPlan plan, IdentificationResult result)
    {
        int NodeOf(string point) => plan.Document.FindPoint(point)!.Node?.Value
            ?? 1 + plan.Document.Interface.TakeWhile(name => name.Value != point).Count();
        return
        [
            .. result.Operations.Where(operation => operation.Phase == PhaseReference.Common).Select(operation => (
                IdentificationFiles.UniversalForces(operation.Name),
                (Action<Stream>)(stream => ForceFile.Write(
                    stream, operation.Forces[0], operation.Amplitude, result.Title, $"boltup {ProgramVersion.Text}", NodeOf)))),
        ];
    }
}
