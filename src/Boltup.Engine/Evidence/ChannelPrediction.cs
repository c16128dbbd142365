using System.Numerics;

namespace Boltup.Engine.Evidence;

/// <summary>A channel as measured and as the other channels predict it, with a weight per line.</summary>
internal sealed record ChannelPrediction(Complex[] Predicted, Complex[] Measured, double[] Weight)
{
    /// <summary>
    /// Measured over predicted as one real factor over the band: the sign of their real part and the root of the ratio of their powers,
    /// which noise in either pulls less than a one-sided fit.
    /// </summary>
    public double Factor => Math.Sign(Cross) * Math.Sqrt(Power(Measured) / Power(Predicted));

    /// <summary>Share of the channel that a real factor explains, from 0 to 1; NaN for a silent channel.</summary>
    public double Explained => Cross * Cross / (Power(Measured) * Power(Predicted));

    /// <summary>Misfit of another channel's spectrum with this prediction, over the power of the prediction.</summary>
    public double MisfitOf(Complex[] spectrum) => Power([.. spectrum.Zip(Predicted, (u, p) => u - p)]) / Power(Predicted);

    private double Cross => Sum(line => (Complex.Conjugate(Predicted[line]) * Measured[line]).Real);

    private double Power(Complex[] values) => Sum(line => KindWeights.Square(values[line]));

    private double Sum(Func<int, double> term)
    {
        double sum = 0;
        for (int line = 0; line < Weight.Length; line++)
        {
            sum += Weight[line] * term(line);
        }

        return sum;
    }
}
