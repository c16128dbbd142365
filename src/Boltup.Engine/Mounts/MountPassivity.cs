using System.Numerics;
using Boltup.Engine.Coupling;
using Boltup.Engine.Spectra;
using MathNet.Numerics.LinearAlgebra;

namespace Boltup.Engine.Mounts;

/// <summary>
/// Does a mount dissipate? With e^{+jωt} the mean power that it takes up is ω/2 · xᴴ (K − Kᴴ)/(2j) x, so the anti-Hermitian part of its
/// stiffness must have no negative eigenvalue; of a single spring that is Im k ≥ 0 (common practice).
/// </summary>
public sealed class MountPassivity
{
    /// <summary>Share of the stiffness by which rounding may make a loss negative.</summary>
    private const double Tolerance = 1e-9;

    private readonly MountLaw _mount;
    private readonly FrequencyAxis _axis;
    private readonly TiledMatrix _stiffness;
    private readonly Complex[,] _loss;
    private readonly Complex[,] _factor;
    private int _tile = -1;

    private MountPassivity(MountLaw mount, FrequencyAxis axis)
    {
        (_mount, _axis) = (mount, axis);
        _stiffness = new TiledMatrix(Tiling.Lanes, mount.Order, mount.Order);
        _loss = new Complex[mount.Order, mount.Order];
        _factor = new Complex[mount.Order, mount.Order];
    }

    /// <summary>The frequencies in Hz at which the mount gives power.</summary>
    /// <param name="axis">Lines within the band of the mount.</param>
    public static IReadOnlyList<double> Offending(MountLaw mount, FrequencyAxis axis)
    {
        var check = new MountPassivity(mount, axis);
        var found = new List<double>();
        for (int line = 0; line < axis.Count; line++)
        {
            check.Load(line);
            if (!check.Dissipates())
            {
                found.Add(axis[line]);
            }
        }

        return found;
    }

    /// <summary>Smallest eigenvalue of the anti-Hermitian part at a line, in the unit of the stiffness.</summary>
    public static double SmallestLoss(MountLaw mount, FrequencyAxis axis, int line)
    {
        var check = new MountPassivity(mount, axis);
        check.Load(line);
        DenseAlgebra.PickUpProvider();
        return Matrix<Complex>.Build.DenseOfArray(check._loss).Evd(Symmetricity.Hermitian).EigenValues.Min(value => value.Real);
    }

    private void Load(int line)
    {
        int lane = line % Tiling.Lanes;
        if (_tile != line / Tiling.Lanes)
        {
            _tile = line / Tiling.Lanes;
            _mount.FillStiffness(_axis, _tile, _stiffness.Tile(0));
        }

        for (int i = 0; i < _mount.Order; i++)
        {
            for (int j = 0; j < _mount.Order; j++)
            {
                _loss[i, j] = (_stiffness[lane, i, j] - Complex.Conjugate(_stiffness[lane, j, i])) / new Complex(0, 2);
            }

            _loss[i, i] += Tolerance * Complex.Abs(_stiffness[lane, i, i]);
        }
    }

    /// <summary>Whether a Cholesky factor exists; a row of zeros is no loss and no gain.</summary>
    private bool Dissipates()
    {
        Array.Copy(_loss, _factor, _loss.Length);
        for (int k = 0; k < _mount.Order; k++)
        {
            double pivot = _factor[k, k].Real;
            if (!(pivot >= 0))
            {
                return false;
            }

            for (int i = k + 1; pivot > 0 && i < _mount.Order; i++)
            {
                for (int j = k + 1; j < _mount.Order; j++)
                {
                    _factor[i, j] -= _factor[i, k] * _factor[k, j] / pivot;
                }
            }
        }

        return true;
    }
}
