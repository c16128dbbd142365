namespace Boltup.Tests.Config;

/// <summary>A document that draws one diagnostic.</summary>
/// <param name="Code">The code that is expected.</param>
/// <param name="Marked">The document with the expected place marked; without a mark the place is the whole file.</param>
/// <param name="Words">Text that occurs in the message, its helps or its notes.</param>
internal sealed record DiagnosticCase(string Code, string Marked, string Words = "");
