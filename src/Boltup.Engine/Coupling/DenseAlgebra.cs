using MathNet.Numerics;

namespace Boltup.Engine.Coupling;

/// <summary>
/// Dense algebra away from the hot loops goes to MathNet.Numerics, which uses Intel MKL where the user has added its provider
/// (build with BoltupNativeMkl=true), and its managed code everywhere else.
/// </summary>
internal static class DenseAlgebra
{
    private static readonly Lazy<bool> Native = new(Control.TryUseNativeMKL);

    /// <summary>Picks the provider up once; call before dense algebra. Says whether MKL runs.</summary>
    public static bool PickUpProvider() => Native.Value;
}
