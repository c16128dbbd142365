using Boltup.Engine.Coupling;
using Boltup.Engine.Mounts;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Sensitivity;

/// <summary>
/// The two ends of du = αᵀ dZ δ for a mount whose stiffness changes by dZ: how it is deformed, δ = Z⁻¹λ, and how a response feels a force
/// between its ends, α = Z⁻ᵀa. It follows from du = −aᵀ d(Z⁻¹) λ with d(Z⁻¹) = −Z⁻¹ dZ Z⁻¹. Holds its own workspace: one per thread.
/// </summary>
internal sealed class MountKernel(FrequencyAxis axis)
{
    private const int LargestMount = BothEnds.LargestOrder;

    private readonly MountCompliance _compliance = new();
    private readonly TiledMatrix _stiffness = new(Tiling.Lanes, LargestMount, LargestMount);
    private readonly LaneComplex[] _inverse = new LaneComplex[LargestMount * LargestMount];
    private int _order;

    /// <summary>Takes up the mount of a joint at the lines of a tile.</summary>
    public void Load(MountLaw mount, int tile)
    {
        _order = mount.Order;
        mount.FillStiffness(axis, tile, _stiffness.Tile(0)[..(_order * _order * Tiling.EntryLength)]);
        ReadOnlySpan<double> compliance = _compliance.Of(mount, axis, tile);
        for (int entry = 0; entry < _order * _order; entry++)
        {
            _inverse[entry] = LaneComplex.At(compliance, entry);
        }
    }

    /// <summary>An entry of the stiffness that was loaded.</summary>
    public LaneComplex Stiffness(int row, int column) => LaneComplex.At(_stiffness.Tile(0), row * _order + column);

    /// <summary>δ of one case.</summary>
    /// <param name="lambda">Tile of the joint forces, constraints × cases.</param>
    /// <param name="first">First constraint of the joint.</param>
    public void Deformation(ReadOnlySpan<double> lambda, int first, int cases, int column, Span<LaneComplex> deformation)
    {
        for (int row = 0; row < _order; row++)
        {
            LaneComplex sum = default;
            for (int i = 0; i < _order; i++)
            {
                sum += _inverse[row * _order + i] * LaneComplex.At(lambda, (first + i) * cases + column);
            }

            deformation[row] = sum;
        }
    }

    /// <summary>α of one response.</summary>
    /// <param name="adjoint">Tile of the adjoints, constraints × responses.</param>
    public void Feeling(ReadOnlySpan<double> adjoint, int first, int responses, int response, Span<LaneComplex> feeling)
    {
        for (int row = 0; row < _order; row++)
        {
            LaneComplex sum = default;
            for (int i = 0; i < _order; i++)
            {
                sum += _inverse[i * _order + row] * LaneComplex.At(adjoint, (first + i) * responses + response);
            }

            feeling[row] = sum;
        }
    }
}
