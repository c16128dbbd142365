namespace Boltup.Engine.Prediction;

/// <summary>How the forces of several sets in one operation add.</summary>
public enum ForceSum
{
    /// <summary>As complex amplitudes: the sets share one phase reference.</summary>
    Phase,

    /// <summary>As powers: the sets have no common phase.</summary>
    Energy,
}
