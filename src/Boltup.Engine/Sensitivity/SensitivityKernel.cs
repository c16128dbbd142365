using System.Runtime.Intrinsics;
using Boltup.Engine.Coupling;
using Boltup.Engine.Mounts;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Sensitivity;

/// <summary>
/// Sums Re(u* ∂u) over the lines of a tile for every response and parameter p, ∂u = ∂u/∂ln p. Holds its own workspace: one per thread.
/// </summary>
internal sealed class SensitivityKernel
{
    private readonly PredictionRun _run;
    private readonly SensitivityLayout _layout;
    private readonly ResponseTiles _responses;
    private readonly MountKernel _mounts;
    private readonly InterfaceMotion _motion;
    private readonly LaneComplex[] _conjugates;
    private readonly LaneComplex[] _deformation = new LaneComplex[BothEnds.LargestOrder];
    private readonly LaneComplex[] _feeling = new LaneComplex[BothEnds.LargestOrder];
    private readonly int _cases;
    private readonly int _parameters;

    public SensitivityKernel(PredictionRun run, SensitivityLayout layout, ResponseTiles responses)
    {
        (_run, _layout, _responses) = (run, layout, responses);
        _mounts = new MountKernel(run.Assembly.Axis);
        _motion = new InterfaceMotion(run);
        _conjugates = new LaneComplex[run.Assembly.Responses.Count];
        _cases = run.Cases.Count;
        _parameters = layout.Parameters.Count;
    }

    /// <summary>Writes the sums of one operation.</summary>
    /// <param name="powers">Receives Σ|u|² per response.</param>
    /// <param name="sums">Receives responses × parameters sums.</param>
    public void Fill(int tile, Range cases, Span<double> powers, Span<double> sums)
    {
        powers.Clear();
        sums.Clear();
        Vector512<double> weights = _responses.Weights(tile);
        (int first, int count) = cases.GetOffsetAndLength(_cases);
        for (int column = first; column < first + count; column++)
        {
            for (int response = 0; response < _conjugates.Length; response++)
            {
                LaneComplex value = _responses.At(tile, response, column);
                powers[response] += Vector512.Sum(weights * value.Square);
                _conjugates[response] = weights * value.Conjugate;
            }

            AddMounts(tile, column, sums);
            AddRows(tile, column, sums);
        }
    }

    private void AddMounts(int tile, int column, Span<double> sums)
    {
        int first = 0;
        foreach (Joint joint in _run.Layout.Joints)
        {
            if (joint.Mount is { } mount)
            {
                _mounts.Load(mount, tile);
                _mounts.Deformation(_run.Solution.JointForces.Tile(tile), first, _cases, column, _deformation);
                AddMount(joint, first, tile, column, sums);
            }

            first += joint.Order;
        }
    }

    private void AddMount(Joint joint, int first, int tile, int column, Span<double> sums)
    {
        ReadOnlySpan<double> lambda = _run.Solution.JointForces.Tile(tile);
        ReadOnlySpan<double> adjoint = _run.Transfers.Adjoint.Tile(tile);
        int directions = joint.Mount!.Directions.Count;
        for (int response = 0; response < _conjugates.Length; response++)
        {
            _mounts.Feeling(adjoint, first, _conjugates.Length, response, _feeling);
            for (int row = 0; row < joint.Order; row++)
            {
                int place = response * _parameters + _layout.MountAt(joint, joint.Mount.Directions[row % directions]);
                LaneComplex stiffness = _feeling[row] * LaneComplex.At(lambda, (first + row) * _cases + column)
                    + LaneComplex.At(adjoint, (first + row) * _conjugates.Length + response) * _deformation[row];
                sums[place] += 0.5 * LaneComplex.RealOfProduct(_conjugates[response], stiffness);
                sums[place + 1] += 0.5 * LaneComplex.RealOfProduct(_conjugates[response], Loss(row, joint.Order));
            }
        }
    }

    /// <summary>αᵀ(E M + M E)δ with M the lossy part of the stiffness and E picking one row.</summary>
    private LaneComplex Loss(int row, int order)
    {
        LaneComplex sum = default;
        for (int i = 0; i < order; i++)
        {
            sum += _feeling[row] * (_mounts.Stiffness(row, i).ImaginaryPart * _deformation[i])
                + _feeling[i] * (_mounts.Stiffness(i, row).ImaginaryPart * _deformation[row]);
        }

        return sum;
    }

    /// <summary>A row that grows by dY lets the response grow by (e + Bᵀa)ᵀ dY (f − Bᵀλ), e the row of the response itself.</summary>
    private void AddRows(int tile, int column, Span<double> sums)
    {
        ReadOnlySpan<double> adjoint = _run.Transfers.Adjoint.Tile(tile);
        for (int part = 0; part < _run.Layout.Parts.Count; part++)
        {
            if (_run.Frfs[part] is null || _run.Layout.Parts[part].InterfaceCount == 0)
            {
                continue;
            }

            ReadOnlySpan<double> motion = _motion.Of(part, tile);
            int row = _layout.FirstRowOf(part);
            foreach (ConstraintEnd end in _run.Layout.Parts[part].Ends)
            {
                LaneComplex moved = LaneComplex.At(motion, end.Interface * _cases + column);
                for (int response = 0; response < _conjugates.Length; response++)
                {
                    LaneComplex felt = LaneComplex.At(adjoint, end.Constraint * _conjugates.Length + response);
                    sums[response * _parameters + row + end.Interface] += end.Sign * LaneComplex.RealOfProduct(_conjugates[response], felt * moved);
                }
            }
        }
    }
}
