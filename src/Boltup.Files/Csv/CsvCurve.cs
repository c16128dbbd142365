using System.Numerics;
using Boltup.Engine.Diagnostics;

namespace Boltup.Files.Csv;

/// <summary>A curve that grows row by row.</summary>
/// <param name="Names">The name columns: response and excitation, dof, or direction.</param>
/// <param name="Span">Place of the first row.</param>
internal sealed record CsvCurve(string[] Names, SourceSpan Span)
{
    public List<double> Hz { get; } = [];

    public List<Complex> Values { get; } = [];
}
