using Boltup.Engine.Kernels;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>Products of FRFs along a path from the source over the interface to the receiver.</summary>
internal static class FrfChain
{
    /// <exception cref="ArgumentException">Y_bc, Y_ca and Y_ba do not have the same a, b, c or lines.</exception>
    public static void RequireFit(FrfMatrix toReceiver, FrfMatrix fromSource, FrfMatrix through)
    {
        SquareFrf.RequireLines(toReceiver.Axis, through.Axis);
        SquareFrf.RequireLines(fromSource.Axis, through.Axis);
        SquareFrf.RequireInterface(fromSource, toReceiver.Columns);
        SquareFrf.RequireInterface(through, toReceiver.Rows);
        if (!through.Columns.SequenceEqual(fromSource.Columns))
        {
            throw new ArgumentException("the FRFs start at different dofs of the source", nameof(through));
        }
    }

    /// <summary>The FRFs times a matrix of as many rows as they have columns.</summary>
    public static FrfMatrix Multiply(FrfMatrix left, TiledMatrix right, IReadOnlyList<Dof> columns)
    {
        var product = new FrfMatrix(left.Axis, left.Rows, columns);
        for (int tile = 0; tile < right.TileCount; tile++)
        {
            BatchProduct.Multiply(
                left.Values.Tile(tile), right.Tile(tile), product.Values.Tile(tile), left.Rows.Count, right.Rows, columns.Count);
        }

        return product;
    }

    /// <summary>The plain transpose, rows for columns.</summary>
    public static FrfMatrix Transpose(FrfMatrix frf)
    {
        var transpose = new FrfMatrix(frf.Axis, frf.Columns, frf.Rows);
        for (int tile = 0; tile < frf.Values.TileCount; tile++)
        {
            for (int i = 0; i < frf.Rows.Count * frf.Columns.Count; i++)
            {
                (int row, int column) = (i / frf.Columns.Count, i % frf.Columns.Count);
                frf.Values.Entry(tile, row, column).CopyTo(transpose.Values.Entry(tile, column, row));
            }
        }

        return transpose;
    }
}
