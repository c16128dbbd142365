namespace Boltup.Engine.Evidence;

/// <summary>Something done to channels of a fit so that they agree: multiplied by a factor, exchanged, or left out.</summary>
/// <param name="Other">The second channel of an exchange, otherwise −1.</param>
/// <param name="Factor">What the spectrum is multiplied by; 1 for an exchange, 0 for a channel that is left out.</param>
internal readonly record struct ChannelCorrection(int Channel, int Other, double Factor)
{
    public bool IsSwap => Other >= 0;

    public bool IsLeftOut => !IsSwap && Factor == 0;

    public static ChannelCorrection Scale(int channel, double factor) => new(channel, -1, factor);

    public static ChannelCorrection Swap(int first, int second) => new(Math.Min(first, second), Math.Max(first, second), 1);

    public static ChannelCorrection LeaveOut(int channel) => new(channel, -1, 0);

    public bool Touches(int channel) => Channel == channel || Other == channel;
}
