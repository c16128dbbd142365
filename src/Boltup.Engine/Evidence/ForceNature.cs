namespace Boltup.Engine.Evidence;

/// <summary>What an interface force is a property of.</summary>
public enum ForceNature
{
    /// <summary>Of the source alone: applied to the coupled assembly, any receiver responds as to the running source.</summary>
    Blocked,

    /// <summary>Of one installation: right on that receiver alone, wrong on any other and wrong on the coupled assembly.</summary>
    Contact,
}
