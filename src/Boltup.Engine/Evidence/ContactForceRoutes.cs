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
    /// force that each massless mount exerts on the receiver.
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
        int size = path.Mount.Directions.Count;
        Complex[][] stretch = [.. path.Mount.Directions.Select(direction => Difference(
            Spectrum(sourceSide, new Dof(path.SourcePoint, direction)), Spectrum(receiverSide, new Dof(path.ReceiverPoint, direction))))];
        Complex[][] forces = [.. stretch.Select(_ => new Complex[axis.Count])];
        var stiffness = new TiledMatrix(Tiling.Lanes, size, size);
        for (int line = 0; line < axis.Count; line++)
        {
            if (line % Tiling.Lanes == 0)
            {
                path.Mount.FillStiffness(axis, line / Tiling.Lanes, stiffness.Tile(0));
            }

            for (int i = 0; i < size * size; i++)
            {
                forces[i / size][line] += stiffness[line % Tiling.Lanes, i / size, i % size] * stretch[i % size][line];
            }
        }

        return forces;
    }

    private static Complex[] Difference(Complex[] first, Complex[] second) => [.. first.Zip(second, (a, b) => a - b)];

    private static Complex[] Spectrum(SpectrumSet set, Dof dof)
    {
        int index = set.Dofs.ToList().IndexOf(dof);
        return index >= 0 ? set.Values[index] : throw new ArgumentException($"there is no motion at {dof}");
    }
}
