using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Kernels;

/// <summary>
/// The reference: one-sided Jacobi on Rᴴ after a Householder QR, one lane after the other. Defines what the vector bodies must give up
/// to rounding and the phases of the singular vectors.
/// </summary>
internal sealed unsafe class ScalarSvd : SvdKernel
{
    private readonly JacobiSvd[] _lanes = [.. Enumerable.Range(0, Tiling.Lanes).Select(_ => new JacobiSvd())];
    private int _rows;
    private int _columns;

    public override void Factor(double* tile, int rows, int columns, double* singularValues)
    {
        (_rows, _columns) = (rows, columns);
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            _lanes[lane].Factor(LaneMatrix.Read(tile + lane, rows, columns), MaxSweeps, OrthogonalityLimit(columns));
            for (int i = 0; i < columns; i++)
            {
                singularValues[i * Tiling.Lanes + lane] = _lanes[lane].SingularValues[i];
            }
        }
    }

    public override void Project(double* rightSides, int count, double* coefficients)
    {
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            Complex[,] projected = _lanes[lane].Project(LaneMatrix.Read(rightSides + lane, _rows, count));
            LaneMatrix.Write(projected, _columns, coefficients + lane);
        }
    }

    public override void Combine(double* gains, double* coefficients, int count, double* result)
    {
        for (int lane = 0; lane < Tiling.Lanes; lane++)
        {
            Complex[,] scaled = LaneMatrix.Read(coefficients + lane, _columns, count);
            for (int i = 0; i < scaled.Length; i++)
            {
                scaled[i / count, i % count] *= gains[i / count * Tiling.Lanes + lane];
            }

            LaneMatrix.Write(_lanes[lane].Combine(scaled), _columns, result + lane);
        }
    }
}
