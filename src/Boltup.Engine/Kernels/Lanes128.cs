using System.Runtime.CompilerServices;
using System.Runtime.Intrinsics;
using System.Runtime.Intrinsics.Arm;
namespace Boltup.Engine.Kernels;

/// <summary>A quarter of a tile in one register: any machine with 128-bit vectors, such as Arm.</summary>
internal readonly unsafe struct Lanes128(Vector128<double> value) : ILanes<Lanes128>
{
    private readonly Vector128<double> _value = value;

    public static int Count => Vector128<double>.Count;

    public static bool HasManyRegisters => AdvSimd.IsSupported;

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes128 Load(double* source) => new(Vector128.Load(source));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static void Store(Lanes128 value, double* target) => value._value.Store(target);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes128 Broadcast(double value) => new(Vector128.Create(value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes128 operator +(Lanes128 a, Lanes128 b) => new(a._value + b._value);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes128 operator -(Lanes128 a, Lanes128 b) => new(a._value - b._value);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes128 operator *(Lanes128 a, Lanes128 b) => new(a._value * b._value);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes128 operator /(Lanes128 a, Lanes128 b) => new(a._value / b._value);

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes128 MultiplyAdd(Lanes128 a, Lanes128 b, Lanes128 c) => new(Vector128.MultiplyAddEstimate(a._value, b._value, c._value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes128 MultiplySubtract(Lanes128 a, Lanes128 b, Lanes128 c) => new(Vector128.MultiplyAddEstimate(-a._value, b._value, c._value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes128 Abs(Lanes128 a) => new(Vector128.Abs(a._value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes128 Sqrt(Lanes128 a) => new(Vector128.Sqrt(a._value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes128 GreaterThan(Lanes128 a, Lanes128 b) => new(Vector128.GreaterThan(a._value, b._value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static Lanes128 Select(Lanes128 mask, Lanes128 a, Lanes128 b) => new(Vector128.ConditionalSelect(mask._value, a._value, b._value));

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static uint Bits(Lanes128 mask) => (uint)Vector128.ExtractMostSignificantBits(mask._value);

    public static Lanes128 MaskOf(uint bits)
    {
        Span<long> mask = stackalloc long[Vector128<long>.Count];
        for (int lane = 0; lane < mask.Length; lane++)
        {
            mask[lane] = -(bits >> lane & 1);
        }

        return new(Vector128.Create<long>(mask).AsDouble());
    }
}
