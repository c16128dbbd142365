using Boltup.Config.Yaml;
using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Binding;

/// <summary>Checks a tree of nodes against shapes and reports everything that does not fit.</summary>
internal sealed partial class ShapeValidator(DiagnosticBag diagnostics)
{
    private const int MaximumErrors = 100;

    /// <summary>Checks a document. Without errors in the bag afterwards, the binder may take every kind for granted.</summary>
    public void Validate(YamlNode root, Shape shape)
    {
        Check(root, new ShapeKind(shape), "the document");
        if (HasEnough)
        {
            diagnostics.Error(ConfigCodes.TooLarge, $"more than {MaximumErrors} errors, the rest is not checked", root.Span);
        }
    }

    private bool HasEnough => diagnostics.Items.Count > MaximumErrors;

    /// <param name="label">What the value belongs to, as messages name it.</param>
    private void Check(YamlNode node, ValueKind kind, string label)
    {
        switch (kind, node)
        {
            case (ReservedKind reserved, _):
                CheckReserved(node, reserved, label);
                break;
            case (EitherKind either, _) when Fits(node, either.First) || Fits(node, either.Second):
                Check(node, Fits(node, either.First) ? either.First : either.Second, label);
                break;
            case (ShapeKind shape, YamlMap map):
                CheckMap(map, shape.Shape, label);
                break;
            case (NamedKind named, YamlMap map):
                CheckNamed(map, named, label);
                break;
            case (ListKind list, YamlList items):
                CheckList(items, list, label);
                break;
            case (StiffnessMatrixKind, YamlList rows):
                CheckMatrix(rows, label);
                break;
            case (_, YamlScalar { IsEmpty: false, IsRemoval: false } scalar) when IsScalarKind(kind):
                CheckScalar(scalar, kind, label);
                break;
            default:
                WrongKind(node, kind, label);
                break;
        }
    }

    private static bool Fits(YamlNode node, ValueKind kind) => node switch
    {
        YamlMap => kind is ShapeKind or NamedKind,
        YamlList => kind is ListKind or StiffnessMatrixKind,
        _ => IsScalarKind(kind) && node is YamlScalar { IsEmpty: false },
    };

    private static bool IsScalarKind(ValueKind kind) => kind is TextKind or PathKind or ChoiceKind or NumberKind or QuantityKind;

    private void WrongKind(YamlNode node, ValueKind kind, string label)
    {
        if (node is YamlScalar { IsRemoval: true } removal)
        {
            diagnostics.Error(ConfigCodes.NothingToRemove,
                $"`{removal.Text}` removes a key of a base, and {label} has no such key in a base",
                node.Span, $"give {kind.Expected}, or remove the key");
            return;
        }

        string found = node is YamlScalar { IsEmpty: true } ? "has no value" : $"is {node.Describe()}";
        diagnostics.Error(ConfigCodes.WrongKind, $"{label} {found}, expected {kind.Expected}", node.Span);
    }

    private void CheckReserved(YamlNode node, ReservedKind kind, string label)
    {
        bool isEmpty = node is YamlMap { Entries.Count: 0 };
        if (!(kind.AllowsEmpty && isEmpty))
        {
            diagnostics.Error(ConfigCodes.NotSupportedYet, $"{label} is not supported yet by this version", node.Span,
                kind.AllowsEmpty ? "leave it out or empty" : null);
        }
    }

    private void CheckList(YamlList list, ListKind kind, string label)
    {
        if (list.Items.Count < kind.Minimum || list.Items.Count > kind.Maximum)
        {
            string expected = kind.Minimum == kind.Maximum ? $"{kind.Minimum}" : $"at least {kind.Minimum}";
            diagnostics.Error(ConfigCodes.WrongCount, $"{label} has {Items(list.Items.Count)}, expected {expected}", list.Span);
        }

        var seen = new HashSet<string>(StringComparer.Ordinal);
        foreach (YamlNode item in list.Items.TakeWhile(_ => !HasEnough))
        {
            Check(item, kind.Item, $"an item of {label}");
            if (kind.IsSet && item is YamlScalar scalar && !seen.Add(scalar.Text))
            {
                diagnostics.Error(ConfigCodes.ListedTwice, $"`{scalar.Text}` is listed twice in {label}", item.Span, "remove one");
            }
        }
    }

    private static string Items(int count) => count == 1 ? "1 item" : $"{count} items";
}
