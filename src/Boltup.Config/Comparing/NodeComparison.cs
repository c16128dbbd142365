using Boltup.Config.Binding;
using Boltup.Config.Yaml;
using Boltup.Engine.Comparing;

namespace Boltup.Config.Comparing;

/// <summary>
/// Walks two validated trees of nodes along the shape of their document and lists where they mean something different. Comments, the order of
/// keys, spellings of numbers and units, and keys that only say what holds anyway are no difference.
/// </summary>
internal sealed partial class NodeComparison(FileContents files)
{
    private static readonly string[] Headers = ["boltup", "based_on"];

    private readonly List<InputDifference> _found = [];
    private bool _isRemark;

    public IReadOnlyList<InputDifference> Compare(YamlMap before, YamlMap after, Shape shape)
    {
        CompareMaps("", before, after, shape);
        return _found;
    }

    private void Compare(string path, YamlNode before, YamlNode after, ValueKind kind)
    {
        switch (kind)
        {
            case EitherKind either:
                CompareEither(path, before, after, either);
                break;
            case ShapeKind shape:
                CompareMaps(path, (YamlMap)before, (YamlMap)after, shape.Shape);
                break;
            case NamedKind named:
                CompareNamed(path, (YamlMap)before, (YamlMap)after, named);
                break;
            case ListKind list:
                CompareLists(path, (YamlList)before, (YamlList)after, list);
                break;
            case StiffnessMatrixKind:
                CompareMatrices(path, (YamlList)before, (YamlList)after);
                break;
            case PathKind:
                CompareFiles(path, before, after);
                break;
            default:
                CompareScalars(path, before, after, kind);
                break;
        }
    }

    private void CompareMaps(string path, YamlMap before, YamlMap after, Shape shape)
    {
        foreach (KeyDefinition key in shape.Keys.Where(key => !Headers.Contains(key.Name)))
        {
            bool wasRemark = _isRemark;
            _isRemark |= key.IsRemark;
            CompareEntries(Join(path, key.Name), before[key.Name] ?? DefaultOf(key, before), after[key.Name] ?? DefaultOf(key, after), key.Kind);
            _isRemark = wasRemark;
        }
    }

    private void CompareNamed(string path, YamlMap before, YamlMap after, NamedKind kind)
    {
        IEnumerable<string> names = before.Entries.Concat(after.Entries).Select(entry => entry.Key).Distinct();
        foreach (string name in names)
        {
            CompareEntries(Join(path, name), before[name], after[name], kind.Item);
        }
    }

    private void CompareEntries(string path, YamlNode? before, YamlNode? after, ValueKind kind)
    {
        switch (before, after)
        {
            case (null, null):
                break;
            case (null, { } added):
                AddWhole(path, null, added, kind);
                break;
            case ({ } removed, null):
                AddWhole(path, removed, null, kind);
                break;
            default:
                Compare(path, before!, after!, kind);
                break;
        }
    }

    /// <summary>What holds where a key is not given: its default, or a map whose every key has one.</summary>
    private static YamlNode? DefaultOf(KeyDefinition key, YamlMap parent) => key switch
    {
        { Default: { } text } => new YamlScalar(parent.Source, parent.Span, text, IsPlain: true),
        { Kind: ShapeKind shape } when shape.Shape.Keys.All(inner => inner.Default is not null) => new YamlMap(parent.Source, parent.Span, []),
        _ => null,
    };

    private void AddWhole(string path, YamlNode? before, YamlNode? after, ValueKind kind)
    {
        if (kind is NamedKind { Item: var item } && (before ?? after) is YamlMap map)
        {
            foreach (YamlEntry entry in map.Entries)
            {
                AddWhole(Join(path, entry.Key), before is null ? null : entry.Value, after is null ? null : entry.Value, item);
            }

            return;
        }

        Add(new InputDifference(
            path,
            before is null ? InputDifferenceKind.Added : InputDifferenceKind.Removed,
            before is null ? null : NodeText.Of(before),
            after is null ? null : NodeText.Of(after))
        { Span = (after ?? before)!.Span });
    }

    private void AddChange(string path, YamlNode before, YamlNode after, double? relative = null) =>
        Add(new InputDifference(path, InputDifferenceKind.Changed, NodeText.Of(before), NodeText.Of(after)) { Relative = relative, Span = after.Span });

    private void Add(InputDifference difference) => _found.Add(difference with { IsRemark = _isRemark });

    private static string Join(string path, string name) => path.Length == 0 ? name : $"{path}.{name}";
}
