using System.Text;

namespace Boltup.Tests.Files;

/// <summary>A file of the temporary folder that goes away with the test.</summary>
internal sealed class TemporaryFile : IDisposable
{
    public TemporaryFile(ReadOnlySpan<byte> bytes)
    {
        Path = System.IO.Path.Combine(System.IO.Path.GetTempPath(), System.IO.Path.GetRandomFileName());
        File.WriteAllBytes(Path, bytes);
    }

    public TemporaryFile(string text)
        : this(Encoding.Latin1.GetBytes(text))
    {
    }

    public string Path { get; }

    public void Dispose() => File.Delete(Path);
}
