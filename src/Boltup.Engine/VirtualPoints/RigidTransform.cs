using Boltup.Engine.Geometry;
using MathNet.Numerics.LinearAlgebra;

namespace Boltup.Engine.VirtualPoints;

/// <summary>
/// The rigid-body relation between some channels and the six dofs of a point (van der Seijs, van den Bosch, Rixen, de Klerk, COMPDYN 2013):
/// u = R·q + ε, with a row (d, r × d) for a channel along d at the distance r; for forces m = Rᵀ·f.
/// </summary>
/// <remarks>Small and the same at every frequency, so plain matrices do.</remarks>
public sealed class RigidTransform
{
    /// <summary>Smallest over largest singular value of the scaled R from which a motion counts as seen.</summary>
    private const double SeenShare = 1e-6;

    /// <summary>Least freedom of a channel that counts as checked by the others.</summary>
    private const double LeastFreedom = 1e-6;

    private static readonly string[] Motions =
        ["translation along x", "translation along y", "translation along z", "rotation about x", "rotation about y", "rotation about z"];

    private readonly Matrix<double> _weights;

    public RigidTransform(VirtualPoint point, IReadOnlyList<MeasuredChannel> channels)
    {
        Channels = channels;
        Rows = Matrix<double>.Build.Dense(channels.Count, 6, (row, column) => Entry(point, channels[row], column));
        _weights = Matrix<double>.Build.DenseDiagonal(channels.Count, channels.Count, i => channels[i].Weight);
        double length = Math.Sqrt(channels.Select(channel => (channel.At - point.At).Dot(channel.At - point.At)).DefaultIfEmpty(0).Average());
        Length = length > 0 ? length : 1;
    }

    public IReadOnlyList<MeasuredChannel> Channels { get; }

    /// <summary>R: channels × 6, translations then rotations in the axes of the point; metres where a rotation meets a translation.</summary>
    public Matrix<double> Rows { get; }

    /// <summary>Root mean square distance of the channels from the point in m, by which rotations are scaled.</summary>
    public double Length { get; }

    /// <summary>Whether nothing is left to judge the fit by: it is then perfect whatever the channels say.</summary>
    public bool IsExactlyDetermined => Channels.Count == 6;

    /// <summary>Condition number of R with rotations scaled by <see cref="Length"/>; infinite when a motion is not seen.</summary>
    public double Condition()
    {
        Vector<double> values = Scaled().Svd(computeVectors: false).S;
        return Channels.Count < 6 || values[5] <= SeenShare * values[0] ? double.PositiveInfinity : values[0] / values[5];
    }

    /// <summary>The motion that the channels see least, in words; null when they see all six.</summary>
    public string? UnseenMotion()
    {
        if (double.IsFinite(Condition()))
        {
            return null;
        }

        Matrix<double> scaled = Scaled();
        Vector<double> least = (scaled.Transpose() * scaled).Evd(Symmetricity.Symmetric).EigenVectors.Column(0);
        return Motions[least.Map(Math.Abs).MaximumIndex()];
    }

    /// <summary>T_u = (RᵀWR)⁻¹RᵀW, 6 × channels: motion of the point from the channels.</summary>
    public Matrix<double> MotionFromChannels() => (Rows.Transpose() * _weights * Rows).Inverse() * Rows.Transpose() * _weights;

    /// <summary>T_f = W·R(RᵀWR)⁻¹, channels × 6: the forces along the channels that make up a load at the point.</summary>
    public Matrix<double> ChannelsFromLoad() => _weights * Rows * (Rows.Transpose() * _weights * Rows).Inverse();

    /// <summary>
    /// How far each channel is checked by the others: 1 − h with h on the diagonal of R·T_u. 0 where a channel alone sees some motion, as the
    /// directions normal to the plane of three sensors do: it then fits whatever it says.
    /// </summary>
    public double[] Freedom()
    {
        Vector<double> share = (Rows * MotionFromChannels()).Diagonal();
        return [.. share.Select(own => 1 - own > LeastFreedom ? 1 - own : 0)];
    }

    private static double Entry(VirtualPoint point, MeasuredChannel channel, int column)
    {
        Vector3d axis = (column % 3) switch { 0 => point.Axes.X, 1 => point.Axes.Y, _ => point.Axes.Z };
        return column < 3 ? axis.Dot(channel.Along) : axis.Dot((channel.At - point.At).Cross(channel.Along));
    }

    private Matrix<double> Scaled()
    {
        Matrix<double> scaled = Matrix<double>.Build.Dense(Math.Max(6, Channels.Count), 6);
        for (int i = 0; i < Channels.Count * 6; i++)
        {
            scaled[i / 6, i % 6] = Rows[i / 6, i % 6] * Math.Sqrt(Channels[i / 6].Weight) / (i % 6 < 3 ? 1 : Length);
        }

        return scaled;
    }
}
