namespace Boltup.Config.Documents;

/// <summary>What a part's FRFs come from.</summary>
public abstract record PartModelDocument;
