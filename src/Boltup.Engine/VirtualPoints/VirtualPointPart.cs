using Boltup.Engine.Diagnostics;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;
using MathNet.Numerics.LinearAlgebra;

namespace Boltup.Engine.VirtualPoints;

/// <summary>
/// A part that has virtual points beside the dofs of its data: Y_qm = T_u·Y·T_f (van der Seijs, van den Bosch, Rixen, de Klerk, COMPDYN 2013).
/// FRFs between a virtual point and a plain dof are transformed on one side only.
/// </summary>
public sealed class VirtualPointPart : IPartModel
{
    private static readonly Direction[] Six = [Direction.X, Direction.Y, Direction.Z, Direction.RX, Direction.RY, Direction.RZ];

    private readonly IPartModel _data;
    private readonly Dictionary<Dof, DofCombination> _motions = [];
    private readonly Dictionary<Dof, DofCombination> _loads = [];

    /// <param name="data">The part as its data have it.</param>
    /// <param name="points">Points whose sensors, or impacts, see all six motions; a point without sensors cannot respond, one without impacts cannot be excited.</param>
    public VirtualPointPart(IPartModel data, IReadOnlyList<VirtualPoint> points)
    {
        _data = data;
        foreach (VirtualPoint point in points)
        {
            if (point.Sensors.Count > 0)
            {
                Add(_motions, point, point.Sensors, new RigidTransform(point, point.Sensors).MotionFromChannels());
            }

            if (point.Impacts.Count > 0)
            {
                Add(_loads, point, point.Impacts, new RigidTransform(point, point.Impacts).ChannelsFromLoad().Transpose());
            }
        }

        Responses = [.. data.Responses, .. _motions.Keys];
        Excitations = [.. data.Excitations, .. _loads.Keys];
    }

    public FrequencyAxis? Axis => _data.Axis;

    public IReadOnlyCollection<Dof> Responses { get; }

    public IReadOnlyCollection<Dof> Excitations { get; }

    public bool HasFrf(Dof response, Dof excitation) => Of(_motions, response).Terms
        .All(row => Of(_loads, excitation).Terms.All(column => _data.HasFrf(row.Dof, column.Dof)));

    public FrfMatrix? Evaluate(FrequencyAxis axis, IReadOnlyList<Dof> rows, IReadOnlyList<Dof> columns, DiagnosticBag diagnostics)
    {
        DofCombination[] motions = [.. rows.Select(row => Of(_motions, row))];
        DofCombination[] loads = [.. columns.Select(column => Of(_loads, column))];
        Dof[] dataRows = DofsOf(motions), dataColumns = DofsOf(loads);
        if (_data.Evaluate(axis, dataRows, dataColumns, diagnostics) is not { } data)
        {
            return null;
        }

        // Rows first, then columns: far fewer products than term by term.
        var half = new TiledMatrix(axis.Count, rows.Count, dataColumns.Length);
        for (int row = 0; row < rows.Count; row++)
        {
            foreach (DofTerm term in motions[row].Terms)
            {
                int source = Array.IndexOf(dataRows, term.Dof);
                for (int column = 0; column < dataColumns.Length; column++)
                {
                    AddEntry(data.Values, source, column, term.Cosine, half, row, column);
                }
            }
        }

        var frf = new FrfMatrix(axis, rows, columns);
        for (int column = 0; column < columns.Count; column++)
        {
            foreach (DofTerm term in loads[column].Terms)
            {
                int source = Array.IndexOf(dataColumns, term.Dof);
                for (int row = 0; row < rows.Count; row++)
                {
                    AddEntry(half, row, source, term.Cosine, frf.Values, row, column);
                }
            }
        }

        return frf;
    }

    private static void Add(
        Dictionary<Dof, DofCombination> target, VirtualPoint point, IReadOnlyList<MeasuredChannel> channels, Matrix<double> transform)
    {
        for (int i = 0; i < Six.Length; i++)
        {
            target[new Dof(point.Name, Six[i])] = new DofCombination([.. channels.Select((channel, k) => new DofTerm(channel.Dof, transform[i, k]))]);
        }
    }

    private static DofCombination Of(Dictionary<Dof, DofCombination> known, Dof dof) => known.GetValueOrDefault(dof) ?? DofCombination.Own(dof);

    private static Dof[] DofsOf(DofCombination[] combinations) =>
        [.. combinations.SelectMany(combination => combination.Terms).Select(term => term.Dof).Distinct()];

    private static void AddEntry(TiledMatrix source, int fromRow, int fromColumn, double factor, TiledMatrix target, int row, int column)
    {
        for (int tile = 0; tile < source.TileCount; tile++)
        {
            Span<double> from = source.Entry(tile, fromRow, fromColumn), to = target.Entry(tile, row, column);
            for (int i = 0; i < to.Length; i++)
            {
                to[i] += factor * from[i];
            }
        }
    }
}
