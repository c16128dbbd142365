using Boltup.Config.Binding;
using Boltup.Engine.Evidence;

namespace Boltup.Config.Documents;

/// <summary>Another way to the forces of a bench's operations.</summary>
/// <param name="SourcePart">The part file of the free source, for the free-velocity route.</param>
public sealed record RouteDocument(
    Marked<string> Name, Marked<ForceRoute> Method, FileReference? SourcePart, IReadOnlyList<BenchSpectraDocument> Operations);
