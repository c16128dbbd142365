using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Coupling;

/// <summary>The signed Boolean matrix B of an assembly, kept as lists: its rows, and which part takes part in them where.</summary>
public sealed class CouplingLayout
{
    private readonly Dictionary<string, PartLayout> _byName;

    public CouplingLayout(IReadOnlyList<PlacedPart> parts, IReadOnlyList<Joint> joints)
    {
        Joints = joints;
        Parts = [.. parts.Select(part => new PartLayout(part))];
        _byName = Parts.ToDictionary(layout => layout.Part.Name);
        Constraints = [.. joints.SelectMany(joint => joint.Constraints)];
        for (int row = 0; row < Constraints.Count; row++)
        {
            AddEnds(row);
        }

        RotationLength = LengthScale.Of(parts, joints);
    }

    public IReadOnlyList<PartLayout> Parts { get; }

    public IReadOnlyList<Joint> Joints { get; }

    /// <summary>Rows of B, joint by joint.</summary>
    public IReadOnlyList<Constraint> Constraints { get; }

    /// <summary>Length in m that makes rotations and moments comparable with translations and forces.</summary>
    public double RotationLength { get; }

    /// <summary>Factor of a constraint that makes rotations comparable: the length for a rotation, otherwise 1.</summary>
    public double ScaleOf(int constraint) => Constraints[constraint].Direction >= Direction.RX ? RotationLength : 1;

    /// <summary>Turns the solution of the scaled interface problem into forces and moments.</summary>
    /// <param name="lambda">constraints × columns entries.</param>
    internal void Unscale(Span<double> lambda, int columns)
    {
        for (int constraint = 0; constraint < Constraints.Count; constraint++)
        {
            double scale = ScaleOf(constraint);
            if (scale != 1)
            {
                int length = columns * Tiling.EntryLength;
                foreach (ref double value in lambda.Slice(constraint * length, length))
                {
                    value *= scale;
                }
            }
        }
    }

    public PartLayout this[string part] => _byName[part];

    /// <summary>Place of a part in <see cref="Parts"/>.</summary>
    public int IndexOf(string part) => Parts.TakeWhile(candidate => candidate.Part.Name != part).Count();

    private void AddEnds(int row)
    {
        Constraint constraint = Constraints[row];
        if (constraint.Side != JointSide.Second)
        {
            AddEnd(row, 1, constraint.Joint.First);
        }

        if (constraint.Side != JointSide.First)
        {
            AddEnd(row, -1, constraint.Joint.Second);
        }
    }

    private void AddEnd(int row, double sign, JointEnd end)
    {
        if (end.Part is { } part)
        {
            _byName[part].AddEnd(row, sign, new Dof(end.Point, Constraints[row].Direction));
        }
    }
}
