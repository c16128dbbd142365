using System.Runtime.InteropServices;

namespace Boltup.Reports.Results;

/// <summary>Exchanges two folders in one step where the system can: renameat2 with RENAME_EXCHANGE on Linux.</summary>
internal static partial class FolderExchange
{
    private const int CurrentDirectory = -100;
    private const uint Exchange = 2;

    /// <param name="first">The new folder; it takes over the permissions of the other.</param>
    /// <returns>False where the system or the file system cannot, and both are where they were.</returns>
    public static bool TryExchange(string first, string second)
    {
        if (!OperatingSystem.IsLinux())
        {
            return false;
        }

        try
        {
            File.SetUnixFileMode(first, File.GetUnixFileMode(second));
            return RenameAt2(CurrentDirectory, first, CurrentDirectory, second, Exchange) == 0;
        }
        catch (EntryPointNotFoundException)
        {
            return false;
        }
    }

    [LibraryImport("libc", EntryPoint = "renameat2", StringMarshalling = StringMarshalling.Utf8, SetLastError = true)]
    private static partial int RenameAt2(int fromFolder, string from, int toFolder, string to, uint flags);
}
