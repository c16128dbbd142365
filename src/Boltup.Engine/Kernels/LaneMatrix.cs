using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Kernels;

/// <summary>One lane of a tile as a plain matrix, for the reference kernels.</summary>
internal static unsafe class LaneMatrix
{
    /// <param name="lane">First entry of the tile, at the lane.</param>
    public static Complex[,] Read(double* lane, int rows, int columns)
    {
        var matrix = new Complex[rows, columns];
        for (int i = 0; i < rows * columns; i++)
        {
            double* entry = lane + i * Tiling.EntryLength;
            matrix[i / columns, i % columns] = new Complex(entry[0], entry[Tiling.Lanes]);
        }

        return matrix;
    }

    /// <summary>Writes the first rows of a matrix.</summary>
    public static void Write(Complex[,] matrix, int rows, double* lane)
    {
        int columns = matrix.GetLength(1);
        for (int i = 0; i < rows * columns; i++)
        {
            double* entry = lane + i * Tiling.EntryLength;
            Complex value = matrix[i / columns, i % columns];
            (entry[0], entry[Tiling.Lanes]) = (value.Real, value.Imaginary);
        }
    }
}
