namespace Boltup.Engine.Kernels;

/// <summary>
/// A SIMD register of doubles, one frequency line per lane. Kernels are written once against it, and the JIT makes one body per width.
/// </summary>
internal unsafe interface ILanes<TSelf>
    where TSelf : unmanaged, ILanes<TSelf>
{
    /// <summary>Lanes in a register.</summary>
    static abstract int Count { get; }

    /// <summary>Whether the machine has 32 registers, so that 4×2 complex accumulators fit.</summary>
    static abstract bool HasManyRegisters { get; }

    static abstract TSelf Load(double* source);

    static abstract void Store(TSelf value, double* target);

    static abstract TSelf Broadcast(double value);

    static abstract TSelf operator +(TSelf a, TSelf b);

    static abstract TSelf operator -(TSelf a, TSelf b);

    static abstract TSelf operator *(TSelf a, TSelf b);

    static abstract TSelf operator /(TSelf a, TSelf b);

    /// <summary>a·b + c, rounded once where the machine can.</summary>
    static abstract TSelf MultiplyAdd(TSelf a, TSelf b, TSelf c);

    /// <summary>c − a·b, rounded once where the machine can.</summary>
    static abstract TSelf MultiplySubtract(TSelf a, TSelf b, TSelf c);

    static abstract TSelf Abs(TSelf a);

    static abstract TSelf Sqrt(TSelf a);

    /// <summary>All bits of a lane set where a &gt; b; clear where either is NaN.</summary>
    static abstract TSelf GreaterThan(TSelf a, TSelf b);

    /// <summary>Lanes of a where the mask is set, of b elsewhere.</summary>
    static abstract TSelf Select(TSelf mask, TSelf a, TSelf b);

    /// <summary>One bit per lane of a mask.</summary>
    static abstract uint Bits(TSelf mask);

    /// <summary>The mask whose lanes are set as the bits are.</summary>
    static abstract TSelf MaskOf(uint bits);
}
