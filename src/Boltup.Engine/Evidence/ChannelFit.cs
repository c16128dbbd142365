using System.Numerics;
using Boltup.Engine.Kernels;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>
/// The least-squares misfit of channels u = Y f at some lines, in a form that answers what-if questions without solving again. With the
/// projector P = 1 − Y Y⁺ the misfit is uᴴPu; leaving channel i out is a rank-one change of P, and its prediction from all others is
/// u_i − (Pu)_i/P_ii (leave-one-out identity of linear regression). Every line is weighted with 1/‖u‖² as measured.
/// </summary>
internal sealed class ChannelFit
{
    private readonly int _lines;
    private readonly Complex[] _whole;
    private readonly Complex[] _projector;
    private readonly Complex[] _measured;
    private readonly Complex[] _motion;
    private readonly Complex[] _residual;
    private readonly double[] _weight;

    /// <param name="frf">FRFs of the channels, more rows than columns.</param>
    /// <param name="spectra">Their spectra in the same quantity, a tile column.</param>
    /// <param name="lines">The lines to look at.</param>
    /// <param name="scales">Factor per channel that makes kinds comparable.</param>
    public ChannelFit(FrfMatrix frf, SpectrumSet spectra, int[] lines, double[] scales)
    {
        Channels = frf.Rows.Count;
        _lines = lines.Length;
        _whole = new Complex[_lines * Channels * Channels];
        _projector = new Complex[_whole.Length];
        _measured = new Complex[_lines * Channels];
        _motion = new Complex[_measured.Length];
        _residual = new Complex[_lines * Channels];
        _weight = new double[_lines];
        for (int line = 0; line < _lines; line++)
        {
            for (int i = 0; i < Channels; i++)
            {
                _measured[line * Channels + i] = scales[i] * spectra.Values[i][lines[line]];
            }

            double power = Dot(_measured.AsSpan(line * Channels, Channels), _measured.AsSpan(line * Channels, Channels));
            _weight[line] = power > 0 ? 1 / power : 0;
        }

        FillProjector(frf, lines, scales);
        Apply([]);
    }

    public int Channels { get; }

    /// <summary>Takes the spectra as measured and does these corrections to them, in order.</summary>
    public void Apply(IEnumerable<ChannelCorrection> corrections)
    {
        _measured.CopyTo(_motion, 0);
        _whole.CopyTo(_projector, 0);
        foreach (ChannelCorrection correction in corrections)
        {
            for (int line = 0; line < _lines; line++)
            {
                Apply(correction, line);
            }
        }

        Update();
    }

    /// <summary>Σ w uᴴPu over the lines, divided by their number: the square of the relative residual.</summary>
    public double Misfit() => Sum(line => Dot(Motion(line), Residual(line)));

    /// <summary>By how much the misfit falls when a channel is left out.</summary>
    public double GainOfLeavingOut(int channel) => Sum(line =>
    {
        double own = Projector(line)[channel * Channels + channel].Real;
        return own > 0 ? KindWeights.Square(Residual(line)[channel]) / own : 0;
    });

    /// <summary>The real factor for a channel's spectrum that makes the misfit least, and by how much it then falls.</summary>
    public (double Factor, double Gain) BestFactor(int channel)
    {
        double slope = Sum(line => (Complex.Conjugate(Motion(line)[channel]) * Residual(line)[channel]).Real);
        double curvature = Sum(line => KindWeights.Square(Motion(line)[channel]) * Projector(line)[channel * Channels + channel].Real);
        return curvature > 0 ? (1 - slope / curvature, slope * slope / curvature) : (1, 0);
    }

    /// <summary>By how much the misfit falls when two channels are exchanged; negative when it rises.</summary>
    public double GainOfSwapping(int first, int second) => -Sum(line =>
    {
        ReadOnlySpan<Complex> p = Projector(line);
        Complex change = Motion(line)[second] - Motion(line)[first];
        Complex residual = Residual(line)[first] - Residual(line)[second];
        double curvature = p[first * Channels + first].Real + p[second * Channels + second].Real - 2 * p[first * Channels + second].Real;
        return 2 * (Complex.Conjugate(change) * residual).Real + KindWeights.Square(change) * curvature;
    });

    /// <summary>What the other channels that take part say about a channel that takes part.</summary>
    public ChannelPrediction Predict(int channel)
    {
        var predicted = new Complex[_lines];
        var measured = new Complex[_lines];
        var weight = new double[_lines];
        for (int line = 0; line < _lines; line++)
        {
            double own = Projector(line)[channel * Channels + channel].Real;
            measured[line] = Motion(line)[channel];
            predicted[line] = own > 0 ? measured[line] - Residual(line)[channel] / own : measured[line];
            weight[line] = _weight[line] * Math.Max(own, 0);
        }

        return new ChannelPrediction(predicted, measured, weight);
    }

    private void Apply(ChannelCorrection correction, int line)
    {
        Span<Complex> motion = Motion(line);
        if (correction.IsSwap)
        {
            (motion[correction.Channel], motion[correction.Other]) = (motion[correction.Other], motion[correction.Channel]);
        }
        else if (correction.IsLeftOut)
        {
            RemoveChannel(Projector(line), correction.Channel);
        }
        else
        {
            motion[correction.Channel] *= correction.Factor;
        }
    }

    private Span<Complex> Motion(int line) => _motion.AsSpan(line * Channels, Channels);

    private Span<Complex> Residual(int line) => _residual.AsSpan(line * Channels, Channels);

    private Span<Complex> Projector(int line) => _projector.AsSpan(line * Channels * Channels, Channels * Channels);

    private double Sum(Func<int, double> term)
    {
        double sum = 0;
        for (int line = 0; line < _lines; line++)
        {
            sum += _weight[line] * term(line);
        }

        return sum / _lines;
    }

    private static double Dot(ReadOnlySpan<Complex> a, ReadOnlySpan<Complex> b)
    {
        double sum = 0;
        for (int i = 0; i < a.Length; i++)
        {
            sum += (Complex.Conjugate(a[i]) * b[i]).Real;
        }

        return sum;
    }

    /// <summary>Pu of every line.</summary>
    private void Update()
    {
        for (int line = 0; line < _lines; line++)
        {
            ReadOnlySpan<Complex> p = Projector(line);
            for (int i = 0; i < Channels; i++)
            {
                Complex sum = Complex.Zero;
                for (int j = 0; j < Channels; j++)
                {
                    sum += p[i * Channels + j] * _motion[line * Channels + j];
                }

                _residual[line * Channels + i] = sum;
            }
        }
    }

    /// <summary>P − P e eᴴ P/P_ii; the row and column become exactly zero.</summary>
    private void RemoveChannel(Span<Complex> p, int channel)
    {
        double own = p[channel * Channels + channel].Real;
        Complex[] column = new Complex[Channels];
        for (int i = 0; i < Channels; i++)
        {
            column[i] = p[i * Channels + channel];
        }

        for (int i = 0; i < Channels * Channels; i++)
        {
            (int row, int other) = (i / Channels, i % Channels);
            p[i] = row == channel || other == channel || !(own > 0)
                ? Complex.Zero
                : p[i] - column[row] * Complex.Conjugate(column[other]) / own;
        }
    }

    /// <summary>1 − Y Y⁺ at the lines, from a least-squares solution for unit vectors.</summary>
    private void FillProjector(FrfMatrix frf, int[] lines, double[] scales)
    {
        int forces = frf.Columns.Count;
        TiledMatrix chosen = Choose(frf, lines, scales);
        var qr = new BatchQr(Channels, forces);
        var unit = new TiledMatrix(Tiling.Lanes, Channels, Channels);
        var inverse = new TiledMatrix(Tiling.Lanes, forces, Channels);
        var product = new TiledMatrix(Tiling.Lanes, Channels, Channels);
        for (int i = 0; i < Channels; i++)
        {
            unit.Entry(0, i, i)[..Tiling.Lanes].Fill(1);
        }

        for (int tile = 0; tile < chosen.TileCount; tile++)
        {
            qr.Factor(chosen.Tile(tile), Channels, forces);
            qr.Solve(unit.Tile(0), Channels, inverse.Tile(0));
            BatchProduct.Multiply(chosen.Tile(tile), inverse.Tile(0), product.Tile(0), Channels, forces, Channels);
            for (int line = tile * Tiling.Lanes; line < Math.Min(_lines, (tile + 1) * Tiling.Lanes); line++)
            {
                StoreProjector(product, line);
            }
        }
    }

    private void StoreProjector(TiledMatrix product, int line)
    {
        for (int i = 0; i < Channels * Channels; i++)
        {
            (int row, int column) = (i / Channels, i % Channels);
            Complex value = (row == column ? 1 : 0) - product[line % Tiling.Lanes, row, column];

            // A line at which the FRFs are singular has no prediction to offer.
            _whole[line * Channels * Channels + i] = Complex.IsFinite(value) ? value : Complex.Zero;
        }
    }

    private static TiledMatrix Choose(FrfMatrix frf, int[] lines, double[] scales)
    {
        var chosen = new TiledMatrix(lines.Length, frf.Rows.Count, frf.Columns.Count);
        for (int row = 0; row < frf.Rows.Count; row++)
        {
            for (int column = 0; column < frf.Columns.Count; column++)
            {
                chosen.ScatterSpectrum(row, column, [.. lines.Select(line => scales[row] * frf[line, row, column])]);
            }
        }

        return chosen;
    }
}
