using System.Numerics;
using Boltup.Engine.Mounts;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>Routes that find the contact forces of one installation. They are no blocked forces: another receiver draws others.</summary>
public static class ContactForceRoutes
{
    /// <summary>Forces of sensors between source and receiver, under their name.</summary>
    /// <param name="forces">As the source acts on the receiver.</param>
    public static RouteForces Direct(SpectrumSet forces) => new(ForceRoute.Direct, forces);

    /// <summary>
    /// Mount-stiffness method of transfer path analysis (common practice; the stiffness as in ISO 10846): f = Z (u_source − u_receiver), the
    /// force that each mount exerts on the receiver; of a mount with mass effect that is not what the source exerts on the mount.
    /// </summary>
    /// <param name="mounts">The mounts and the points that they join.</param>
    /// <param name="sourceSide">Displacements that hold every direction of the mounts at their source points, in the axes of the mounts.</param>
    /// <param name="receiverSide">The same at their receiver points, at the same lines.</param>
    /// <returns>One force per mount and direction, named by the receiver point.</returns>
    public static RouteForces ThroughMounts(IReadOnlyList<MountPath> mounts, SpectrumSet sourceSide, SpectrumSet receiverSide)
    {
        SquareFrf.RequireLines(sourceSide.Axis, receiverSide.Axis);
        var dofs = new List<Dof>();
        var forces = new List<Complex[]>();
        foreach (MountPath path in mounts)
        {
            dofs.AddRange(path.Mount.Directions.Select(direction => new Dof(path.ReceiverPoint, direction)));
            forces.AddRange(Carried(path, sourceSide, receiverSide));
        }

        return new RouteForces(ForceRoute.MountStiffness, new SpectrumSet(sourceSide.Axis, dofs, forces));
    }

    private static Complex[][] Carried(MountPath path, SpectrumSet sourceSide, SpectrumSet receiverSide)
    {
        FrequencyAxis axis = sourceSide.Axis;
        int order = path.Mount.Order;
        int forceCount = path.Mount.Directions.Count;
        Complex[][] motion = Motion(path, sourceSide, receiverSide);
        Complex[][] forces = [.. path.Mount.Directions.Select(_ => new Complex[axis.Count])];
        var stiffness = new TiledMatrix(Tiling.Lanes, order, order);
        for (int line = 0; line < axis.Count; line++)
        {
            if (line % Tiling.Lanes == 0)
            {
                path.Mount.FillStiffness(axis, line / Tiling.Lanes, stiffness.Tile(0));
            }

            for (int i = 0; i < forceCount * order; i++)
            {
                (int row, int column) = (i / order, i % order);
                forces[row][line] += stiffness[line % Tiling.Lanes, order - forceCount + row, column] * motion[column][line];
            }
        }

        return forces;
    }

    /// <summary>The displacements that the stiffness of a mount takes: relative ones, or those of its two ends.</summary>
    private static Complex[][] Motion(MountPath path, SpectrumSet sourceSide, SpectrumSet receiverSide)
    {
        IEnumerable<Complex[]> source = path.Mount.Directions.Select(direction => Spectrum(sourceSide, new Dof(path.SourcePoint, direction)));
        IEnumerable<Complex[]> receiver = path.Mount.Directions.Select(direction => Spectrum(receiverSide, new Dof(path.ReceiverPoint, direction)));
        return path.Mount.IsTwoPort
            ? [.. source, .. receiver.Select(values => values.Select(value => -value).ToArray())]
            : [.. source.Zip(receiver, (first, second) => first.Zip(second, (a, b) => a - b).ToArray())];
    }

    private static Complex[] Spectrum(SpectrumSet set, Dof dof)
    {
        int index = set.Dofs.ToList().IndexOf(dof);
        return index >= 0 ? set.Values[index] : throw new ArgumentException($"there is no motion at {dof}");
    }
}
