using Boltup.Engine.Diagnostics;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;

namespace Boltup.Tests.Engine.Sensitivity;

/// <summary>A part of which the FRFs to one dof are multiplied.</summary>
internal sealed class ScaledRow(IPartModel model, string row, double factor) : IPartModel
{
    public FrequencyAxis? Axis => model.Axis;

    public IReadOnlyCollection<Dof> Responses => model.Responses;

    public IReadOnlyCollection<Dof> Excitations => model.Excitations;

    public bool HasFrf(Dof response, Dof excitation) => model.HasFrf(response, excitation);

    public FrfMatrix? Evaluate(FrequencyAxis axis, IReadOnlyList<Dof> rows, IReadOnlyList<Dof> columns, DiagnosticBag diagnostics)
    {
        FrfMatrix? frf = model.Evaluate(axis, rows, columns, diagnostics);
        for (int i = 0; frf is not null && i < rows.Count; i++)
        {
            for (int entry = 0; rows[i].ToString() == row && entry < frf.Values.TileCount * columns.Count; entry++)
            {
                foreach (ref double number in frf.Values.Entry(entry / columns.Count, i, entry % columns.Count))
                {
                    number *= factor;
                }
            }
        }

        return frf;
    }
}
