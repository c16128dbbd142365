using System.Numerics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;

namespace Boltup.Tests.Engine.Parts;

/// <summary>A curve given by a function of frequency in Hz.</summary>
internal sealed class InMemoryCurve(string response, string excitation, FrfQuantity quantity, FrequencyAxis axis, Func<double, Complex> value)
    : IFrfCurve
{
    public Dof Response { get; } = Dof.Parse(response);

    public Dof Excitation { get; } = Dof.Parse(excitation);

    public FrfQuantity Quantity { get; } = quantity;

    public FrequencyAxis Axis { get; } = axis;

    public SourceSpan Origin { get; } = new("curve");

    public bool TryRead(Span<Complex> values, DiagnosticBag diagnostics)
    {
        for (int line = 0; line < Axis.Count; line++)
        {
            values[line] = value(Axis[line]);
        }

        return true;
    }
}
