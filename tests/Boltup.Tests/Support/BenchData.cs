using System.Numerics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Spectra;
using Boltup.Files;

namespace Boltup.Tests.Support;

/// <summary>The bench of the reference case (Data/bench, see its README), with motion as displacement.</summary>
internal static class BenchData
{
    public static readonly Dof[] Interface = Dofs("101", "102", "103", "104");
    public static readonly Dof[] BenchSide = Dofs("301", "302", "303", "304");
    public static readonly Dof[] Indicators = Dofs("311", "312", "313", "314", "315", "316", "317", "318");
    public static readonly Dof[] Validation = Dofs("321", "322");

    /// <summary>The directions x, y, z of some points.</summary>
    public static Dof[] Dofs(params string[] points) =>
        [.. points.SelectMany(point => new[] { Direction.X, Direction.Y, Direction.Z }.Select(direction => new Dof(point, direction)))];

    /// <summary>FRFs of a file in Data/bench as receptances; coherences as real parts.</summary>
    public static FrfMatrix Frf(string file, IReadOnlyList<Dof> rows, IReadOnlyList<Dof> columns) =>
        FrfAt(PathOf(file), rows, columns);

    /// <summary>The free compressor of the demo, whose interface is 101–104.</summary>
    public static FrfMatrix FreeCompressor() => FrfAt(Repository.PathTo("examples", "minibus", "compressor.unv"), Interface, Interface);

    /// <summary>Spectra of a file in Data/bench; motion becomes displacement.</summary>
    public static SpectrumSet Spectra(string file, IReadOnlyList<Dof> dofs)
    {
        using DataFile data = Open(PathOf(file));
        Curve[] curves = [.. dofs.Select(dof => data.Curves.Single(curve => curve.Response == dof))];
        return new SpectrumSet(curves[0].Axis, dofs, [.. curves.Select(curve => Read(data, curve))]);
    }

    /// <summary>The noisy set and the bench alone belong to the example.</summary>
    private static string PathOf(string file) => file switch
    {
        "bench_insitu_noisy.unv" => Example("bench.unv"),
        "bench_insitu_coherence.unv" => Example("bench_coherence.unv"),
        "bench_operation_noisy.unv" => Example("bench_5400rpm.unv"),
        "bench_free.unv" => Example("bench_alone.unv"),
        _ => Repository.Data("bench", file),
    };

    private static string Example(string file) => Repository.PathTo("examples", "supplier", file);

    private static FrfMatrix FrfAt(string path, IReadOnlyList<Dof> rows, IReadOnlyList<Dof> columns)
    {
        using DataFile data = Open(path);
        Dictionary<DofPair, Curve> curves = data.Curves.ToDictionary(curve => new DofPair(curve.Response!, curve.Excitation!));
        var frf = new FrfMatrix(data.Curves[0].Axis, rows, columns);
        for (int i = 0; i < rows.Count * columns.Count; i++)
        {
            (int row, int column) = (i / columns.Count, i % columns.Count);
            frf.Values.ScatterSpectrum(row, column, Read(data, curves[new DofPair(rows[row], columns[column])]));
        }

        return frf;
    }

    private static DataFile Open(string path) => DataFile.Open(path, path, new DiagnosticBag())!;

    private static Complex[] Read(DataFile data, Curve curve)
    {
        var values = new Complex[curve.Axis.Count];
        Assert.True(data.ReadSpectrum(curve, values, new DiagnosticBag()));
        int order = FrfQuantity.DerivativeOrder(curve.ResponseQuantity);
        return [.. values.Select((value, line) => value / Complex.Pow(new Complex(0, curve.Axis.Omega(line)), order))];
    }
}
