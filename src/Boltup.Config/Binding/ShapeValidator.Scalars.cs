using Boltup.Config.Units;
using Boltup.Config.Yaml;
using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Binding;

/// <summary>Single values: words, numbers and quantities.</summary>
internal sealed partial class ShapeValidator
{
    private const int MaximumNodeNumberDigits = 9;

    private void CheckScalar(YamlScalar scalar, ValueKind kind, string label)
    {
        switch (kind)
        {
            case ChoiceKind choice when !choice.Allowed.Contains(scalar.Text):
                string? suggestion = NearestName.Suggest(scalar.Text, choice.Allowed);
                diagnostics.Error(ConfigCodes.NotAllowed,
                    $"{label} is {scalar.Describe()}, expected {choice.Expected}", scalar.Span, suggestion);
                break;
            case NumberKind number:
                CheckNumber(scalar, number, label);
                break;
            case QuantityKind quantity:
                CheckQuantity(scalar, quantity, label);
                break;
            case TextKind or PathKind:
                CheckText(scalar, kind, label);
                break;
        }
    }

    private void CheckText(YamlScalar scalar, ValueKind kind, string label)
    {
        if (string.IsNullOrWhiteSpace(scalar.Text))
        {
            diagnostics.Error(ConfigCodes.WrongKind, $"{label} is an empty text, expected {kind.Expected}", scalar.Span);
        }
        else if (scalar.Text.Any(char.IsControl))
        {
            diagnostics.Error(ConfigCodes.BadText,
                $"{label} holds a control character or a line break", scalar.Span, "write it on one line without escapes");
        }
    }

    private void CheckNumber(YamlScalar scalar, NumberKind kind, string label)
    {
        if (QuantityParser.TryParseNumber(scalar.Text, out double value))
        {
            CheckInteger(scalar, kind, label);
            CheckSign(value, kind.Sign, scalar, label);
            return;
        }

        ParsedQuantity parsed = QuantityParser.Parse(scalar.Text);
        if (parsed.Fault is QuantityFault.WrongDimension or QuantityFault.UnknownUnit)
        {
            diagnostics.Error(ConfigCodes.UnitOnRatio, $"{label} carries no unit, found `{Excerpt.Of(parsed.UnitText)}`", scalar.Span,
                $"write a number such as `{kind.Example}`");
            return;
        }

        NotANumber(scalar, kind, label, parsed.Fault);
    }

    private void CheckInteger(YamlScalar scalar, NumberKind kind, string label)
    {
        bool isInteger = scalar.Text.Length <= MaximumNodeNumberDigits && scalar.Text.All(char.IsAsciiDigit);
        if (kind.IsInteger && !isInteger)
        {
            diagnostics.Error(ConfigCodes.NotANumber, $"{label} is {scalar.Describe()}, expected {kind.Expected}", scalar.Span);
        }
    }

    private void CheckQuantity(YamlScalar scalar, QuantityKind kind, string label)
    {
        ParsedQuantity parsed = QuantityParser.Parse(scalar.Text, kind.Dimension);
        switch (parsed.Fault)
        {
            case QuantityFault.None:
                CheckSign(parsed.Si, kind.Sign, scalar, label);
                break;
            case QuantityFault.NoUnit:
                diagnostics.Error(ConfigCodes.NoUnit, $"{label} has no unit: found {scalar.Describe()}, expected {kind.Dimension.Name}",
                    scalar.Span, $"write `{parsed.NumberText} {kind.Dimension.CustomaryUnit}`", Units(kind.Dimension));
                break;
            case QuantityFault.UnknownUnit:
                UnknownUnit(scalar, kind, parsed);
                break;
            case QuantityFault.WrongDimension:
                diagnostics.Error(ConfigCodes.WrongDimension,
                    $"{label} is {kind.Dimension.Name}, and `{Excerpt.Of(parsed.UnitText)}` is a unit of {Bare(parsed.Unit!.Dimension)}",
                    UnitSpan(scalar, parsed), $"write {kind.Dimension.Name} such as `{kind.Example} {kind.Dimension.CustomaryUnit}`",
                    Units(kind.Dimension));
                break;
            default:
                NotANumber(scalar, kind, label, parsed.Fault);
                break;
        }
    }

    private static string Bare(Dimension dimension) => dimension.Name[(dimension.Name.IndexOf(' ', StringComparison.Ordinal) + 1)..];

    private static string Units(Dimension dimension) => $"units of {Bare(dimension)}: {Words.List(UnitTable.SymbolsOf(dimension))}";

    private void UnknownUnit(YamlScalar scalar, QuantityKind kind, ParsedQuantity parsed)
    {
        string? near = NearestName.Of(parsed.UnitText, UnitTable.SymbolsOf(kind.Dimension))
            ?? NearestName.Of(parsed.UnitText, UnitTable.All.Select(unit => unit.Symbol));
        string help = near is null
            ? $"write {kind.Dimension.Name} such as `{kind.Example} {kind.Dimension.CustomaryUnit}`"
            : $"did you mean `{parsed.NumberText} {near}`?";
        diagnostics.Error(ConfigCodes.UnknownUnit, $"unknown unit `{Excerpt.Of(parsed.UnitText)}`", UnitSpan(scalar, parsed), help,
            Units(kind.Dimension));
    }

    /// <summary>The unit alone, where the text stands in the file exactly as it is.</summary>
    private static SourceSpan UnitSpan(YamlScalar scalar, ParsedQuantity parsed)
    {
        int at = scalar.Text.Length - parsed.UnitText.Length;
        bool isVerbatim = scalar.IsPlain && scalar.Span.Length == scalar.Text.Length
            && scalar.Text.EndsWith(parsed.UnitText, StringComparison.Ordinal);
        return isVerbatim ? scalar.Span with { Column = scalar.Span.Column + at, Length = parsed.UnitText.Length } : scalar.Span;
    }

    private void NotANumber(YamlScalar scalar, ValueKind kind, string label, QuantityFault fault)
    {
        string? help = fault == QuantityFault.DecimalComma ? $"write `{Excerpt.Of(scalar.Text.Trim().Replace(',', '.'))}`" : null;
        diagnostics.Error(ConfigCodes.NotANumber, $"{label} is {scalar.Describe()}, expected {kind.Expected}", scalar.Span, help);
    }

    private void CheckSign(double value, Sign sign, YamlScalar scalar, string label)
    {
        bool isWrong = sign switch
        {
            Sign.NotNegative => value < 0,
            Sign.Positive => value <= 0,
            _ => false,
        };
        if (isWrong)
        {
            string expected = sign == Sign.Positive ? "a positive value" : "zero or a positive value";
            diagnostics.Error(ConfigCodes.OutOfRange, $"{label} is {scalar.Describe()}, expected {expected}", scalar.Span);
        }
    }
}
