using Boltup.Reports.Results;
using Boltup.Tests.Support;

namespace Boltup.Tests.Reports.Results;

public class InputFingerprintTests
{
    /// <summary>The one-block example of FIPS 180 for SHA-256, `abc` (from memory).</summary>
    [Fact]
    public void Of_File_IsItsSha256UnderTheNameThatIsShown()
    {
        using var folder = new TemporaryFolder();
        File.WriteAllText(folder.PathTo("input.csv"), "abc");

        var fingerprint = InputFingerprint.Of(folder.PathTo("input.csv"), "data/input.csv");

        Assert.Equal("data/input.csv", fingerprint.File);
        Assert.Equal("ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad", fingerprint.Sha256);
    }

    [Fact]
    public void Abbreviate_AnotherContent_GivesOtherDigits()
    {
        InputFingerprint other = TinyResult.Input with { Sha256 = new string('b', 64) };

        Assert.Equal(8, InputFingerprint.Abbreviate([TinyResult.Input]).Length);
        Assert.NotEqual(InputFingerprint.Abbreviate([TinyResult.Input]), InputFingerprint.Abbreviate([other]));
    }
}
