using Boltup.Engine.Prediction;

namespace Boltup.Tests.Config.Binding;

public class FileNamesTests
{
    [Theory]
    [InlineData("2400 rpm", "2400-rpm")]
    [InlineData("Driver  Ear (left)", "driver-ear-left-")]
    [InlineData("a_b.c/../d", "a-b-c-d")]
    [InlineData("Öl 3", "öl-3")]
    [InlineData("..", "-")]
    public void FromName_AnyName_HasOnlyLettersDigitsAndHyphens(string name, string expected) => Assert.Equal(expected, FileNames.FromName(name));
}
