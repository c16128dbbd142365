using Boltup.Engine.Diagnostics;

namespace Boltup.Files.UniversalFile;

/// <summary>Counts datasets that play no role here, so that each number draws one note.</summary>
internal sealed class SkippedDatasets
{
    /// <summary>Numbers that are named one by one.</summary>
    private const int MaximumNotes = 20;

    // A dictionary of boxed counts: collections of plain values are compiled at start-up, those of references are not.
    private readonly Dictionary<int, object> _counts = [];

    public void Add(int number) => _counts[number] = _counts.TryGetValue(number, out object? count) ? (int)count + 1 : 1;

    /// <summary>Says what was skipped, by rising number.</summary>
    public void SayAll(string displayPath, DiagnosticBag diagnostics)
    {
        if (_counts.Count == 0)
        {
            return;
        }

        int[] numbers = [.. _counts.Keys];
        Array.Sort(numbers);
        foreach (int number in numbers.AsSpan(0, Math.Min(MaximumNotes, numbers.Length)))
        {
            int count = (int)_counts[number];
            string text = count == 1 ? $"1 dataset {number} was skipped" : $"{count} datasets {number} were skipped";
            diagnostics.Note(FileCodes.SkippedDataset, text, new SourceSpan(displayPath));
        }

        if (numbers.Length > MaximumNotes)
        {
            string text = $"datasets of {numbers.Length - MaximumNotes} more numbers were skipped";
            diagnostics.Note(FileCodes.SkippedDataset, text, new SourceSpan(displayPath));
        }
    }
}
