namespace Boltup.Tests.Reports.Pictures;

/// <summary>How an eye sees colours.</summary>
public enum ColourVision
{
    Full,
    Deutan,
    Protan,
}
