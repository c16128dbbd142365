namespace Boltup.Engine.Comparing;

/// <summary>A level before and after.</summary>
/// <param name="BasePower">Mean square before, in the unit of the response squared.</param>
/// <param name="ChangedPower">Mean square after.</param>
public sealed record LevelChange(double BasePower, double ChangedPower)
{
    /// <summary>The difference in dB; 0 between silence and silence, NaN where a level is not known.</summary>
    public double Decibels => BasePower == 0 && ChangedPower == 0 ? 0 : 10 * Math.Log10(ChangedPower / BasePower);
}
