using Boltup.Config.Units;
using Boltup.Config.Yaml;

namespace Boltup.Config.Binding;

/// <summary>Full stiffness matrices.</summary>
internal sealed partial class ShapeValidator
{
    private const int Translations = 3;
    private const int AllDirections = 6;

    private void CheckMatrix(YamlList rows, string label)
    {
        int size = rows.Items.Count;
        if (size is not (Translations or AllDirections))
        {
            diagnostics.Error(ConfigCodes.WrongCount, $"{label} has {Items(size)}, expected 3 rows of 3 or 6 rows of 6", rows.Span);
            return;
        }

        for (int i = 0; i < size; i++)
        {
            CheckRow(rows.Items[i], i, size, label);
        }
    }

    private void CheckRow(YamlNode node, int row, int size, string label)
    {
        if (node is not YamlList list)
        {
            diagnostics.Error(ConfigCodes.WrongKind, $"row {row + 1} of {label} is {node.Describe()}, expected a list", node.Span);
        }
        else if (list.Items.Count != size)
        {
            diagnostics.Error(ConfigCodes.WrongCount,
                $"row {row + 1} of {label} has {Items(list.Items.Count)}, expected {size}", list.Span);
        }
        else
        {
            for (int j = 0; j < size; j++)
            {
                CheckEntry(list.Items[j], row, j, $"entry {row + 1},{j + 1} of {label}");
            }
        }
    }

    private void CheckEntry(YamlNode node, int row, int column, string label)
    {
        bool isZero = node is YamlScalar scalar && QuantityParser.TryParseNumber(scalar.Text, out double value) && value == 0;
        if (!isZero)
        {
            Check(node, new QuantityKind(DimensionAt(row, column), "120"), label);
        }
    }

    /// <summary>What one entry of a stiffness matrix is.</summary>
    internal static Dimension DimensionAt(int row, int column) => (row < Translations, column < Translations) switch
    {
        (true, true) => Dimension.Stiffness,
        (false, false) => Dimension.RotationalStiffness,
        _ => Dimension.CouplingStiffness,
    };
}
