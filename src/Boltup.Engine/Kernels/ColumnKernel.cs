using System.Runtime.CompilerServices;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Kernels;

/// <summary>
/// What orthogonal factorisations do with columns whose entries lie one after the other: products vᴴa, a ∓= v·f, reflections.
/// </summary>
/// <remarks>Pointers address the lanes of one register inside an entry; an entry is 8 real, then 8 imaginary parts. Lanes never mix.</remarks>
internal static unsafe class ColumnKernel<T>
    where T : unmanaged, ILanes<T>
{
    private const int Entry = Tiling.EntryLength;
    private const int Imaginary = Tiling.Lanes;

    /// <summary>Σ conj(v)·a.</summary>
    public static void Dot(double* v, double* a, int rows, out T real, out T imaginary)
    {
        T r = default, i = default;
        for (nint at = 0; at < (nint)rows * Entry; at += Entry)
        {
            AddDot(ref r, ref i, T.Load(v + at), T.Load(v + at + Imaginary), a + at);
        }

        (real, imaginary) = (r, i);
    }

    /// <summary>Σ |v|².</summary>
    public static T SquaredNorm(double* v, int rows)
    {
        T sum = default;
        for (nint at = 0; at < (nint)rows * Entry; at += Entry)
        {
            T r = T.Load(v + at), i = T.Load(v + at + Imaginary);
            sum = T.MultiplyAdd(i, i, T.MultiplyAdd(r, r, sum));
        }

        return sum;
    }

    /// <summary>pᴴp, qᴴq and pᴴq in one pass, in eight sums that do not wait for each other.</summary>
    public static void Gram(double* p, double* q, int rows, out T pp, out T qq, out T real, out T imaginary)
    {
        T pp0 = default, pp1 = default, qq0 = default, qq1 = default, r0 = default, r1 = default, i0 = default, i1 = default;
        for (nint at = 0; at < (nint)rows * Entry; at += Entry)
        {
            T pr = T.Load(p + at), pi = T.Load(p + at + Imaginary), qr = T.Load(q + at), qi = T.Load(q + at + Imaginary);
            pp0 = T.MultiplyAdd(pr, pr, pp0);
            pp1 = T.MultiplyAdd(pi, pi, pp1);
            qq0 = T.MultiplyAdd(qr, qr, qq0);
            qq1 = T.MultiplyAdd(qi, qi, qq1);
            r0 = T.MultiplyAdd(pr, qr, r0);
            r1 = T.MultiplyAdd(pi, qi, r1);
            i0 = T.MultiplyAdd(pr, qi, i0);
            i1 = T.MultiplySubtract(pi, qr, i1);
        }

        (pp, qq, real, imaginary) = (pp0 + pp1, qq0 + qq1, r0 + r1, i0 + i1);
    }

    /// <summary>a −= v·(real + j·imaginary).</summary>
    public static void Subtract(double* v, T real, T imaginary, double* a, int rows)
    {
        for (nint at = 0; at < (nint)rows * Entry; at += Entry)
        {
            SubtractScaled(T.Load(v + at), T.Load(v + at + Imaginary), real, imaginary, a + at);
        }
    }

    /// <summary>a −= factor·v·(vᴴa) for some columns, four at a time so that v is loaded once.</summary>
    /// <param name="stride">Doubles from one column to the next.</param>
    public static void Reflect(double* v, T factor, double* a, nint stride, int count, int rows)
    {
        int column = 0;
        for (; column + 4 <= count; column += 4)
        {
            Reflect4(v, factor, a + column * stride, stride, rows);
        }

        for (; column < count; column++)
        {
            double* target = a + column * stride;
            Dot(v, target, rows, out T r, out T i);
            Subtract(v, r * factor, i * factor, target, rows);
        }
    }

    private static void Reflect4(double* v, T factor, double* a, nint stride, int rows)
    {
        T r0 = default, i0 = default, r1 = default, i1 = default, r2 = default, i2 = default, r3 = default, i3 = default;
        double* a1 = a + stride, a2 = a1 + stride, a3 = a2 + stride;
        nint end = (nint)rows * Entry;
        for (nint at = 0; at < end; at += Entry)
        {
            T vr = T.Load(v + at), vi = T.Load(v + at + Imaginary);
            AddDot(ref r0, ref i0, vr, vi, a + at);
            AddDot(ref r1, ref i1, vr, vi, a1 + at);
            AddDot(ref r2, ref i2, vr, vi, a2 + at);
            AddDot(ref r3, ref i3, vr, vi, a3 + at);
        }

        (r0, i0, r1, i1) = (r0 * factor, i0 * factor, r1 * factor, i1 * factor);
        (r2, i2, r3, i3) = (r2 * factor, i2 * factor, r3 * factor, i3 * factor);
        for (nint at = 0; at < end; at += Entry)
        {
            T vr = T.Load(v + at), vi = T.Load(v + at + Imaginary);
            SubtractScaled(vr, vi, r0, i0, a + at);
            SubtractScaled(vr, vi, r1, i1, a1 + at);
            SubtractScaled(vr, vi, r2, i2, a2 + at);
            SubtractScaled(vr, vi, r3, i3, a3 + at);
        }
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static void AddDot(ref T r, ref T i, T vr, T vi, double* a)
    {
        T ar = T.Load(a), ai = T.Load(a + Imaginary);
        r = T.MultiplyAdd(vr, ar, r);
        i = T.MultiplyAdd(vr, ai, i);
        r = T.MultiplyAdd(vi, ai, r);
        i = T.MultiplySubtract(vi, ar, i);
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static void SubtractScaled(T vr, T vi, T fr, T fi, double* a)
    {
        T r = T.Load(a), i = T.Load(a + Imaginary);
        BlockKernel<T>.Subtract(ref r, ref i, vr, vi, fr, fi);
        BlockKernel<T>.Store(a, r, i);
    }
}
