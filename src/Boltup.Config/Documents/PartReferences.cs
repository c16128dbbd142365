using Boltup.Config.Binding;
using Boltup.Engine.Diagnostics;

namespace Boltup.Config.Documents;

/// <summary>Checks that the names within a part file agree.</summary>
internal static class PartReferences
{
    public static void Check(PartDocument part, DiagnosticBag diagnostics)
    {
        PointNodes.Check(part.Points, diagnostics);
        VirtualPointBinder.Check(part.VirtualPoints, part.Points, diagnostics);
        if (part.Model is LumpedModelDocument lumped)
        {
            CheckLumped(part, lumped, diagnostics);
        }
    }

    private static void CheckLumped(PartDocument part, LumpedModelDocument lumped, DiagnosticBag diagnostics)
    {
        var masses = new KnownNames("mass", lumped.Masses.Select(mass => mass.Point.Value));
        foreach (PointDocument point in part.Points)
        {
            masses.Check(point.Name.Value, point.Name.Span, diagnostics);
        }

        foreach (LumpedLinkDocument link in lumped.Links)
        {
            CheckLink(link, masses, diagnostics);
        }
    }

    private static void CheckLink(LumpedLinkDocument link, KnownNames masses, DiagnosticBag diagnostics)
    {
        foreach (Marked<string?> end in new[] { link.First, link.Second })
        {
            if (end.Value is string name)
            {
                masses.Check(name, end.Span, diagnostics);
            }
        }

        if (link.First.Value == link.Second.Value)
        {
            diagnostics.Error(ConfigCodes.JoinedToItself,
                $"a link joins `{link.First.Value ?? GroundPoint.Name}` to itself", link.Second.Span);
        }
    }
}
