using System.Numerics;
using Boltup.Engine.Diagnostics;

namespace Boltup.Files;

/// <summary>What a format offers to <see cref="DataFile"/>.</summary>
internal interface IDataReader : IDisposable
{
    string Format { get; }

    IReadOnlyList<Curve> Curves { get; }

    IReadOnlyList<MeasuredPoint> Points { get; }

    /// <summary>Reads the values of one of <see cref="Curves"/>.</summary>
    bool Read(Curve curve, Span<Complex> values, DiagnosticBag diagnostics);
}
