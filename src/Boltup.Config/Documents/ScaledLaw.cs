namespace Boltup.Config.Documents;

/// <summary>A mount law and the factor on its whole dynamic stiffness.</summary>
public sealed record ScaledLaw(MountLawDocument Law, double Scale);
