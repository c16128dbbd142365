namespace Boltup.Reports.Pictures;

/// <summary>A tick of an axis; minor ones have no label.</summary>
public readonly record struct AxisTick(double At, string Label)
{
    public bool IsMajor => Label.Length > 0;
}
