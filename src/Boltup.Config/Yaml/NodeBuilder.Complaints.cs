using Boltup.Engine.Diagnostics;
using YamlDotNet.Core;
using YamlDotNet.Core.Events;

namespace Boltup.Config.Yaml;

/// <summary>What the builder refuses.</summary>
internal sealed partial class NodeBuilder
{
    private void RefuseDecoration(NodeEvent node)
    {
        if (!node.Anchor.IsEmpty)
        {
            Report(ConfigCodes.Anchor, $"anchor `&{Excerpt.Of(node.Anchor.Value)}`: anchors are not read", spans.Word(node.Start),
                "remove it; use `like` for mounts and `based_on` for assemblies");
        }

        if (!node.Tag.IsEmpty)
        {
            Report(ConfigCodes.Tag, $"tag `{Excerpt.Of(node.Tag.Value)}`: tags are not read", spans.Word(node.Start), "remove the tag");
        }
    }

    private bool IsAcceptableKey(YamlNode key)
    {
        if (key is not YamlScalar name)
        {
            Report(ConfigCodes.OddKey, $"{key.Describe()} cannot be a key", key.Span, "use a plain text as key");
            return false;
        }

        if (name.IsEmpty)
        {
            Report(ConfigCodes.OddKey, "a key is empty", name.Span, "write the key before the colon");
            return false;
        }

        if (name is { IsPlain: true, Text: "<<" })
        {
            Report(ConfigCodes.MergeKey, "merge key `<<` is not read", name.Span,
                "write the keys out, or use `like` for mounts and `based_on` for assemblies");
            return false;
        }

        return true;
    }

    private bool IsNew(YamlEntry entry, Dictionary<string, SourceSpan> places)
    {
        if (places.TryAdd(entry.Key, entry.KeySpan))
        {
            return true;
        }

        Report(ConfigCodes.DuplicateKey, $"key `{Excerpt.Of(entry.Key)}` occurs twice", entry.KeySpan, "remove or rename one of them",
            $"the first is at {places[entry.Key]}");
        return false;
    }

    private void ReportMalformed(ParserFailure failure)
    {
        string reason = failure.Reason is null ? "the text cannot be read from here on" : Lowered(failure.Reason);
        NodeEvent? unclosed = _open.FirstOrDefault(IsFlow);
        if (failure.Reason is null && unclosed is not null)
        {
            Report(ConfigCodes.Malformed, $"this `{Bracket(unclosed)}` is not closed properly", spans.At(unclosed.Start),
                "close it, and put a comma between entries");
            return;
        }

        string[] notes = unclosed is null ? [] : [$"inside the `{Bracket(unclosed)}` opened at {spans.At(unclosed.Start)}"];
        Report(ConfigCodes.Malformed, $"malformed YAML: {reason}", spans.Between(failure.Start, failure.End),
            "check brackets, commas and indentation; quote a text that contains `: ` or begins with a special character", notes);
    }

    private static string Lowered(string reason)
    {
        string text = Excerpt.Of(reason.TrimEnd('.', ' '), 200);
        return text.Length == 0 ? text : char.ToLowerInvariant(text[0]) + text[1..];
    }

    private static bool IsFlow(NodeEvent start) =>
        start is MappingStart { Style: MappingStyle.Flow } or SequenceStart { Style: SequenceStyle.Flow };

    private static string Bracket(NodeEvent start) => start is MappingStart ? "{" : "[";

    private void Report(DiagnosticCode code, string message, SourceSpan span, string? help = null, params string[] notes)
    {
        if (_errors++ < YamlLimits.MaximumErrors)
        {
            diagnostics.Error(code, message, span, help, notes);
        }
        else if (!_gaveUp)
        {
            _gaveUp = true;
            diagnostics.Error(ConfigCodes.TooLarge, $"more than {YamlLimits.MaximumErrors} errors, the rest is not read", span);
        }
    }
}
