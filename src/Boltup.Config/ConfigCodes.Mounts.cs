using Boltup.Engine.Diagnostics;

namespace Boltup.Config;

/// <summary>Laws of mounts.</summary>
public static partial class ConfigCodes
{
    public static readonly DiagnosticCode BadRelaxation = new(
        "CFG110", "relaxation that no material has",
        "A relaxing stiffness rises with frequency: `stiffening` is the ratio of the stiffness at high frequency to that at rest, so at "
            + "least 1, and the order of the derivative is at most 1. Other values would give a mount that feeds power into the assembly.",
        "relaxation: { stiffening: 0.4, time: 2 ms }",
        "Give the stiffness at rest under `stiffness`, `stiffening` of at least 1, and `order` up to 1.");

    public static readonly DiagnosticCode MadeOfItself = new(
        "CFG111", "mount that is made of itself",
        "The `series` and `parallel` keys of mounts lead in a circle, so the mount would contain itself.",
        "pair: { parallel: [soft, pair] }",
        "Name mounts that have a law of their own.");

    public static readonly DiagnosticCode TooManyElements = new(
        "CFG112", "mount made of absurdly many elements",
        "Mounts in series and parallel that are themselves made of others multiply quickly. Beyond 16 elements the cause is most likely a "
            + "slip, and the computation would take long.",
        "a: { parallel: [soft, soft] }\nb: { parallel: [a, a] }  # and so on",
        "Use `like` with `scale` for many equal mounts side by side.");
}
