using System.Runtime.Intrinsics;
using Boltup.Engine.Coupling;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Sensitivity;

/// <summary>The responses of a solution in their own unit, tile by tile, and which lines of a tile count in an operation.</summary>
internal sealed class ResponseTiles
{
    private readonly FrequencyAxis _axis;
    private readonly TiledMatrix?[] _values;
    private readonly int[] _rows;
    private readonly int[] _orders;
    private readonly double[] _weights;

    /// <param name="lines">Lines of the operation, all of them lines of the coupling.</param>
    public ResponseTiles(PredictionRun run, FrequencyAxis lines)
    {
        _axis = run.Assembly.Axis;
        _values = [.. run.Assembly.Responses.Select(response => run.Solution.Responses[run.Layout.IndexOf(response.Part)])];
        _rows = run.ResponseRows;
        _orders = [.. run.Assembly.Responses.Select(response => FrfQuantity.DerivativeOrder(response.As))];
        _weights = new double[_axis.TileCount * Tiling.Lanes];
        foreach (double hz in lines.Hz)
        {
            _weights[_axis.IndexOf(hz)] = 1;
        }
    }

    /// <summary>1 in the lanes that count, 0 in others.</summary>
    public Vector512<double> Weights(int tile) => Vector512.Create(_weights.AsSpan(tile * Tiling.Lanes, Tiling.Lanes));

    /// <summary>A response in a case; zero for a part that nothing reaches.</summary>
    public LaneComplex At(int tile, int response, int column)
    {
        if (_values[response] is not { } values)
        {
            return default;
        }

        return InOwnUnit(tile, response, LaneComplex.At(values.Tile(tile), _rows[response] * values.Columns + column));
    }

    /// <summary>A displacement (or pressure) at a response in its own unit: times (jω)ⁿ.</summary>
    public LaneComplex InOwnUnit(int tile, int response, LaneComplex motion) => _orders[response] switch
    {
        0 => motion,
        1 => Omega(tile) * new LaneComplex(-motion.Imaginary, motion.Real),
        _ => -(Omega(tile) * Omega(tile)) * motion,
    };

    private Vector512<double> Omega(int tile)
    {
        Span<double> omega = stackalloc double[Tiling.Lanes];
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            omega[lane] = _axis.Omega(Math.Min(tile * Tiling.Lanes + lane, _axis.Count - 1));
        }

        return Vector512.Create<double>(omega);
    }
}
