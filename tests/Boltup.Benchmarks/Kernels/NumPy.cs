using System.Diagnostics;
using System.Globalization;
using System.Runtime.CompilerServices;

namespace Boltup.Benchmarks.Kernels;

/// <summary>Runs a timing script beside this file on one BLAS thread; the variable PYTHON names another interpreter than python3.</summary>
internal static class NumPy
{
    private const string Repeats = "5";

    /// <summary>Shortest time in seconds.</summary>
    public static double Time(string script, int rows, int columns, int lines, params string[] more)
    {
        string path = Path.Combine(Folder(), script);
        var start = new ProcessStartInfo(
            Environment.GetEnvironmentVariable("PYTHON") ?? "python3", [path, $"{rows}", $"{columns}", $"{lines}", Repeats, .. more])
        {
            RedirectStandardOutput = true,
        };
        start.Environment["OPENBLAS_NUM_THREADS"] = "1";
        start.Environment.Remove("OPENBLAS_CORETYPE");
        start.Environment.Remove("OPENBLAS_L2_SIZE");
        using Process process = Process.Start(start)!;
        return double.Parse(process.StandardOutput.ReadLine()!, CultureInfo.InvariantCulture);
    }

    private static string Folder([CallerFilePath] string file = "") => Path.GetDirectoryName(file)!;
}
