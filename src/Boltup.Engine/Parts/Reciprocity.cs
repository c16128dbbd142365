using Boltup.Engine.Spectra;

namespace Boltup.Engine.Parts;

/// <summary>
/// Which FRF is the reciprocal of which. Motion over force is symmetric (Maxwell–Betti, Rayleigh). Between a structural and an
/// acoustic point p/F = −v/q, for F and v along the same direction and q a volume velocity out of the source (Lyamshev 1959; from
/// memory). Sound pressure over volume velocity is symmetric.
/// </summary>
public static class Reciprocity
{
    /// <summary>The response and excitation of the reciprocal experiment: <c>i.p / j.x</c> ↔ <c>j.x / i.q</c>.</summary>
    public static DofPair Swap(DofPair pair) => new(AsResponse(pair.Excitation), AsExcitation(pair.Response));

    /// <summary>
    /// Power of jω with which an internal value of the reciprocal experiment, negated when not zero, becomes the value wanted:
    /// 0 for like kinds; +1 for p/F = −jω·(x/q); −1 for x/q = −(p/F)/(jω).
    /// </summary>
    public static int OmegaPower(Dof response, Dof excitation) => (response.IsMotion, excitation.IsMotion) switch
    {
        (false, true) => 1,
        (true, false) => -1,
        _ => 0,
    };

    private static Dof AsResponse(Dof excitation) =>
        excitation.Direction == Direction.Q ? excitation with { Direction = Direction.P } : excitation;

    private static Dof AsExcitation(Dof response) =>
        response.Direction == Direction.P ? response with { Direction = Direction.Q } : response;
}
