using Boltup.Config.Binding;
using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Documents;

/// <summary>Checks that every name in an assembly names something, as far as documents without data can tell.</summary>
internal sealed class AssemblyReferences(AssemblyDocument assembly, DiagnosticBag diagnostics)
{
    private readonly string[] _parts = [.. assembly.Parts.Select(part => part.Name.Value)];
    private readonly string[] _mounts = [.. assembly.Mounts.Select(mount => mount.Name.Value)];

    public void Check()
    {
        CheckMounts();
        CheckJoints();
        foreach (ForceDocument force in assembly.Operations.SelectMany(operation => operation.Forces))
        {
            CheckPart(force.Part.Value, force.Part.Span);
        }

        foreach (ResponseDocument response in assembly.Responses)
        {
            CheckPoint(response.At.Value.Part, response.At.Value.Dof.Point, response.At.Span);
        }
    }

    private void CheckMounts()
    {
        foreach (MountDocument mount in assembly.Mounts)
        {
            if (mount.Law is LikeLawDocument like && IsMount(like.Mount) && LeadsTo(like, mount.Name.Value))
            {
                diagnostics.Error(ConfigCodes.LikeItself, $"mount `{mount.Name}` is like itself", like.Mount.Span,
                    "let one of the mounts in the circle have a stiffness of its own");
            }
        }
    }

    private bool IsMount(Marked<string> name)
    {
        bool isKnown = _mounts.Contains(name.Value);
        if (!isKnown)
        {
            diagnostics.Error(ConfigCodes.UnknownName, $"no mount is named `{name}`", name.Span, NearestName.Suggest(name.Value, _mounts),
                Words.Known("mounts", _mounts));
        }

        return isKnown;
    }

    private bool LeadsTo(LikeLawDocument like, string name)
    {
        string next = like.Mount.Value;
        for (int i = 0; i < _mounts.Length && next != name; i++)
        {
            if (assembly.FindMount(next)?.Law is not LikeLawDocument further)
            {
                return false;
            }

            next = further.Mount.Value;
        }

        return next == name;
    }

    private void CheckJoints()
    {
        var seen = new Dictionary<(string, string), JointDocument>();
        foreach (JointDocument joint in assembly.Joints)
        {
            bool hasPoints = CheckEnd(joint.First) & CheckEnd(joint.Second);
            bool hasMount = joint.Mount is null || IsMount(joint.Mount);
            if (hasPoints && hasMount)
            {
                CheckPair(joint, seen);
            }
        }
    }

    private bool CheckEnd(JointEnd end) => end.IsGround || CheckPoint(end.Part!, end.Point!, end.Span);

    private void CheckPair(JointDocument joint, Dictionary<(string, string), JointDocument> seen)
    {
        string first = joint.First.ToString();
        string second = joint.Second.ToString();
        if (first == second)
        {
            DiagnosticCode code = joint.First.IsGround ? ConfigCodes.GroundMisused : ConfigCodes.JoinedToItself;
            diagnostics.Error(code, $"joint `{joint.Name}` joins `{first}` to itself", joint.Second.Span, "name two different points");
            return;
        }

        var pair = string.CompareOrdinal(first, second) < 0 ? (first, second) : (second, first);
        if (!seen.TryAdd(pair, joint))
        {
            JointDocument other = seen[pair];
            diagnostics.Error(ConfigCodes.SameJoint, $"joints `{other.Name}` and `{joint.Name}` join the same two points", joint.Name.Span,
                "make one joint of them", $"the other is at {other.Name.Span}");
        }
    }

    private bool CheckPart(string name, SourceSpan span)
    {
        bool isKnown = _parts.Contains(name);
        if (!isKnown)
        {
            diagnostics.Error(ConfigCodes.UnknownName, $"no part is named `{name}`", span, NearestName.Suggest(name, _parts), Words.Known("parts", _parts));
        }

        return isKnown;
    }

    /// <summary>The part must be there, and the point too where the part's document names its points.</summary>
    private bool CheckPoint(string part, string point, SourceSpan span)
    {
        if (!CheckPart(part, span))
        {
            return false;
        }

        if (assembly.FindPart(part)!.Document?.KnownPoints is not { } points || points.Contains(point))
        {
            return true;
        }

        string? near = NearestName.Of(point, points);
        diagnostics.Error(ConfigCodes.UnknownName, $"part `{part}` has no point `{point}`", span,
            near is null ? null : $"did you mean `{part}.{near}`?", Words.Known($"points of `{part}`", points));
        return false;
    }
}
