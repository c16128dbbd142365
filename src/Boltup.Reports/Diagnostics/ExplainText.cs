using System.Text;
using Boltup.Engine.Diagnostics;

namespace Boltup.Reports.Diagnostics;

/// <summary>What <c>boltup explain</c> prints.</summary>
public static class ExplainText
{
    private const int Width = 80;

    public static void Write(TextWriter output, DiagnosticCode code, Ink ink)
    {
        output.WriteLine(ink.Strong($"{code.Code}: {code.Title}"));
        output.WriteLine();
        WriteWrapped(output, code.Meaning);
        output.WriteLine();
        output.WriteLine(ink.Strong("Example"));
        foreach (string line in code.Example.Split('\n'))
        {
            output.WriteLine($"    {line}");
        }

        output.WriteLine();
        output.WriteLine(ink.Strong("Cure"));
        WriteWrapped(output, code.Cure);
        if (code.Kind == ErrorKind.UnsupportedByData)
        {
            output.WriteLine();
            WriteWrapped(output, "An error of this kind ends with exit code 3: the input is well formed, but the data cannot support the result.");
        }
    }

    private static void WriteWrapped(TextWriter output, string text)
    {
        var line = new StringBuilder();
        foreach (string word in text.Split(' '))
        {
            if (line.Length > 0 && line.Length + 1 + word.Length > Width)
            {
                output.WriteLine(line);
                line.Clear();
            }

            line.Append(line.Length > 0 ? " " : "").Append(word);
        }

        output.WriteLine(line);
    }
}
