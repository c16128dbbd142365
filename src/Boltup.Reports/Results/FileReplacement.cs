namespace Boltup.Reports.Results;

/// <summary>Replaces files one by one, where a folder cannot change places as a whole. After a failure the earlier files are back.</summary>
internal sealed class FileReplacement(StagingFolder staging, string target)
{
    private readonly Stack<(string From, string To)> _moves = [];

    /// <summary>Puts the named files of the staging folder, and its manifest, in place of the earlier ones.</summary>
    public void Run(IEnumerable<string> names)
    {
        try
        {
            foreach (string name in FolderManifest.OwnFilesIn(target))
            {
                SetAside(name);
            }

            foreach (string name in names.Append(FolderManifest.FileName))
            {
                Move(Path.Combine(staging.FullPath, name), Path.Combine(target, name));
            }
        }
        catch
        {
            Undo();
            throw;
        }
    }

    private void SetAside(string name)
    {
        string aside = $"{name}.earlier";
        staging.Claim(aside);
        Move(Path.Combine(target, name), Path.Combine(staging.FullPath, aside));
    }

    private void Move(string from, string to)
    {
        Directory.CreateDirectory(Path.GetDirectoryName(to)!);
        File.Move(from, to);
        _moves.Push((from, to));
    }

    private void Undo()
    {
        while (_moves.TryPop(out (string From, string To) move))
        {
            File.Move(move.To, move.From);
        }
    }
}
