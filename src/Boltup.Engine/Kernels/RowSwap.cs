namespace Boltup.Engine.Kernels;

/// <summary>One exchange of rows during pivoting.</summary>
/// <param name="Lanes">Bits of the lanes concerned, within the register.</param>
internal readonly record struct RowSwap(int First, int Second, uint Lanes);
