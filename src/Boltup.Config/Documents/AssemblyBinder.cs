using Boltup.Config.Binding;
using Boltup.Config.Units;
using Boltup.Config.Yaml;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Geometry;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Config.Documents;

/// <summary>Turns the validated nodes of an assembly into a document; parts are bound without their files.</summary>
internal sealed partial class AssemblyBinder(DiagnosticBag diagnostics)
{
    private const double DefaultJointGapM = 0.005;

    public AssemblyDocument Bind(YamlMap root, IReadOnlyList<SourceFile> bases) => new(
        root.Source,
        bases,
        root["title"]?.MarkedText(),
        root["frequencies"] is YamlMap frequencies ? FrequencyBinder.Bind(frequencies, diagnostics) : null,
        [.. root["parts"].Entries().Select(BindPart)],
        [.. root["mounts"].Entries().Select(mount => new MountDocument(mount.MarkedKey(), BindLaw((YamlMap)mount.Value)))],
        [.. root["joints"].Entries().Select(BindJoint).OfType<JointDocument>()],
        [.. root["operations"].Entries().Select(BindOperation)],
        [.. root["responses"].Entries().Select(BindResponse).OfType<ResponseDocument>()],
        root["joint_gap"]?.Si(Dimension.Length) ?? DefaultJointGapM)
    {
        Targets = [.. root["targets"].Entries().Select(BindTarget)],
        Root = root,
    };

    private PlacedPartDocument BindPart(YamlEntry entry)
    {
        var map = entry.Value as YamlMap;
        return new PlacedPartDocument(
            entry.MarkedKey(),
            (map?["file"] ?? entry.Value).File(),
            map?["turned"] is YamlMap turned ? BindTurn(turned) : null,
            map?["moved"]?.Position(),
            Document: null);
    }

    private TurnDocument? BindTurn(YamlMap map)
    {
        YamlNode about = map["about"]!;
        Vector3d axis = about is YamlScalar name ? UnitVector(name.Text) : about.Vector().Value;
        double length = axis.Length;
        if (!(length > 0 && double.IsFinite(length)))
        {
            diagnostics.Error(ConfigCodes.BadAxes,
                "the axis of rotation has no direction", about.Span, "write `x`, `y`, `z` or a vector such as `[0, 0, 1]`");
            return null;
        }

        return new TurnDocument(new(axis.Normalised(), about.Span), map["by"]!.MarkedSi(Dimension.Angle));
    }

    private static Vector3d UnitVector(string name) => name switch
    {
        "x" => new(1, 0, 0),
        "y" => new(0, 1, 0),
        _ => new(0, 0, 1),
    };

    private static OperationDocument BindOperation(YamlEntry entry)
    {
        var map = (YamlMap)entry.Value;
        return new OperationDocument(
            entry.MarkedKey(),
            map["title"]?.MarkedText(),
            [.. BindForces(map["blocked_forces"], ForceKind.Blocked), .. BindForces(map["applied_forces"], ForceKind.Applied)],
            map["sum"]?.Text() == "energy" ? ForceSum.Energy : ForceSum.Phase,
            map["amplitude"] is YamlNode amplitude
                ? new(amplitude.Text() == "peak" ? Amplitude.Peak : Amplitude.Rms, amplitude.Span)
                : null);
    }

    private static IEnumerable<ForceDocument> BindForces(YamlNode? node, ForceKind kind)
    {
        IEnumerable<YamlNode> files = node is YamlMap single ? [single] : node.Items();
        return files.Cast<YamlMap>().Select(file => new ForceDocument(
            kind, file["file"]!.File(), file["part"]!.MarkedText(), file["operation"]?.MarkedText()));
    }
}
