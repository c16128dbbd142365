using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Mounts;

/// <summary>A mount whose whole static stiffness follows one <see cref="Relaxation"/>: Zener and fractional Zener laws.</summary>
/// <param name="atRest">The law at low frequency.</param>
public sealed class RelaxingMount(MountLaw atRest, Relaxation relaxation) : MountLaw
{
    public override IReadOnlyList<Direction> Directions => atRest.Directions;

    public override bool IsDiagonal => atRest.IsDiagonal;

    public override bool IsTwoPort => atRest.IsTwoPort;

    public override (double FromHz, double ToHz)? Band => atRest.Band;

    public override double ConstantLossFactor => atRest.ConstantLossFactor;

    public override void FillStiffness(FrequencyAxis axis, int tile, Span<double> stiffness)
    {
        atRest.FillStiffness(axis, tile, stiffness);
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            Complex factor = relaxation.FactorAt(2 * Math.PI * HertzOf(axis, tile, lane));
            for (int at = lane; at < stiffness.Length; at += Tiling.EntryLength)
            {
                Complex k = factor * new Complex(stiffness[at], stiffness[at + Tiling.Lanes]);
                stiffness[at] = k.Real;
                stiffness[at + Tiling.Lanes] = k.Imaginary;
            }
        }
    }
}
