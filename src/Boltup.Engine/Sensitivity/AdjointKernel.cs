using Boltup.Engine.Coupling;
using Boltup.Engine.Kernels;
using Boltup.Engine.Paths;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Sensitivity;

/// <summary>
/// The adjoint of every response: a = (B Y Bᵀ + Z⁻¹)⁻ᵀ Kᵀ, one more solution of the interface problem that the coupling has just factored.
/// An assembly whose interface problem changes by dA then responds with du = −aᵀ dA λ more, for any dA (adjoint method; Haftka, Gürdal,
/// Elements of Structural Optimization, chapter 7; from memory).
/// </summary>
internal static class AdjointKernel
{
    /// <param name="transfers">Holds K at the tile, and receives a.</param>
    public static void Fill(CouplingLayout layout, PathTransfers transfers, int tile, BatchLu factored)
    {
        int order = layout.Constraints.Count;
        int responses = transfers.Responses.Count;
        Span<double> adjoint = transfers.Adjoint.Tile(tile);
        ReadOnlySpan<double> fromJoints = transfers.FromJoints.Tile(tile);
        adjoint.Clear();
        for (int constraint = 0; constraint < order; constraint++)
        {
            double scale = layout.ScaleOf(constraint);
            for (int response = 0; response < responses; response++)
            {
                TileEntry.AddScaled(adjoint, constraint * responses + response, fromJoints, response * order + constraint, scale);
            }
        }

        factored.SolveTransposed(adjoint, responses);
        layout.Unscale(adjoint, responses);
    }
}
