using System.CommandLine;
using Boltup.Cli.Terminal;
using Boltup.Config;
using Boltup.Config.Planning;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Prediction;
using Boltup.Reports.Results;

namespace Boltup.Cli.Commands;

/// <summary><c>boltup predict</c>: couples an assembly, applies its operations, writes and prints the results.</summary>
internal sealed class PredictCommand(Screen screen, CancellationToken cancellation)
{
    private readonly Argument<string> _assembly = new("ASSEMBLY") { Description = "An assembly file (*.assembly.yaml)" };
    private readonly Option<string> _output = SharedOptions.Output();
    private readonly Option<bool> _noPictures = SharedOptions.NoPictures();
    private readonly Option<bool> _pathLines = new("--path-lines") { Description = "Write every contribution at every line as well" };
    private readonly Option<bool> _timing = SharedOptions.Timing();
    private readonly Option<bool> _allowOutside = SharedOptions.AllowOutside();
    private readonly Option<MessageForm> _messages = SharedOptions.Messages();

    public static Command Build(Screen screen, CancellationToken cancellation)
    {
        var command = new PredictCommand(screen, cancellation);
        var built = new Command(
            "predict", "Predict the responses of an assembly.\n\nExample: boltup predict configs/minibus.assembly.yaml -o out/minibus")
        {
            command._assembly,
            command._output,
            command._noPictures,
            command._pathLines,
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
        string path = parsed.GetValue(_assembly)!;
        using AssemblyPlan? plan = AssemblyPlanner.Plan(path, parsed.LoadOptions(_allowOutside), diagnostics);
        Task<InputFingerprint[]>? fingerprints = plan is null ? null : Task.Run(() => Fingerprints(plan), cancellation);
        stages.End("load and plan");
        PredictionResult? result = plan is null ? null : Predictor.Predict(plan.Assembly, diagnostics, withPaths: true, cancellation);
        stages.End("read and couple");
        string folder = parsed.GetValue(_output)!;
        var options = new ResultOptions(ProgramVersion.Text, !parsed.GetValue(_noPictures)) { PathLines = parsed.GetValue(_pathLines) };
        IReadOnlyList<string>? files = result is null
            ? null
            : ResultWriter.Write(result, fingerprints!.Result, folder, options, diagnostics);
        stages.End("write");
        screen.Say(diagnostics, parsed.GetValue(_messages));
        if (files is not null)
        {
            PredictionSummary.Print(screen, result!, folder, files);
        }

        if (parsed.GetValue(_timing))
        {
            stages.Print(screen.Error);
        }

        bool isMissed = files is not null && result!.Verdicts.Any(verdict => verdict.IsMissed);
        return ExitCode.Of(diagnostics) is var code && code == ExitCode.Done && isMissed ? ExitCode.TargetMissed : code;
    }

    private static InputFingerprint[] Fingerprints(AssemblyPlan plan) =>
        [.. plan.Inputs.Select(input => InputFingerprint.Of(input.FullPath, input.DisplayPath))];
}
