using System.Numerics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;
using Boltup.Files;

namespace Boltup.Config.Planning;

/// <summary>A function of a data file as an FRF between points of a part.</summary>
internal sealed class DataCurve(DataFile file, Curve curve, Dof response, Dof excitation, FrfQuantity quantity) : IFrfCurve
{
    public Dof Response => response;

    public Dof Excitation => excitation;

    public FrfQuantity Quantity => quantity;

    public FrequencyAxis Axis => curve.Axis;

    public SourceSpan Origin => curve.Span;

    /// <summary>Parts are read side by side, and two of them may share a file, which reads one curve at a time.</summary>
    public bool TryRead(Span<Complex> values, DiagnosticBag diagnostics)
    {
        lock (file)
        {
            return file.ReadSpectrum(curve, values, diagnostics);
        }
    }
}
