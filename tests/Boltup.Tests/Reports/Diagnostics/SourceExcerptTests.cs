using Boltup.Reports.Diagnostics;
using CsCheck;

namespace Boltup.Tests.Reports.Diagnostics;

public class SourceExcerptTests
{
    [Fact]
    public void Of_Tabs_KeepsTheCaretsUnderTheText()
    {
        var excerpt = SourceExcerpt.Of("\ta:\tb", 5, 1);

        Assert.Equal("    a:    b", excerpt.Text);
        Assert.Equal('b', excerpt.Text[excerpt.MarkAt]);
    }

    [Fact]
    public void Of_LongLine_ShowsTheMarkedPart()
    {
        var excerpt = SourceExcerpt.Of(new string('x', 500) + "wrong" + new string('y', 500), 501, 5);

        Assert.Equal("wrong", excerpt.Text.Substring(excerpt.MarkAt, excerpt.MarkWidth));
        Assert.InRange(excerpt.Text.Length, 100, 130);
    }

    /// <summary>Spans come from readers of damaged files: none of them may break the message that reports the damage.</summary>
    [Fact]
    public void Of_AnySpan_MarksSomethingWithinTheText() =>
        Gen.Select(Gen.String[0, 300], Gen.Int, Gen.Int).Sample((line, column, length) =>
        {
            var excerpt = SourceExcerpt.Of(line, column, length);
            return excerpt.MarkWidth >= 1 && excerpt.MarkAt >= 0 && excerpt.MarkAt + excerpt.MarkWidth <= excerpt.Text.Length + 1
                && !excerpt.Text.Any(char.IsControl);
        });
}
