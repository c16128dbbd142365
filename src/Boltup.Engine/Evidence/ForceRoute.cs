namespace Boltup.Engine.Evidence;

/// <summary>How interface forces of a running source were found. Results name the route, because the routes do not find the same thing.</summary>
public enum ForceRoute
{
    /// <summary>u = Y_C f̄ at indicators of the installed source (ISO 20270): blocked forces.</summary>
    InSitu,

    /// <summary>f̄ = Y⁻¹ u of the source that runs hung free (ISO 9611 measurement): blocked forces.</summary>
    FreeVelocity,

    /// <summary>Motion on both sides of the mounts times their dynamic stiffness: contact forces of that installation.</summary>
    MountStiffness,

    /// <summary>Force sensors between source and receiver: contact forces of that installation.</summary>
    Direct,
}
