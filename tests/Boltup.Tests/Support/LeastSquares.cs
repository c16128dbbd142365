using Boltup.Engine.Kernels;
using Boltup.Engine.Spectra;

namespace Boltup.Tests.Support;

/// <summary>Plain least squares for forces, as a bench is inverted by default.</summary>
internal static class LeastSquares
{
    public static SpectrumSet Forces(FrfMatrix frf, SpectrumSet indicators)
    {
        var qr = new BatchQr(frf.Rows.Count, frf.Columns.Count);
        TiledMatrix motion = indicators.ToTiles();
        var forces = new TiledMatrix(frf.Axis.Count, frf.Columns.Count, 1);
        for (int tile = 0; tile < forces.TileCount; tile++)
        {
            qr.Factor(frf.Values.Tile(tile), frf.Rows.Count, frf.Columns.Count);
            qr.Solve(motion.Tile(tile), 1, forces.Tile(tile));
        }

        return SpectrumSet.FromTiles(frf.Axis, frf.Columns, forces);
    }
}
