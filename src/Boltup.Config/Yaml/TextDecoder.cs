using System.Text;
using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Yaml;

/// <summary>Turns the bytes of a document into text that the parser may see, or says why not.</summary>
internal static class TextDecoder
{
    private static readonly UTF8Encoding Strict = new(encoderShouldEmitUTF8Identifier: false, throwOnInvalidBytes: true);

    /// <summary>The text, or null when the bytes are no UTF-8 or hold characters that no document needs.</summary>
    public static string? Decode(byte[] bytes, SourceFile file, DiagnosticBag diagnostics)
    {
        ReadOnlySpan<byte> content = bytes;
        if (content.StartsWith("\uFEFF"u8))
        {
            content = content[3..];
        }
        else if (content.StartsWith((ReadOnlySpan<byte>)[0xFF, 0xFE]) || content.StartsWith((ReadOnlySpan<byte>)[0xFE, 0xFF]))
        {
            diagnostics.Error(ConfigCodes.NotUtf8, "the file is UTF-16, not UTF-8", new SourceSpan(file.DisplayPath, 1, 1),
                "save it as UTF-8");
            return null;
        }

        try
        {
            string text = Strict.GetString(content);
            return HasOnlyPrintable(text, file, diagnostics) ? text : null;
        }
        catch (DecoderFallbackException e)
        {
            string before = Encoding.UTF8.GetString(content[..Math.Clamp(e.Index, 0, content.Length)]);
            byte offending = e.BytesUnknown is { Length: > 0 } unknown ? unknown[0] : (byte)0;
            diagnostics.Error(ConfigCodes.NotUtf8, $"byte 0x{offending:X2} is not UTF-8", At(file, before, before.Length),
                "save the file as UTF-8");
            return null;
        }
    }

    private static bool HasOnlyPrintable(string text, SourceFile file, DiagnosticBag diagnostics)
    {
        for (int i = 0; i < text.Length; i++)
        {
            char c = text[i];
            bool isOdd = c < ' ' ? c is not ('\t' or '\n' or '\r') : c is >= '\u007F' and <= '\u009F' or '\u2028' or '\u2029' or '\uFEFF';
            if (isOdd)
            {
                diagnostics.Error(ConfigCodes.NotUtf8, $"control character U+{(int)c:X4}", At(file, text, i), "remove it");
                return false;
            }
        }

        return true;
    }

    /// <summary>The place of a character, with lines counted as the parser counts them.</summary>
    private static SourceSpan At(SourceFile file, string text, int index)
    {
        int line = 1;
        int lineStart = 0;
        for (int i = 0; i < index; i++)
        {
            if (text[i] == '\n' || (text[i] == '\r' && !(i + 1 < text.Length && text[i + 1] == '\n')))
            {
                line++;
                lineStart = i + 1;
            }
        }

        return new SourceSpan(file.DisplayPath, line, index - lineStart + 1);
    }
}
