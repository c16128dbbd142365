using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Planning;

/// <summary>Diagnostics of planning mounts.</summary>
public static partial class PlanCodes
{
    public static readonly DiagnosticCode SeriesDoesNotJoin = new(
        "PLN080",
        "mounts in series that cannot be joined",
        "A direction that one of the mounts leaves free carries no force through the series. Where all directions are free nothing is left; and where a mount that couples directions or has mass effect takes part, the point between the mounts must be held in the same directions from both sides.",
        "mounts: { a: { stiffness: { x: 90 N/mm } }, b: { stiffness: { z: 90 N/mm } }, both: { series: [a, b] } }",
        "Name mounts that connect the same directions.");
}
