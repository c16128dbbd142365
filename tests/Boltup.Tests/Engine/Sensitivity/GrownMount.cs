using Boltup.Engine.Mounts;
using Boltup.Engine.Spectra;

namespace Boltup.Tests.Engine.Sensitivity;

/// <summary>A mount whose stiffness in one direction, or its imaginary part, is greater by a share: row and column by half of it.</summary>
internal sealed class GrownMount(MountLaw mount, Direction direction, double share, bool lossOnly) : MountLaw
{
    public override IReadOnlyList<Direction> Directions => mount.Directions;

    public override bool IsDiagonal => mount.IsDiagonal;

    public override bool IsTwoPort => mount.IsTwoPort;

    public override void FillStiffness(FrequencyAxis axis, int tile, Span<double> stiffness)
    {
        mount.FillStiffness(axis, tile, stiffness);
        for (int entry = 0; entry < Order * Order; entry++)
        {
            double factor = 1 + 0.5 * share * (Counts(entry / Order) + Counts(entry % Order));
            Span<double> numbers = stiffness.Slice(entry * Tiling.EntryLength, Tiling.EntryLength);
            foreach (ref double number in lossOnly ? numbers[Tiling.Lanes..] : numbers)
            {
                number *= factor;
            }
        }
    }

    private int Counts(int row) => Directions[row % Directions.Count] == direction ? 1 : 0;
}
