using Boltup.Engine.Diagnostics;
using Boltup.Files.Text;

namespace Boltup.Files.UniversalFile;

/// <summary>Counts liberties, so that a file with a thousand records that break one rule draws one note.</summary>
internal sealed class Liberties(string displayPath)
{
    private readonly Dictionary<string, TakenLiberty> _taken = new(StringComparer.Ordinal);

    private static readonly (NumberForms Form, Liberty Liberty)[] OfForms =
    [
        (NumberForms.LetterD, Liberty.LetterD),
        (NumberForms.NoLetter, Liberty.NoExponentLetter),
        (NumberForms.NotFinite, Liberty.NotANumber),
        (NumberForms.Touching, Liberty.TouchingNumbers),
    ];

    /// <summary>Where the record stands that is being read.</summary>
    public SourceSpan Place { get; set; } = new(displayPath);

    public void Take(Liberty liberty) => Note(FileCodes.Liberty, liberty.Rule);

    public void Note(DiagnosticCode code, string text)
    {
        if (!_taken.TryGetValue(text, out TakenLiberty? taken))
        {
            _taken.Add(text, taken = new TakenLiberty(code, text, Place));
        }

        taken.Count++;
    }

    /// <summary>Takes the liberties that reading numbers of these forms means.</summary>
    public void Take(NumberForms forms)
    {
        foreach ((NumberForms form, Liberty liberty) in OfForms)
        {
            if (forms.HasFlag(form))
            {
                Take(liberty);
            }
        }
    }

    /// <summary>Says everything that was noted.</summary>
    public void SayAll(DiagnosticBag diagnostics)
    {
        foreach (TakenLiberty taken in _taken.Values)
        {
            diagnostics.Note(taken.Code, taken.Text, taken.Span, notes: taken.Count > 1 ? [$"{taken.Count} times in this file"] : []);
        }

        _taken.Clear();
    }
}
