using System.Runtime.CompilerServices;
using System.Runtime.Intrinsics;
using System.Runtime.Intrinsics.X86;

namespace Boltup.Engine.Kernels;

/// <summary>A whole tile in one register: AVX-512.</summary>
internal readonly unsafe struct Lanes512(Vector512<double> value) : ILanes<Lanes512>
{
    private readonly Vector512<double> _value = value;

    public static int Count => Vector512<double>.Count;

    public static bool HasManyRegisters => true;

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes512 Load(double* source) => new(Vector512.Load(source));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static void Store(Lanes512 value, double* target) => value._value.Store(target);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes512 Broadcast(double value) => new(Vector512.Create(value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes512 operator +(Lanes512 a, Lanes512 b) => new(a._value + b._value);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes512 operator -(Lanes512 a, Lanes512 b) => new(a._value - b._value);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes512 operator *(Lanes512 a, Lanes512 b) => new(a._value * b._value);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes512 operator /(Lanes512 a, Lanes512 b) => new(a._value / b._value);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes512 MultiplyAdd(Lanes512 a, Lanes512 b, Lanes512 c) => new(Avx512F.FusedMultiplyAdd(a._value, b._value, c._value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes512 MultiplySubtract(Lanes512 a, Lanes512 b, Lanes512 c) => new(Avx512F.FusedMultiplyAddNegated(a._value, b._value, c._value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes512 Abs(Lanes512 a) => new(Vector512.Abs(a._value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes512 Sqrt(Lanes512 a) => new(Vector512.Sqrt(a._value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes512 GreaterThan(Lanes512 a, Lanes512 b) => new(Vector512.GreaterThan(a._value, b._value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes512 Select(Lanes512 mask, Lanes512 a, Lanes512 b) => new(Vector512.ConditionalSelect(mask._value, a._value, b._value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static uint Bits(Lanes512 mask) => (uint)Vector512.ExtractMostSignificantBits(mask._value);

    public static Lanes512 MaskOf(uint bits)
    {
        Span<long> mask = stackalloc long[Vector512<long>.Count];
        for (int lane = 0; lane < mask.Length; lane++)
        {
            mask[lane] = -(bits >> lane & 1);
        }

        return new(Vector512.Create<long>(mask).AsDouble());
    }
}
