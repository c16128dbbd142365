namespace Boltup.Engine.Identification;

/// <summary>How the λ of Tikhonov is found at each line.</summary>
public enum DampingRule
{
    /// <summary>The same share of the largest singular value everywhere.</summary>
    Fixed,

    /// <summary>Generalised cross-validation: least ‖Yf−u‖²/(m − Σφ)² (Golub, Heath, Wahba, Technometrics 21 (1979); Hansen).</summary>
    CrossValidation,

    /// <summary>The corner of lg‖Yf−u‖ against lg‖f‖: largest curvature (Hansen, SIAM Review 34 (1992)).</summary>
    LCurve,
}
