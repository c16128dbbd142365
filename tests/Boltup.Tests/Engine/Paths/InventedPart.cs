using System.Numerics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;

namespace Boltup.Tests.Engine.Paths;

/// <summary>A part with a full set of invented reciprocal FRFs between six directions of two points: one mode and a residual for every dof.</summary>
internal sealed class InventedPart(int seed) : IPartModel
{
    private static readonly Dof[] Dofs =
        [.. new[] { "1", "2" }.SelectMany(point => Enumerable.Range(0, 6).Select(direction => new Dof(point, (Direction)direction)))];

    public FrequencyAxis? Axis => null;

    public IReadOnlyCollection<Dof> Responses => Dofs;

    public IReadOnlyCollection<Dof> Excitations => Dofs;

    public bool HasFrf(Dof response, Dof excitation) => true;

    public FrfMatrix Evaluate(FrequencyAxis axis, IReadOnlyList<Dof> rows, IReadOnlyList<Dof> columns, DiagnosticBag diagnostics)
    {
        var frf = new FrfMatrix(axis, rows, columns);
        for (int i = 0; i < rows.Count * columns.Count; i++)
        {
            (int row, int column) = (i / columns.Count, i % columns.Count);
            Complex[] values = [.. axis.Hz.ToArray().Select(hz => At(hz, Array.IndexOf(Dofs, rows[row]), Array.IndexOf(Dofs, columns[column])))];
            frf.Values.ScatterSpectrum(row, column, values);
        }

        return frf;
    }

    private Complex At(double hz, int row, int column)
    {
        Complex sum = row == column ? 1e-7 : 0;
        for (int mode = 0; mode < 8; mode++)
        {
            double natural = 15 + 13 * mode + seed;
            double shapes = Math.Sin(1 + (row + 1) * (mode + seed)) * Math.Sin(1 + (column + 1) * (mode + seed));
            sum += shapes * 1e-3 / (natural * natural * new Complex(1, 0.03) - hz * hz);
        }

        return sum;
    }
}
