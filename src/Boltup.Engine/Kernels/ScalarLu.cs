using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Kernels;

/// <summary>
/// The reference: right-looking LU with partial pivoting by |Re|+|Im| (Golub, Van Loan, Matrix Computations, algorithm 3.4.1), one
/// lane after the other. Defines what the vector bodies must give up to rounding.
/// </summary>
internal sealed unsafe class ScalarLu : LuKernel
{
    private readonly Complex[][,] _factors = new Complex[Tiling.Lanes][,];
    private readonly int[][] _rows = new int[Tiling.Lanes][];
    private readonly Complex[] _column;
    private int _order;

    public ScalarLu(int maxOrder)
    {
        _column = new Complex[maxOrder];
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            _factors[lane] = new Complex[maxOrder, maxOrder];
            _rows[lane] = new int[maxOrder];
        }
    }

    public override void Factor(double* tile, int order)
    {
        _order = order;
        SingularLanes = 0;
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            Load(tile, lane);
            if (!Eliminate(_factors[lane], _rows[lane]))
            {
                SingularLanes |= (byte)(1 << lane);
            }
        }
    }

    public override void Solve(double* tile, int columns)
    {
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            for (int column = 0; column < columns; column++)
            {
                SolveColumn(tile + column * Tiling.EntryLength + lane, columns, _factors[lane], _rows[lane]);
            }
        }
    }

    public override void SolveTransposed(double* tile, int columns)
    {
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            for (int column = 0; column < columns; column++)
            {
                SolveColumnTransposed(tile + column * Tiling.EntryLength + lane, columns, _factors[lane], _rows[lane]);
            }
        }
    }

    private static double Size(Complex value) => Math.Abs(value.Real) + Math.Abs(value.Imaginary);

    private static Complex Read(double* entry) => new(entry[0], entry[Tiling.Lanes]);

    private static void Write(double* entry, Complex value) => (entry[0], entry[Tiling.Lanes]) = (value.Real, value.Imaginary);

    private void Load(double* tile, int lane)
    {
        for (int i = 0; i < _order * _order; i++)
        {
            _factors[lane][i / _order, i % _order] = Read(tile + i * Tiling.EntryLength + lane);
        }
    }

    /// <returns>False when some pivot is zero or no finite number.</returns>
    private bool Eliminate(Complex[,] a, int[] rows)
    {
        bool regular = true;
        for (int i = 0; i < _order; i++)
        {
            rows[i] = i;
        }

        for (int k = 0; k < _order; k++)
        {
            int pivot = k;
            for (int i = k + 1; i < _order; i++)
            {
                pivot = Size(a[rows[i], k]) > Size(a[rows[pivot], k]) ? i : pivot;
            }

            (rows[k], rows[pivot]) = (rows[pivot], rows[k]);
            double size = Size(a[rows[k], k]);
            regular &= size > 0 && double.IsFinite(size);
            EliminateBelow(a, rows, k);
        }

        return regular;
    }

    private void EliminateBelow(Complex[,] a, int[] rows, int k)
    {
        Complex inverse = 1 / a[rows[k], k];
        for (int i = k + 1; i < _order; i++)
        {
            Complex factor = a[rows[i], k] *= inverse;
            for (int j = k + 1; j < _order; j++)
            {
                a[rows[i], j] -= factor * a[rows[k], j];
            }
        }
    }

    private void SolveColumn(double* first, int columns, Complex[,] lu, int[] rows)
    {
        for (int i = 0; i < _order; i++)
        {
            Complex sum = Read(first + rows[i] * columns * Tiling.EntryLength);
            for (int k = 0; k < i; k++)
            {
                sum -= lu[rows[i], k] * _column[k];
            }

            _column[i] = sum;
        }

        for (int i = _order - 1; i >= 0; i--)
        {
            for (int k = i + 1; k < _order; k++)
            {
                _column[i] -= lu[rows[i], k] * _column[k];
            }

            _column[i] /= lu[rows[i], i];
            Write(first + i * columns * Tiling.EntryLength, _column[i]);
        }
    }

    private void SolveColumnTransposed(double* first, int columns, Complex[,] lu, int[] rows)
    {
        for (int i = 0; i < _order; i++)
        {
            Complex sum = Read(first + i * columns * Tiling.EntryLength);
            for (int k = 0; k < i; k++)
            {
                sum -= lu[rows[k], i] * _column[k];
            }

            _column[i] = sum / lu[rows[i], i];
        }

        for (int i = _order - 1; i >= 0; i--)
        {
            for (int k = i + 1; k < _order; k++)
            {
                _column[i] -= lu[rows[k], i] * _column[k];
            }

            Write(first + rows[i] * columns * Tiling.EntryLength, _column[i]);
        }
    }
}
