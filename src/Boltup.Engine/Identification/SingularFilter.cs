using Boltup.Engine.Spectra;

namespace Boltup.Engine.Identification;

/// <summary>Chooses at each of 8 lines what every singular direction is multiplied by: 1/σ, 0, or σ/(σ²+λ²).</summary>
internal sealed class SingularFilter
{
    private readonly int _rows;
    private readonly int _order;
    private readonly SolveChoice _choice;
    private readonly double[] _gains;
    private readonly LineChoice[] _choices = new LineChoice[Tiling.Lanes];
    private readonly double[] _values;
    private readonly double[] _powers;

    public SingularFilter(int rows, int order, SolveChoice choice)
    {
        (_rows, _order, _choice) = (rows, order, choice);
        _gains = new double[order * Tiling.Lanes];
        _values = new double[order];
        _powers = new double[order];
    }

    /// <summary>order × 8 lanes.</summary>
    public ReadOnlySpan<double> Gains => _gains;

    /// <summary>One per lane.</summary>
    public ReadOnlySpan<LineChoice> Choices => _choices;

    /// <param name="singularValues">order × 8 lanes.</param>
    /// <param name="coefficients">Uᴴ·u, order × count entries.</param>
    /// <param name="measured">u, rows × count entries.</param>
    /// <param name="noise">Standard deviations of the FRFs, rows × order entries (real parts), or empty.</param>
    public void Choose(
        ReadOnlySpan<double> singularValues, ReadOnlySpan<double> coefficients, ReadOnlySpan<double> measured, int count, ReadOnlySpan<double> noise)
    {
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            for (int i = 0; i < _order; i++)
            {
                _values[i] = singularValues[i * Tiling.Lanes + lane];
                _powers[i] = Power(coefficients, i, count, lane);
            }

            if (_choice.Method == SolveMethod.Truncated)
            {
                Truncate(lane, _choice.Threshold is { } share ? share * _values.Max() : NoiseLevel(noise, lane));
            }
            else
            {
                Damp(lane, LambdaFor(measured, count, lane));
            }
        }
    }

    /// <summary>Σ|entry|² over a row of a tile, at a lane.</summary>
    private static double Power(ReadOnlySpan<double> tile, int row, int count, int lane)
    {
        double sum = 0;
        for (int at = row * count * Tiling.EntryLength + lane; at < (row + 1) * count * Tiling.EntryLength; at += Tiling.EntryLength)
        {
            sum += tile[at] * tile[at] + tile[at + Tiling.Lanes] * tile[at + Tiling.Lanes];
        }

        return sum;
    }

    private void Truncate(int lane, double threshold)
    {
        int kept = 0;
        for (int i = 0; i < _order; i++)
        {
            bool keeps = _values[i] >= threshold && _values[i] > 0;
            _gains[i * Tiling.Lanes + lane] = keeps ? 1 / _values[i] : 0;
            kept += keeps ? 1 : 0;
        }

        _choices[lane] = new LineChoice(kept, 0);
    }

    private void Damp(int lane, double lambda)
    {
        for (int i = 0; i < _order; i++)
        {
            double sum = _values[i] * _values[i] + lambda * lambda;
            _gains[i * Tiling.Lanes + lane] = sum > 0 ? _values[i] / sum : 0;
        }

        _choices[lane] = new LineChoice(_order, lambda / _values.Max());
    }

    /// <summary>
    /// What a matrix of independent errors may add to a singular value: its expected spectral norm, by the leading terms of the bound of
    /// Bandeira and van Handel (Ann. Probab. 44 (2016), from memory): the root of the largest row sum of variances, and that of the largest
    /// column sum.
    /// </summary>
    private double NoiseLevel(ReadOnlySpan<double> noise, int lane)
    {
        double largestRow = 0, largestColumn = 0;
        for (int row = 0; row < _rows; row++)
        {
            double sum = 0;
            for (int column = 0; column < _order; column++)
            {
                sum += Variance(noise, row, column, lane);
            }

            largestRow = Math.Max(largestRow, sum);
        }

        for (int column = 0; column < _order; column++)
        {
            double sum = 0;
            for (int row = 0; row < _rows; row++)
            {
                sum += Variance(noise, row, column, lane);
            }

            largestColumn = Math.Max(largestColumn, sum);
        }

        return Math.Sqrt(largestRow) + Math.Sqrt(largestColumn);
    }

    private double Variance(ReadOnlySpan<double> noise, int row, int column, int lane)
    {
        double deviation = noise[(row * _order + column) * Tiling.EntryLength + lane];
        return 2 * deviation * deviation;
    }

    private double LambdaFor(ReadOnlySpan<double> measured, int count, int lane)
    {
        if (_choice.Rule == DampingRule.Fixed)
        {
            return _choice.Damping * _values.Max();
        }

        double total = 0;
        for (int row = 0; row < _rows; row++)
        {
            total += Power(measured, row, count, lane);
        }

        var search = new DampingSearch(_values, _powers, Math.Max(0, total - _powers.Sum()), _rows);
        return _choice.Rule == DampingRule.LCurve ? search.LCurveCorner() : search.CrossValidated();
    }
}
