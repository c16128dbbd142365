using System.Globalization;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>Up to which frequency two levels agree within a limit, without a break from the lowest line.</summary>
/// <param name="UpToHz">The last line of the unbroken agreement; null when the first line is off already.</param>
public sealed record AgreementLimit(double LimitDb, double? UpToHz)
{
    /// <summary>Follows differences in dB from the lowest line; a line that is no number breaks the agreement.</summary>
    public static AgreementLimit Find(FrequencyAxis axis, IReadOnlyList<double> differenceDb, double limitDb)
    {
        int agreed = 0;
        while (agreed < axis.Count && Math.Abs(differenceDb[agreed]) <= limitDb)
        {
            agreed++;
        }

        return new AgreementLimit(limitDb, agreed == 0 ? null : axis[agreed - 1]);
    }

    public override string ToString() => UpToHz is { } end
        ? string.Create(CultureInfo.InvariantCulture, $"within {LimitDb:G3} dB up to {end:G6} Hz")
        : string.Create(CultureInfo.InvariantCulture, $"within {LimitDb:G3} dB nowhere from the lowest line on");
}
