using System.Globalization;

namespace Boltup.Reports.Results;

/// <summary>Differences in dB as people read them: with a sign, and zero without one.</summary>
public static class SignedText
{
    /// <summary>Such as <c>+1.2</c>, <c>−0.3</c>, <c>0.0</c>; a dash where there is no number.</summary>
    public static string Of(double value, int decimals)
    {
        double rounded = Math.Round(value, decimals);
        string digits = Math.Abs(rounded).ToString($"F{decimals}", CultureInfo.InvariantCulture);
        return !double.IsFinite(value) ? "–" : rounded > 0 ? $"+{digits}" : rounded < 0 ? $"−{digits}" : digits;
    }
}
