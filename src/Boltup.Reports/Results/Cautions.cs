namespace Boltup.Reports.Results;

/// <summary>What every result says about its own limits.</summary>
public static class Cautions
{
    public const string Text =
        "A prediction is no sign-off. Static load, durability, restraint and crash behaviour of mounts, and exposure limits for people, "
        + "belong to licensed practice and local codes.";
}
