using System.Numerics;

namespace Boltup.Engine.Paths;

/// <summary>Factors on the powers of adjacent lines: the share that a band takes of each, times a weighting where there is one.</summary>
/// <param name="First">First line.</param>
/// <param name="Factors">One factor per line from there on.</param>
public sealed record LineWeights(int First, double[] Factors)
{
    /// <summary>Every line with its whole power.</summary>
    public static LineWeights All(int lines)
    {
        var ones = new double[lines];
        Array.Fill(ones, 1);
        return new LineWeights(0, ones);
    }

    /// <summary>One line with its whole power.</summary>
    public static LineWeights Line(int line) => new(line, [1]);

    /// <summary>The factor of a line, 0 where none is given.</summary>
    public double FactorAt(int line) => line >= First && line < First + Factors.Length ? Factors[line - First] : 0;

    /// <summary>Σ factor·(a·b + c·d): with real and imaginary parts the weighted scalar product of two spectra.</summary>
    /// <param name="a">All lines, as for the other spans.</param>
    internal double Dot(ReadOnlySpan<double> a, ReadOnlySpan<double> b, ReadOnlySpan<double> c, ReadOnlySpan<double> d)
    {
        int count = Factors.Length;
        a = a.Slice(First, count);
        b = b.Slice(First, count);
        c = c.Slice(First, count);
        d = d.Slice(First, count);
        var sums = Vector<double>.Zero;
        int line = 0;
        for (int width = Vector<double>.Count; line <= count - width; line += width)
        {
            sums += At(Factors, line) * (At(a, line) * At(b, line) + At(c, line) * At(d, line));
        }

        double sum = Vector.Sum(sums);
        for (; line < count; line++)
        {
            sum += Factors[line] * (a[line] * b[line] + c[line] * d[line]);
        }

        return sum;
    }

    private static Vector<double> At(ReadOnlySpan<double> values, int line) => new(values[line..]);
}
