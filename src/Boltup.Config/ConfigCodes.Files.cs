using Boltup.Engine.Diagnostics;

namespace Boltup.Config;

/// <summary>Files that documents name.</summary>
public static partial class ConfigCodes
{
    public static readonly DiagnosticCode MissingFile = new(
        "CFG070", "file not found",
        "There is no file at the path. Paths are relative to the document that names them.",
        "frf: [ { file: compresor.uff } ]",
        "Correct the path, or put the file there.");

    public static readonly DiagnosticCode OutsidePath = new(
        "CFG071", "path that leaves the tree",
        "The path, with symbolic links resolved, leads out of the repository or, where there is none, out of the "
            + "folder of the document. A document from elsewhere should not read any file of the machine, and a result "
            + "should not depend on files that the repository does not have.",
        "frf: [ { file: ../../../other/compressor.uff } ]",
        "Copy the data into the repository, or allow the path with `--allow-outside`.");

    public static readonly DiagnosticCode FileTooLarge = new(
        "CFG072", "file too large",
        "The file is far larger than such a file sensibly is, so it is most likely another one.",
        "based_on: video.yaml",
        "Check that the path is the one that is meant.");

    public static readonly DiagnosticCode UnreadableFile = new(
        "CFG073", "file that cannot be read",
        "The path is a folder, or the file may not be read.",
        "frf: [ { file: data/ } ]",
        "Name a file, and check its permissions.");
}
