namespace Boltup.Engine.Kernels;

/// <summary>What a body of the SVD kernel offers to <see cref="BatchSvd"/>: A = U·Σ·Vᴴ with columns in no order, the same for all three.</summary>
internal abstract unsafe class SvdKernel
{
    /// <summary>Sweeps after which the rotations stop in any case; 6 to 9 are usual at the orders of interfaces.</summary>
    protected const int MaxSweeps = 40;

    /// <summary>Factors a tile and writes the singular values: columns × 8 lanes.</summary>
    public abstract void Factor(double* tile, int rows, int columns, double* singularValues);

    /// <summary>Writes Uᴴ·B.</summary>
    /// <param name="rightSides">rows × count entries; not changed.</param>
    /// <param name="coefficients">columns × count entries.</param>
    public abstract void Project(double* rightSides, int count, double* coefficients);

    /// <summary>Writes V·diag(gains)·C.</summary>
    /// <param name="gains">columns × 8 lanes.</param>
    /// <param name="coefficients">columns × count entries; not changed.</param>
    /// <param name="result">columns × count entries.</param>
    public abstract void Combine(double* gains, double* coefficients, int count, double* result);

    /// <summary>The body of a variant, with room for matrices up to a size.</summary>
    public static SvdKernel Create(KernelVariant variant, int maxRows, int maxColumns) => variant switch
    {
        KernelVariant.Vector512 => new VectorSvd<Lanes512>(maxRows, maxColumns),
        KernelVariant.Vector256 => new VectorSvd<Lanes256>(maxRows, maxColumns),
        KernelVariant.Vector128 => new VectorSvd<Lanes128>(maxRows, maxColumns),
        _ => new ScalarSvd(),
    };

    /// <summary>Cosine of the angle between two columns, squared, below which they count as orthogonal.</summary>
    protected static double OrthogonalityLimit(int columns) => Math.Pow(columns * Math.ScaleB(1, -52), 2);
}
