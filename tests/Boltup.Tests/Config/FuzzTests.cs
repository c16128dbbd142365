using System.Text;
using Boltup.Config.Documents;
using Boltup.Engine.Diagnostics;

namespace Boltup.Tests.Config;

/// <summary>Damaged documents give a diagnostic or load, and never throw.</summary>
public class FuzzTests
{
    private const int Flips = 1000;
    private const int Seed = 20240117;

    public static TheoryData<string> Names => ["a.assembly.yaml", "parts/compressor.part.yaml", "parts/body.part.yaml"];

    [Theory]
    [MemberData(nameof(Names))]
    public void Load_TruncatedAtEveryByte_NeverThrows(string name)
    {
        using ConfigFolder folder = Samples.Folder();
        byte[] whole = File.ReadAllBytes(Path.Combine(folder.Root, name));
        for (int length = 0; length < whole.Length; length++)
        {
            Check(folder, name, whole[..length]);
        }
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void Load_RandomByteFlips_NeverThrows(string name)
    {
        using ConfigFolder folder = Samples.Folder();
        byte[] whole = File.ReadAllBytes(Path.Combine(folder.Root, name));
        var random = new Random(Seed);
        for (int i = 0; i < Flips; i++)
        {
            byte[] damaged = [.. whole];
            for (int flips = random.Next(1, 4); flips > 0; flips--)
            {
                damaged[random.Next(damaged.Length)] ^= (byte)(1 << random.Next(8));
            }

            Check(folder, name, damaged);
        }
    }

    [Fact]
    public void Load_RandomPunctuation_NeverThrows()
    {
        using ConfigFolder folder = Samples.Folder();
        const string letters = "ab: ,[]{}&*!|>'\"%@`#-?~<\n\t 0";
        var random = new Random(Seed);
        for (int i = 0; i < 2 * Flips; i++)
        {
            string text = string.Concat(Enumerable.Range(0, random.Next(1, 40)).Select(_ => letters[random.Next(letters.Length)]));
            Check(folder, "a.assembly.yaml", Encoding.UTF8.GetBytes("boltup: assembly/1\n" + text));
        }
    }

    private static void Check(ConfigFolder folder, string name, byte[] content)
    {
        folder.With(name, content);
        int before = folder.Diagnostics.Items.Count(item => item.Severity == Severity.Error);
        object? document = folder.Load(name);
        int errors = folder.Diagnostics.Items.Count(item => item.Severity == Severity.Error) - before;
        Assert.Equal(errors == 0, document is PartDocument or AssemblyDocument);
        Assert.All(folder.Diagnostics.Items.Skip(before), item => Assert.True(item.Span is { Line: >= 0, Column: >= 0, Length: >= 1 }));
    }
}
