using System.Globalization;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>A channel whose operational spectrum does not go with the installed FRFs.</summary>
/// <param name="Channel">The channel.</param>
/// <param name="Other">The channel with which it is exchanged; null for other faults.</param>
/// <param name="Factor">Operation over prediction from all other channels, over the band; 1 for a swap, NaN where no factor fits.</param>
/// <param name="EvidenceDb">By how much the misfit of all channels rises when this one correction is undone, in dB of power.</param>
public sealed record ChannelSuspect(ChannelFault Fault, Dof Channel, Dof? Other, double Factor, double EvidenceDb)
{
    /// <summary>What to say about it, without a final stop.</summary>
    public string Describe() => Fault switch
    {
        ChannelFault.Flipped => $"`{Channel}` seems to have the opposite sign",
        ChannelFault.InG => string.Create(
            CultureInfo.InvariantCulture,
            $"{(Math.Abs(Factor) < 1 ? $"`{Channel}`" : $"the installed FRFs of `{Channel}`")} seem{(Math.Abs(Factor) < 1 ? "s" : "")} to be in g where m/s² is stated{(Factor < 0 ? ", with the opposite sign" : "")} (factor {Factor:G3})"),
        ChannelFault.Scaled => string.Create(CultureInfo.InvariantCulture, $"`{Channel}` seems to be scaled by {Factor:G3}"),
        ChannelFault.Swapped => $"`{Channel}` and `{Other}` seem to be exchanged",
        _ => $"`{Channel}` does not go with its FRFs by any factor",
    };
}
