using Boltup.Engine.Diagnostics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>
/// Whether the interface dofs c carry everything that goes from the source to the receiver: Ŷ_ba = Y_bc Y_cc⁻¹ Y_ca against the measured
/// Y_ba, all in one installation, a on the source and b on the receiver (interface completeness criterion, Meggitt, Elliott, Moorhouse,
/// Inter-Noise 2018; form from memory). A dof that is missing, such as a rotation, lowers the agreement.
/// </summary>
/// <param name="Estimated">Ŷ_ba.</param>
/// <param name="Agreement">Its <see cref="FrfAgreement.Consistency"/> is the criterion.</param>
public sealed record InterfaceCompleteness(FrfMatrix Estimated, FrfAgreement Agreement)
{
    /// <param name="atInterface">Y_cc, rows and columns in one order.</param>
    /// <param name="toReceiver">Y_bc.</param>
    /// <param name="fromSource">Y_ca.</param>
    /// <param name="through">Y_ba as measured.</param>
    /// <returns>The comparison, or null after an error in <paramref name="diagnostics"/>: Y_cc is singular.</returns>
    public static InterfaceCompleteness? Check(
        FrfMatrix atInterface, FrfMatrix toReceiver, FrfMatrix fromSource, FrfMatrix through, DiagnosticBag diagnostics)
    {
        SquareFrf.RequireInterface(atInterface, atInterface.Columns);
        SquareFrf.RequireInterface(fromSource, atInterface.Columns);
        FrfChain.RequireFit(toReceiver, fromSource, through);
        SquareFrf.RequireLines(atInterface.Axis, through.Axis);
        TiledMatrix? forces = SquareFrf.Solve(atInterface.Axis, atInterface.Values, fromSource.Values, "the installation", diagnostics);
        if (forces is null)
        {
            return null;
        }

        FrfMatrix estimated = FrfChain.Multiply(toReceiver, forces, through.Columns);
        return new InterfaceCompleteness(estimated, FrfAgreement.Of(estimated, through));
    }
}
