using Boltup.Config.Documents;
using Boltup.Config.Yaml;
using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Paths;

/// <summary>Reads YAML files and remembers which.</summary>
internal sealed class DocumentReader(PathGuard guard, LoadOptions options)
{
    private readonly List<SourceFile> _filesRead = [];

    public IReadOnlyList<SourceFile> FilesRead => _filesRead;

    /// <summary>The root map of a document, or null with diagnostics.</summary>
    /// <param name="named">Where another document names it; null for the document that the user asked for.</param>
    public YamlMap? Read(string fullPath, FileReference? named, DiagnosticBag diagnostics)
    {
        var file = new SourceFile(fullPath, DisplayPath.Of(fullPath, options.WorkingDirectory));
        if (!guard.IsReadable(fullPath, named, options.MaximumDocumentBytes, diagnostics)
            || ReadBytes(file, named, diagnostics) is not byte[] bytes)
        {
            return null;
        }

        if (!_filesRead.Contains(file))
        {
            _filesRead.Add(file);
        }

        YamlNode? root = YamlReader.Read(bytes, file, diagnostics);
        if (root is not null and not YamlMap)
        {
            diagnostics.Error(ConfigCodes.WrongKind, $"the document is {root.Describe()}, expected a map", root.Span,
                "begin with `boltup: part/1` or `boltup: assembly/1`");
        }

        return root as YamlMap;
    }

    /// <summary>The whole file, never more than the limit, whatever its declared size.</summary>
    private byte[]? ReadBytes(SourceFile file, FileReference? named, DiagnosticBag diagnostics)
    {
        SourceSpan span = named?.Span ?? new SourceSpan(file.DisplayPath);
        try
        {
            using FileStream stream = File.OpenRead(file.FullPath);
            byte[]? content = ReadUpTo(stream, options.MaximumDocumentBytes);
            if (content is null)
            {
                diagnostics.Error(ConfigCodes.FileTooLarge,
                    $"`{file.DisplayPath}` has more than the {options.MaximumDocumentBytes} bytes that are read", span);
            }

            return content;
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException)
        {
            diagnostics.Error(ConfigCodes.UnreadableFile, $"`{file.DisplayPath}` cannot be read", span, notes: e.Message);
            return null;
        }
    }

    private static byte[]? ReadUpTo(FileStream stream, long maximum)
    {
        using var content = new MemoryStream();
        var chunk = new byte[1 << 14];
        for (int read = stream.Read(chunk); read > 0; read = stream.Read(chunk))
        {
            content.Write(chunk, 0, read);
            if (content.Length > maximum)
            {
                return null;
            }
        }

        return content.ToArray();
    }
}
