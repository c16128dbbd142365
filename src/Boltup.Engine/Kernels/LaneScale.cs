using Boltup.Engine.Spectra;

namespace Boltup.Engine.Kernels;

/// <summary>A power of two per lane that brings the largest part of a matrix near one, so that squares neither overflow nor vanish.</summary>
internal static unsafe class LaneScale
{
    /// <summary>Smallest exponent that is undone; its inverse is still a number.</summary>
    private const int MinExponent = -1000;

    /// <param name="lanes">Receives the factors of one register; 1 for a matrix of zeros or with an infinite part.</param>
    public static void Of<T>(double* tile, int entries, double* lanes)
        where T : unmanaged, ILanes<T>
    {
        T real = default, imaginary = default;
        for (double* at = tile; at < tile + (nint)entries * Tiling.EntryLength; at += Tiling.EntryLength)
        {
            T r = T.Abs(T.Load(at)), i = T.Abs(T.Load(at + Tiling.Lanes));
            real = T.Select(T.GreaterThan(r, real), r, real);
            imaginary = T.Select(T.GreaterThan(i, imaginary), i, imaginary);
        }

        T.Store(T.Select(T.GreaterThan(real, imaginary), real, imaginary), lanes);
        for (int lane = 0; lane < T.Count; lane++)
        {
            lanes[lane] = For(lanes[lane]);
        }
    }

    /// <summary>The factor for a matrix whose largest part has this size.</summary>
    public static double For(double largest) =>
        largest > 0 && double.IsFinite(largest) ? Math.ScaleB(1, -Math.Max(Math.ILogB(largest), MinExponent)) : 1;
}
