using System.Security.Cryptography;

namespace Boltup.Config.Pinning;

/// <summary>What a file holds, in 64 digits.</summary>
internal static class FileDigest
{
    /// <summary>Its SHA-256, as lower-case hexadecimal digits.</summary>
    public static string Of(string fullPath)
    {
        using var stream = new FileStream(fullPath, FileMode.Open, FileAccess.Read, FileShare.Read, bufferSize: 1);
        return Convert.ToHexStringLower(SHA256.HashData(stream));
    }
}
