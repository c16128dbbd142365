using System.Numerics;

namespace Boltup.Engine.Spectra;

/// <summary>Spectra of several dofs over one axis: forces (N, N·m), motion (m, rad) or pressure (Pa), time factor e^{+jωt}.</summary>
/// <param name="Axis">Lines of every spectrum.</param>
/// <param name="Dofs">What each spectrum belongs to.</param>
/// <param name="Values">For each dof one value per line.</param>
public sealed record SpectrumSet(FrequencyAxis Axis, IReadOnlyList<Dof> Dofs, IReadOnlyList<Complex[]> Values)
{
    /// <summary>The spectra as one column per line, as kernels take them.</summary>
    public TiledMatrix ToTiles()
    {
        var tiles = new TiledMatrix(Axis.Count, Dofs.Count, 1);
        for (int row = 0; row < Dofs.Count; row++)
        {
            tiles.ScatterSpectrum(row, 0, Values[row]);
        }

        return tiles;
    }

    /// <summary>The spectra that the first column of a matrix holds, a row for each dof.</summary>
    public static SpectrumSet FromTiles(FrequencyAxis axis, IReadOnlyList<Dof> dofs, TiledMatrix tiles) =>
        new(axis, dofs, [.. Enumerable.Range(0, dofs.Count).Select(row => tiles.GatherSpectrum(row, 0))]);
}
