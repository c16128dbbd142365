using Boltup.Engine.Coupling;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Comparing;

/// <summary>Finds what two assemblies have in common and where it may differ: mounts, FRFs of parts, forces.</summary>
internal sealed class AttributionPlan
{
    private readonly PredictionRun _base;
    private readonly PredictionRun _changed;
    private readonly List<string> _causes = [];
    private readonly List<MountEdit> _mounts = [];
    private readonly List<PartEdit> _parts = [];
    private readonly List<string> _notAttributed = [];

    public AttributionPlan(PredictionRun before, PredictionRun changed)
    {
        (_base, _changed) = (before, changed);
        if (!before.Assembly.Axis.Matches(changed.Assembly.Axis))
        {
            _notAttributed.Add("the frequencies differ");
            return;
        }

        PlanMounts();
        PlanParts();
    }

    /// <summary>What the edits are called; one place for each of them.</summary>
    public IReadOnlyList<string> Causes => _causes;

    public IReadOnlyList<MountEdit> Mounts => _mounts;

    /// <summary>Parts with the same rows and columns of FRFs on both sides.</summary>
    public IReadOnlyList<PartEdit> Parts => _parts;

    public IReadOnlyList<string> NotAttributed => _notAttributed;

    private void PlanMounts()
    {
        int first = 0;
        foreach (Joint joint in _base.Layout.Joints)
        {
            Joint? other = _changed.Layout.Joints.FirstOrDefault(candidate => candidate.Name == joint.Name);
            if (other is null)
            {
                _notAttributed.Add($"joint {joint.Name} was removed");
            }
            else if (!JoinAlike(joint, other))
            {
                _notAttributed.Add($"joint {joint.Name} joins in another way");
            }
            else if (joint.Mount is not null)
            {
                _mounts.Add(new MountEdit(CauseOf(joint, other), joint, other, first));
            }

            first += joint.Order;
        }

        IEnumerable<Joint> added = _changed.Layout.Joints.Where(joint => _base.Layout.Joints.All(known => known.Name != joint.Name));
        _notAttributed.AddRange(added.Select(joint => $"joint {joint.Name} was added"));
    }

    private static bool JoinAlike(Joint one, Joint other) =>
        one.First == other.First && one.Second == other.Second && one.Mount is null == other.Mount is null
        && one.Order == other.Order && one.Directions.SequenceEqual(other.Directions);

    /// <summary>An edited mount is one cause for all of its joints, another mount one for each joint that it was given to.</summary>
    private int CauseOf(Joint joint, Joint other) => IndexOf(
        joint.MountName is { } mount && mount == other.MountName ? $"mount {mount}" : $"joint {joint.Name}");

    private int IndexOf(string cause)
    {
        int index = _causes.IndexOf(cause);
        if (index < 0)
        {
            index = _causes.Count;
            _causes.Add(cause);
        }

        return index;
    }

    private void PlanParts()
    {
        for (int i = 0; i < _base.Layout.Parts.Count; i++)
        {
            PartLayout part = _base.Layout.Parts[i];
            int other = _changed.Layout.IndexOf(part.Part.Name);
            if (other == _changed.Layout.Parts.Count || _base.Frfs[i] is not { } before || _changed.Frfs[other] is not { } after)
            {
                continue;
            }

            PartLayout changed = _changed.Layout.Parts[other];
            if (part.Rows.SequenceEqual(changed.Rows) && part.Columns.SequenceEqual(changed.Columns))
            {
                int cause = ReferenceEquals(before, after) ? -1 : IndexOf($"part {part.Part.Name}");
                _parts.Add(new PartEdit(cause, IndexOf("forces"), i, other));
            }
            else if (_notAttributed.Count == 0)
            {
                _notAttributed.Add($"part {part.Part.Name} is joined, driven or asked at other points");
            }
        }
    }
}
