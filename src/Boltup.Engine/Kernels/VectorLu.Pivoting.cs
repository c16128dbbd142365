using System.Runtime.CompilerServices;

namespace Boltup.Engine.Kernels;

/// <summary>Choice and exchange of pivot rows.</summary>
internal sealed unsafe partial class VectorLu<T>
{
    /// <summary>Squares of pivots between this and its reciprocal are inverted without scaling.</summary>
    private const double LargestSquare = 1e280;

    /// <summary>Finds and places the pivot of a column, and keeps its reciprocal.</summary>
    private void Pivot(int group, double* a, long* rows, int column, double* inverse)
    {
        if (column < _order)
        {
            T best = FindBest(a, rows, column, out T bestRow);
            uint regular = T.Bits(T.GreaterThan(best, default)) & ~T.Bits(T.GreaterThan(best, T.Broadcast(double.MaxValue))) & AllLanes;
            SingularLanes |= (byte)((~regular & AllLanes) << (group * T.Count));
            PlacePivots(group, a, rows, column, best, bestRow, regular);
        }

        StoreReciprocal(a + rows[column] + (nint)column * Entry, inverse + (nint)column * Entry);
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static T SizeOf(double* entry) => T.Abs(T.Load(entry)) + T.Abs(T.Load(entry + Imaginary));

    /// <summary>Largest |Re|+|Im| of the column per lane, and the row where it is.</summary>
    private T FindBest(double* a, long* rows, int column, out T bestRow)
    {
        T best = default;
        bestRow = T.Broadcast(column);
        for (int row = column; row < _order; row++)
        {
            T size = SizeOf(a + rows[row] + (nint)column * Entry);
            T larger = T.GreaterThan(size, best);
            best = T.Select(larger, size, best);
            bestRow = T.Select(larger, T.Broadcast(row), bestRow);
        }

        return best;
    }

    private void PlacePivots(int group, double* a, long* rows, int column, T best, T bestRow, uint regular)
    {
        double* wanted = stackalloc double[T.Count];
        T.Store(bestRow, wanted);
        for (int lane = 0; lane < T.Count; lane++)
        {
            if ((regular >> lane & 1) != 0 && IsGoodInAllLanes(a + rows[(int)wanted[lane]] + (nint)column * Entry, best, regular))
            {
                Swap(group, a, rows, new RowSwap(column, (int)wanted[lane], AllLanes));
                return;
            }
        }

        SwapEachLane(group, a, rows, column, wanted, regular);
    }

    /// <summary>Whether a candidate is within a factor of two of the best in every regular lane; NaN is not.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static bool IsGoodInAllLanes(double* candidate, T best, uint regular)
    {
        T size = SizeOf(candidate);
        return (T.Bits(T.GreaterThan(size + size, best)) & regular) == regular;
    }

    private void SwapEachLane(int group, double* a, long* rows, int column, double* wanted, uint regular)
    {
        uint open = regular;
        while (open != 0)
        {
            int row = (int)wanted[System.Numerics.BitOperations.TrailingZeroCount(open)];
            uint lanes = 0;
            for (int lane = 0; lane < T.Count; lane++)
            {
                lanes |= (open >> lane & 1) != 0 && (int)wanted[lane] == row ? 1u << lane : 0;
            }

            Swap(group, a, rows, new RowSwap(column, row, lanes));
            open &= ~lanes;
        }
    }

    private void Swap(int group, double* a, long* rows, RowSwap swap)
    {
        if (swap.First != swap.Second)
        {
            _swaps[group].Add(swap);
            Exchange(a, rows, swap, _evenOrder);
        }
    }

    /// <summary>Exchanges two rows: by their pointers where all lanes take part, otherwise by blending.</summary>
    private static void Exchange(double* c, long* rows, RowSwap swap, int columns)
    {
        if (swap.Lanes == AllLanes)
        {
            (rows[swap.First], rows[swap.Second]) = (rows[swap.Second], rows[swap.First]);
            return;
        }

        T mask = T.MaskOf(swap.Lanes);
        double* first = c + rows[swap.First];
        double* second = c + rows[swap.Second];
        for (int i = 0; i < columns; i++)
        {
            Blend(first + (nint)i * Entry, second + (nint)i * Entry, mask);
            Blend(first + (nint)i * Entry + Imaginary, second + (nint)i * Entry + Imaginary, mask);
        }
    }

    private static void Blend(double* first, double* second, T mask)
    {
        T x = T.Load(first), y = T.Load(second);
        T.Store(T.Select(mask, y, x), first);
        T.Store(T.Select(mask, x, y), second);
    }

    /// <summary>1/(x + jy): by x² + y² where that is far from overflow and underflow in every lane, otherwise scaled.</summary>
    private static void StoreReciprocal(double* pivot, double* target)
    {
        T x = T.Load(pivot), y = T.Load(pivot + Imaginary);
        T square = T.MultiplyAdd(x, x, y * y);
        T isSafe = T.GreaterThan(T.Broadcast(LargestSquare), square);
        if ((T.Bits(T.GreaterThan(square, T.Broadcast(1 / LargestSquare))) & T.Bits(isSafe)) == AllLanes)
        {
            T inverse = T.Broadcast(1) / square;
            BlockKernel<T>.Store(target, x * inverse, default(T) - y * inverse);
            return;
        }

        StoreScaledReciprocal(x, y, target);
    }

    /// <summary>1/(x + jy) with both parts scaled by the larger one (Smith, CACM 5 (1962) 435).</summary>
    private static void StoreScaledReciprocal(T x, T y, double* target)
    {
        T absX = T.Abs(x), absY = T.Abs(y);
        T scale = T.Broadcast(1) / T.Select(T.GreaterThan(absX, absY), absX, absY);
        T p = x * scale, q = y * scale;
        T factor = scale / T.MultiplyAdd(p, p, q * q);
        BlockKernel<T>.Store(target, p * factor, default(T) - q * factor);
    }
}
