using Boltup.Engine.Spectra;

namespace Boltup.Engine.Mounts;

/// <summary>Another mount with its whole dynamic stiffness multiplied by a factor.</summary>
public sealed class ScaledMount(MountLaw like, double scale) : MountLaw
{
    public override IReadOnlyList<Direction> Directions => like.Directions;

    public override bool IsDiagonal => like.IsDiagonal;

    public override bool IsTwoPort => like.IsTwoPort;

    public override (double FromHz, double ToHz)? Band => like.Band;

    public override double ConstantLossFactor => like.ConstantLossFactor;

    public override void FillStiffness(FrequencyAxis axis, int tile, Span<double> stiffness)
    {
        like.FillStiffness(axis, tile, stiffness);
        foreach (ref double value in stiffness)
        {
            value *= scale;
        }
    }
}
