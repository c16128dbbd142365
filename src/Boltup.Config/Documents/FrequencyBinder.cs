using Boltup.Config.Binding;
using Boltup.Config.Units;
using Boltup.Config.Yaml;
using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Documents;

/// <summary>Binds the lines that a document asks for.</summary>
internal static class FrequencyBinder
{
    /// <summary>Share of a step by which rounding may miss the last line; 1e7 steps are off by less than 1e-8.</summary>
    private const double StepTolerance = 1e-6;

    public static FrequencyDocument? Bind(YamlMap map, DiagnosticBag diagnostics)
    {
        Marked<double> from = map["from"]!.MarkedSi(Dimension.Frequency);
        Marked<double> to = map["to"]!.MarkedSi(Dimension.Frequency);
        Marked<double> step = map["step"]!.MarkedSi(Dimension.Frequency);
        if (to.Value < from.Value)
        {
            diagnostics.Error(ConfigCodes.BadFrequencies, "`to` is below `from`", to.Span, notes: $"`from` is at {from.Span}");
            return null;
        }

        double steps = Math.Floor((to.Value - from.Value) / step.Value + StepTolerance);
        if (!(steps < FrequencyLimits.MaximumLines))
        {
            diagnostics.Error(ConfigCodes.BadFrequencies,
                FormattableString.Invariant($"more than {FrequencyLimits.MaximumLines} frequency lines"), step.Span, "take a larger step");
            return null;
        }

        return new FrequencyDocument(from, to, step, (int)steps + 1);
    }
}
