using System.Numerics;

namespace Boltup.Engine.Kernels;

/// <summary>Householder QR of one complex matrix with at least as many rows as columns: A = Q·R.</summary>
internal sealed class HouseholderQr
{
    private Complex[,] _matrix = new Complex[0, 0];
    private Complex[] _diagonal = [];
    private double[] _factors = [];
    private double _scale;

    public int Rows => _matrix.GetLength(0);

    public int Columns => _matrix.GetLength(1);

    /// <summary>The column of the matrix that stands at each place.</summary>
    public int[] Order { get; private set; } = [];

    /// <summary>Power of two by which the matrix was multiplied.</summary>
    public double Scale => _scale;

    public bool HasFullRank =>
        Rank.IsFull(_diagonal.Select(Complex.Abs).Aggregate(0.0, Math.Max), _diagonal.Select(Complex.Abs).Aggregate(double.PositiveInfinity, Math.Min), Rows);

    /// <summary>Factors the matrix, which becomes the workspace.</summary>
    /// <param name="isPivoted">Whether the largest of the remaining columns is taken next.</param>
    public void Factor(Complex[,] matrix, bool isPivoted = false)
    {
        _matrix = matrix;
        Order = [.. Enumerable.Range(0, Columns)];
        _diagonal = new Complex[Columns];
        _factors = new double[Columns];
        _scale = LaneScale.For(LargestPart());
        for (int i = 0; i < matrix.Length; i++)
        {
            matrix[i / Columns, i % Columns] *= _scale;
        }

        for (int k = 0; k < Columns; k++)
        {
            if (isPivoted)
            {
                BringLargest(k);
            }

            MakeReflector(k);
            Reflect(k, matrix, k + 1);
        }
    }

    /// <summary>Replaces B by Qᴴ·B.</summary>
    public void Transform(Complex[,] b)
    {
        for (int k = 0; k < Columns; k++)
        {
            Reflect(k, b, 0);
        }
    }

    /// <summary>Replaces the first rows of Qᴴ·B by the solution.</summary>
    public void SolveTriangle(Complex[,] b)
    {
        for (int column = 0; column < b.GetLength(1); column++)
        {
            for (int row = Columns - 1; row >= 0; row--)
            {
                Complex sum = b[row, column];
                for (int k = row + 1; k < Columns; k++)
                {
                    sum -= _matrix[row, k] * b[k, column];
                }

                b[row, column] = sum / _diagonal[row];
            }
        }

        for (int i = 0; i < Columns * b.GetLength(1); i++)
        {
            b[i / b.GetLength(1), i % b.GetLength(1)] *= _scale;
        }
    }

    /// <summary>An entry of the triangle of the scaled matrix, on or above the diagonal.</summary>
    public Complex Triangle(int row, int column) => row == column ? _diagonal[row] : _matrix[row, column];

    private double LargestPart()
    {
        double largest = 0;
        foreach (Complex value in _matrix)
        {
            double size = Math.Max(Math.Abs(value.Real), Math.Abs(value.Imaginary));
            largest = size > largest ? size : largest;
        }

        return largest;
    }

    private void BringLargest(int k)
    {
        int largest = k;
        for (int column = k + 1; column < Columns; column++)
        {
            largest = SquaredNorm(column, k) > SquaredNorm(largest, k) ? column : largest;
        }

        (Order[k], Order[largest]) = (Order[largest], Order[k]);
        for (int row = 0; row < Rows; row++)
        {
            (_matrix[row, k], _matrix[row, largest]) = (_matrix[row, largest], _matrix[row, k]);
        }
    }

    private double SquaredNorm(int column, int firstRow)
    {
        double square = 0;
        for (int row = firstRow; row < Rows; row++)
        {
            square += _matrix[row, column].Real * _matrix[row, column].Real + _matrix[row, column].Imaginary * _matrix[row, column].Imaginary;
        }

        return square;
    }

    private void MakeReflector(int k)
    {
        double norm = Math.Sqrt(SquaredNorm(k, k)), size = Complex.Abs(_matrix[k, k]);
        Complex phase = size == 0 ? Complex.One : _matrix[k, k] / size;
        _diagonal[k] = -phase * norm;
        _matrix[k, k] += phase * norm;
        _factors[k] = norm == 0 ? 0 : 1 / (norm * (norm + size));
    }

    private void Reflect(int k, Complex[,] target, int firstColumn)
    {
        for (int column = firstColumn; column < target.GetLength(1); column++)
        {
            Complex dot = Complex.Zero;
            for (int row = k; row < Rows; row++)
            {
                dot += Complex.Conjugate(_matrix[row, k]) * target[row, column];
            }

            for (int row = k; row < Rows; row++)
            {
                target[row, column] -= _factors[k] * dot * _matrix[row, k];
            }
        }
    }
}
