using Boltup.Engine.Diagnostics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>
/// Blocked forces from the motion of the source that runs hung free: f̄ = Y⁻¹ u_free, since a force that undoes the free motion is what
/// a rigid foundation would exert. Free velocity as ISO 9611 measures it; the relation is that of Mondot and Petersson (J. Sound Vib. 114
/// (1987) 507; from memory).
/// </summary>
public static class FreeVelocityRoute
{
    /// <summary>Solves for the blocked forces.</summary>
    /// <param name="source">Receptances of the free source between its interface dofs, which are rows and columns in one order.</param>
    /// <param name="freeMotion">Displacements at the same dofs in the same order, at the same lines.</param>
    /// <returns>The forces, or null after an error in <paramref name="diagnostics"/>: the FRFs are singular.</returns>
    public static RouteForces? BlockedForces(FrfMatrix source, SpectrumSet freeMotion, DiagnosticBag diagnostics)
    {
        SquareFrf.RequireInterface(source, source.Columns);
        SquareFrf.RequireInterface(source, freeMotion.Dofs);
        SquareFrf.RequireLines(source.Axis, freeMotion.Axis);
        TiledMatrix? forces = SquareFrf.Solve(source.Axis, source.Values, freeMotion.ToTiles(), "the free source", diagnostics);
        return forces is null ? null : new RouteForces(ForceRoute.FreeVelocity, SpectrumSet.FromTiles(source.Axis, source.Columns, forces));
    }
}
