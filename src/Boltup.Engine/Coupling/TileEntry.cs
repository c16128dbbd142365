using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Coupling;

/// <summary>Small operations on single entries of a tile.</summary>
internal static class TileEntry
{
    /// <summary>target[to] += factor · source[from], for entries of <see cref="Tiling.EntryLength"/> numbers.</summary>
    public static void AddScaled(Span<double> target, int to, ReadOnlySpan<double> source, int from, double factor)
    {
        Span<double> sum = target.Slice(to * Tiling.EntryLength, Tiling.EntryLength);
        ReadOnlySpan<double> term = source.Slice(from * Tiling.EntryLength, Tiling.EntryLength);
        for (int i = 0; i < Tiling.EntryLength; i++)
        {
            sum[i] += factor * term[i];
        }
    }

    /// <summary>Writes the unit matrix.</summary>
    public static void FillIdentity(Span<double> target, int order)
    {
        target.Clear();
        for (int i = 0; i < order; i++)
        {
            target.Slice(i * (order + 1) * Tiling.EntryLength, Tiling.Lanes).Fill(1);
        }
    }

    /// <summary>Writes the reciprocals of the diagonal of a matrix to the diagonal of another.</summary>
    public static void InvertDiagonal(ReadOnlySpan<double> source, Span<double> target, int order)
    {
        for (int i = 0; i < order; i++)
        {
            int at = i * (order + 1) * Tiling.EntryLength;
            for (int lane = 0; lane < Tiling.Lanes; lane++)
            {
                Complex inverse = Complex.Reciprocal(new Complex(source[at + lane], source[at + Tiling.Lanes + lane]));
                target[at + lane] = inverse.Real;
                target[at + Tiling.Lanes + lane] = inverse.Imaginary;
            }
        }
    }
}
