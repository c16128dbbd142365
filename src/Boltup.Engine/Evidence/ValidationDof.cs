using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>Predicted against measured at one dof.</summary>
/// <param name="Predicted">One value per line.</param>
/// <param name="Measured">One value per line, in the same quantity.</param>
/// <param name="DifferenceDb">Per line 20 lg |predicted|/|measured|; NaN where either is zero.</param>
/// <param name="RelativeError">‖predicted − measured‖₂/‖measured‖₂ over all lines, phase included.</param>
/// <param name="LevelDifferenceDb">10 lg Σ|predicted|²/Σ|measured|² over all lines.</param>
public sealed record ValidationDof(
    Dof Dof,
    IReadOnlyList<Complex> Predicted,
    IReadOnlyList<Complex> Measured,
    IReadOnlyList<double> DifferenceDb,
    double RelativeError,
    double LevelDifferenceDb);
