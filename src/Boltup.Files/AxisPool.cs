using System.Runtime.InteropServices;
using Boltup.Engine.Spectra;

namespace Boltup.Files;

/// <summary>Makes equal axes one instance, so that comparing them is cheap.</summary>
internal sealed class AxisPool
{
    private readonly Dictionary<int, List<FrequencyAxis>> _byHash = [];
    private FrequencyAxis? _last;

    /// <summary>The one axis with these lines in Hz, or null when they are no axis.</summary>
    public FrequencyAxis? Share(ReadOnlySpan<double> hz)
    {
        if (_last is null || !_last.Hz.SequenceEqual(hz))
        {
            _last = FindOrAdd(hz);
        }

        return _last;
    }

    private FrequencyAxis? FindOrAdd(ReadOnlySpan<double> hz)
    {
        var hash = new HashCode();
        hash.AddBytes(MemoryMarshal.AsBytes(hz));
        int key = hash.ToHashCode();
        if (!_byHash.TryGetValue(key, out List<FrequencyAxis>? alike))
        {
            _byHash.Add(key, alike = []);
        }

        foreach (FrequencyAxis known in alike)
        {
            if (known.Hz.SequenceEqual(hz))
            {
                return known;
            }
        }

        if (FrequencyAxis.TryFromHertz(hz, out FrequencyAxis? axis))
        {
            alike.Add(axis!);
        }

        return axis;
    }
}
