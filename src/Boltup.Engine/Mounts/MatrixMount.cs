using Boltup.Engine.Spectra;

namespace Boltup.Engine.Mounts;

/// <summary>Springs that couple directions, with viscous dampers along them: K(1+jη) + jωC, K symmetric, C diagonal.</summary>
public sealed class MatrixMount : MountLaw
{
    private readonly double[,] _stiffness;
    private readonly double _lossFactor;
    private readonly double[] _damping;

    /// <param name="directions">x y z, or all six.</param>
    /// <param name="stiffness">Square, in N/m, N/rad, N·m/m and N·m/rad, rows and columns as the directions.</param>
    /// <param name="damping">Viscous damping per direction in N·s/m and N·m·s/rad.</param>
    public MatrixMount(IReadOnlyList<Direction> directions, double[,] stiffness, double lossFactor, double[] damping)
    {
        Directions = directions;
        _stiffness = stiffness;
        _lossFactor = lossFactor;
        _damping = damping;
    }

    public override IReadOnlyList<Direction> Directions { get; }

    public override bool IsDiagonal => false;

    public override double ConstantLossFactor => _lossFactor;

    public override void FillStiffness(FrequencyAxis axis, int tile, Span<double> stiffness)
    {
        int order = Directions.Count;
        for (int i = 0; i < order * order; i++)
        {
            double value = _stiffness[i / order, i % order];
            Span<double> entry = stiffness.Slice(i * Tiling.EntryLength, Tiling.EntryLength);
            entry[..Tiling.Lanes].Fill(value);
            entry[Tiling.Lanes..].Fill(value * _lossFactor);
        }

        AddDamping(axis, tile, stiffness);
    }

    private void AddDamping(FrequencyAxis axis, int tile, Span<double> stiffness)
    {
        for (int i = 0; i < _damping.Length; i++)
        {
            Span<double> imaginary = stiffness.Slice(i * (_damping.Length + 1) * Tiling.EntryLength + Tiling.Lanes, Tiling.Lanes);
            for (int lane = 0; lane < Tiling.Lanes; lane++)
            {
                imaginary[lane] += 2 * Math.PI * HertzOf(axis, tile, lane) * _damping[i];
            }
        }
    }
}
