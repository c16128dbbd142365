namespace Boltup.Engine.Evidence;

/// <summary>Which question a validation asked. The two are not of equal worth.</summary>
public enum ValidationCheck
{
    /// <summary>
    /// Dofs of the same installation that took no part in the identification (ISO 20270). They share the bench's dynamics, so this can look
    /// excellent while transfer fails.
    /// </summary>
    OnBoard,

    /// <summary>Responses of another installation, with a changed receiver.</summary>
    Transfer,
}
