using Boltup.Config.Binding;
using Boltup.Config.Yaml;

namespace Boltup.Config.Documents;

/// <summary>A pins file: what the data files of an assembly held when somebody looked at them.</summary>
/// <param name="Assembly">File name of the assembly, which lies in the same folder.</param>
public sealed record PinsDocument(SourceFile Source, Marked<string> Assembly, IReadOnlyList<PinDocument> Files);

/// <summary>One pinned file.</summary>
/// <param name="Sha256">64 lower-case hexadecimal digits.</param>
public sealed record PinDocument(FileReference File, string Sha256);
