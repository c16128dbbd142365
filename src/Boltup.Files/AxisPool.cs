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
        int key = HashOf(hz);
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

    /// <summary>Own code, because the library's generic hash is compiled at start-up, which costs more than the hash.</summary>
    private static int HashOf(ReadOnlySpan<double> hz)
    {
        const ulong oddMultiplier = 0x9E3779B97F4A7C15;
        ulong hash = (ulong)hz.Length;
        foreach (double line in hz)
        {
            hash = (hash ^ BitConverter.DoubleToUInt64Bits(line)) * oddMultiplier;
            hash ^= hash >> 32;
        }

        return (int)hash;
    }
}
