using Boltup.Engine.Coupling;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Mounts;

/// <summary>Mounts one behind the other, the first at the first point of the joint; nothing else holds the points between them.</summary>
public sealed class SeriesMount : MountLaw
{
    private readonly IReadOnlyList<MountLaw> _mounts;

    /// <param name="mounts">
    /// At least one. A direction that one of them leaves free carries nothing; where mounts that couple directions or have mass effect take
    /// part, all must have the same directions.
    /// </param>
    public SeriesMount(IReadOnlyList<MountLaw> mounts)
    {
        _mounts = mounts;
        Directions = [.. mounts[0].Directions.Where(direction => mounts.All(mount => mount.Directions.Contains(direction)))];
        IsTwoPort = mounts.Any(mount => mount.IsTwoPort);
        IsDiagonal = !IsTwoPort && mounts.All(mount => mount.IsDiagonal);
        Band = ComposedBand.Of(mounts);
        if (!CanJoin(mounts))
        {
            throw new ArgumentException("mounts of different directions that cannot be joined", nameof(mounts));
        }
    }

    public override IReadOnlyList<Direction> Directions { get; }

    public override bool IsDiagonal { get; }

    public override bool IsTwoPort { get; }

    public override (double FromHz, double ToHz)? Band { get; }

    public override double ConstantLossFactor => _mounts.Max(mount => mount.ConstantLossFactor);

    /// <summary>Whether the point between the mounts is held in every direction that matters.</summary>
    public static bool CanJoin(IReadOnlyList<MountLaw> mounts) =>
        mounts.All(mount => mount is { IsDiagonal: true, IsTwoPort: false })
        || mounts.All(mount => mount.Directions.SequenceEqual(mounts[0].Directions));

    public override void FillStiffness(FrequencyAxis axis, int tile, Span<double> stiffness)
    {
        int order = 2 * Directions.Count;
        int length = order * order * Tiling.EntryLength;
        Span<double> chain = stackalloc double[length];
        Span<double> next = stackalloc double[length];
        chain.Clear();
        BothEnds.Add(_mounts[0], Directions, axis, tile, chain);
        for (int i = 1; i < _mounts.Count; i++)
        {
            next.Clear();
            BothEnds.Add(_mounts[i], Directions, axis, tile, next);
            TwoPortChain.Append(chain, next, Directions.Count);
        }

        Take(chain, stiffness);
    }

    /// <summary>A two-port as it is; otherwise the block that relates the force at one end to the displacement of the other.</summary>
    private void Take(ReadOnlySpan<double> chain, Span<double> stiffness)
    {
        if (IsTwoPort)
        {
            chain.CopyTo(stiffness);
            return;
        }

        int size = Directions.Count;
        stiffness.Clear();
        for (int i = 0; i < size * size; i++)
        {
            TileEntry.AddScaled(stiffness, i, chain, i / size * 2 * size + size + i % size, 1);
        }
    }
}
