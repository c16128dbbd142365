using Boltup.Engine.Diagnostics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Files;

/// <summary>One function of a data file over frequency, without its values.</summary>
public sealed record Curve
{
    /// <summary>Place in <see cref="DataFile.Curves"/>.</summary>
    public required int Index { get; init; }

    public required FunctionKind Kind { get; init; }

    /// <summary>The dof that responds; in a Universal File the point is the node number as text. Null when the file does not say.</summary>
    public Dof? Response { get; init; }

    /// <summary>The dof that is excited, or the reference. Null when there is none.</summary>
    public Dof? Excitation { get; init; }

    public Quantity ResponseQuantity { get; init; } = Quantity.Unknown;

    public Quantity ExcitationQuantity { get; init; } = Quantity.Unknown;

    public required FrequencyAxis Axis { get; init; }

    /// <summary>Whether magnitudes are rms or peak, where the file says so.</summary>
    public Amplitude? Amplitude { get; init; }

    /// <summary>What a mount's stiffness was measured at, where a file holds several, as written there.</summary>
    public string? At { get; init; }

    /// <summary>k11, k12, k21 or k22 of a mount with mass effect; null for the one stiffness of a mount without.</summary>
    public string? Term { get; init; }

    public bool IsComplex { get; init; } = true;

    /// <summary>Whether values have the precision of double; otherwise of single.</summary>
    public bool IsDouble { get; init; } = true;

    /// <summary>First identification line.</summary>
    public string Title { get; init; } = "";

    public required SourceSpan Span { get; init; }
}
