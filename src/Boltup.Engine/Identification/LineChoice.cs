namespace Boltup.Engine.Identification;

/// <summary>What the inversion did at one line of one operation.</summary>
/// <param name="Kept">Singular directions that took part; all of them for least squares and Tikhonov.</param>
/// <param name="Damping">λ of Tikhonov as a share of the largest singular value; 0 otherwise.</param>
public readonly record struct LineChoice(int Kept, double Damping);
