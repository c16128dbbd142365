namespace Boltup.Engine.Spectra;

/// <summary>What one FRF relates: <c>response / excitation</c>.</summary>
public sealed record DofPair(Dof Response, Dof Excitation)
{
    public override string ToString() => $"{Response} / {Excitation}";
}
