namespace Boltup.Engine.Identification;

/// <summary>How the indicator FRFs are inverted at each line.</summary>
public enum SolveMethod
{
    /// <summary>Plain least squares, the default: regularising a well-conditioned line makes it worse (Choi, Thite, Thompson).</summary>
    LeastSquares,

    /// <summary>Singular values below a threshold are left out (Thite, Thompson, JSV 264 (2003)).</summary>
    Truncated,

    /// <summary>Singular directions are damped by σ²/(σ²+λ²) (Tikhonov).</summary>
    Tikhonov,
}
