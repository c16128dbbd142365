using Boltup.Engine.Diagnostics;
using Boltup.Engine.Kernels;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Parts;

/// <summary>
/// Masses on springs and dampers that move in one direction, solved directly at every line:
/// Y = (K(1+jη) + jωC − ω²M)⁻¹, receptance in m/N.
/// </summary>
public sealed class LumpedPart : IPartModel
{
    private readonly string _name;
    private readonly double[] _masses;
    private readonly IReadOnlyList<LumpedLink> _links;
    private readonly Dof[] _dofs;

    /// <param name="name">Name for messages.</param>
    /// <param name="direction">The one direction in which everything moves.</param>
    /// <param name="masses">Point names and masses in kg.</param>
    /// <param name="links">Springs and dampers.</param>
    public LumpedPart(
        string name, Direction direction, IReadOnlyList<(string Point, double Mass)> masses, IReadOnlyList<LumpedLink> links)
    {
        _name = name;
        _masses = [.. masses.Select(mass => mass.Mass)];
        _links = links;
        _dofs = [.. masses.Select(mass => new Dof(mass.Point, direction))];
    }

    public FrequencyAxis? Axis => null;

    public IReadOnlyCollection<Dof> Responses => _dofs;

    public IReadOnlyCollection<Dof> Excitations => _dofs;

    public bool HasFrf(Dof response, Dof excitation) => _dofs.Contains(response) && _dofs.Contains(excitation);

    public FrfMatrix? Evaluate(
        FrequencyAxis axis, IReadOnlyList<Dof> rows, IReadOnlyList<Dof> columns, DiagnosticBag diagnostics)
    {
        int order = _masses.Length;
        var frf = new FrfMatrix(axis, rows, columns);
        var dynamicStiffness = new TiledMatrix(Tiling.Lanes, order, order);
        var unitForces = new TiledMatrix(Tiling.Lanes, order, columns.Count);
        var lu = new BatchLu(order);
        var singularHz = new List<double>();
        for (int tile = 0; tile < axis.TileCount; tile++)
        {
            FillDynamicStiffness(axis, tile, dynamicStiffness);
            FillUnitForces(columns, unitForces);
            lu.Factor(dynamicStiffness.Tile(0), order);
            lu.Solve(unitForces.Tile(0), columns.Count);
            CopyRows(rows, unitForces, frf.Values, tile);
            LaneLines.Collect(lu.SingularLanes, axis, tile, singularHz);
        }

        return singularHz.Count == 0 ? frf : RefuseSingular(singularHz, diagnostics);
    }

    private FrfMatrix? RefuseSingular(List<double> singularHz, DiagnosticBag diagnostics)
    {
        diagnostics.Error(
            EngineCodes.NoUniqueResponse,
            $"part `{_name}` has no unique response at {FrequencyList.Of(singularHz)}",
            help: "a part that can move without restoring force (a mechanism, a free part at 0 Hz) or an undamped resonance on a line has no finite FRF: add damping, a link or a mass");
        return null;
    }

    private void FillDynamicStiffness(FrequencyAxis axis, int tile, TiledMatrix target)
    {
        target.Tile(0).Clear();
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            double omega = axis.Omega(Math.Min(tile * Tiling.Lanes + lane, axis.Count - 1));
            for (int i = 0; i < _masses.Length; i++)
            {
                target.Entry(0, i, i)[lane] -= omega * omega * _masses[i];
            }

            foreach (LumpedLink link in _links)
            {
                AddLink(link, omega, lane, target);
            }
        }
    }

    private static void AddLink(LumpedLink link, double omega, int lane, TiledMatrix target)
    {
        double real = link.Stiffness;
        double imaginary = link.Stiffness * link.LossFactor + omega * link.Damping;
        void Add(int row, int column, double sign)
        {
            Span<double> entry = target.Entry(0, row, column);
            entry[lane] += sign * real;
            entry[Tiling.Lanes + lane] += sign * imaginary;
        }

        Add(link.First, link.First, 1);
        if (link.Second is { } second)
        {
            Add(second, second, 1);
            Add(link.First, second, -1);
            Add(second, link.First, -1);
        }
    }

    private void FillUnitForces(IReadOnlyList<Dof> columns, TiledMatrix target)
    {
        target.Tile(0).Clear();
        for (int column = 0; column < columns.Count; column++)
        {
            target.Entry(0, IndexOf(columns[column]), column)[..Tiling.Lanes].Fill(1);
        }
    }

    private void CopyRows(IReadOnlyList<Dof> rows, TiledMatrix solution, TiledMatrix target, int tile)
    {
        for (int row = 0; row < rows.Count; row++)
        {
            int mass = IndexOf(rows[row]);
            for (int column = 0; column < solution.Columns; column++)
            {
                solution.Entry(0, mass, column).CopyTo(target.Entry(tile, row, column));
            }
        }
    }

    private int IndexOf(Dof dof)
    {
        int index = Array.IndexOf(_dofs, dof);
        return index >= 0 ? index : throw new ArgumentException($"part `{_name}` has no dof {dof}");
    }
}
