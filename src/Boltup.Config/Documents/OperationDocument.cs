using Boltup.Config.Binding;
using Boltup.Engine.Prediction;

namespace Boltup.Config.Documents;

/// <summary>One running condition: its forces and how they add up.</summary>
/// <param name="Amplitude">What the magnitudes are, when the document says so.</param>
public sealed record OperationDocument(
    Marked<string> Name, Marked<string>? Title, IReadOnlyList<ForceDocument> Forces, ForceSum Sum, Marked<Amplitude>? Amplitude);

/// <summary>A file of forces on one part.</summary>
public sealed record ForceDocument(ForceKind Kind, FileReference File, Marked<string> Part);

/// <summary>What the forces of a file are.</summary>
public enum ForceKind
{
    /// <summary>Forces of the running source on an immovable foundation; act at its interface.</summary>
    Blocked,

    /// <summary>Forces that act from outside, at any dof.</summary>
    Applied,
}

/// <summary>How the responses to several force files add up.</summary>
public enum ForceSum
{
    /// <summary>As complex numbers.</summary>
    Phase,

    /// <summary>As squared magnitudes, for sources that do not know of each other.</summary>
    Energy,
}
