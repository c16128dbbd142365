using Boltup.Engine.Kernels;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>Responses to known forces: u = Y f at every line.</summary>
public static class ResponsePrediction
{
    /// <param name="frf">FRFs whose columns are the dofs of the forces, in their order, at their lines.</param>
    /// <returns>One spectrum per row, in the quantity of the FRFs.</returns>
    public static SpectrumSet Of(FrfMatrix frf, SpectrumSet forces)
    {
        SquareFrf.RequireLines(frf.Axis, forces.Axis);
        if (!frf.Columns.SequenceEqual(forces.Dofs))
        {
            throw new ArgumentException($"the FRFs are driven at {string.Join(", ", frf.Columns)}, not at {string.Join(", ", forces.Dofs)}");
        }

        TiledMatrix f = forces.ToTiles();
        var u = new TiledMatrix(frf.Axis.Count, frf.Rows.Count, 1);
        for (int tile = 0; tile < u.TileCount; tile++)
        {
            BatchProduct.Multiply(frf.Values.Tile(tile), f.Tile(tile), u.Tile(tile), frf.Rows.Count, frf.Columns.Count, 1);
        }

        return SpectrumSet.FromTiles(frf.Axis, frf.Rows, u);
    }
}
