using Boltup.Engine.Diagnostics;
using Boltup.Reports.Diagnostics;

namespace Boltup.Cli.Terminal;

/// <summary>Where a command prints: results to one writer, messages to the other. Colour only on a terminal that wants it.</summary>
internal sealed class Screen(TextWriter output, TextWriter error)
{
    public TextWriter Out { get; } = output;

    public TextWriter Error { get; } = error;

    public Ink Ink { get; } = WantsColour ? Ink.Coloured : Ink.Plain;

    public Ink ErrorInk { get; } = WantsErrorColour ? Ink.Coloured : Ink.Plain;

    private static bool AllowsColour =>
        string.IsNullOrEmpty(Environment.GetEnvironmentVariable("NO_COLOR")) && Environment.GetEnvironmentVariable("TERM") != "dumb";

    private static bool WantsColour => AllowsColour && !Console.IsOutputRedirected;

    private static bool WantsErrorColour => AllowsColour && !Console.IsErrorRedirected;

    /// <summary>Prints diagnostics in the order of a run, in the chosen form.</summary>
    public void Say(DiagnosticBag diagnostics, MessageForm form)
    {
        switch (form)
        {
            case MessageForm.Json:
                using (var bytes = new MemoryStream())
                {
                    DiagnosticJson.WriteDocument(bytes, diagnostics.Items);
                    Error.WriteLine(System.Text.Encoding.UTF8.GetString(bytes.ToArray()));
                }

                break;
            case MessageForm.Lines:
                foreach (Diagnostic diagnostic in diagnostics.Items)
                {
                    Error.WriteLine(DiagnosticText.OneLine(diagnostic));
                }

                break;
            default:
                new DiagnosticText(Error, ErrorInk).WriteAll(diagnostics.Items);
                break;
        }
    }
}
