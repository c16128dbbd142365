using Boltup.Config.Binding;
using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Documents;

/// <summary>Checks that every name in an assembly names something, as far as documents without data can tell.</summary>
internal sealed class AssemblyReferences(AssemblyDocument assembly, DiagnosticBag diagnostics)
{
    /// <summary>Composed mounts are evaluated element by element on the stack, which this keeps short.</summary>
    private const int MaximumElements = 16;

    private readonly Dictionary<string, KnownNames?> _pointsByPart = assembly.Parts.ToDictionary(
        part => part.Name.Value, part => part.Document?.KnownPoints is { } points ? new KnownNames("point", points) : null);

    private readonly KnownNames _parts = new("part", assembly.Parts.Select(part => part.Name.Value));
    private readonly KnownNames _mounts = new("mount", assembly.Mounts.Select(mount => mount.Name.Value));

    public void Check()
    {
        CheckMounts();
        CheckJoints();
        foreach (ForceDocument force in assembly.Operations.SelectMany(operation => operation.Forces))
        {
            _parts.Check(force.Part.Value, force.Part.Span, diagnostics);
            CheckHandover(force);
        }

        var responses = new KnownNames("response", assembly.Responses.Select(response => response.Name.Value));
        var operations = new KnownNames("operation", assembly.Operations.Select(operation => operation.Name.Value));
        foreach (TargetDocument target in assembly.Targets)
        {
            responses.Check(target.Response.Value, target.Response.Span, diagnostics);
            foreach (Marked<string> operation in target.Operations)
            {
                operations.Check(operation.Value, operation.Span, diagnostics);
            }
        }

        WeightingCheck.Run(assembly, diagnostics);
        foreach (ResponseDocument response in assembly.Responses)
        {
            CheckPoint(response.At.Value.Part, response.At.Value.Dof.Point, response.At.Span);
        }
    }

    private void CheckHandover(ForceDocument force)
    {
        if (force.Handover is null && force.Operation is { } stray)
        {
            diagnostics.Error(ConfigCodes.NeedsOtherKey, "`operation` goes with a handover of blocked forces", stray.Span,
                "name a `*.forces.yaml` with `file`, or remove `operation`");
        }
        else if (force.Handover is { } handover && force.HandoverOperation is null)
        {
            string[] names = [.. handover.Operations.Select(operation => operation.Name.Value)];
            diagnostics.Error(
                ConfigCodes.NoSuchOperation,
                force.Operation is { } asked ? $"`{force.File.Written}` holds no operation `{asked}`" : $"which operation of `{force.File.Written}`?",
                force.Operation?.Span ?? force.File.Span,
                force.Operation is { } wrong ? NearestName.Suggest(wrong.Value, names) : $"add `operation: {names[0]}`",
                Words.Known("operations", names));
        }
    }

    private void CheckMounts()
    {
        var madeOf = new Dictionary<string, IReadOnlyList<string>>(StringComparer.Ordinal);
        foreach (MountDocument mount in assembly.Mounts)
        {
            Marked<string>[] known = [.. mount.Law.Others.Where(other => _mounts.Check(other.Value, other.Span, diagnostics))];
            madeOf.Add(mount.Name.Value, [.. known.Select(other => other.Value)]);
        }

        var graph = new MountGraph(madeOf);
        foreach (string name in graph.Circular())
        {
            SayIsCircular(name, assembly.FindMount(name)!.Law);
        }

        foreach ((string name, _) in graph.CountElements(MaximumElements + 1).Where(count => count.Value > MaximumElements))
        {
            diagnostics.Error(ConfigCodes.TooManyElements, $"mount `{name}` is made of more than {MaximumElements} elements",
                assembly.FindMount(name)!.Name.Span, "for many equal mounts side by side use `like` with `scale`");
        }
    }

    private void SayIsCircular(string name, MountLawDocument law)
    {
        if (law is LikeLawDocument like)
        {
            diagnostics.Error(ConfigCodes.LikeItself, $"mount `{name}` is like itself", like.Mount.Span,
                "let one of the mounts in the circle have a stiffness of its own");
        }
        else if (law is ComposedLawDocument composed)
        {
            diagnostics.Error(ConfigCodes.MadeOfItself, $"mount `{name}` is made of itself", composed.Span,
                "let one of the mounts in the circle have a law of its own");
        }
    }

    private void CheckJoints()
    {
        var seen = new Dictionary<(string, string), JointDocument>();
        foreach (JointDocument joint in assembly.Joints)
        {
            bool hasPoints = CheckEnd(joint.First) & CheckEnd(joint.Second);
            bool hasMount = joint.Mount is null || _mounts.Check(joint.Mount.Value, joint.Mount.Span, diagnostics);
            if (hasPoints && hasMount)
            {
                CheckPair(joint, seen);
            }
        }
    }

    private bool CheckEnd(JointEndDocument end) => end.IsGround || CheckPoint(end.Part!, end.Point!, end.Span);

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

    /// <summary>The part must be there, and the point too where the part's document names its points.</summary>
    private bool CheckPoint(string part, string point, SourceSpan span)
    {
        if (!_parts.Check(part, span, diagnostics))
        {
            return false;
        }

        if (_pointsByPart[part] is not KnownNames points || points.Contains(point))
        {
            return true;
        }

        string? near = points.Nearest(point);
        diagnostics.Error(ConfigCodes.UnknownName, $"part `{part}` has no point `{point}`", span,
            near is null ? null : $"did you mean `{part}.{near}`?", Words.Known($"points of `{part}`", points.All));
        return false;
    }
}
