using Boltup.Config.Documents;
using Boltup.Config.Yaml;
using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Binding;

/// <summary>Keys: unknown, missing, contradicting; and the rules for names that users choose.</summary>
internal sealed partial class ShapeValidator
{
    private const int MaximumNameLength = 100;

    private static readonly HashSet<string> OldBooleans =
        new(StringComparer.OrdinalIgnoreCase) { "on", "off", "yes", "no", "true", "false" };

    private void CheckMap(YamlMap map, Shape shape, string label)
    {
        HashSet<string> meant = CheckKeys(map, shape);
        foreach (KeyDefinition key in shape.Keys.Where(key => key.IsRequired && !meant.Contains(key.Name)))
        {
            diagnostics.Error(ConfigCodes.MissingKey, $"{label} has no `{key.Name}`", map.Span,
                $"add `{key.Name}`: {key.Kind.Expected}");
        }

        foreach (KeyRule rule in shape.Rules)
        {
            CheckRule(map, rule, meant, label);
        }
    }

    /// <summary>Checks every key with its value; gives the keys that are there, and those that misspelt ones probably mean.</summary>
    private HashSet<string> CheckKeys(YamlMap map, Shape shape)
    {
        var meant = new HashSet<string>(StringComparer.Ordinal);
        foreach (YamlEntry entry in map.Entries.TakeWhile(_ => !HasEnough))
        {
            meant.Add(entry.Key);
            if (shape.Find(entry.Key) is not KeyDefinition key)
            {
                meant.Add(UnknownKey(entry, shape) ?? entry.Key);
            }
            else if (key.Kind is ReservedKind { AllowsEmpty: false })
            {
                CheckReserved(entry.Value with { Span = entry.KeySpan }, new ReservedKind(), $"`{key.Name}`");
            }
            else
            {
                Check(entry.Value, key.Kind, $"`{key.Name}`");
            }
        }

        return meant;
    }

    /// <summary>Complains, and gives the key that was probably meant, which then does not count as missing too.</summary>
    private string? UnknownKey(YamlEntry entry, Shape shape)
    {
        IEnumerable<string> known = shape.Keys.Select(key => key.Name);
        string? near = NearestName.Of(entry.Key, known);
        diagnostics.Error(ConfigCodes.UnknownKey, $"unknown key `{Excerpt.Of(entry.Key)}`", entry.KeySpan,
            near is null ? null : $"did you mean `{near}`?", near is null ? [$"{shape.What} knows {Words.List(known)}"] : []);
        return near;
    }

    private void CheckRule(YamlMap map, KeyRule rule, HashSet<string> meant, string label)
    {
        YamlEntry[] present = [.. rule.Keys.Select(map.Find).OfType<YamlEntry>()];
        switch (rule.Kind)
        {
            case KeyRuleKind.ExactlyOne or KeyRuleKind.AtMostOne when present.Length > 1:
                Contradiction(present);
                break;
            case KeyRuleKind.ExactlyOne or KeyRuleKind.AtLeastOne when !rule.Keys.Any(meant.Contains):
                string count = rule.Kind == KeyRuleKind.ExactlyOne ? "exactly one" : "at least one";
                diagnostics.Error(ConfigCodes.OneOf, $"{label} has none of {Words.List(rule.Keys)}", map.Span,
                    $"give {count} of them");
                break;
            case KeyRuleKind.Needs when map.Find(rule.Keys[0]) is not null && !rule.Keys.Skip(1).Any(meant.Contains):
                diagnostics.Error(ConfigCodes.NeedsOtherKey, $"`{rule.Keys[0]}` means nothing without {Words.List(rule.Keys.Skip(1))}",
                    present[0].KeySpan);
                break;
        }
    }

    /// <summary>Points at the key that came last; when an overlay added it, the cure is to remove the key of the base.</summary>
    private void Contradiction(YamlEntry[] present)
    {
        YamlEntry last = present[^1];
        YamlEntry first = present[0];
        bool isOneFile = last.KeySpan.File == first.KeySpan.File;
        if (isOneFile && Place(last).CompareTo(Place(first)) < 0)
        {
            (first, last) = (last, first);
        }

        string? help = isOneFile
            ? "keep one of them"
            : $"in the overlay write `{first.Key}: ~` or `{last.Key}: ~` to remove the one that the base gives";
        diagnostics.Error(ConfigCodes.OneOf,
            $"only one of {Words.List(present.Select(entry => entry.Key))} can be given", last.KeySpan, help,
            $"the other is at {first.KeySpan}");
    }

    private static (int Line, int Column) Place(YamlEntry entry) => (entry.KeySpan.Line, entry.KeySpan.Column);

    private void CheckNamed(YamlMap map, NamedKind kind, string label)
    {
        if (map.Entries.Count < kind.Minimum)
        {
            diagnostics.Error(ConfigCodes.WrongCount, $"{label} is empty, expected at least {kind.Minimum} {kind.What}", map.Span);
        }

        foreach (YamlEntry entry in map.Entries.TakeWhile(_ => !HasEnough))
        {
            CheckName(entry, kind);
            Check(entry.Value, kind.Item, $"{kind.What} `{Excerpt.Of(entry.Key)}`");
        }

        if (kind.MakesFileNames)
        {
            CheckFileNames(map, kind);
        }
    }

    private void CheckName(YamlEntry entry, NamedKind kind)
    {
        string name = entry.Key;
        if (string.IsNullOrWhiteSpace(name) || name.Length > MaximumNameLength || name != name.Trim() || name.Any(char.IsControl))
        {
            diagnostics.Error(ConfigCodes.BadName, $"`{Excerpt.Of(name)}` is no name for a {kind.What}", entry.KeySpan,
                $"use 1 to {MaximumNameLength} characters with no blank at the ends");
        }
        else if (kind.IsDotted && name.Contains('.', StringComparison.Ordinal))
        {
            diagnostics.Error(ConfigCodes.BadName, $"{kind.What} name `{Excerpt.Of(name)}` holds a full stop", entry.KeySpan,
                $"write `{Excerpt.Of(name.Replace('.', '_'))}`", "the full stop separates part, point and direction");
        }
        else if (kind.IsDotted && name == GroundPoint.Name)
        {
            diagnostics.Error(ConfigCodes.ReservedName,
                $"`{GroundPoint.Name}` cannot name a {kind.What}", entry.KeySpan, "choose another name",
                $"`{GroundPoint.Name}` is the immovable point of every assembly");
        }
        else if (entry.KeyIsPlain && (OldBooleans.Contains(name) || name is "~" or "null"))
        {
            diagnostics.Warning(ConfigCodes.BooleanName, $"{kind.What} name `{name}` is no text for many YAML readers", entry.KeySpan,
                $"quote it: `\"{name}\"`, or choose another name");
        }
    }

    private void CheckFileNames(YamlMap map, NamedKind kind)
    {
        var taken = new Dictionary<string, YamlEntry>(StringComparer.Ordinal);
        foreach (YamlEntry entry in map.Entries)
        {
            string fileName = Engine.Prediction.FileNames.FromName(entry.Key);
            if (!taken.TryAdd(fileName, entry))
            {
                diagnostics.Error(ConfigCodes.SameFileName,
                    $"{kind.What} names `{taken[fileName].Key}` and `{entry.Key}` give the same file name `{fileName}`", entry.KeySpan,
                    "rename one of them", $"the other is at {taken[fileName].KeySpan}");
            }
        }
    }
}
