using System.Globalization;
using Boltup.Config.Binding;
using Boltup.Config.Yaml;
using Boltup.Engine.Comparing;

namespace Boltup.Config.Comparing;

/// <summary>Single values, lists and files.</summary>
internal sealed partial class NodeComparison
{
    private const string FileKey = "file";

    private void CompareScalars(string path, YamlNode before, YamlNode after, ValueKind kind)
    {
        if (before is YamlScalar one && after is YamlScalar other)
        {
            if (!ScalarComparison.AreSame(one, other, kind))
            {
                AddChange(path, before, after, ScalarComparison.RelativeChange(one, other, kind));
            }
        }
        else if (NodeText.Of(before) != NodeText.Of(after))
        {
            AddChange(path, before, after);
        }
    }

    /// <summary>A file or a map that begins with it, one map or a list of them: the short form is brought into the long one.</summary>
    private void CompareEither(string path, YamlNode before, YamlNode after, EitherKind kind)
    {
        switch (kind)
        {
            case { First: PathKind, Second: ShapeKind written }:
                Compare(path, WithFile(before), WithFile(after), written);
                break;
            case { First: ShapeKind, Second: ListKind list }:
                Compare(path, AsList(before), AsList(after), list);
                break;
            case { Second: ListKind list } when before is YamlList && after is YamlList:
                Compare(path, before, after, list);
                break;
            default:
                CompareScalars(path, before, after, kind.First);
                break;
        }
    }

    private static YamlNode WithFile(YamlNode node) => node is YamlScalar
        ? new YamlMap(node.Source, node.Span, [new YamlEntry(FileKey, node.Span, KeyIsPlain: true, node)])
        : node;

    private static YamlNode AsList(YamlNode node) => node is YamlMap ? new YamlList(node.Source, node.Span, [node]) : node;

    private void CompareFiles(string path, YamlNode before, YamlNode after)
    {
        if (files.DocumentAt(before) is { } one && files.DocumentAt(after) is { } other && one.Shape == other.Shape)
        {
            string owner = path.EndsWith($".{FileKey}", StringComparison.Ordinal) ? path[..^(FileKey.Length + 1)] : path;
            CompareMaps(owner, one.Root, other.Root, one.Shape);
        }
        else if (!files.AreSame(before, after))
        {
            Add(new InputDifference(path, InputDifferenceKind.Content, files.Describe(before), files.Describe(after)) { Span = after.Span });
        }
    }

    private void CompareLists(string path, YamlList before, YamlList after, ListKind kind)
    {
        if (kind.Item is ShapeKind or EitherKind)
        {
            CompareItems(path, before, after, kind.Item);
        }
        else if (!(kind.IsSet ? AreSameSets(before, after) : AreSameLists(before, after, kind.Item)))
        {
            AddChange(path, before, after);
        }
    }

    private static bool AreSameSets(YamlList before, YamlList after) =>
        before.Items.Select(NodeText.Of).ToHashSet().SetEquals(after.Items.Select(NodeText.Of));

    private static bool AreSameLists(YamlList before, YamlList after, ValueKind item) =>
        before.Items.Count == after.Items.Count
        && before.Items.Zip(after.Items).All(pair => ScalarComparison.AreSame((YamlScalar)pair.First, (YamlScalar)pair.Second, item));

    /// <summary>Maps in a list stand side by side, in any order: equal ones pair up first, the rest by place.</summary>
    private void CompareItems(string path, YamlList before, YamlList after, ValueKind kind)
    {
        var left = before.Items.Index().ToList();
        var right = after.Items.Index().ToList();
        foreach ((int Index, YamlNode Item) one in before.Items.Index())
        {
            int partner = right.FindIndex(other => IsSame(one.Item, other.Item, kind));
            if (partner >= 0)
            {
                left.Remove(one);
                right.RemoveAt(partner);
            }
        }

        for (int i = 0; i < Math.Max(left.Count, right.Count); i++)
        {
            int place = i < left.Count ? left[i].Index : right[i].Index;
            string name = before.Items.Count <= 1 && after.Items.Count <= 1 ? path : string.Create(CultureInfo.InvariantCulture, $"{path}[{place + 1}]");
            CompareEntries(name, left.ElementAtOrDefault(i).Item, right.ElementAtOrDefault(i).Item, kind);
        }
    }

    private bool IsSame(YamlNode before, YamlNode after, ValueKind kind)
    {
        var inner = new NodeComparison(files);
        inner.Compare("", before, after, kind);
        return inner._found.Count == 0;
    }

    private void CompareMatrices(string path, YamlList before, YamlList after)
    {
        if (before.Items.Count != after.Items.Count)
        {
            AddChange(path, before, after);
            return;
        }

        for (int i = 0; i < before.Items.Count * before.Items.Count; i++)
        {
            (int row, int column) = (i / before.Items.Count, i % before.Items.Count);
            var kind = new QuantityKind(ShapeValidator.DimensionAt(row, column), "1");
            string name = string.Create(CultureInfo.InvariantCulture, $"{path}[{row + 1},{column + 1}]");
            CompareScalars(name, ((YamlList)before.Items[row]).Items[column], ((YamlList)after.Items[row]).Items[column], kind);
        }
    }
}
