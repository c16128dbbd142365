namespace Boltup.Engine.Parts;

/// <summary>The power that the structure draws at a driving point, whose sign a passive structure cannot turn round (ISO 7626-1).</summary>
/// <param name="Dof">Name of the dof.</param>
/// <param name="GeneratedShare">Power generated over power drawn and generated, all lines together: 0 for a passive structure, 1 for a flipped sensor.</param>
/// <param name="GeneratingHz">Frequencies of the lines with Re mobility &lt; 0, in Hz.</param>
public sealed record DrivingPointPower(string Dof, double GeneratedShare, IReadOnlyList<double> GeneratingHz);
