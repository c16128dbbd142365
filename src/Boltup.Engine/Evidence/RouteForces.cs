using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>Interface forces as one route found them, N or N·m, as the source acts on what it is joined to.</summary>
public sealed record RouteForces(ForceRoute Route, SpectrumSet Forces)
{
    /// <summary>Whether these are blocked forces, which transfer, or contact forces, which do not.</summary>
    public ForceNature Nature => Route is ForceRoute.InSitu or ForceRoute.FreeVelocity ? ForceNature.Blocked : ForceNature.Contact;
}
