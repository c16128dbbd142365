using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Coupling;

/// <summary>
/// Which FRFs of a part the coupling needs. Rows: interface, then responses. Columns: interface, then excitations that are no
/// interface dofs.
/// </summary>
public sealed class PartLayout(PlacedPart part)
{
    private readonly List<DofCombination> _interface = [];
    private readonly List<DofCombination> _responses = [];
    private readonly List<DofCombination> _excitations = [];
    private readonly List<ConstraintEnd> _ends = [];

    public PlacedPart Part { get; } = part;

    /// <summary>The dofs that take part in joints: the first rows and columns.</summary>
    public IReadOnlyList<DofCombination> Interface => _interface;

    public int InterfaceCount => _interface.Count;

    public int ResponseCount => _responses.Count;

    public IReadOnlyList<ConstraintEnd> Ends => _ends;

    public IReadOnlyList<DofCombination> Rows => [.. _interface, .. _responses];

    public IReadOnlyList<DofCombination> Columns => [.. _interface, .. _excitations];

    /// <summary>Whether the part is asked for anything at all.</summary>
    public bool IsUsed => _interface.Count > 0 || (_responses.Count > 0 && _excitations.Count > 0);

    internal void AddEnd(int constraint, double sign, Dof dof) =>
        _ends.Add(new ConstraintEnd(constraint, sign, IndexIn(_interface, Part.InAssemblyAxes(dof))));

    /// <summary>Adds a response in the axes of the assembly.</summary>
    /// <returns>Its place among the responses of the part.</returns>
    internal int AddResponse(Dof dof) => IndexIn(_responses, Part.InAssemblyAxes(dof));

    /// <summary>Adds a force along one of the part's own dofs; call when all joints are known.</summary>
    /// <returns>Its column.</returns>
    internal int AddExcitation(Dof own)
    {
        DofCombination force = DofCombination.Own(own);
        int joined = _interface.IndexOf(force);
        return joined >= 0 ? joined : _interface.Count + IndexIn(_excitations, force);
    }

    private static int IndexIn(List<DofCombination> list, DofCombination wanted)
    {
        int index = list.IndexOf(wanted);
        if (index < 0)
        {
            index = list.Count;
            list.Add(wanted);
        }

        return index;
    }
}
