using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Mounts;

/// <summary>Independent springs with hysteretic loss and viscous damping along the axes of the assembly.</summary>
public sealed class DiagonalMount : MountLaw
{
    private readonly SpringDamper[] _springs;

    /// <param name="springs">At most one per direction; those without stiffness and damping are left out.</param>
    public DiagonalMount(IEnumerable<SpringDamper> springs)
    {
        _springs = [.. springs.Where(spring => spring.Stiffness != 0 || spring.Damping != 0).OrderBy(spring => spring.Direction)];
        Directions = [.. _springs.Select(spring => spring.Direction)];
    }

    public override IReadOnlyList<Direction> Directions { get; }

    public override bool IsDiagonal => true;

    public override double ConstantLossFactor => _springs.Length == 0 ? 0 : _springs.Max(spring => spring.LossFactor);

    public override void FillStiffness(FrequencyAxis axis, int tile, Span<double> stiffness)
    {
        stiffness.Clear();
        for (int i = 0; i < _springs.Length; i++)
        {
            Span<double> entry = stiffness.Slice(i * (_springs.Length + 1) * Tiling.EntryLength, Tiling.EntryLength);
            for (int lane = 0; lane < Tiling.Lanes; lane++)
            {
                Complex k = At(_springs[i], 2 * Math.PI * HertzOf(axis, tile, lane));
                entry[lane] = k.Real;
                entry[Tiling.Lanes + lane] = k.Imaginary;
            }
        }
    }

    private static Complex At(SpringDamper spring, double omega) =>
        new(spring.Stiffness, spring.Stiffness * spring.LossFactor + omega * spring.Damping);
}
