using System.Runtime.CompilerServices;
using System.Runtime.Intrinsics;
using System.Runtime.Intrinsics.X86;

namespace Boltup.Engine.Kernels;

/// <summary>Half a tile in one register: AVX2 with FMA.</summary>
internal readonly unsafe struct Lanes256(Vector256<double> value) : ILanes<Lanes256>
{
    private readonly Vector256<double> _value = value;

    public static int Count => Vector256<double>.Count;

    public static bool HasManyRegisters => false;

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes256 Load(double* source) => new(Vector256.Load(source));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static void Store(Lanes256 value, double* target) => value._value.Store(target);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes256 Broadcast(double value) => new(Vector256.Create(value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes256 operator +(Lanes256 a, Lanes256 b) => new(a._value + b._value);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes256 operator -(Lanes256 a, Lanes256 b) => new(a._value - b._value);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes256 operator *(Lanes256 a, Lanes256 b) => new(a._value * b._value);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes256 operator /(Lanes256 a, Lanes256 b) => new(a._value / b._value);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes256 MultiplyAdd(Lanes256 a, Lanes256 b, Lanes256 c) => new(Fma.MultiplyAdd(a._value, b._value, c._value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes256 MultiplySubtract(Lanes256 a, Lanes256 b, Lanes256 c) => new(Fma.MultiplyAddNegated(a._value, b._value, c._value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes256 Abs(Lanes256 a) => new(Vector256.Abs(a._value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes256 Sqrt(Lanes256 a) => new(Vector256.Sqrt(a._value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes256 GreaterThan(Lanes256 a, Lanes256 b) => new(Vector256.GreaterThan(a._value, b._value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes256 Select(Lanes256 mask, Lanes256 a, Lanes256 b) => new(Vector256.ConditionalSelect(mask._value, a._value, b._value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static uint Bits(Lanes256 mask) => (uint)Vector256.ExtractMostSignificantBits(mask._value);

    public static Lanes256 MaskOf(uint bits)
    {
        Span<long> mask = stackalloc long[Vector256<long>.Count];
        for (int lane = 0; lane < mask.Length; lane++)
        {
            mask[lane] = -(bits >> lane & 1);
        }

        return new(Vector256.Create<long>(mask).AsDouble());
    }
}
