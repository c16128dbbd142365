using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Prediction;

/// <summary>The FRFs of parts, read and judged once: assemblies that share a part and join it alike share its matrix.</summary>
internal sealed class PartFrfs
{
    private readonly List<Known> _known = [];

    /// <summary>Rows × columns of the layout, or null after an error. Parts may be asked for side by side.</summary>
    public TiledMatrix? Of(PartLayout part, FrequencyAxis axis, DiagnosticBag diagnostics)
    {
        lock (_known)
        {
            if (_known.Find(known => known.Fits(part, axis)) is { } found)
            {
                return found.Frf;
            }
        }

        TiledMatrix? frf = part.Part.Evaluate(axis, part.Rows, part.Columns, diagnostics);
        if (frf is not null)
        {
            FrfQuality.Check(part.Part.Name, part.Part.Origin, axis, part.Interface, frf, diagnostics);
            lock (_known)
            {
                _known.Add(new Known(part.Part, axis, part.Rows, part.Columns, frf));
            }
        }

        return frf;
    }

    private sealed record Known(
        PlacedPart Part, FrequencyAxis Axis, IReadOnlyList<DofCombination> Rows, IReadOnlyList<DofCombination> Columns, TiledMatrix Frf)
    {
        public bool Fits(PartLayout layout, FrequencyAxis axis) =>
            ReferenceEquals(Part, layout.Part) && Axis.Matches(axis) && Rows.SequenceEqual(layout.Rows) && Columns.SequenceEqual(layout.Columns);
    }
}
