using Boltup.Config.Binding;

namespace Boltup.Config.Schema;

/// <summary>Maps with known keys and maps with chosen names.</summary>
internal sealed partial class SchemaWriter
{
    public void WriteShape(Shape shape)
    {
        KeyDefinition[] keys = [.. shape.Keys.Where(key => key.Kind is not ReservedKind { AllowsEmpty: false })];
        json.WriteString("type", "object");
        json.WriteBoolean("additionalProperties", false);
        WriteObject("properties", () =>
        {
            foreach (KeyDefinition key in keys)
            {
                WriteObject(key.Name, () => WriteKey(key));
            }
        });
        if (!isOverlay)
        {
            WriteConditions(shape, [.. keys.Select(key => key.Name)]);
        }
    }

    private void WriteKey(KeyDefinition key)
    {
        json.WriteString("title", key.Doc);
        WriteRemovable(key.Kind);
    }

    private void WriteNamed(NamedKind named)
    {
        json.WriteString("type", "object");
        json.WriteNumber("minProperties", isOverlay ? 0 : named.Minimum);
        if (named.IsDotted)
        {
            WriteObject("propertyNames", () => json.WriteString("pattern", @"^(?!ground$)[^.]+$"));
        }

        WriteObject("additionalProperties", () => WriteRemovable(named.Item));
    }

    private void WriteRemovable(ValueKind kind)
    {
        if (!isOverlay)
        {
            WriteKind(kind);
            return;
        }

        json.WriteStartArray("anyOf");
        json.WriteStartObject();
        WriteKind(kind);
        json.WriteEndObject();
        json.WriteStartObject();
        json.WriteString("type", "null");
        json.WriteEndObject();
        json.WriteEndArray();
    }

    private void WriteConditions(Shape shape, HashSet<string> known)
    {
        string[] required = [.. shape.Keys.Where(key => key.IsRequired).Select(key => key.Name)];
        if (required.Length > 0)
        {
            WriteStrings("required", required);
        }

        if (shape.Rules.Count == 0)
        {
            return;
        }

        json.WriteStartArray("allOf");
        foreach (KeyRule rule in shape.Rules)
        {
            json.WriteStartObject();
            WriteRule(rule, known);
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }

    private void WriteRule(KeyRule rule, HashSet<string> known)
    {
        switch (rule.Kind)
        {
            case KeyRuleKind.ExactlyOne:
                WriteRequiredAlternatives("oneOf", rule.Keys.Where(known.Contains));
                break;
            case KeyRuleKind.AtLeastOne:
                WriteRequiredAlternatives("anyOf", rule.Keys.Where(known.Contains));
                break;
            case KeyRuleKind.AtMostOne:
                WriteObject("not", () => WriteStrings("required", rule.Keys));
                break;
            default:
                WriteObject("dependentSchemas", () =>
                    WriteObject(rule.Keys[0], () => WriteRequiredAlternatives("anyOf", rule.Keys.Skip(1))));
                break;
        }
    }

    private void WriteRequiredAlternatives(string member, IEnumerable<string> keys)
    {
        json.WriteStartArray(member);
        foreach (string key in keys)
        {
            json.WriteStartObject();
            WriteStrings("required", [key]);
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }
}
