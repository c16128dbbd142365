using Microsoft.Win32.SafeHandles;

namespace Boltup.Files.Text;

/// <summary>A file that is read at any place.</summary>
internal sealed class ByteSource : IDisposable
{
    private readonly SafeFileHandle _handle;

    private ByteSource(SafeFileHandle handle)
    {
        _handle = handle;
        Length = RandomAccess.GetLength(handle);
    }

    public long Length { get; }

    public static ByteSource Open(string path) => new(File.OpenHandle(path));

    /// <summary>Reads as much as is there, up to the length of the buffer.</summary>
    public int ReadAt(long offset, Span<byte> buffer)
    {
        long left = Math.Max(0, Length - offset);
        buffer = buffer[..(int)Math.Min(buffer.Length, left)];
        int total = 0;
        while (total < buffer.Length)
        {
            int read = RandomAccess.Read(_handle, buffer[total..], offset + total);
            if (read == 0)
            {
                break;
            }

            total += read;
        }

        return total;
    }

    public void Dispose() => _handle.Dispose();
}
