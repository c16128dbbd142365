using System.Security.Cryptography;
using System.Text;

namespace Boltup.Reports.Results;

/// <summary>The SHA-256 of an input file, so that a result can be traced to it.</summary>
/// <param name="File">Path as the user would type it.</param>
/// <param name="Sha256">64 lower-case hexadecimal digits.</param>
public sealed record InputFingerprint(string File, string Sha256)
{
    /// <summary>Reads a file as a stream.</summary>
    public static InputFingerprint Of(string path, string displayPath)
    {
        using var stream = new FileStream(path, FileMode.Open, FileAccess.Read, FileShare.Read, bufferSize: 1);
        return new InputFingerprint(displayPath, Convert.ToHexStringLower(SHA256.HashData(stream)));
    }

    /// <summary>Eight digits that stand for all inputs together, for captions.</summary>
    public static string Abbreviate(IEnumerable<InputFingerprint> inputs) =>
        Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(string.Join('\n', inputs.Select(input => input.Sha256)))))[..8];
}
