using System.Runtime.Intrinsics;
using System.Runtime.Intrinsics.X86;

namespace Boltup.Engine.Kernels;

/// <summary>Chooses the batch kernels: the widest that the machine has, or what <see cref="Variable"/> asks for.</summary>
public static class KernelChoice
{
    /// <summary>Environment variable that forces a variant: scalar, vector128, vector256 or vector512.</summary>
    public const string Variable = "BOLTUP_KERNELS";

    /// <summary>The variants that this machine can run, slowest first.</summary>
    public static IReadOnlyList<KernelVariant> Available { get; } = [.. Enum.GetValues<KernelVariant>().Where(CanRun)];

    /// <summary>The variant in use.</summary>
    public static KernelVariant Current { get; } = Requested() ?? Available[^1];

    /// <summary>Name of the variant in use, as results record it.</summary>
    public static string Name => NameOf(Current);

    /// <summary>What the environment asks for although this machine cannot run it or no variant is named so; null when all is well.</summary>
    public static string? UnmetRequest
    {
        get
        {
            string? asked = Environment.GetEnvironmentVariable(Variable);
            return string.IsNullOrEmpty(asked) || Requested() is not null ? null : asked;
        }
    }

    public static string NameOf(KernelVariant variant) => variant switch
    {
        KernelVariant.Vector128 => "vector128",
        KernelVariant.Vector256 => "vector256",
        KernelVariant.Vector512 => "vector512",
        _ => "scalar",
    };

    private static KernelVariant? Requested()
    {
        string? asked = Environment.GetEnvironmentVariable(Variable);
        foreach (KernelVariant variant in Available)
        {
            if (NameOf(variant) == asked)
            {
                return variant;
            }
        }

        return null;
    }

    private static bool CanRun(KernelVariant variant) => variant switch
    {
        KernelVariant.Vector128 => Vector128.IsHardwareAccelerated,
        KernelVariant.Vector256 => Vector256.IsHardwareAccelerated && Fma.IsSupported,
        KernelVariant.Vector512 => Vector512.IsHardwareAccelerated && Avx512F.IsSupported,
        _ => true,
    };
}
