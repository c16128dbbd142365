using Boltup.Engine.Spectra;

namespace Boltup.Engine.Mounts;

/// <summary>Springs that couple directions: a symmetric stiffness matrix times (1+jη).</summary>
public sealed class MatrixMount : MountLaw
{
    private readonly double[,] _stiffness;
    private readonly double _lossFactor;

    /// <param name="directions">x y z, or all six.</param>
    /// <param name="stiffness">Square, in N/m, N/rad, N·m/m and N·m/rad, rows and columns as the directions.</param>
    public MatrixMount(IReadOnlyList<Direction> directions, double[,] stiffness, double lossFactor)
    {
        Directions = directions;
        _stiffness = stiffness;
        _lossFactor = lossFactor;
    }

    public override IReadOnlyList<Direction> Directions { get; }

    public override bool IsDiagonal => false;

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
    }
}
