using Boltup.Engine.Spectra;

namespace Boltup.Engine.Parts;

/// <summary>A dof that is both a row and a column of a matrix of FRFs.</summary>
internal readonly record struct FrfPlace(string Name, int Row, int Column)
{
    /// <summary>The dofs of motion that were both excited and measured, in the order of the columns.</summary>
    public static FrfPlace[] InBoth(IReadOnlyList<Dof> rows, IReadOnlyList<Dof> columns)
    {
        List<Dof> responses = [.. rows];
        return [.. columns
            .Select((dof, column) => (Dof: dof, Place: new FrfPlace(dof.ToString(), responses.IndexOf(dof), column)))
            .Where(entry => entry.Place.Row >= 0 && entry.Dof.IsMotion)
            .Select(entry => entry.Place)];
    }
}
