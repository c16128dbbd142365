using System.Numerics;

namespace Boltup.Engine.Kernels;

/// <summary>One-sided Jacobi SVD of one complex matrix: Rᴴ·J = V·Σ, A = (Q·J)·Σ·Vᴴ; columns in no order.</summary>
internal sealed class JacobiSvd
{
    private readonly HouseholderQr _qr = new();
    private Complex[,] _v = new Complex[0, 0];
    private Complex[,] _j = new Complex[0, 0];
    private int _order;

    public double[] SingularValues { get; private set; } = [];

    public void Factor(Complex[,] matrix, int maxSweeps, double orthogonalityLimit)
    {
        _qr.Factor(matrix, isPivoted: true);
        _order = _qr.Columns;
        (_v, _j) = (new Complex[_order, _order], new Complex[_order, _order]);
        for (int column = 0; column < _order; column++)
        {
            _j[column, column] = 1;
            for (int row = column; row < _order; row++)
            {
                _v[row, column] = Complex.Conjugate(_qr.Triangle(column, row));
            }
        }

        int sweep = 0;
        while (Sweep(orthogonalityLimit) && ++sweep < maxSweeps)
        {
        }

        Normalise();
    }

    /// <summary>Uᴴ·B; B becomes the workspace.</summary>
    public Complex[,] Project(Complex[,] b)
    {
        _qr.Transform(b);
        return Product(_order, b.GetLength(1), (i, k) => Complex.Conjugate(_j[k, i]), b);
    }

    /// <summary>V·C.</summary>
    public Complex[,] Combine(Complex[,] c)
    {
        int[] places = new int[_order];
        for (int i = 0; i < _order; i++)
        {
            places[_qr.Order[i]] = i;
        }

        return Product(_order, c.GetLength(1), (i, k) => _v[places[i], k], c);
    }

    private Complex[,] Product(int rows, int columns, Func<int, int, Complex> left, Complex[,] right)
    {
        var result = new Complex[rows, columns];
        for (int i = 0; i < rows * columns * _order; i++)
        {
            int k = i % _order, column = i / _order % columns, row = i / _order / columns;
            result[row, column] += left(row, k) * right[k, column];
        }

        return result;
    }

    private bool Sweep(double limit)
    {
        bool turned = false;
        for (int p = 0; p < _order - 1; p++)
        {
            for (int q = p + 1; q < _order; q++)
            {
                turned |= Rotate(p, q, limit);
            }
        }

        return turned;
    }

    private bool Rotate(int p, int q, double limit)
    {
        double pp = SquaredNorm(p), qq = SquaredNorm(q);
        Complex dot = Complex.Zero;
        for (int row = 0; row < _order; row++)
        {
            dot += Complex.Conjugate(_v[row, p]) * _v[row, q];
        }

        double size = Complex.Abs(dot);
        if (!(size * size > pp * qq * limit))
        {
            return false;
        }

        double zeta = (qq - pp) / (2 * size);
        double steep = 1 / (Math.Abs(zeta) + Math.Sqrt(1 + zeta * zeta));
        double tangent = zeta < 0 ? -steep : steep;
        double cosine = 1 / Math.Sqrt(1 + tangent * tangent);
        Turn(_v, p, q, cosine, cosine * tangent, Complex.Conjugate(dot / size));
        Turn(_j, p, q, cosine, cosine * tangent, Complex.Conjugate(dot / size));
        return true;
    }

    private void Turn(Complex[,] columns, int p, int q, double cosine, double sine, Complex phase)
    {
        for (int row = 0; row < _order; row++)
        {
            Complex first = columns[row, p], second = columns[row, q] * phase;
            columns[row, p] = cosine * first - sine * second;
            columns[row, q] = sine * first + cosine * second;
        }
    }

    private double SquaredNorm(int column)
    {
        double sum = 0;
        for (int row = 0; row < _order; row++)
        {
            sum += _v[row, column].Real * _v[row, column].Real + _v[row, column].Imaginary * _v[row, column].Imaginary;
        }

        return sum;
    }

    /// <summary>Columns of V·Σ become columns of V; a column of zeros stays one, and carries nothing.</summary>
    private void Normalise()
    {
        SingularValues = new double[_order];
        for (int column = 0; column < _order; column++)
        {
            double norm = Math.Sqrt(SquaredNorm(column));
            SingularValues[column] = norm / _qr.Scale;
            for (int row = 0; row < _order; row++)
            {
                _v[row, column] *= norm == 0 ? 0 : 1 / norm;
            }
        }
    }
}
