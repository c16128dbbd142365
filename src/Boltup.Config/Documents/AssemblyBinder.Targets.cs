using Boltup.Config.Binding;
using Boltup.Config.Units;
using Boltup.Config.Yaml;
using Boltup.Engine.Acoustics;
using Boltup.Engine.Targets;

namespace Boltup.Config.Documents;

/// <summary>Targets.</summary>
internal sealed partial class AssemblyBinder
{
    private TargetDocument BindTarget(YamlEntry entry)
    {
        var map = (YamlMap)entry.Value;
        CheckBand(map["from"], map["to"]);
        return new TargetDocument(
            entry.MarkedKey(),
            map["response"]!.MarkedText(),
            [.. map["operations"].Items().Select(item => item.MarkedText())],
            BindWeighting(map["weighting"]),
            map["from"]?.Si(Dimension.Frequency),
            map["to"]?.Si(Dimension.Frequency),
            map["limit"] is YamlNode limit ? [new TargetLimit(null, limit.Si(Dimension.Level))] : [.. map["third_octaves"].Entries().Select(BindBand).OfType<TargetLimit>()]);
    }

    private static Marked<FrequencyWeighting>? BindWeighting(YamlNode? node) =>
        node is null ? null : new(Enum.Parse<FrequencyWeighting>(node.Text()), node.Span);

    private void CheckBand(YamlNode? from, YamlNode? to)
    {
        if (from is not null && to is not null && to.Si(Dimension.Frequency) < from.Si(Dimension.Frequency))
        {
            diagnostics.Error(ConfigCodes.BadFrequencies, "`to` is below `from`", to.Span, notes: $"`from` is at {from.Span}");
        }
    }

    private TargetLimit? BindBand(YamlEntry entry)
    {
        ParsedQuantity centre = QuantityParser.Parse(entry.Key, Dimension.Frequency);
        if (centre.Fault == QuantityFault.None && centre.Si > 0 && Math.Abs(OctaveBand.Of(centre.Si).NominalHz / centre.Si - 1) < 0.02)
        {
            return new TargetLimit(OctaveBand.Of(centre.Si), entry.Value.Si(Dimension.Level));
        }

        diagnostics.Error(ConfigCodes.NoThirdOctave, $"`{entry.Key}` is no third octave", entry.KeySpan,
            "name bands by their nominal centres with the unit, such as `63 Hz`, `80 Hz` or `1 kHz`");
        return null;
    }
}
