using Boltup.Engine.Spectra;

namespace Boltup.Files.Csv;

/// <summary>A column of names, and which texts it takes.</summary>
/// <param name="Column">Its header.</param>
/// <param name="Expected">What one name is, for messages.</param>
/// <param name="Choices">Which texts there are, for messages.</param>
internal sealed record CsvName(string Column, string Expected, string Choices, Func<string, bool> Takes)
{
    public const string At = "at";
    public const string Term = "term";

    private static readonly string[] Terms = ["k11", "k12", "k21", "k22"];

    public static CsvName Of(string column) => column switch
    {
        "direction" => new(column, "a direction", "directions are x, y, z, rx, ry and rz", IsMotion),
        Term => new(column, "a term of a two-port", "terms are k11, k12, k21 and k22", Terms.Contains),
        At => new(column, "a condition", "a condition is a text such as `40 degC`", text => text.Length > 0),
        _ => new(column, "a dof of the form point.direction", "directions are x, y, z, rx, ry, rz, p and q", text => Dof.TryParse(text, out _)),
    };

    private static bool IsMotion(string text) => Dof.TryParseDirection(text, out Direction direction) && direction <= Direction.RZ;
}
