using System.Numerics;
using Boltup.Engine.Coupling;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Parts;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Identification;

/// <summary>
/// The matrix T that turns blocked forces of a source into the contact forces of its joints in one assembly, by coupling with unit blocked
/// forces. T is the unit matrix where the receiver is rigid against the source (Mondot, Petersson 1987; from memory).
/// </summary>
public static class ContactOfAssembly
{
    /// <param name="dofs">Interface dofs of the source, along the axes of its points.</param>
    /// <returns>dofs × dofs over the lines, or null after an error in <paramref name="diagnostics"/>.</returns>
    public static TiledMatrix? Transfer(InstalledSource installed, FrequencyAxis axis, IReadOnlyList<Dof> dofs, DiagnosticBag diagnostics)
    {
        AssemblyModel units = installed.Assembly with
        {
            Axis = axis,
            Operations = [.. dofs.Select((_, unit) => UnitForce(installed.Source, axis, dofs, unit))],
            Responses = [],
        };
        return Predictor.Predict(units, diagnostics) is { } prediction ? Read(prediction, installed, dofs, axis) : null;
    }

    /// <summary>One at a dof, and zero at all others: nothing is left to be assumed.</summary>
    private static Operation UnitForce(string part, FrequencyAxis axis, IReadOnlyList<Dof> dofs, int unit)
    {
        Complex[][] spectra = [.. dofs.Select(_ => new Complex[axis.Count])];
        Array.Fill(spectra[unit], Complex.One);
        return new Operation(dofs[unit].ToString(), ForceSum.Phase, Amplitude.Rms, [new ForceSet(ForceKind.Blocked, part, axis, dofs, spectra)]);
    }

    private static TiledMatrix Read(PredictionResult prediction, InstalledSource installed, IReadOnlyList<Dof> dofs, FrequencyAxis axis)
    {
        var transfer = new TiledMatrix(axis.Count, dofs.Count, dofs.Count);
        PlacedPart source = installed.Assembly.Parts.First(part => part.Name == installed.Source);
        for (int column = 0; column < dofs.Count; column++)
        {
            Complex[][] forces = [.. dofs.Select(_ => new Complex[axis.Count])];
            foreach (JointForceSpectrum joint in prediction.Operations[column].JointForces)
            {
                AddTo(forces, dofs, source, installed.Assembly.Joints.First(each => each.Name == joint.Joint), joint);
            }

            for (int row = 0; row < dofs.Count; row++)
            {
                transfer.ScatterSpectrum(row, column, forces[row]);
            }
        }

        return transfer;
    }

    /// <summary>Adds what the source exerts through one direction of a joint, in the axes of its own point.</summary>
    private static void AddTo(Complex[][] forces, IReadOnlyList<Dof> dofs, PlacedPart source, Joint joint, JointForceSpectrum carried)
    {
        bool isFirst = joint.First.Part == source.Name;
        JointEnd end = isFirst ? joint.First : joint.Second;
        if (end.Part != source.Name)
        {
            return;
        }

        foreach (DofTerm term in source.InAssemblyAxes(new Dof(end.Point, carried.Direction)).Terms)
        {
            int row = dofs.ToList().IndexOf(term.Dof);
            for (int line = 0; row >= 0 && line < carried.Values.Count; line++)
            {
                forces[row][line] += (isFirst ? term.Cosine : -term.Cosine) * carried.Values[line];
            }
        }
    }
}
