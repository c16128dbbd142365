using System.Numerics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Identification;
using Boltup.Engine.Parts;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Tests.Engine.Identification;

/// <summary>A bench of random FRFs and forces, seeded: what the sensors measure is known exactly.</summary>
internal sealed class RandomBench : IPartModel
{
    private readonly Dictionary<DofPair, Complex[]> _frfs = [];

    public RandomBench(int sensors, int forces, int lines, int seed = 1)
    {
        var random = new Random(seed);
        Axis = FrequencyAxis.Even(20, 5, lines);
        Interface = [.. Enumerable.Range(1, forces).Select(i => Dof.Parse($"m{i}.x"))];
        Sensors = [.. Enumerable.Range(1, sensors).Select(i => Dof.Parse($"s{i}.x"))];
        foreach (DofPair pair in Sensors.SelectMany(sensor => Interface.Select(force => new DofPair(sensor, force))))
        {
            _frfs[pair] = Spectrum(random, lines);
        }
    }

    public FrequencyAxis Axis { get; }

    public Dof[] Interface { get; }

    public Dof[] Sensors { get; }

    public IReadOnlyCollection<Dof> Responses => Sensors;

    public IReadOnlyCollection<Dof> Excitations => Interface;

    public Complex[] this[Dof sensor, Dof force]
    {
        get => _frfs[new DofPair(sensor, force)];
        set => _frfs[new DofPair(sensor, force)] = value;
    }

    public static Complex[] Spectrum(Random random, int lines) =>
        [.. Enumerable.Range(0, lines).Select(_ => new Complex(2 * random.NextDouble() - 1, 2 * random.NextDouble() - 1))];

    public SpectrumSet RandomForces(int seed)
    {
        var random = new Random(seed);
        return new SpectrumSet(Axis, Interface, [.. Interface.Select(_ => Spectrum(random, Axis.Count))]);
    }

    /// <summary>What the sensors measure: u = Y·f.</summary>
    public SpectrumSet Measure(SpectrumSet forces) => new(Axis, Sensors, [.. Sensors.Select(sensor => Response(sensor, forces))]);

    public BenchModel Model(int indicators, SolveChoice solve, params BenchOperation[] operations) =>
        new("bench", Axis, this, Interface, Sensors[..indicators], Sensors[indicators..], operations, solve);

    public static BenchOperation Operation(string name, params SpectrumSet[] columns) =>
        new(name, Amplitude.Rms, columns.Length == 1 ? PhaseReference.Common : PhaseReference.Free, columns);

    public bool HasFrf(Dof response, Dof excitation) => _frfs.ContainsKey(new DofPair(response, excitation));

    public FrfMatrix Evaluate(FrequencyAxis axis, IReadOnlyList<Dof> rows, IReadOnlyList<Dof> columns, DiagnosticBag diagnostics)
    {
        var frf = new FrfMatrix(axis, rows, columns);
        for (int i = 0; i < rows.Count * columns.Count; i++)
        {
            frf.Values.ScatterSpectrum(i / columns.Count, i % columns.Count, this[rows[i / columns.Count], columns[i % columns.Count]]);
        }

        return frf;
    }

    private Complex[] Response(Dof sensor, SpectrumSet forces)
    {
        var sum = new Complex[Axis.Count];
        for (int i = 0; i < Interface.Length * sum.Length; i++)
        {
            (int force, int line) = Math.DivRem(i, sum.Length);
            sum[line] += this[sensor, Interface[force]][line] * forces.Values[force][line];
        }

        return sum;
    }
}
