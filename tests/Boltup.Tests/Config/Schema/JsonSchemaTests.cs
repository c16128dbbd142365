using System.Text.Json;
using Boltup.Config;
using Boltup.Config.Binding;
using Boltup.Config.Documents;
using Boltup.Config.Schema;

namespace Boltup.Tests.Config.Schema;

public class JsonSchemaTests
{
    [Fact]
    public void Of_Part_HasEveryKeyThatLoadingKnows()
    {
        using JsonDocument schema = JsonDocument.Parse(JsonSchema.Of(DocumentKind.Part));
        IEnumerable<string> expected = PartShape.Root.Keys.Where(key => key.Kind is not ReservedKind).Select(key => key.Name);
        Assert.Equal(expected, schema.RootElement.GetProperty("properties").EnumerateObject().Select(property => property.Name));
        Assert.False(schema.RootElement.GetProperty("additionalProperties").GetBoolean());
        JsonElement models = schema.RootElement.GetProperty("allOf")[0].GetProperty("oneOf");
        Assert.Equal(["frf", "lumped"], models.EnumerateArray().Select(model => model.GetProperty("required")[0].GetString()!));
    }

    [Fact]
    public void Of_Assembly_RequiresPartsOnlyWithoutABase()
    {
        using JsonDocument schema = JsonDocument.Parse(JsonSchema.Of(DocumentKind.Assembly));
        Assert.Equal(["boltup", "parts"],
            schema.RootElement.GetProperty("else").GetProperty("required").EnumerateArray().Select(key => key.GetString()!));
        Assert.False(schema.RootElement.GetProperty("then").TryGetProperty("required", out _));
        JsonElement mounts = schema.RootElement.GetProperty("then").GetProperty("properties").GetProperty("mounts");
        Assert.Equal("null", mounts.GetProperty("anyOf")[1].GetProperty("type").GetString());
    }

    [Theory]
    [InlineData("120 N/mm", true)]
    [InlineData("-1.5e3 µm", true)]
    [InlineData("90 °", true)]
    [InlineData("120", false)]
    [InlineData("N/mm", false)]
    [InlineData("0,8 kg", false)]
    public void Of_Assembly_QuantityPattern_WantsANumberAndAUnit(string text, bool isMatch)
    {
        using JsonDocument schema = JsonDocument.Parse(JsonSchema.Of(DocumentKind.Assembly));
        string pattern = schema.RootElement.GetProperty("else").GetProperty("properties").GetProperty("joint_gap").GetProperty("pattern").GetString()!;
        Assert.Equal(isMatch, System.Text.RegularExpressions.Regex.IsMatch(text, pattern));
    }

    [Fact]
    public void Shapes_EveryKey_HasOneLineOfWords()
    {
        Assert.All(PartShape.Root.Keys.Concat(AssemblyShape.Root.Keys), key => Assert.Matches("^[A-Za-z][^\n]{5,}[^.]$", key.Doc));
    }
}
