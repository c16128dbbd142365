namespace Boltup.Engine.Spectra;

/// <summary>From the lanes of a tile to the lines of an axis.</summary>
internal static class LaneLines
{
    /// <summary>Adds the frequencies of the lanes whose bit is set; lanes beyond the last line are padding.</summary>
    public static void Collect(byte lanes, FrequencyAxis axis, int tile, List<double> frequenciesHz)
    {
        for (int lane = 0; lane < Tiling.Lanes && tile * Tiling.Lanes + lane < axis.Count; lane++)
        {
            if ((lanes >> lane & 1) != 0)
            {
                frequenciesHz.Add(axis[tile * Tiling.Lanes + lane]);
            }
        }
    }
}
