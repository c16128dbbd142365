using Boltup.Config.Binding;
using Boltup.Config.Yaml;
using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Documents;

/// <summary>Turns the validated nodes of a pins file into a document.</summary>
internal sealed class PinsBinder(DiagnosticBag diagnostics)
{
    private const int DigestDigits = 64;

    public PinsDocument Bind(YamlMap root) =>
        new(root.Source, root["assembly"]!.MarkedText(), [.. root["files"].Items().Cast<YamlMap>().Select(BindPin)]);

    private PinDocument BindPin(YamlMap map)
    {
        FileReference file = map["file"]!.File();
        string digest = map["sha256"]!.Text();
        if (digest.Length != DigestDigits || !digest.All(char.IsAsciiHexDigit))
        {
            diagnostics.Error(ConfigCodes.BadDigest, $"the pin of `{file.Written}` is {map["sha256"]!.Describe()}, expected 64 hexadecimal digits",
                map["sha256"]!.Span, "write the file anew with `boltup pin --accept`");
        }

        return new PinDocument(file, digest.ToLowerInvariant());
    }
}
