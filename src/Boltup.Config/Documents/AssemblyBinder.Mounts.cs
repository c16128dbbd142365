using Boltup.Config.Binding;
using Boltup.Config.Units;
using Boltup.Config.Yaml;
using Boltup.Engine.Mounts;
using Boltup.Engine.Spectra;

namespace Boltup.Config.Documents;

/// <summary>Mount laws.</summary>
internal sealed partial class AssemblyBinder
{
    /// <summary>Largest asymmetry of a stiffness matrix, relative to the larger of the two entries.</summary>
    private const double SymmetryTolerance = 1e-6;

    private MountLawDocument BindLaw(YamlMap map)
    {
        if (map["like"] is YamlNode like)
        {
            return new LikeLawDocument(like.MarkedText(), map["scale"]?.Number() ?? 1);
        }

        if (map["table"] is YamlNode table)
        {
            var chosen = table as YamlMap;
            return new TableLawDocument((chosen?["file"] ?? table).File(), chosen?["at"]?.MarkedText());
        }

        if ((map["series"] ?? map["parallel"]) is YamlNode others)
        {
            return new ComposedLawDocument([.. others.Items().Select(item => item.MarkedText())], map["series"] is not null, others.Span);
        }

        return map["relaxation"] is YamlMap relaxation
            ? new RelaxingLawDocument(BindStiffness(map), BindRelaxation(relaxation))
            : BindStiffness(map);
    }

    private MountLawDocument BindStiffness(YamlMap map)
    {
        double lossFactor = map["loss_factor"]?.Number() ?? 0;
        Dictionary<Direction, Marked<double>> damping = PerDirection(map["damping"], Dimension.Damping, Dimension.RotationalDamping);
        return map["stiffness_matrix"] is YamlList rows
            ? new MatrixLawDocument(BindMatrix(rows), lossFactor, damping)
            : new DirectionalLawDocument(
                PerDirection(map["stiffness"], Dimension.Stiffness, Dimension.RotationalStiffness), lossFactor, damping);
    }

    private Relaxation BindRelaxation(YamlMap map)
    {
        double stiffening = map["stiffening"]!.Number();
        double order = map["order"]?.Number() ?? 1;
        if (stiffening < 1)
        {
            diagnostics.Error(ConfigCodes.BadRelaxation, $"`stiffening` is {map["stiffening"]!.Describe()}, expected at least 1", map["stiffening"]!.Span,
                "give the stiffness at rest under `stiffness`, and the stiffness at high frequency as a multiple of it");
        }

        if (order > 1)
        {
            diagnostics.Error(ConfigCodes.BadRelaxation, $"`order` is {map["order"]!.Describe()}, expected at most 1", map["order"]!.Span,
                "leave it out for the Zener law; rubber is often between 0.3 and 0.8");
        }

        return new Relaxation(stiffening, map["time"]!.Si(Dimension.Time), order);
    }

    private static Dictionary<Direction, Marked<double>> PerDirection(YamlNode? node, Dimension translation, Dimension rotation)
    {
        var values = new Dictionary<Direction, Marked<double>>();
        foreach (YamlEntry entry in node.Entries())
        {
            Direction direction = NodeValues.DirectionNamed(entry.Key);
            values[direction] = entry.Value.MarkedSi(direction <= Direction.Z ? translation : rotation);
        }

        return values;
    }

    private Marked<double[,]> BindMatrix(YamlList rows)
    {
        int size = rows.Items.Count;
        var matrix = new double[size, size];
        for (int i = 0; i < size; i++)
        {
            for (int j = 0; j < size; j++)
            {
                YamlNode node = rows.Items[i].Items()[j];
                bool isBareZero = QuantityParser.TryParseNumber(node.Text(), out _);
                matrix[i, j] = isBareZero ? 0 : node.Si(ShapeValidator.DimensionAt(i, j));
            }
        }

        CheckSymmetry(matrix, rows);
        return new(matrix, rows.Span);
    }

    private void CheckSymmetry(double[,] matrix, YamlList rows)
    {
        int size = rows.Items.Count;
        for (int i = 0; i < size; i++)
        {
            for (int j = 0; j < i; j++)
            {
                double larger = Math.Max(Math.Abs(matrix[i, j]), Math.Abs(matrix[j, i]));
                if (Math.Abs(matrix[i, j] - matrix[j, i]) > SymmetryTolerance * larger)
                {
                    diagnostics.Error(ConfigCodes.BadMatrix,
                        $"stiffness matrix is not symmetric: entries {i + 1},{j + 1} and {j + 1},{i + 1} differ",
                        rows.Items[i].Items()[j].Span,
                        "give both the same value", $"the other is at {rows.Items[j].Items()[i].Span}");
                }
            }
        }
    }
}
