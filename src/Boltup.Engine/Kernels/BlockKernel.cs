using System.Runtime.CompilerServices;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Kernels;

/// <summary>
/// The one hot loop of all products and eliminations: C ∓= Σₖ M[r, k]·X[k, c] for a block of 4 or 2 rows and 2 or 1 columns of complex
/// numbers whose sums stay in registers.
/// </summary>
/// <remarks>
/// Pointers address the lanes of one register inside an entry; an entry is 8 real, then 8 imaginary parts. Rows of M and C are given by
/// pointers to their first entry, rows of X by offsets from a base, so that exchanged rows cost nothing. Lanes never mix. Rounding: a
/// sum of K products is as accurate as any order of summation, K·ε relative to Σ|M||X|.
/// </remarks>
internal static unsafe class BlockKernel<T>
    where T : unmanaged, ILanes<T>
{
    private const int Entry = Tiling.EntryLength;
    private const int Imaginary = Tiling.Lanes;

    /// <summary>Two columns of C −= M·X for 4 rows.</summary>
    /// <param name="m">Four pointers to M[r, k₀].</param>
    /// <param name="c">Four pointers to C[r, c].</param>
    /// <param name="x">Base of X, at the column.</param>
    /// <param name="offsets">For each k from k₀ the offset of row k of X, in doubles.</param>
    public static void Subtract4x2(double** m, double** c, double* x, long* offsets, int count)
    {
        double* m0 = m[0], m1 = m[1], m2 = m[2], m3 = m[3];
        double* c0 = c[0], c1 = c[1], c2 = c[2], c3 = c[3];
        T r00 = T.Load(c0), i00 = T.Load(c0 + Imaginary), r01 = T.Load(c0 + Entry), i01 = T.Load(c0 + Entry + Imaginary);
        T r10 = T.Load(c1), i10 = T.Load(c1 + Imaginary), r11 = T.Load(c1 + Entry), i11 = T.Load(c1 + Entry + Imaginary);
        T r20 = T.Load(c2), i20 = T.Load(c2 + Imaginary), r21 = T.Load(c2 + Entry), i21 = T.Load(c2 + Entry + Imaginary);
        T r30 = T.Load(c3), i30 = T.Load(c3 + Imaginary), r31 = T.Load(c3 + Entry), i31 = T.Load(c3 + Entry + Imaginary);
        for (int k = 0; k < count; k++)
        {
            double* row = x + offsets[k];
            T xr0 = T.Load(row), xi0 = T.Load(row + Imaginary);
            T xr1 = T.Load(row + Entry), xi1 = T.Load(row + Entry + Imaginary);
            nint at = (nint)k * Entry;
            T ar = T.Load(m0 + at), ai = T.Load(m0 + at + Imaginary);
            Subtract(ref r00, ref i00, ar, ai, xr0, xi0);
            Subtract(ref r01, ref i01, ar, ai, xr1, xi1);
            (ar, ai) = (T.Load(m1 + at), T.Load(m1 + at + Imaginary));
            Subtract(ref r10, ref i10, ar, ai, xr0, xi0);
            Subtract(ref r11, ref i11, ar, ai, xr1, xi1);
            (ar, ai) = (T.Load(m2 + at), T.Load(m2 + at + Imaginary));
            Subtract(ref r20, ref i20, ar, ai, xr0, xi0);
            Subtract(ref r21, ref i21, ar, ai, xr1, xi1);
            (ar, ai) = (T.Load(m3 + at), T.Load(m3 + at + Imaginary));
            Subtract(ref r30, ref i30, ar, ai, xr0, xi0);
            Subtract(ref r31, ref i31, ar, ai, xr1, xi1);
        }

        Store(c0, r00, i00);
        Store(c0 + Entry, r01, i01);
        Store(c1, r10, i10);
        Store(c1 + Entry, r11, i11);
        Store(c2, r20, i20);
        Store(c2 + Entry, r21, i21);
        Store(c3, r30, i30);
        Store(c3 + Entry, r31, i31);
    }

    /// <summary>Two columns of C −= M·X for 2 rows.</summary>
    public static void Subtract2x2(double** m, double** c, double* x, long* offsets, int count)
    {
        double* m0 = m[0], m1 = m[1], c0 = c[0], c1 = c[1];
        T r00 = T.Load(c0), i00 = T.Load(c0 + Imaginary), r01 = T.Load(c0 + Entry), i01 = T.Load(c0 + Entry + Imaginary);
        T r10 = T.Load(c1), i10 = T.Load(c1 + Imaginary), r11 = T.Load(c1 + Entry), i11 = T.Load(c1 + Entry + Imaginary);
        for (int k = 0; k < count; k++)
        {
            double* row = x + offsets[k];
            T xr0 = T.Load(row), xi0 = T.Load(row + Imaginary);
            T xr1 = T.Load(row + Entry), xi1 = T.Load(row + Entry + Imaginary);
            nint at = (nint)k * Entry;
            T ar = T.Load(m0 + at), ai = T.Load(m0 + at + Imaginary);
            Subtract(ref r00, ref i00, ar, ai, xr0, xi0);
            Subtract(ref r01, ref i01, ar, ai, xr1, xi1);
            (ar, ai) = (T.Load(m1 + at), T.Load(m1 + at + Imaginary));
            Subtract(ref r10, ref i10, ar, ai, xr0, xi0);
            Subtract(ref r11, ref i11, ar, ai, xr1, xi1);
        }

        Store(c0, r00, i00);
        Store(c0 + Entry, r01, i01);
        Store(c1, r10, i10);
        Store(c1 + Entry, r11, i11);
    }

    /// <summary>One column of C −= M·X for 4 rows.</summary>
    public static void Subtract4x1(double** m, double** c, double* x, long* offsets, int count)
    {
        double* m0 = m[0], m1 = m[1], m2 = m[2], m3 = m[3];
        T r0 = T.Load(c[0]), i0 = T.Load(c[0] + Imaginary);
        T r1 = T.Load(c[1]), i1 = T.Load(c[1] + Imaginary);
        T r2 = T.Load(c[2]), i2 = T.Load(c[2] + Imaginary);
        T r3 = T.Load(c[3]), i3 = T.Load(c[3] + Imaginary);
        for (int k = 0; k < count; k++)
        {
            double* row = x + offsets[k];
            T xr = T.Load(row), xi = T.Load(row + Imaginary);
            nint at = (nint)k * Entry;
            Subtract(ref r0, ref i0, T.Load(m0 + at), T.Load(m0 + at + Imaginary), xr, xi);
            Subtract(ref r1, ref i1, T.Load(m1 + at), T.Load(m1 + at + Imaginary), xr, xi);
            Subtract(ref r2, ref i2, T.Load(m2 + at), T.Load(m2 + at + Imaginary), xr, xi);
            Subtract(ref r3, ref i3, T.Load(m3 + at), T.Load(m3 + at + Imaginary), xr, xi);
        }

        Store(c[0], r0, i0);
        Store(c[1], r1, i1);
        Store(c[2], r2, i2);
        Store(c[3], r3, i3);
    }

    /// <summary>One column of C −= M·X for 1 row.</summary>
    public static void Subtract1x1(double* m, double* c, double* x, long* offsets, int count)
    {
        T r = T.Load(c), i = T.Load(c + Imaginary);
        for (int k = 0; k < count; k++)
        {
            double* row = x + offsets[k];
            double* a = m + (nint)k * Entry;
            Subtract(ref r, ref i, T.Load(a), T.Load(a + Imaginary), T.Load(row), T.Load(row + Imaginary));
        }

        Store(c, r, i);
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static void Store(double* target, T real, T imaginary)
    {
        T.Store(real, target);
        T.Store(imaginary, target + Imaginary);
    }

    /// <summary>(r + ji) −= (ar + j·ai)·(xr + j·xi).</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static void Subtract(ref T r, ref T i, T ar, T ai, T xr, T xi)
    {
        r = T.MultiplySubtract(ar, xr, r);
        i = T.MultiplySubtract(ar, xi, i);
        r = T.MultiplyAdd(ai, xi, r);
        i = T.MultiplySubtract(ai, xr, i);
    }
}
