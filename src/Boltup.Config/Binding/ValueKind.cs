namespace Boltup.Config.Binding;

/// <summary>What the value of a key must be. Data only: the validator checks it, the schema writer prints it.</summary>
public abstract record ValueKind
{
    /// <summary>What is expected, with article and example, as messages say it.</summary>
    public abstract string Expected { get; }
}
