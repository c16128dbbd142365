using Boltup.Config.Binding;
using Boltup.Engine.Prediction;

namespace Boltup.Config.Documents;

/// <summary>One running condition: its forces and how they add up.</summary>
/// <param name="Amplitude">What the magnitudes are, when the document says so.</param>
public sealed record OperationDocument(
    Marked<string> Name, Marked<string>? Title, IReadOnlyList<ForceDocument> Forces, ForceSum Sum, Marked<Amplitude>? Amplitude);

/// <summary>A file of forces on one part.</summary>
/// <param name="File">The force file, or a handover of blocked forces that names one for each operation.</param>
/// <param name="Operation">Which operation of the handover.</param>
/// <param name="Handover">The handover, once it is loaded.</param>
public sealed record ForceDocument(
    ForceKind Kind, FileReference File, Marked<string> Part, Marked<string>? Operation = null, ForcesDocument? Handover = null)
{
    /// <summary>The file that holds the numbers.</summary>
    public FileReference DataFile => HandoverOperation?.File ?? File;

    /// <summary>The forces of the handover that are meant; null without a handover.</summary>
    public ForcesOperationDocument? HandoverOperation => Handover?.Operations.FirstOrDefault(operation => operation.Name.Value == Operation?.Value);
}
