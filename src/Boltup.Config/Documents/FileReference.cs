using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Documents;

/// <summary>A file that a document names.</summary>
/// <param name="FullPath">Absolute path; relative ones start at the folder of the document that names it.</param>
/// <param name="Written">The path as written.</param>
public sealed record FileReference(string FullPath, string Written, SourceSpan Span);
