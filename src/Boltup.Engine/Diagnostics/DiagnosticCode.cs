using System.Reflection;

namespace Boltup.Engine.Diagnostics;

/// <summary>One kind of diagnostic, with the text that <c>boltup explain</c> prints for it.</summary>
/// <param name="Code">Three letters of the layer and three digits, such as <c>CFG012</c>; never reused.</param>
/// <param name="Title">One lower-case line without a final stop.</param>
/// <param name="Meaning">What went wrong and why it matters, as whole sentences.</param>
/// <param name="Example">A short input that draws the diagnostic.</param>
/// <param name="Cure">What to do about it, as whole sentences.</param>
/// <param name="Kind">What an error of this code says about the run.</param>
public sealed record DiagnosticCode(
    string Code, string Title, string Meaning, string Example, string Cure, ErrorKind Kind = ErrorKind.WrongInput)
{
    /// <summary>The codes that a catalogue class declares as public static fields, in order of their code.</summary>
    public static IReadOnlyList<DiagnosticCode> DeclaredIn(Type catalogue) =>
        [.. catalogue.GetFields(BindingFlags.Public | BindingFlags.Static)
            .Select(field => field.GetValue(null))
            .OfType<DiagnosticCode>()
            .OrderBy(code => code.Code, StringComparer.Ordinal)];

    public override string ToString() => Code;
}
