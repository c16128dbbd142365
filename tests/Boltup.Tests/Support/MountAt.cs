using System.Numerics;
using Boltup.Engine.Mounts;
using Boltup.Engine.Spectra;

namespace Boltup.Tests.Support;

/// <summary>Evaluates mount laws at single frequencies.</summary>
internal static class MountAt
{
    /// <summary>One entry of the stiffness as the coupling takes it.</summary>
    public static Complex Entry(MountLaw mount, double hz, int row = 0, int column = 0)
    {
        var stiffness = new TiledMatrix(1, mount.Order, mount.Order);
        mount.FillStiffness(FrequencyAxis.FromHertz([hz]), 0, stiffness.Tile(0));
        return stiffness[0, row, column];
    }

    public static Complex[,] Matrix(MountLaw mount, double hz)
    {
        var matrix = new Complex[mount.Order, mount.Order];
        for (int i = 0; i < matrix.Length; i++)
        {
            matrix[i / mount.Order, i % mount.Order] = Entry(mount, hz, i / mount.Order, i % mount.Order);
        }

        return matrix;
    }
}
