using Boltup.Engine.Diagnostics;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Evidence;

/// <summary>
/// A source of masses 1 to 3 on a receiver of masses 6 to 8, which touch in the interface masses 4 and 5 and nowhere else; invented numbers.
/// </summary>
internal static class InstalledLattice
{
    public static readonly FrequencyAxis Axis = FrequencyAxis.Even(5, 5, 37);
    public static readonly Dof[] Source = Dofs("1", "2", "3");
    public static readonly Dof[] Interface = Dofs("4", "5");
    public static readonly Dof[] Receiver = Dofs("6", "7", "8");

    private static readonly PlacedPart Installation = Chain.Part(
        "installed",
        [1, 0.6, 0.8, 0.5, 0.7, 1.5, 2, 1.2],
        [
            Link(0, 1, 3e4), Link(1, 2, 5e4), Link(0, 3, 8e4), Link(1, 3, 2e4), Link(1, 4, 6e4), Link(2, 4, 9e4),
            Link(3, 4, 1e4), Link(3, 5, 7e4), Link(3, 6, 4e4), Link(4, 6, 5e4), Link(4, 7, 8e4), Link(5, 6, 3e4), Link(6, 7, 6e4),
            Link(5, null, 2e5), Link(7, null, 1e5),
        ]);

    public static FrfMatrix Frf(IReadOnlyList<Dof> rows, IReadOnlyList<Dof> columns) =>
        Installation.Model.Evaluate(Axis, rows, columns, new DiagnosticBag())!;

    private static LumpedLink Link(int first, int? second, double stiffness) => new(first, second, stiffness, 0.03, 0);

    private static Dof[] Dofs(params string[] points) => [.. points.Select(point => new Dof(point, Direction.X))];
}
