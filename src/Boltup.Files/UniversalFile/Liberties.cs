using Boltup.Engine.Diagnostics;
using Boltup.Files.Text;

namespace Boltup.Files.UniversalFile;

/// <summary>Counts liberties, so that a file with a thousand records that break one rule draws one note.</summary>
internal sealed class Liberties(string displayPath)
{
    private readonly Dictionary<(DiagnosticCode Code, string Text), (SourceSpan Span, int Count)> _taken = [];

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
        (SourceSpan span, int count) = _taken.GetValueOrDefault((code, text), (Place, 0));
        _taken[(code, text)] = (span, count + 1);
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
        foreach (((DiagnosticCode code, string text), (SourceSpan span, int count)) in _taken)
        {
            diagnostics.Note(code, text, span, notes: count > 1 ? [$"{count} times in this file"] : []);
        }

        _taken.Clear();
    }
}
