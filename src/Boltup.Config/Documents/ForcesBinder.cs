using Boltup.Config.Binding;
using Boltup.Config.Units;
using Boltup.Config.Yaml;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Identification;
using Boltup.Engine.Prediction;

namespace Boltup.Config.Documents;

/// <summary>Turns the validated nodes of a handover into a document.</summary>
internal sealed class ForcesBinder(DiagnosticBag diagnostics)
{
    public ForcesDocument Bind(YamlMap root)
    {
        var holds = (YamlMap)root["holds"]!;
        return new ForcesDocument(
            root.Source,
            root["mounts_belong_to"]?.Text() is { } side ? side == "source" : null,
            [.. root["points"].Entries().Select(point => PointBinder.Bind(point, diagnostics))],
            holds["from"]!.Si(Dimension.Frequency),
            holds["to"]!.Si(Dimension.Frequency),
            holds["because"]?.Text(),
            [.. root["operations"].Entries().Select(BindOperation)])
        {
            Root = root,
        };
    }

    private static ForcesOperationDocument BindOperation(YamlEntry entry)
    {
        var map = (YamlMap)entry.Value;
        return new ForcesOperationDocument(
            entry.MarkedKey(),
            map["file"]!.File(),
            map["phase"]!.Text() == "free" ? PhaseReference.Free : PhaseReference.Common,
            map["amplitude"]!.Text() == "peak" ? Amplitude.Peak : Amplitude.Rms);
    }
}
