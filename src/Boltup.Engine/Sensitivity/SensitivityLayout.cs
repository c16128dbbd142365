using Boltup.Engine.Coupling;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Sensitivity;

/// <summary>The parameters of an assembly that the adjoint gives derivatives for, and where each of them is.</summary>
internal sealed class SensitivityLayout
{
    private readonly List<SensitivityParameter> _parameters = [];
    private readonly Dictionary<(string Mount, Direction Direction), int> _mounts = [];
    private readonly IReadOnlyList<Constraint> _constraints;
    private readonly int[] _firstRow;

    public SensitivityLayout(PredictionRun run)
    {
        _constraints = run.Layout.Constraints;
        foreach (Joint joint in run.Layout.Joints.Where(joint => joint.Mount is not null))
        {
            AddMount(joint);
        }

        _firstRow = [.. run.Layout.Parts.Select((part, i) => AddRows(part, run.Frfs[i]))];
    }

    public IReadOnlyList<SensitivityParameter> Parameters => _parameters;

    /// <summary>Place of the stiffness of a mount in a direction; its loss factor comes next.</summary>
    public int MountAt(Joint joint, Direction direction) => _mounts[(NameOf(joint), direction)];

    /// <summary>Place of the first FRF row of a part; the others follow in the order of its interface.</summary>
    public int FirstRowOf(int part) => _firstRow[part];

    private static string NameOf(Joint joint) => joint.MountName ?? joint.Name;

    private void AddMount(Joint joint)
    {
        foreach (Direction direction in joint.Mount!.Directions)
        {
            if (_mounts.TryAdd((NameOf(joint), direction), _parameters.Count))
            {
                _parameters.Add(new SensitivityParameter(SensitivityKind.MountStiffness, NameOf(joint), direction));
                _parameters.Add(new SensitivityParameter(SensitivityKind.MountLoss, NameOf(joint), direction));
            }
        }
    }

    /// <summary>A joined dof in the axes of the assembly.</summary>
    private string NameOf(PartLayout part, int dof)
    {
        ConstraintEnd end = part.Ends.First(end => end.Interface == dof);
        Constraint constraint = _constraints[end.Constraint];
        JointEnd place = end.Sign > 0 ? constraint.Joint.First : constraint.Joint.Second;
        return $"{part.Part.Name}.{new Dof(place.Point!, constraint.Direction)}";
    }

    private int AddRows(PartLayout part, TiledMatrix? frf)
    {
        int first = _parameters.Count;
        if (frf is not null)
        {
            _parameters.AddRange(part.Interface.Select((_, i) => new SensitivityParameter(SensitivityKind.FrfRow, NameOf(part, i))));
        }

        return first;
    }
}
