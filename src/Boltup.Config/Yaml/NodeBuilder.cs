using Boltup.Engine.Diagnostics;
using YamlDotNet.Core;
using YamlDotNet.Core.Events;

namespace Boltup.Config.Yaml;

/// <summary>Builds the node tree from the events of one document and collects everything wrong with it.</summary>
internal sealed partial class NodeBuilder(EventStream events, SpanFactory spans, DiagnosticBag diagnostics)
{
    private readonly Stack<NodeEvent> _open = new();
    private int _errors;
    private int _nodes;
    private bool _gaveUp;

    /// <summary>The root, or null when anything was wrong.</summary>
    public YamlNode? BuildDocument()
    {
        YamlNode? root = null;
        if (MoveTo<DocumentStart>() && events.Move() && events.Current is not DocumentEnd)
        {
            root = BuildNode(owner: null);
            RefuseSecondDocument();
        }

        if (events.Failure is ParserFailure failure)
        {
            ReportMalformed(failure);
        }
        else if (root is null or YamlScalar { IsEmpty: true } && _errors == 0)
        {
            Report(ConfigCodes.EmptyDocument, "the document is empty", new SourceSpan(spans.File.DisplayPath),
                "begin with `boltup: part/1` or `boltup: assembly/1`");
        }

        return _errors == 0 ? root : null;
    }

    private bool MoveTo<TEvent>()
        where TEvent : ParsingEvent
    {
        while (events.Move())
        {
            if (events.Current is TEvent)
            {
                return true;
            }
        }

        return false;
    }

    private void RefuseSecondDocument()
    {
        if (!_gaveUp && MoveTo<DocumentStart>())
        {
            Report(ConfigCodes.SeveralDocuments, "a second document begins here", spans.Word(events.Current!.Start),
                "keep one document to a file and remove the `---`");
        }
    }

    /// <summary>Builds the node under the cursor and leaves the cursor on its last event; null when the document is abandoned.</summary>
    private YamlNode? BuildNode(SourceSpan? owner)
    {
        if (++_nodes > YamlLimits.MaximumNodes)
        {
            Report(ConfigCodes.TooLarge, $"more than {YamlLimits.MaximumNodes} keys and values", spans.At(events.Current!.Start));
            _gaveUp = true;
            return null;
        }

        if (events.Current is NodeEvent node)
        {
            RefuseDecoration(node);
        }

        return events.Current switch
        {
            Scalar scalar => BuildScalar(scalar),
            MappingStart start => Nest(start, () => BuildMap(start, owner)),
            SequenceStart start => Nest(start, () => BuildList(start, owner)),
            AnchorAlias alias => BuildAlias(alias),
            _ => null,
        };
    }

    private YamlNode? Nest(NodeEvent start, Func<YamlNode?> build)
    {
        if (_open.Count >= YamlLimits.MaximumDepth)
        {
            Report(ConfigCodes.TooLarge, $"nested more than {YamlLimits.MaximumDepth} levels deep", spans.At(start.Start));
            _gaveUp = true;
            return null;
        }

        _open.Push(start);
        YamlNode? built = build();
        if (built is not null)
        {
            _open.Pop();
        }

        return built;
    }

    private YamlScalar BuildScalar(Scalar scalar)
    {
        SourceSpan span = scalar.Tag.IsEmpty && scalar.Anchor.IsEmpty
            ? spans.Between(scalar.Start, scalar.End)
            : spans.Word(scalar.Start);
        return new YamlScalar(spans.File, span, scalar.Value, scalar.Style == ScalarStyle.Plain);
    }

    private YamlScalar BuildAlias(AnchorAlias alias)
    {
        SourceSpan span = spans.Between(alias.Start, alias.End);
        Report(ConfigCodes.Anchor, $"alias `*{Excerpt.Of(alias.Value.Value)}`: aliases are not read", span,
            "write the value out, or use `like` for mounts and `based_on` for assemblies");
        return new YamlScalar(spans.File, span, alias.Value.Value, IsPlain: true);
    }

    private YamlList? BuildList(SequenceStart start, SourceSpan? owner)
    {
        var items = new List<YamlNode>();
        while (CanGoOn() && events.Move())
        {
            if (events.Current is SequenceEnd end)
            {
                return new YamlList(spans.File, CollectionSpan(start, end, owner), items);
            }

            if (BuildNode(owner: null) is YamlNode item)
            {
                items.Add(item);
            }
        }

        return null;
    }

    private YamlMap? BuildMap(MappingStart start, SourceSpan? owner)
    {
        var entries = new List<YamlEntry>();
        var places = new Dictionary<string, SourceSpan>(StringComparer.Ordinal);
        while (CanGoOn() && events.Move())
        {
            if (events.Current is MappingEnd end)
            {
                return new YamlMap(spans.File, CollectionSpan(start, end, owner ?? entries.FirstOrDefault()?.KeySpan), entries);
            }

            if (BuildEntry() is YamlEntry entry && IsNew(entry, places))
            {
                entries.Add(entry);
            }
        }

        return null;
    }

    private YamlEntry? BuildEntry()
    {
        YamlNode? key = BuildNode(owner: null);
        if (key is null || !CanGoOn() || !events.Move())
        {
            return null;
        }

        YamlNode? value = BuildNode(key.Span);
        if (value is null || !IsAcceptableKey(key))
        {
            return null;
        }

        var name = (YamlScalar)key;
        YamlNode placed = value is YamlScalar { IsEmpty: true } ? value with { Span = name.Span } : value;
        return new YamlEntry(name.Text, name.Span, name.IsPlain, placed);
    }

    private bool CanGoOn() => !_gaveUp && events.Failure is null;

    /// <summary>A collection in braces or brackets spans itself, one in block style the key that holds it.</summary>
    private SourceSpan CollectionSpan(NodeEvent start, ParsingEvent end, SourceSpan? owner) =>
        (IsFlow(start) ? spans.Brackets(start.Start, end.Start) : null) ?? owner ?? spans.At(start.Start);
}
