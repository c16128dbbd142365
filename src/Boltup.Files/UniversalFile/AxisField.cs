namespace Boltup.Files.UniversalFile;

/// <summary>Lines 8 to 11 of a dataset 58: what an axis of the function is.</summary>
/// <param name="DataType">Specific data type: 8 displacement, 12 acceleration, 18 frequency …</param>
/// <param name="Unit">Label of the unit as written.</param>
internal sealed record AxisField(int DataType, int LengthExponent, int ForceExponent, string Label, string Unit)
{
    /// <summary>Whether the file states the dimension by exponents of length and force.</summary>
    public bool HasExponents => LengthExponent != 0 || ForceExponent != 0;
}
