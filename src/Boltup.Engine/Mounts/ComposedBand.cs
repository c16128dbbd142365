namespace Boltup.Engine.Mounts;

/// <summary>The band of a mount that is made of others.</summary>
internal static class ComposedBand
{
    /// <summary>Where all of them are known; null when none has a band.</summary>
    public static (double FromHz, double ToHz)? Of(IEnumerable<MountLaw> mounts)
    {
        (double FromHz, double ToHz)[] bands = [.. mounts.Select(mount => mount.Band).OfType<(double, double)>()];
        return bands.Length == 0 ? null : (bands.Max(band => band.FromHz), bands.Min(band => band.ToHz));
    }
}
