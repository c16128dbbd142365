using Boltup.Engine.Kernels;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Identification;

/// <summary>
/// Turns a matrix of auto and cross spectra into columns without a common phase: G = Σ σᵢ·vᵢ·vᵢᴴ, columns √σᵢ·vᵢ (principal components;
/// Cho, Kim, MSSP 16 (2002)). What is linear can then be applied to the columns, and powers add up to the same G.
/// </summary>
public static class PrincipalComponents
{
    /// <param name="spectra">Hermitian, not negative; rows and columns are <paramref name="dofs"/>.</param>
    /// <returns>As many columns as dofs; those without power are zero.</returns>
    public static IReadOnlyList<SpectrumSet> Of(FrequencyAxis axis, IReadOnlyList<Dof> dofs, TiledMatrix spectra)
    {
        int order = dofs.Count;
        var components = new TiledMatrix(axis.Count, order, order);
        TileBuffer identity = Identity(order);
        var svd = new BatchSvd(order, order);
        var roots = new double[order * Tiling.Lanes];
        for (int tile = 0; tile < spectra.TileCount; tile++)
        {
            svd.Factor(spectra.Tile(tile), order, order);
            for (int i = 0; i < roots.Length; i++)
            {
                roots[i] = Math.Sqrt(svd.SingularValues[i]);
            }

            svd.Combine(roots, identity.Span, order, components.Tile(tile));
        }

        return [.. Enumerable.Range(0, order).Select(column =>
            new SpectrumSet(axis, dofs, [.. Enumerable.Range(0, order).Select(row => components.GatherSpectrum(row, column))]))];
    }

    private static TileBuffer Identity(int order)
    {
        var identity = new TileBuffer(order * order * Tiling.EntryLength);
        for (int i = 0; i < order; i++)
        {
            identity.Span.Slice((i * order + i) * Tiling.EntryLength, Tiling.Lanes).Fill(1);
        }

        return identity;
    }
}
