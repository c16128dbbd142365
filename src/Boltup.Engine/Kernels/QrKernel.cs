namespace Boltup.Engine.Kernels;

/// <summary>What a body of the QR kernel offers to <see cref="BatchQr"/>: all pointers are tiles as <see cref="Spectra.Tiling"/> says.</summary>
internal abstract unsafe class QrKernel
{
    /// <summary>One bit per lane whose triangle has a diagonal entry that is zero to working precision, or no finite number.</summary>
    public byte DeficientLanes { get; protected set; }

    /// <summary>Factors A = Q·R; the input is not changed.</summary>
    public abstract void Factor(double* tile, int rows, int columns);

    /// <summary>Solves min ‖A·X − B‖.</summary>
    /// <param name="rightSides">rows × count entries; not changed.</param>
    /// <param name="solution">columns × count entries.</param>
    public abstract void Solve(double* rightSides, int count, double* solution);

    /// <summary>The body of a variant, with room for matrices up to a size.</summary>
    public static QrKernel Create(KernelVariant variant, int maxRows, int maxColumns) => variant switch
    {
        KernelVariant.Vector512 => new VectorQr<Lanes512>(maxRows, maxColumns),
        KernelVariant.Vector256 => new VectorQr<Lanes256>(maxRows, maxColumns),
        KernelVariant.Vector128 => new VectorQr<Lanes128>(maxRows, maxColumns),
        _ => new ScalarQr(),
    };
}
