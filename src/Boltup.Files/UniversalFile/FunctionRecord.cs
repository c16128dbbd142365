namespace Boltup.Files.UniversalFile;

/// <summary>A dataset 58 that can be read.</summary>
/// <param name="Factor">Takes values to SI units and positive directions.</param>
/// <param name="KeepsImaginary">Whether an imaginary part is meant.</param>
internal sealed record FunctionRecord(DataLayout Layout, double Factor, bool KeepsImaginary);
