using Boltup.Engine.Coupling;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Mounts;

/// <summary>Mounts side by side between the same two points: their stiffnesses add.</summary>
public sealed class ParallelMount : MountLaw
{
    private readonly IReadOnlyList<MountLaw> _mounts;

    public ParallelMount(IReadOnlyList<MountLaw> mounts)
    {
        _mounts = mounts;
        Directions = [.. mounts.SelectMany(mount => mount.Directions).Distinct().Order()];
        IsTwoPort = mounts.Any(mount => mount.IsTwoPort);
        IsDiagonal = !IsTwoPort && mounts.All(mount => mount.IsDiagonal);
        Band = ComposedBand.Of(mounts);
    }

    public override IReadOnlyList<Direction> Directions { get; }

    public override bool IsDiagonal { get; }

    public override bool IsTwoPort { get; }

    public override (double FromHz, double ToHz)? Band { get; }

    public override double ConstantLossFactor => _mounts.Max(mount => mount.ConstantLossFactor);

    public override void FillStiffness(FrequencyAxis axis, int tile, Span<double> stiffness)
    {
        stiffness.Clear();
        if (IsTwoPort)
        {
            AddBothEnds(axis, tile, stiffness);
            return;
        }

        int size = Directions.Count;
        Span<double> sum = stackalloc double[4 * size * size * Tiling.EntryLength];
        sum.Clear();
        AddBothEnds(axis, tile, sum);
        for (int i = 0; i < size * size; i++)
        {
            TileEntry.AddScaled(stiffness, i, sum, i / size * 2 * size + i % size, 1);
        }
    }

    private void AddBothEnds(FrequencyAxis axis, int tile, Span<double> sum)
    {
        foreach (MountLaw mount in _mounts)
        {
            BothEnds.Add(mount, Directions, axis, tile, sum);
        }
    }
}
