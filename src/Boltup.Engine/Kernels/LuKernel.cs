namespace Boltup.Engine.Kernels;

/// <summary>What a body of the LU kernel offers to <see cref="BatchLu"/>: all pointers are tiles as <see cref="Spectra.Tiling"/> says.</summary>
internal abstract unsafe class LuKernel
{
    /// <summary>One bit per lane whose matrix has no usable pivot at some step.</summary>
    public byte SingularLanes { get; protected set; }

    /// <summary>Factors P·A = L·U; the input is not changed.</summary>
    public abstract void Factor(double* tile, int order);

    /// <summary>Replaces B by A⁻¹B.</summary>
    public abstract void Solve(double* tile, int columns);

    /// <summary>Replaces B by A⁻ᵀB (plain transpose).</summary>
    public abstract void SolveTransposed(double* tile, int columns);

    /// <summary>The body of a variant, with room for matrices up to an order.</summary>
    public static LuKernel Create(KernelVariant variant, int maxOrder) => variant switch
    {
        KernelVariant.Vector512 => new VectorLu<Lanes512>(maxOrder),
        KernelVariant.Vector256 => new VectorLu<Lanes256>(maxOrder),
        KernelVariant.Vector128 => new VectorLu<Lanes128>(maxOrder),
        _ => new ScalarLu(maxOrder),
    };
}
