using Boltup.Engine.Diagnostics;
using Boltup.Engine.Kernels;

namespace Boltup.Cli.Commands;

/// <summary>Says when the environment asks for kernels that this machine does not have.</summary>
internal static class KernelRequest
{
    public static void Check(DiagnosticBag diagnostics)
    {
        if (KernelChoice.UnmetRequest is { } asked)
        {
            diagnostics.Warning(
                CliCodes.KernelsNotAvailable,
                $"{KernelChoice.Variable} asks for `{asked}`, which this machine does not have; `{KernelChoice.Name}` runs",
                help: $"available here: {string.Join(", ", KernelChoice.Available.Select(KernelChoice.NameOf))}");
        }
    }
}
