namespace Boltup.Files.UniversalFile;

/// <summary>How functions are stored in a Universal File.</summary>
/// <param name="IsBinary">58b, otherwise ASCII.</param>
/// <param name="IsBigEndian">Byte order of 58b.</param>
/// <param name="IsDouble">Double precision, otherwise single.</param>
/// <param name="IsComplex">Complex values, otherwise their real parts.</param>
public sealed record UniversalFileStorage(bool IsBinary = true, bool IsBigEndian = false, bool IsDouble = true, bool IsComplex = true);
