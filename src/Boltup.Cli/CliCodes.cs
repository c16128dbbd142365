using Boltup.Engine.Diagnostics;

namespace Boltup.Cli;

/// <summary>Diagnostics of the command line itself.</summary>
internal static partial class CliCodes
{
    public static readonly DiagnosticCode KernelsNotAvailable = new(
        "CLI001",
        "the kernels asked for are not available",
        "The environment variable BOLTUP_KERNELS forces a body of the batch kernels. It names one that this machine cannot run, or none at all. Results do not depend on it beyond rounding; the best available body runs.",
        "BOLTUP_KERNELS=vector512 on a machine without AVX-512",
        "Unset the variable, or name one of scalar, vector128, vector256 and vector512 that the machine has.");

    public static readonly DiagnosticCode UnknownCode = new(
        "CLI002",
        "no diagnostic has this code",
        "`boltup explain` knows the codes that diagnostics carry in brackets, such as CFG012.",
        "boltup explain CFG999",
        "Copy the code from the diagnostic; `boltup explain` without a code lists all of them.");
}
