using Boltup.Reports.Comparing;

namespace Boltup.Tests.Reports.Comparing;

public class MarkdownTextTests
{
    [Theory]
    [InlineData("seat rail", "seat rail")]
    [InlineData("a|b", @"a\|b")]
    [InlineData("loss_factor *", @"loss\_factor \*")]
    [InlineData("<img src=x>", "&lt;img src=x&gt;")]
    [InlineData("@everyone", "&#64;everyone")]
    [InlineData("[link](x)", @"\[link\](x)")]
    [InlineData("two\nlines", "two lines")]
    [InlineData("µm/s² → 3 %", "µm/s² → 3 %")]
    public void Of_TextOfAUser_MarksNothingUp(string text, string expected) => Assert.Equal(expected, MarkdownText.Of(text));
}
