using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Kernels;

/// <summary>
/// The reference: Householder QR (Golub, Van Loan, Matrix Computations, section 5.2), one lane after the other. Defines what the vector
/// bodies must give up to rounding.
/// </summary>
internal sealed unsafe class ScalarQr : QrKernel
{
    private readonly HouseholderQr[] _lanes = [.. Enumerable.Range(0, Tiling.Lanes).Select(_ => new HouseholderQr())];
    private int _rows;
    private int _columns;

    public override void Factor(double* tile, int rows, int columns)
    {
        (_rows, _columns) = (rows, columns);
        DeficientLanes = 0;
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            _lanes[lane].Factor(LaneMatrix.Read(tile + lane, rows, columns));
            DeficientLanes |= _lanes[lane].HasFullRank ? (byte)0 : (byte)(1 << lane);
        }
    }

    public override void Solve(double* rightSides, int count, double* solution)
    {
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            Complex[,] b = LaneMatrix.Read(rightSides + lane, _rows, count);
            _lanes[lane].Transform(b);
            _lanes[lane].SolveTriangle(b);
            LaneMatrix.Write(b, _columns, solution + lane);
        }
    }
}
