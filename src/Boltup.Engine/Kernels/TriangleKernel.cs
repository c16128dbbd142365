using System.Runtime.CompilerServices;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Kernels;

/// <summary>Solves with a diagonal block of 4 rows for two columns that stay in registers.</summary>
/// <remarks>Pointers and lanes as in <see cref="BlockKernel{T}"/>.</remarks>
internal static unsafe class TriangleKernel<T>
    where T : unmanaged, ILanes<T>
{
    private const int Entry = Tiling.EntryLength;
    private const int Imaginary = Tiling.Lanes;

    /// <summary>Two columns of C become L⁻¹C, L the unit lower triangle of the block.</summary>
    /// <param name="m">Four pointers to the rows of the block, at its first column.</param>
    /// <param name="c">Four pointers to C[r, c].</param>
    public static void SolveLower(double** m, double** c)
    {
        double* c0 = c[0], c1 = c[1], c2 = c[2], c3 = c[3];
        T r00 = T.Load(c0), i00 = T.Load(c0 + Imaginary), r01 = T.Load(c0 + Entry), i01 = T.Load(c0 + Entry + Imaginary);
        T r10 = T.Load(c1), i10 = T.Load(c1 + Imaginary), r11 = T.Load(c1 + Entry), i11 = T.Load(c1 + Entry + Imaginary);
        T r20 = T.Load(c2), i20 = T.Load(c2 + Imaginary), r21 = T.Load(c2 + Entry), i21 = T.Load(c2 + Entry + Imaginary);
        T r30 = T.Load(c3), i30 = T.Load(c3 + Imaginary), r31 = T.Load(c3 + Entry), i31 = T.Load(c3 + Entry + Imaginary);
        Eliminate(m[1], ref r10, ref i10, ref r11, ref i11, r00, i00, r01, i01);
        Eliminate(m[2], ref r20, ref i20, ref r21, ref i21, r00, i00, r01, i01);
        Eliminate(m[3], ref r30, ref i30, ref r31, ref i31, r00, i00, r01, i01);
        Eliminate(m[2] + Entry, ref r20, ref i20, ref r21, ref i21, r10, i10, r11, i11);
        Eliminate(m[3] + Entry, ref r30, ref i30, ref r31, ref i31, r10, i10, r11, i11);
        Eliminate(m[3] + 2 * Entry, ref r30, ref i30, ref r31, ref i31, r20, i20, r21, i21);
        Store(c1, r10, i10, r11, i11);
        Store(c2, r20, i20, r21, i21);
        Store(c3, r30, i30, r31, i31);
    }

    /// <summary>Two columns of C become U⁻¹C, U the upper triangle of the block.</summary>
    /// <param name="inverse">Reciprocals of the diagonal of the block.</param>
    public static void SolveUpper(double** m, double** c, double* inverse)
    {
        double* c0 = c[0], c1 = c[1], c2 = c[2], c3 = c[3];
        T r00 = T.Load(c0), i00 = T.Load(c0 + Imaginary), r01 = T.Load(c0 + Entry), i01 = T.Load(c0 + Entry + Imaginary);
        T r10 = T.Load(c1), i10 = T.Load(c1 + Imaginary), r11 = T.Load(c1 + Entry), i11 = T.Load(c1 + Entry + Imaginary);
        T r20 = T.Load(c2), i20 = T.Load(c2 + Imaginary), r21 = T.Load(c2 + Entry), i21 = T.Load(c2 + Entry + Imaginary);
        T r30 = T.Load(c3), i30 = T.Load(c3 + Imaginary), r31 = T.Load(c3 + Entry), i31 = T.Load(c3 + Entry + Imaginary);
        Scale(inverse + 3 * Entry, ref r30, ref i30, ref r31, ref i31);
        Eliminate(m[0] + 3 * Entry, ref r00, ref i00, ref r01, ref i01, r30, i30, r31, i31);
        Eliminate(m[1] + 3 * Entry, ref r10, ref i10, ref r11, ref i11, r30, i30, r31, i31);
        Eliminate(m[2] + 3 * Entry, ref r20, ref i20, ref r21, ref i21, r30, i30, r31, i31);
        Scale(inverse + 2 * Entry, ref r20, ref i20, ref r21, ref i21);
        Eliminate(m[0] + 2 * Entry, ref r00, ref i00, ref r01, ref i01, r20, i20, r21, i21);
        Eliminate(m[1] + 2 * Entry, ref r10, ref i10, ref r11, ref i11, r20, i20, r21, i21);
        Scale(inverse + Entry, ref r10, ref i10, ref r11, ref i11);
        Eliminate(m[0] + Entry, ref r00, ref i00, ref r01, ref i01, r10, i10, r11, i11);
        Scale(inverse, ref r00, ref i00, ref r01, ref i01);
        Store(c0, r00, i00, r01, i01);
        Store(c1, r10, i10, r11, i11);
        Store(c2, r20, i20, r21, i21);
        Store(c3, r30, i30, r31, i31);
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static void Eliminate(double* factor, ref T r0, ref T i0, ref T r1, ref T i1, T xr0, T xi0, T xr1, T xi1)
    {
        T fr = T.Load(factor), fi = T.Load(factor + Imaginary);
        BlockKernel<T>.Subtract(ref r0, ref i0, fr, fi, xr0, xi0);
        BlockKernel<T>.Subtract(ref r1, ref i1, fr, fi, xr1, xi1);
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static void Scale(double* factor, ref T r0, ref T i0, ref T r1, ref T i1)
    {
        T fr = T.Load(factor), fi = T.Load(factor + Imaginary);
        (r0, i0) = (T.MultiplySubtract(i0, fi, r0 * fr), T.MultiplyAdd(r0, fi, i0 * fr));
        (r1, i1) = (T.MultiplySubtract(i1, fi, r1 * fr), T.MultiplyAdd(r1, fi, i1 * fr));
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static void Store(double* target, T r0, T i0, T r1, T i1)
    {
        BlockKernel<T>.Store(target, r0, i0);
        BlockKernel<T>.Store(target + Entry, r1, i1);
    }
}
