namespace Boltup.Engine.Spectra;

/// <summary>An immutable, strictly increasing list of frequency lines in Hz.</summary>
public sealed class FrequencyAxis
{
    /// <summary>
    /// Relative difference up to which two lines are the same line: six-digit text is off by 5e-6 in the first line and
    /// in the step, on both sides of a comparison.
    /// </summary>
    public const double RelativeTolerance = 2e-5;

    /// <summary>Largest share of the local step that the tolerance may take, so that neighbours never merge.</summary>
    private const double StepShare = 0.1;

    private readonly double[] _hz;

    private FrequencyAxis(double[] hz) => _hz = hz;

    /// <summary>Number of lines.</summary>
    public int Count => _hz.Length;

    /// <summary>Number of tiles of <see cref="Tiling.Lanes"/> lines that hold this axis.</summary>
    public int TileCount => Tiling.TilesFor(Count);

    public double FirstHz => _hz[0];

    public double LastHz => _hz[^1];

    /// <summary>All lines in Hz.</summary>
    public ReadOnlySpan<double> Hz => _hz;

    /// <summary>Frequency of a line in Hz.</summary>
    public double this[int line] => _hz[line];

    /// <summary>Whether neighbouring lines have the same distance, within the tolerance of text.</summary>
    public bool IsEven
    {
        get
        {
            double step = Count > 1 ? (LastHz - FirstHz) / (Count - 1) : 0;
            for (int i = 1; i < Count; i++)
            {
                if (Math.Abs(_hz[i] - (FirstHz + i * step)) > RelativeTolerance * step)
                {
                    return false;
                }
            }

            return true;
        }
    }

    /// <summary>An axis of the given lines.</summary>
    /// <param name="hz">At least one line, finite, not negative, strictly increasing.</param>
    /// <exception cref="ArgumentException">The lines are not such an axis.</exception>
    public static FrequencyAxis FromHertz(ReadOnlySpan<double> hz) =>
        TryFromHertz(hz, out FrequencyAxis? axis)
            ? axis!
            : throw new ArgumentException("frequency lines must be finite, not negative and strictly increasing", nameof(hz));

    /// <summary>An axis of the given lines, or false when they are not finite, not negative and strictly increasing.</summary>
    public static bool TryFromHertz(ReadOnlySpan<double> hz, out FrequencyAxis? axis)
    {
        axis = null;
        if (hz.IsEmpty || !(hz[0] >= 0) || !double.IsFinite(hz[^1]))
        {
            return false;
        }

        for (int i = 1; i < hz.Length; i++)
        {
            if (!(hz[i] > hz[i - 1]))
            {
                return false;
            }
        }

        axis = new FrequencyAxis(hz.ToArray());
        return true;
    }

    /// <summary>
    /// Lines <c>first + i·step</c>. Each is rounded to the decimal that is meant (12 significant digits), so that
    /// 20 Hz + 3·0.1 Hz reads 20.3 and not 20.300000000000001.
    /// </summary>
    public static FrequencyAxis Even(double firstHz, double stepHz, int count)
    {
        ArgumentOutOfRangeException.ThrowIfNegativeOrZero(count);
        var hz = new double[count];
        for (int i = 0; i < count; i++)
        {
            hz[i] = RoundToDigits(firstHz + i * stepHz);
        }

        return FromHertz(hz);
    }

    /// <summary>Angular frequency ω = 2πf of a line in rad/s.</summary>
    public double Omega(int line) => 2 * Math.PI * _hz[line];

    /// <summary>Index of the line that is this frequency within the tolerance, or −1.</summary>
    public int IndexOf(double hz)
    {
        int at = Array.BinarySearch(_hz, hz);
        if (at >= 0)
        {
            return at;
        }

        int above = ~at;
        return IsLine(above - 1, hz) ? above - 1 : IsLine(above, hz) ? above : -1;
    }

    /// <summary>Whether both axes have the same lines within the tolerance.</summary>
    public bool Matches(FrequencyAxis other)
    {
        if (ReferenceEquals(this, other))
        {
            return true;
        }

        if (Count != other.Count)
        {
            return false;
        }

        for (int i = 0; i < Count; i++)
        {
            if (!IsLine(i, other[i]))
            {
                return false;
            }
        }

        return true;
    }

    /// <summary>The lines of this axis that the other has too, or null when there are none.</summary>
    public FrequencyAxis? SharedWith(FrequencyAxis other)
    {
        if (Matches(other))
        {
            return this;
        }

        double[] shared = [.. _hz.Where(hz => other.IndexOf(hz) >= 0)];
        return shared.Length == 0 ? null : new FrequencyAxis(shared);
    }

    /// <summary>The lines within a closed band in Hz (within the tolerance at its ends), or null when there are none.</summary>
    public FrequencyAxis? Within(double fromHz, double toHz)
    {
        double[] kept = [.. _hz.Where(hz => hz >= fromHz * (1 - RelativeTolerance) && hz <= toHz * (1 + RelativeTolerance))];
        return kept.Length == Count ? this : kept.Length == 0 ? null : new FrequencyAxis(kept);
    }

    public override string ToString() => Count == 1
        ? FormattableString.Invariant($"1 line at {FirstHz} Hz")
        : IsEven
            ? FormattableString.Invariant($"{FirstHz} to {LastHz} Hz by {RoundToDigits((LastHz - FirstHz) / (Count - 1))} Hz, {Count} lines")
            : FormattableString.Invariant($"{FirstHz} to {LastHz} Hz, {Count} lines, uneven");

    private static double RoundToDigits(double value)
    {
        if (value == 0)
        {
            return 0;
        }

        int decimals = 11 - (int)Math.Floor(Math.Log10(Math.Abs(value)));
        return decimals is >= 0 and <= 15 ? Math.Round(value, decimals) : value;
    }

    private bool IsLine(int line, double hz)
    {
        if ((uint)line >= (uint)Count)
        {
            return false;
        }

        double step = Math.Min(
            line > 0 ? _hz[line] - _hz[line - 1] : double.PositiveInfinity,
            line + 1 < Count ? _hz[line + 1] - _hz[line] : double.PositiveInfinity);
        return Math.Abs(hz - _hz[line]) <= Math.Min(RelativeTolerance * _hz[line], StepShare * step);
    }
}
