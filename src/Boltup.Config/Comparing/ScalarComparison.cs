using Boltup.Config.Binding;
using Boltup.Config.Units;
using Boltup.Config.Yaml;

namespace Boltup.Config.Comparing;

/// <summary>Compares single values by what they mean: <c>0.42 kN/mm</c> is <c>420 N/mm</c>.</summary>
internal static class ScalarComparison
{
    /// <summary>Two spellings of one value differ by rounding of the conversion to SI only.</summary>
    private const double Rounding = 1e-12;

    /// <summary>Whether both mean the same.</summary>
    public static bool AreSame(YamlScalar before, YamlScalar after, ValueKind kind) => before.Text == after.Text
        || (Number(before, kind) is { } one && Number(after, kind) is { } other
            && Math.Abs(one - other) <= Rounding * Math.Max(Math.Abs(one), Math.Abs(other)));

    /// <summary>Change of a number relative to what it was; null for words, from zero, and where the zero of the unit is arbitrary.</summary>
    public static double? RelativeChange(YamlScalar before, YamlScalar after, ValueKind kind) =>
        kind is QuantityKind { Dimension: var dimension } && (dimension == Dimension.Level || dimension == Dimension.Temperature) ? null
        : Number(before, kind) is { } one && Number(after, kind) is { } other && one != 0 ? (other - one) / Math.Abs(one)
        : null;

    private static double? Number(YamlScalar scalar, ValueKind kind)
    {
        bool isBare = QuantityParser.TryParseNumber(scalar.Text, out double bare);
        return kind switch
        {
            NumberKind => isBare ? bare : null,
            QuantityKind when isBare && bare == 0 => 0,
            QuantityKind quantity when QuantityParser.Parse(scalar.Text, quantity.Dimension) is { Fault: QuantityFault.None } parsed => parsed.Si,
            _ => null,
        };
    }
}
