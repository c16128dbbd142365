namespace Boltup.Engine.Kernels;

/// <summary>When a matrix counts as rank deficient to working precision.</summary>
internal static class Rank
{
    /// <summary>False when the smallest diagonal entry or singular value is at most rows·ε of the largest, or either is no finite number.</summary>
    public static bool IsFull(double largest, double smallest, int rows) =>
        double.IsFinite(largest) && smallest > rows * Math.ScaleB(1, -52) * largest;
}
