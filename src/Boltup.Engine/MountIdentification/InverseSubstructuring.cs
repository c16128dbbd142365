using System.Numerics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Evidence;
using Boltup.Engine.Mounts;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.MountIdentification;

/// <summary>
/// Mounts from receptances of the assembled installation (inverse substructuring; Meggitt, Moorhouse; Haeussler, Klaassen, Rixen, J. Sound
/// Vib. (2020), both from memory): Z_C = Y_C⁻¹ over both ends of all mounts. Between the two ends of a mount nothing but the mount adds to
/// Z_C, so that block is minus its transfer stiffness, whatever the structures on both sides are. Dofs that are left out count as free of
/// force, and their elasticity and inertia end up in the result: that is the bias of the method.
/// </summary>
public static class InverseSubstructuring
{
    /// <summary>From this share on, what leaks to other mounts draws a warning.</summary>
    private const double NotableLeak = 0.1;

    /// <summary>Identifies all mounts of an installation.</summary>
    /// <returns>One result per mount, or null after an error in <paramref name="diagnostics"/>: the receptances are singular.</returns>
    public static IReadOnlyList<IdentifiedMount>? Identify(InstalledMounts installed, DiagnosticBag diagnostics)
    {
        if (SquareFrf.Solve(installed.Axis, installed.Receptance, Identity(installed), "the installation", diagnostics) is not { } stiffness)
        {
            return null;
        }

        IdentifiedMount[] found = [.. installed.Mounts.Select(mount => Read(installed, stiffness, mount))];
        foreach (IdentifiedMount mount in found)
        {
            Judge(installed.Axis, mount, diagnostics);
        }

        SayWhatIsOmitted(installed, diagnostics);
        return found;
    }

    private static TiledMatrix Identity(InstalledMounts installed)
    {
        int order = installed.Dofs.Count;
        var identity = new TiledMatrix(installed.Axis.Count, order, order);
        Complex[] ones = [.. Enumerable.Repeat(Complex.One, installed.Axis.Count)];
        for (int i = 0; i < order; i++)
        {
            identity.ScatterSpectrum(i, i, ones);
        }

        return identity;
    }

    private static IdentifiedMount Read(InstalledMounts installed, TiledMatrix stiffness, MountEnds mount)
    {
        var evidence = new InstalledEvidence(installed, stiffness, mount);
        IReadOnlyList<Direction> directions = installed.DirectionsOf(mount);
        return new IdentifiedMount(
            mount,
            new MountSpectrum(mount.ToString(), [.. directions.Select(direction => new MountTerm(direction, "", evidence.TransferOf(direction)))]),
            [.. directions.Select(evidence.Of)]);
    }

    private static void Judge(FrequencyAxis axis, IdentifiedMount mount, DiagnosticBag diagnostics)
    {
        double leak = mount.Evidence.Max(evidence => evidence.OtherMounts);
        if (leak > NotableLeak)
        {
            diagnostics.Warning(
                EngineCodes.MountsLeak,
                FormattableString.Invariant($"mount `{mount.Ends}` is not the only connection from `{mount.Ends.First}`: {100 * leak:F0} % of its stiffness leads to other mounts"),
                help: "measure both ends of every mount, with rotations where they matter, and look for hoses and cables that join the two sides");
        }

        var law = new TabledMount(mount.Stiffness.Terms.Select(term => new StiffnessTable(term.Direction, axis, term.Values)));
        IReadOnlyList<double> offending = law.Order == 0 ? [] : MountPassivity.Offending(law, axis);
        if (offending.Count > 0)
        {
            diagnostics.Warning(
                EngineCodes.MountGivesPower,
                $"mount `{mount.Ends}` gives power instead of dissipating it at {FrequencyList.Of(offending)}",
                help: "its loss is within the error of the measurement there: smooth the table, or leave these lines out");
        }
    }

    private static void SayWhatIsOmitted(InstalledMounts installed, DiagnosticBag diagnostics)
    {
        if (!installed.Dofs.Any(dof => dof.IsRotation))
        {
            diagnostics.Note(
                EngineCodes.RotationsOmitted,
                "the ends of the mounts are measured without rotations, which therefore count as free of moments",
                help: "an end with three sensors gives its rotations; where the change without the other dofs is small, they matter little");
        }
    }
}
