using Boltup.Config.Documents;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Mounts;
using Boltup.Engine.Spectra;

namespace Boltup.Config.Planning;

/// <summary>Turns the mounts of an assembly into engine laws, each once.</summary>
internal sealed class MountPlanner(AssemblyDocument assembly, DataLibrary library, DiagnosticBag diagnostics)
{
    private static readonly Direction[] SixDirections =
        [Direction.X, Direction.Y, Direction.Z, Direction.RX, Direction.RY, Direction.RZ];

    private readonly Dictionary<string, MountLaw?> _laws = [];

    /// <summary>The law of a mount, or null after an error.</summary>
    public MountLaw? Plan(string name)
    {
        if (!_laws.TryGetValue(name, out MountLaw? law))
        {
            ScaledLaw scaled = assembly.LawOf(name);
            law = PlanLaw(scaled.Law);
            law = law is null || scaled.Scale == 1 ? law : new ScaledMount(law, scaled.Scale);
            _laws.Add(name, law);
        }

        return law;
    }

    private MountLaw? PlanLaw(MountLawDocument document) => document switch
    {
        DirectionalLawDocument law => new DiagonalMount(SixDirections.Select(direction => new SpringDamper(
            direction,
            law.Stiffness.GetValueOrDefault(direction)?.Value ?? 0,
            law.LossFactor,
            law.Damping.GetValueOrDefault(direction)?.Value ?? 0))),
        MatrixLawDocument law => PlanMatrix(law),
        RelaxingLawDocument law => PlanLaw(law.AtRest) is { } atRest ? new RelaxingMount(atRest, law.Relaxation) : null,
        ComposedLawDocument law => PlanComposed(law),
        TableLawDocument law => new TablePlanner(library, diagnostics).Plan(law),
        _ => throw new InvalidOperationException($"no planner for {document.GetType().Name}"),
    };

    private static MatrixMount PlanMatrix(MatrixLawDocument law)
    {
        Direction[] directions = SixDirections[..law.Stiffness.Value.GetLength(0)];
        return new MatrixMount(
            directions,
            law.Stiffness.Value,
            law.LossFactor,
            [.. directions.Select(direction => law.Damping.GetValueOrDefault(direction)?.Value ?? 0)]);
    }

    private MountLaw? PlanComposed(ComposedLawDocument law)
    {
        MountLaw?[] planned = [.. law.Mounts.Select(mount => Plan(mount.Value))];
        if (Array.Exists(planned, mount => mount is null))
        {
            return null;
        }

        MountLaw[] mounts = [.. planned.OfType<MountLaw>()];
        return law.IsSeries ? PlanSeries(law, mounts) : new ParallelMount(mounts);
    }

    private SeriesMount? PlanSeries(ComposedLawDocument law, MountLaw[] mounts)
    {
        if (SeriesMount.CanJoin(mounts) && new SeriesMount(mounts) is { Directions.Count: > 0 } series)
        {
            return series;
        }

        diagnostics.Error(
            PlanCodes.SeriesDoesNotJoin,
            SeriesMount.CanJoin(mounts) ? "the mounts in series share no direction" : "the mounts in series do not have the same directions",
            law.Span,
            "name mounts that connect the same directions",
            [.. law.Mounts.Zip(mounts, (name, mount) => $"`{name.Value}` connects {string.Join(", ", mount.Directions.Select(Dof.NameOf))}")]);
        return null;
    }
}
