using Boltup.Config.Binding;
using Boltup.Engine.Prediction;

namespace Boltup.Config.Documents;

/// <summary>One running condition: its forces and how they add up.</summary>
/// <param name="Amplitude">What the magnitudes are, when the document says so.</param>
public sealed record OperationDocument(
    Marked<string> Name, Marked<string>? Title, IReadOnlyList<ForceDocument> Forces, ForceSum Sum, Marked<Amplitude>? Amplitude);

/// <summary>A file of forces on one part.</summary>
public sealed record ForceDocument(ForceKind Kind, FileReference File, Marked<string> Part);
