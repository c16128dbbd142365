using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Kernels;

/// <summary>
/// ‖A⁻¹‖₁ of all lanes from a few solutions: a power method on the 1-norm (Hager 1984), with Higham's (1988) second start that
/// catches the cases where it stalls.
/// </summary>
internal readonly ref struct InverseNormEstimate(BatchLu lu, Span<double> probe, int order)
{
    private const int Steps = 2;

    private readonly BatchLu _lu = lu;
    private readonly Span<double> _probe = probe;
    private readonly int _order = order;

    /// <summary>Writes the estimate of each lane.</summary>
    public void Run(Span<double> lanes)
    {
        FillUniform();
        _lu.Solve(_probe, 1);
        Sum(lanes);
        Span<double> better = stackalloc double[Tiling.Lanes];
        for (int step = 0; step < Steps; step++)
        {
            TakeConjugatePhases();
            _lu.SolveTransposed(_probe, 1);
            TakeLargestUnitVectors();
            _lu.Solve(_probe, 1);
            Sum(better);
            KeepLarger(lanes, better);
        }

        FillAlternating();
        _lu.Solve(_probe, 1);
        Sum(better);
        foreach (ref double value in better)
        {
            value *= 2.0 / (3 * _order);
        }

        KeepLarger(lanes, better);
    }

    private Span<double> EntryOf(int row) => _probe.Slice(row * Tiling.EntryLength, Tiling.EntryLength);

    private void FillUniform()
    {
        _probe.Clear();
        for (int row = 0; row < _order; row++)
        {
            EntryOf(row)[..Tiling.Lanes].Fill(1.0 / _order);
        }
    }

    private void FillAlternating()
    {
        _probe.Clear();
        for (int row = 0; row < _order; row++)
        {
            double size = 1 + (_order > 1 ? (double)row / (_order - 1) : 0);
            EntryOf(row)[..Tiling.Lanes].Fill(row % 2 == 0 ? size : -size);
        }
    }

    private void Sum(Span<double> lanes)
    {
        lanes.Clear();
        for (int row = 0; row < _order; row++)
        {
            OneNorm.AddModuli(EntryOf(row), lanes);
        }
    }

    /// <summary>y → conj(y/|y|): the transposed solution then is the conjugate of the one with the adjoint.</summary>
    private void TakeConjugatePhases()
    {
        for (int row = 0; row < _order; row++)
        {
            Span<double> entry = EntryOf(row);
            for (int lane = 0; lane < Tiling.Lanes; lane++)
            {
                var value = new Complex(entry[lane], entry[Tiling.Lanes + lane]);
                double modulus = Complex.Abs(value);
                Complex phase = modulus > 0 ? value / modulus : Complex.One;
                (entry[lane], entry[Tiling.Lanes + lane]) = (phase.Real, -phase.Imaginary);
            }
        }
    }

    /// <summary>z → the unit vector at the largest |z| of each lane.</summary>
    private void TakeLargestUnitVectors()
    {
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            int largest = 0;
            double size = -1;
            for (int row = 0; row < _order; row++)
            {
                Span<double> entry = EntryOf(row);
                double modulus = Complex.Abs(new Complex(entry[lane], entry[Tiling.Lanes + lane]));
                (largest, size) = modulus > size ? (row, modulus) : (largest, size);
            }

            for (int row = 0; row < _order; row++)
            {
                Span<double> entry = EntryOf(row);
                (entry[lane], entry[Tiling.Lanes + lane]) = (row == largest ? 1 : 0, 0);
            }
        }
    }

    private static void KeepLarger(Span<double> lanes, ReadOnlySpan<double> better)
    {
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            lanes[lane] = Math.Max(lanes[lane], better[lane]);
        }
    }
}
