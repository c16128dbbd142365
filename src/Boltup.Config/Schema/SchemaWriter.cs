using System.Text.Json;
using Boltup.Config.Binding;
using Boltup.Config.Units;

namespace Boltup.Config.Schema;

/// <summary>Writes the members of the schema of one kind of value into an open JSON object.</summary>
/// <param name="isOverlay">Whether keys may be missing, or <c>null</c> to remove what a base gives.</param>
internal sealed partial class SchemaWriter(Utf8JsonWriter json, bool isOverlay)
{
    private const string QuantityPattern = @"^\s*[+-]?(\d+(\.\d*)?|\.\d+)([eE][+-]?\d+)?\s*[^\s\d.,].*$";

    public void WriteKind(ValueKind kind)
    {
        switch (kind)
        {
            case ShapeKind shape:
                WriteShape(shape.Shape);
                break;
            case NamedKind named:
                WriteNamed(named);
                break;
            case ListKind list:
                WriteList(list);
                break;
            case EitherKind either:
                WriteAlternatives("anyOf", [either.First, either.Second]);
                break;
            case StiffnessMatrixKind:
                WriteMatrix();
                break;
            case ReservedKind:
                json.WriteString("type", "object");
                json.WriteNumber("maxProperties", 0);
                break;
            default:
                WriteSingle(kind);
                break;
        }
    }

    private void WriteSingle(ValueKind kind)
    {
        switch (kind)
        {
            case ChoiceKind choice:
                WriteStrings("enum", choice.Allowed);
                break;
            case NumberKind number:
                json.WriteString("type", number.IsInteger ? "integer" : "number");
                WriteSign(number.IsInteger ? Sign.NotNegative : number.Sign);
                break;
            case QuantityKind quantity:
                WriteQuantity(quantity.Dimension);
                break;
            case PathKind:
                json.WriteString("type", "string");
                break;
            default:
                WriteStrings("type", ["string", "number", "boolean"]);
                break;
        }
    }

    private void WriteQuantity(Dimension dimension)
    {
        json.WriteString("type", "string");
        json.WriteString("pattern", QuantityPattern);
        json.WriteString("description", $"{dimension.Name}; units {string.Join(", ", UnitTable.SymbolsOf(dimension))}");
    }

    private void WriteSign(Sign sign)
    {
        if (sign != Sign.Any)
        {
            json.WriteNumber(sign == Sign.Positive ? "exclusiveMinimum" : "minimum", 0);
        }
    }

    private void WriteList(ListKind list)
    {
        json.WriteString("type", "array");
        json.WriteNumber("minItems", list.Minimum);
        if (list.Maximum != int.MaxValue)
        {
            json.WriteNumber("maxItems", list.Maximum);
        }

        if (list.IsSet)
        {
            json.WriteBoolean("uniqueItems", true);
        }

        WriteObject("items", () => WriteKind(list.Item));
    }

    private void WriteMatrix()
    {
        json.WriteString("type", "array");
        json.WriteNumber("minItems", 3);
        json.WriteNumber("maxItems", 6);
        WriteObject("items", () =>
        {
            json.WriteString("type", "array");
            json.WriteNumber("minItems", 3);
            json.WriteNumber("maxItems", 6);
            WriteObject("items", () =>
            {
                WriteStrings("type", ["string", "number"]);
                json.WriteString("pattern", QuantityPattern);
                json.WriteNumber("maximum", 0);
                json.WriteNumber("minimum", 0);
            });
        });
    }

    private void WriteAlternatives(string member, IReadOnlyList<ValueKind> kinds)
    {
        json.WriteStartArray(member);
        foreach (ValueKind kind in kinds)
        {
            json.WriteStartObject();
            WriteKind(kind);
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }

    private void WriteObject(string member, Action write)
    {
        json.WriteStartObject(member);
        write();
        json.WriteEndObject();
    }

    private void WriteStrings(string member, IEnumerable<string> values)
    {
        json.WriteStartArray(member);
        foreach (string value in values)
        {
            json.WriteStringValue(value);
        }

        json.WriteEndArray();
    }
}
