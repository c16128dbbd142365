using Boltup.Engine.Coupling;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Paths;

/// <summary>
/// From every force and every joint to every response of an assembly, at all lines of the coupling; an operation only multiplies them.
/// </summary>
/// <remarks>
/// Responses are in their own unit (m, m/s, m/s², rad…, Pa), so (jω)ⁿ is contained. With f the forces and λ the joint forces of an
/// operation, two sums give a response u, both exact and without any assumption:
/// <list type="bullet">
/// <item>u = Σ H f over all forces, H the transfer of the coupled assembly;</item>
/// <item>u = Σ K λ over the joints of the response's part + Σ D f over the forces on that part, K and D transfers of that part alone.
/// Where no force acts on the part, as with the blocked forces of a source and a response on its receiver, everything enters by the joints
/// and the second sum has no D.</item>
/// </list>
/// A joint from the part to itself counts with both of its ends.
/// </remarks>
public sealed class PathTransfers
{
    internal PathTransfers(CouplingLayout layout, FrequencyAxis axis, IReadOnlyList<Response> responses, IReadOnlyList<ForceDof> forces)
    {
        (Axis, Responses, Forces, Constraints) = (axis, responses, forces, layout.Constraints);
        FromForces = new TiledMatrix(axis.Count, responses.Count, forces.Count);
        FromJoints = new TiledMatrix(axis.Count, responses.Count, Constraints.Count);
        Adjoint = new TiledMatrix(axis.Count, Constraints.Count, responses.Count);
        Direct = responses.Any(response => forces.Any(force => force.Part == response.Part))
            ? new TiledMatrix(axis.Count, responses.Count, forces.Count)
            : null;
    }

    /// <summary>Lines of the coupling.</summary>
    public FrequencyAxis Axis { get; }

    /// <summary>What the rows belong to.</summary>
    public IReadOnlyList<Response> Responses { get; }

    /// <summary>What the columns of <see cref="FromForces"/> and <see cref="Direct"/> belong to.</summary>
    public IReadOnlyList<ForceDof> Forces { get; }

    /// <summary>What the columns of <see cref="FromJoints"/> belong to.</summary>
    public IReadOnlyList<Constraint> Constraints { get; }

    /// <summary>H: responses × forces, in the unit of the response per N (N·m, m³/s).</summary>
    public TiledMatrix FromForces { get; }

    /// <summary>
    /// K: responses × constraints, in the unit of the response per N (N·m) of joint force, counted positive from the first to the second
    /// point of the joint; zero for a joint that does not touch the response's part.
    /// </summary>
    public TiledMatrix FromJoints { get; }

    /// <summary>
    /// Constraints × responses: what a response gains per metre (rad) by which the two points of a joint are kept apart, in the unit of the
    /// response per m.
    /// </summary>
    public TiledMatrix Adjoint { get; }

    /// <summary>D: responses × forces, zero for a force on another part; null where no force acts on the part of a response.</summary>
    public TiledMatrix? Direct { get; }

    /// <summary>Whether a joint touches the part of a response.</summary>
    public bool Touches(int constraint, int response) => Touches(Constraints[constraint], Responses[response].Part);

    /// <summary>Whether a force acts on the part of a response.</summary>
    public bool IsDirect(int force, int response) => Forces[force].Part == Responses[response].Part;

    private static bool Touches(Constraint constraint, string part) =>
        (constraint.Side != JointSide.Second && constraint.Joint.First.Part == part)
        || (constraint.Side != JointSide.First && constraint.Joint.Second.Part == part);
}
