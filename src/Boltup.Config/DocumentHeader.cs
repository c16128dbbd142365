using Boltup.Config.Binding;
using Boltup.Config.Yaml;
using Boltup.Engine.Diagnostics;

namespace Boltup.Config;

/// <summary>Reads the first key of a document, <c>boltup: kind/version</c>.</summary>
internal static class DocumentHeader
{
    private const string Key = "boltup";
    private const string Version = "1";

    /// <summary>Names in the order of <see cref="DocumentKind"/>.</summary>
    internal static readonly string[] Supported = ["part", "assembly", "bench", "forces", "pins"];
    private static readonly string[] Announced = ["study"];

    /// <summary>Whether the document is of the expected kind.</summary>
    public static bool Is(YamlMap root, DocumentKind expected, DiagnosticBag diagnostics)
    {
        if (KindOf(root, diagnostics) is not DocumentKind kind)
        {
            return false;
        }

        if (kind != expected)
        {
            diagnostics.Error(ConfigCodes.WrongHeader,
                $"this is a document of the kind `{Supported[(int)kind]}`, expected `{Supported[(int)expected]}`",
                root[Key]!.Span);
        }

        return kind == expected;
    }

    public static DocumentKind? KindOf(YamlMap root, DiagnosticBag diagnostics)
    {
        YamlEntry? entry = root.Find(Key);
        if (entry is null || entry != root.Entries[0])
        {
            string help = entry is null
                ? $"begin with a kind and a version, such as `boltup: {Supported[0]}/{Version}`; kinds: {Words.List(Supported)}"
                : $"move `{Key}` from line {entry.KeySpan.Line} to the top";
            diagnostics.Error(ConfigCodes.WrongHeader,
                "the first key is not `boltup`", root.Entries.Count > 0 ? root.Entries[0].KeySpan : root.Span, help);
            return null;
        }

        if (entry.Value is not YamlScalar { IsEmpty: false } scalar || scalar.Text.Split('/') is not [string name, string version])
        {
            diagnostics.Error(ConfigCodes.WrongHeader,
                $"`boltup` is {entry.Value.Describe()}, expected a kind and a version", entry.Value.Span,
                "write `part/1` or `assembly/1`");
            return null;
        }

        return Recognize(scalar, name, version, diagnostics);
    }

    private static DocumentKind? Recognize(YamlScalar scalar, string name, string version, DiagnosticBag diagnostics)
    {
        int kind = Array.IndexOf(Supported, name);
        if (kind < 0 && Announced.Contains(name))
        {
            diagnostics.Error(ConfigCodes.NotSupportedYet,
                $"documents of the kind `{name}` are not supported yet by this version", scalar.Span);
        }
        else if (kind < 0)
        {
            diagnostics.Error(ConfigCodes.WrongHeader, $"unknown kind of document `{Excerpt.Of(name)}`", scalar.Span,
                NearestName.Suggest(name, Supported), $"kinds: {Words.List(Supported)}");
        }
        else if (version != Version)
        {
            diagnostics.Error(ConfigCodes.WrongHeader, $"version `{Excerpt.Of(version)}` of `{name}` is unknown", scalar.Span,
                $"write `{name}/{Version}`, or use a version of the program that knows it");
        }
        else
        {
            return (DocumentKind)kind;
        }

        return null;
    }
}
