using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Evidence;

/// <summary>
/// Makes translations, rotations and sound comparable in one sum: each dof is weighted with the inverse mean square of its kind over all
/// dofs and lines. With one kind only, the weight is a common factor that cancels from every ratio.
/// </summary>
internal static class KindWeights
{
    /// <summary>A weight for the squares of each spectrum; 0 for a kind that is zero throughout.</summary>
    public static double[] Of(IReadOnlyList<Dof> dofs, IReadOnlyList<Complex[]> spectra)
    {
        int[] kinds = [.. dofs.Select(KindOf)];
        double[] power = [.. spectra.Select(values => values.Sum(Square) / values.Length)];
        return [.. kinds.Select(kind => Inverse(Enumerable.Range(0, kinds.Length).Where(i => kinds[i] == kind).Average(i => power[i])))];
    }

    /// <summary>|value|², without the root that a modulus takes.</summary>
    public static double Square(Complex value) => value.Real * value.Real + value.Imaginary * value.Imaginary;

    private static double Inverse(double power) => power > 0 ? 1 / power : 0;

    private static int KindOf(Dof dof) => dof.IsTranslation ? 0 : dof.IsRotation ? 1 : 2 + (int)dof.Direction;
}
