using System.Numerics;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Paths;

/// <summary>The paths of one operation: takes every response apart into contributions.</summary>
public sealed class OperationPaths
{
    private readonly TiledMatrix _forces;
    private readonly TiledMatrix _jointForces;
    private readonly int[] _lines;
    private readonly int _first;
    private readonly int _cases;
    private readonly double _powerFactor;
    private readonly int[] _acting;

    /// <param name="forces">Forces × cases, rows as in <paramref name="transfers"/>.</param>
    /// <param name="jointForces">Constraints × cases.</param>
    /// <param name="cases">The cases of the operation.</param>
    /// <param name="axis">Lines of the operation, all of them lines of the coupling.</param>
    internal OperationPaths(
        PathTransfers transfers, TiledMatrix forces, TiledMatrix jointForces, Range cases, FrequencyAxis axis, Operation operation)
    {
        (Transfers, _forces, _jointForces) = (transfers, forces, jointForces);
        (_first, _cases) = cases.GetOffsetAndLength(forces.Columns);
        _lines = [.. axis.Hz.ToArray().Select(transfers.Axis.IndexOf)];
        _powerFactor = operation.Amplitude == Amplitude.Peak ? 0.5 : 1;
        HashSet<ForceDof> own = [.. operation.Forces.SelectMany(set => set.Dofs.Select(dof => new ForceDof(set.Part, dof)))];
        _acting = [.. Enumerable.Range(0, transfers.Forces.Count).Where(i => own.Contains(transfers.Forces[i]))];
        Axis = axis;
    }

    public PathTransfers Transfers { get; }

    /// <summary>Lines of the contributions: those of the operation's forces.</summary>
    public FrequencyAxis Axis { get; }

    /// <summary>The dofs at which the operation has forces.</summary>
    public IEnumerable<ForceDof> Forces => _acting.Select(force => Transfers.Forces[force]);

    /// <summary>All contributions to one response.</summary>
    /// <param name="response">Its place in the assembly.</param>
    public PathSpectra Of(int response, PathView view) => view == PathView.Forces ? ByForce(response) : ByJoint(response);

    /// <summary>Σ|H|² over the operation's forces at a line of the operation, in the unit of the response squared per N².</summary>
    public double SquaredTransfers(int response, int line)
    {
        double sum = 0;
        foreach (int force in _acting)
        {
            Complex transfer = Transfers.FromForces[_lines[line], response, force];
            sum += transfer.Real * transfer.Real + transfer.Imaginary * transfer.Imaginary;
        }

        return sum;
    }

    private PathSpectra ByForce(int response)
    {
        PathSpectra spectra = Empty([.. Forces.Select(force => new TransferPath(PathKind.Force, force.ToString()))]);
        for (int path = 0; path < _acting.Length; path++)
        {
            AddProducts(spectra, path, Transfers.FromForces, response, _acting[path], _forces);
        }

        spectra.SumUp();
        return spectra;
    }

    private PathSpectra ByJoint(int response)
    {
        int[] joints = [.. Enumerable.Range(0, Transfers.Constraints.Count).Where(joint => Transfers.Touches(joint, response))];
        int[] direct = [.. _acting.Where(force => Transfers.IsDirect(force, response))];
        IEnumerable<TransferPath> paths = joints.Select(joint => new TransferPath(PathKind.Joint, Transfers.Constraints[joint].ToString()));
        PathSpectra spectra = Empty(direct.Length == 0
            ? [.. paths]
            : [.. paths, new TransferPath(PathKind.Direct, $"forces on {Transfers.Responses[response].Part}")]);
        for (int path = 0; path < joints.Length; path++)
        {
            AddProducts(spectra, path, Transfers.FromJoints, response, joints[path], _jointForces);
        }

        foreach (int force in direct)
        {
            AddProducts(spectra, joints.Length, Transfers.Direct!, response, force, _forces);
        }

        spectra.SumUp();
        return spectra;
    }

    private PathSpectra Empty(IReadOnlyList<TransferPath> paths) => new(paths, _cases, _lines.Length, _powerFactor);

    /// <summary>Adds transfer × force, in every case, to a contribution.</summary>
    private void AddProducts(PathSpectra spectra, int path, TiledMatrix transfers, int response, int column, TiledMatrix forces)
    {
        for (int i = 0; i < _cases; i++)
        {
            Span<double> real = spectra.Real(path, i);
            Span<double> imaginary = spectra.Imaginary(path, i);
            for (int line = 0; line < _lines.Length; line++)
            {
                (int tile, int lane) = (_lines[line] / Tiling.Lanes, _lines[line] % Tiling.Lanes);
                ReadOnlySpan<double> transfer = transfers.Entry(tile, response, column);
                ReadOnlySpan<double> force = forces.Entry(tile, column, _first + i);
                real[line] += transfer[lane] * force[lane] - transfer[Tiling.Lanes + lane] * force[Tiling.Lanes + lane];
                imaginary[line] += transfer[lane] * force[Tiling.Lanes + lane] + transfer[Tiling.Lanes + lane] * force[lane];
            }
        }
    }
}
