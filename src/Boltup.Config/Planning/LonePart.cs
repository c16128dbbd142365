using Boltup.Config.Binding;
using Boltup.Config.Documents;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Parts;

namespace Boltup.Config.Planning;

/// <summary>A part that is in no assembly: in its own place and axes.</summary>
internal static class LonePart
{
    /// <summary>The part under its title, or null after an error.</summary>
    public static PlacedPart? Plan(PartDocument document, DataLibrary library, DiagnosticBag diagnostics)
    {
        string name = document.Title?.Value ?? Path.GetFileName(document.Source.DisplayPath);
        var start = new SourceSpan(document.Source.DisplayPath);
        var alone = new PlacedPartDocument(
            new Marked<string>(name, start),
            new FileReference(document.Source.FullPath, document.Source.DisplayPath, start),
            Turned: null,
            Moved: null,
            document);
        return new PartPlanner(library, diagnostics).Plan(alone);
    }
}
