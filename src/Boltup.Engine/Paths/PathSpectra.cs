using System.Numerics;

namespace Boltup.Engine.Paths;

/// <summary>The contributions of all paths to one response in one operation, and their sum.</summary>
/// <remarks>
/// Where an operation adds energies every set of forces is a case of its own: contributions sum to the response within a case, and powers
/// sum over the cases.
/// </remarks>
public sealed class PathSpectra
{
    private readonly double[] _real;
    private readonly double[] _imaginary;

    /// <summary>All contributions are zero.</summary>
    /// <param name="powerFactor">From a squared magnitude to a mean square: 1 for rms lines, ½ for peaks.</param>
    internal PathSpectra(IReadOnlyList<TransferPath> paths, int cases, int lines, double powerFactor)
    {
        (Paths, Cases, Lines, PowerFactor) = (paths, cases, lines, powerFactor);
        _real = new double[cases * (paths.Count + 1) * lines];
        _imaginary = new double[_real.Length];
    }

    public IReadOnlyList<TransferPath> Paths { get; }

    /// <summary>Number of sets of forces without a common phase.</summary>
    public int Cases { get; }

    public int Lines { get; }

    /// <summary>From a squared magnitude to a mean square.</summary>
    public double PowerFactor { get; }

    /// <summary>Whether contributions have a phase: nothing adds in energy.</summary>
    public bool HavePhase => Cases == 1;

    /// <summary>One contribution per line; where there is no phase the root of the powers of the cases.</summary>
    public Complex[] Contribution(int path)
    {
        var spectrum = new Complex[Lines];
        for (int line = 0; line < Lines; line++)
        {
            spectrum[line] = HavePhase ? new Complex(Real(path, 0)[line], Imaginary(path, 0)[line]) : Math.Sqrt(SquareAt(path, line));
        }

        return spectrum;
    }

    /// <summary>Mean square of a contribution over weighted lines.</summary>
    public double PowerOf(int path, LineWeights weights) => Product(path, path, weights);

    /// <summary>Mean square of the response over weighted lines.</summary>
    public double TotalPower(LineWeights weights) => Product(Paths.Count, Paths.Count, weights);

    /// <summary>
    /// The part of the response's power that a path brings in, Σ Re(c u*): the parts of all paths sum to the power of the response; a
    /// negative one works against it.
    /// </summary>
    public double PartOf(int path, LineWeights weights) => Product(path, Paths.Count, weights);

    /// <summary>Σ Re(c d*) of two contributions over weighted lines: half of what the pair adds to the power, negative where they cancel.</summary>
    public double Product(int path, int other, LineWeights weights)
    {
        double sum = 0;
        for (int i = 0; i < Cases; i++)
        {
            sum += weights.Dot(Real(path, i), Real(other, i), Imaginary(path, i), Imaginary(other, i));
        }

        return PowerFactor * sum;
    }

    internal Span<double> Real(int path, int forceCase) => _real.AsSpan((forceCase * (Paths.Count + 1) + path) * Lines, Lines);

    internal Span<double> Imaginary(int path, int forceCase) => _imaginary.AsSpan((forceCase * (Paths.Count + 1) + path) * Lines, Lines);

    /// <summary>Sums the contributions of each case to its response; call when all are there.</summary>
    internal void SumUp()
    {
        for (int i = 0; i < Cases; i++)
        {
            for (int path = 0; path < Paths.Count; path++)
            {
                Add(Real(path, i), Real(Paths.Count, i));
                Add(Imaginary(path, i), Imaginary(Paths.Count, i));
            }
        }
    }

    private static void Add(ReadOnlySpan<double> term, Span<double> sum)
    {
        for (int line = 0; line < sum.Length; line++)
        {
            sum[line] += term[line];
        }
    }

    private double SquareAt(int path, int line)
    {
        double sum = 0;
        for (int i = 0; i < Cases; i++)
        {
            (double real, double imaginary) = (Real(path, i)[line], Imaginary(path, i)[line]);
            sum += real * real + imaginary * imaginary;
        }

        return sum;
    }
}
