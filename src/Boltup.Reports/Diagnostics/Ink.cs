namespace Boltup.Reports.Diagnostics;

/// <summary>Colours of terminal text by meaning; plain text carries the same words.</summary>
public sealed class Ink
{
    public static readonly Ink Plain = new(false);

    public static readonly Ink Coloured = new(true);

    private readonly bool _coloured;

    private Ink(bool coloured) => _coloured = coloured;

    public string Error(string text) => Wrap("1;31", text);

    public string Warning(string text) => Wrap("1;33", text);

    public string Note(string text) => Wrap("1;36", text);

    public string Help(string text) => Wrap("1;32", text);

    public string Frame(string text) => Wrap("34", text);

    public string Strong(string text) => Wrap("1", text);

    private string Wrap(string code, string text) => _coloured ? $"\u001b[{code}m{text}\u001b[0m" : text;
}
