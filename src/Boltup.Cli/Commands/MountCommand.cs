using System.CommandLine;
using Boltup.Cli.Terminal;
using Boltup.Config.Planning;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.MountIdentification;
using Boltup.Reports.MountIdentification;
using Boltup.Reports.Results;

namespace Boltup.Cli.Commands;

/// <summary><c>boltup mount</c>: the stiffness of mounts from FRFs of the assembled installation.</summary>
internal sealed class MountCommand(Screen screen)
{
    private readonly Argument<string> _installed = new("INSTALLED") { Description = "A part file with the FRFs of the whole installation" };
    private readonly Option<string[]> _between = new("--between")
    {
        Description = "The two points between which a mount sits; give the option once for every mount of the installation",
        HelpName = "FIRST,SECOND",
        Required = true,
    };

    private readonly Option<string> _output = SharedOptions.Output();
    private readonly Option<bool> _noPictures = SharedOptions.NoPictures();
    private readonly Option<bool> _allowOutside = SharedOptions.AllowOutside();
    private readonly Option<MessageForm> _messages = SharedOptions.Messages();

    public static Command Build(Screen screen)
    {
        var command = new MountCommand(screen);
        var built = new Command(
            "mount",
            "Identify mounts in an installation by inverse substructuring.\n\n"
            + "Example: boltup mount installed.part.yaml --between m1,b1 --between m2,b2 -o out/mounts")
        {
            command._installed,
            command._between,
            command._output,
            command._noPictures,
            command._allowOutside,
            command._messages,
        };
        built.SetAction(command.Run);
        return built;
    }

    private int Run(ParseResult parsed)
    {
        var diagnostics = new DiagnosticBag();
        KernelRequest.Check(diagnostics);
        Installation? installation = InstallationReader.Read(
            parsed.GetValue(_installed)!, parsed.GetValue(_between)!, parsed.LoadOptions(_allowOutside), diagnostics);
        IReadOnlyList<IdentifiedMount>? mounts = installation is null ? null : InverseSubstructuring.Identify(installation.Mounts, diagnostics);
        string folder = parsed.GetValue(_output)!;
        MountReport? report = mounts is null ? null : new MountReport(
            installation!.Title,
            installation.Mounts.Axis,
            mounts,
            [.. diagnostics.Items],
            [.. installation.Inputs.Select(input => InputFingerprint.Of(input.FullPath, input.DisplayPath))],
            ProgramVersion.Text);
        IReadOnlyList<string>? files = report is null ? null : MountReportWriter.Write(report, folder, !parsed.GetValue(_noPictures), diagnostics);
        screen.Say(diagnostics, parsed.GetValue(_messages));
        if (files is not null)
        {
            MountText.Print(screen, report!, folder, files);
        }

        return ExitCode.Of(diagnostics);
    }
}
