using Boltup.Engine.Coupling;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Prediction;

/// <summary>
/// The columns of forces that have to be solved: one per operation, or one per force set where an operation adds energies.
/// </summary>
internal sealed class ForceCases
{
    private readonly Range[] _ofOperation;

    /// <summary>Lays out the columns, and adds the forces' dofs to the layout.</summary>
    public ForceCases(AssemblyModel assembly, CouplingLayout layout)
    {
        List<IReadOnlyList<ForceSet>> cases = [];
        _ofOperation = new Range[assembly.Operations.Count];
        for (int i = 0; i < assembly.Operations.Count; i++)
        {
            Operation operation = assembly.Operations[i];
            int first = cases.Count;
            cases.AddRange(operation.Sum == ForceSum.Phase ? [operation.Forces] : operation.Forces.Select(set => new[] { set }));
            _ofOperation[i] = first..cases.Count;
        }

        Count = cases.Count;
        foreach (ForceSet set in assembly.Operations.SelectMany(operation => operation.Forces))
        {
            foreach (Dof dof in set.Dofs)
            {
                layout[set.Part].AddExcitation(dof);
            }
        }

        Forces = [.. layout.Parts.Select(part => ForcesOn(part, cases, assembly.Axis))];
    }

    /// <summary>Number of columns.</summary>
    public int Count { get; }

    /// <summary>For each part of the layout its columns × cases; null for a part without forces.</summary>
    public IReadOnlyList<TiledMatrix?> Forces { get; }

    /// <summary>The columns of an operation.</summary>
    public Range this[int operation] => _ofOperation[operation];

    private static TiledMatrix? ForcesOn(PartLayout part, List<IReadOnlyList<ForceSet>> cases, FrequencyAxis axis)
    {
        if (!cases.Exists(sets => sets.Any(set => set.Part == part.Part.Name)))
        {
            return null;
        }

        var forces = new TiledMatrix(axis.Count, part.Columns.Count, cases.Count);
        for (int column = 0; column < cases.Count; column++)
        {
            foreach (ForceSet set in cases[column].Where(set => set.Part == part.Part.Name))
            {
                Add(set, part, axis, forces, column);
            }
        }

        return forces;
    }

    /// <summary>Adds a set at the lines that it has; elsewhere its force stays zero and no result is read.</summary>
    private static void Add(ForceSet set, PartLayout part, FrequencyAxis axis, TiledMatrix forces, int column)
    {
        int[] sourceLines = [.. axis.Hz.ToArray().Select(set.Axis.IndexOf)];
        for (int i = 0; i < set.Dofs.Count; i++)
        {
            int row = part.AddExcitation(set.Dofs[i]);
            for (int line = 0; line < axis.Count; line++)
            {
                if (sourceLines[line] >= 0)
                {
                    Span<double> entry = forces.Entry(line / Tiling.Lanes, row, column);
                    entry[line % Tiling.Lanes] += set.Spectra[i][sourceLines[line]].Real;
                    entry[Tiling.Lanes + line % Tiling.Lanes] += set.Spectra[i][sourceLines[line]].Imaginary;
                }
            }
        }
    }
}
