namespace Boltup.Engine.Kernels;

/// <summary>Which body of the batch kernels runs.</summary>
public enum KernelVariant
{
    /// <summary>The readable reference, one line at a time.</summary>
    Scalar,

    /// <summary>128-bit vectors, 2 lines at a time.</summary>
    Vector128,

    /// <summary>AVX2 with FMA, 4 lines at a time.</summary>
    Vector256,

    /// <summary>AVX-512, a whole tile at a time.</summary>
    Vector512,
}
