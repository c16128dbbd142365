namespace Boltup.Reports.Pictures;

/// <summary>A colour of a picture, 8 bits per channel (sRGB).</summary>
public readonly record struct Rgb(byte Red, byte Green, byte Blue)
{
    /// <summary>Relative luminance (WCAG 2.2).</summary>
    public double Luminance => 0.2126 * Linear(Red) + 0.7152 * Linear(Green) + 0.0722 * Linear(Blue);

    /// <summary>Contrast ratio with another colour, 1 to 21 (WCAG 2.2).</summary>
    public double ContrastWith(Rgb other)
    {
        (double lighter, double darker) = Luminance > other.Luminance ? (Luminance, other.Luminance) : (other.Luminance, Luminance);
        return (lighter + 0.05) / (darker + 0.05);
    }

    /// <summary>The linear light of a channel value, 0 to 1.</summary>
    internal static double Linear(byte channel)
    {
        double value = channel / 255.0;
        return value <= 0.04045 ? value / 12.92 : Math.Pow((value + 0.055) / 1.055, 2.4);
    }
}
