using Boltup.Config.Binding;
using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Documents;

/// <summary>The names that exist of one kind of thing, with the complaint about one that does not.</summary>
/// <param name="what">What one of them is, in the singular; its plural adds an s or es.</param>
internal sealed class KnownNames(string what, IEnumerable<string> names)
{
    private readonly HashSet<string> _names = [.. names];

    public IReadOnlyCollection<string> All => _names;

    public bool Contains(string name) => _names.Contains(name);

    public string? Nearest(string name) => NearestName.Of(name, _names);

    /// <summary>Whether the name exists; a diagnostic with the nearest and all known ones when it does not.</summary>
    public bool Check(string name, SourceSpan span, DiagnosticBag diagnostics)
    {
        bool isKnown = Contains(name);
        if (!isKnown)
        {
            string plural = what.EndsWith('s') ? $"{what}es" : $"{what}s";
            diagnostics.Error(ConfigCodes.UnknownName, $"no {what} is named `{name}`", span, NearestName.Suggest(name, _names),
                Words.Known(plural, _names));
        }

        return isKnown;
    }
}
