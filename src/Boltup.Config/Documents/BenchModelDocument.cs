using Boltup.Config.Binding;

namespace Boltup.Config.Documents;

/// <summary>The bench as an assembly of source, mounts and bench.</summary>
public sealed record BenchModelDocument(FileReference Assembly, Marked<string> Source);
