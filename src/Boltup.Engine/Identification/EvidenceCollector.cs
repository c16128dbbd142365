using System.Numerics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Evidence;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.Identification;

/// <summary>Collects what speaks for and against identified forces.</summary>
public sealed class EvidenceCollector(IdentificationResult result, DiagnosticBag diagnostics)
{
    /// <summary>Level difference in dB over all lines from which a validation is called poor (common practice: 3 dB in third octaves).</summary>
    private const double PoorDb = 3;

    /// <param name="second">Another installation, where there is one.</param>
    /// <param name="installed">The bench as an assembly, where there is one.</param>
    /// <param name="routes">What was measured for other routes.</param>
    public BenchEvidence Collect(SecondInstallation? second, InstalledSource? installed, IReadOnlyList<RouteMeasurement> routes) => new(
        [.. OnBoard(), .. second is null ? [] : Transfer(second)],
        installed is null ? null : Stiffness(installed),
        [.. routes.SelectMany(Follow)]);

    private IEnumerable<OperationValidation> OnBoard()
    {
        foreach (IdentifiedOperation operation in result.Operations.Where(_ => result.Validation.Count > 0))
        {
            ValidationReport report = ValidationComparison.Compare(
                ValidationCheck.OnBoard, Accelerations(Spectra(operation.Phase, operation.Predicted)), Accelerations(Spectra(operation.Phase, operation.Measured)));
            if (Math.Abs(report.OverallLevelDifferenceDb) > PoorDb || report.RelativeError > 1)
            {
                diagnostics.Warning(
                    EngineCodes.ValidationPoor,
                    FormattableString.Invariant($"operation `{operation.Name}`: the validation sensors are off by {report.OverallLevelDifferenceDb:F1} dB, {report.RelativeError:P0} with phase"),
                    help: "look at validation.csv and at the data quality before these forces are handed over");
            }

            yield return new OperationValidation(operation.Name, null, report);
        }
    }

    /// <summary>The one column as it is; powers of several, which have no phase, as magnitudes.</summary>
    private static SpectrumSet Spectra(PhaseReference phase, IReadOnlyList<SpectrumSet> columns) => phase == PhaseReference.Common
        ? columns[0]
        : columns[0] with
        {
            Values = [.. columns[0].Dofs.Select((_, dof) =>
                IdentifiedOperation.MagnitudesOf(columns, dof).Select(value => new Complex(value, 0)).ToArray())],
        };

    /// <summary>Motion as the acceleration that sensors measure, so that figures over all lines are not ruled by the lowest; sound as it is.</summary>
    private static SpectrumSet Accelerations(SpectrumSet set) => set with
    {
        Values = [.. set.Values.Select((values, dof) => set.Dofs[dof].IsMotion
            ? values.Select((value, line) => -set.Axis.Omega(line) * set.Axis.Omega(line) * value).ToArray()
            : values)],
    };

    private IEnumerable<OperationValidation> Transfer(SecondInstallation second)
    {
        foreach ((string name, SpectrumSet measured) in second.Measured)
        {
            IdentifiedOperation operation = result.Operations.First(each => each.Name == name);
            if (operation.Phase == PhaseReference.Common
                && second.Installed.Evaluate(measured.Axis, second.Sensors, result.Interface, diagnostics) is { } frf)
            {
                SpectrumSet predicted = ResponsePrediction.Of(frf, LinePick.On(operation.Forces[0], measured.Axis));
                yield return new OperationValidation(
                    name, second.Title, ValidationComparison.Compare(ValidationCheck.Transfer, Accelerations(predicted), Accelerations(measured)));
            }
        }
    }

    private BenchStiffness? Stiffness(InstalledSource installed)
    {
        TiledMatrix? transfer = ContactOfAssembly.Transfer(installed, result.Axis, result.Interface, diagnostics);
        IdentifiedOperation? coherent = result.Operations.FirstOrDefault(operation => operation.Phase == PhaseReference.Common);
        return transfer is null ? null
            : coherent is null ? BenchStiffnessCheck.FromTransfer(result.Axis, result.Interface, transfer)
            : BenchStiffnessCheck.FromTransfer(transfer, coherent.Forces[0]);
    }

    private IEnumerable<RouteResult> Follow(RouteMeasurement route)
    {
        foreach ((string name, SpectrumSet measured) in route.Measured)
        {
            if (ForcesOf(route, measured) is { } forces)
            {
                yield return new RouteResult(route.Name, name, forces, Compare(name, forces));
            }
        }
    }

    private RouteForces? ForcesOf(RouteMeasurement route, SpectrumSet measured) => route.Route switch
    {
        ForceRoute.MountStiffness => AtTheSource(route, ContactForceRoutes.ThroughMounts(route.Mounts, measured, measured)),
        ForceRoute.FreeVelocity => route.FreeSource!.Evaluate(measured.Axis, measured.Dofs, measured.Dofs, diagnostics) is { } source
            ? FreeVelocityRoute.BlockedForces(source, measured, diagnostics)
            : null,
        _ => AtTheSource(route, ContactForceRoutes.Direct(measured)),
    };

    /// <summary>The force that a mount exerts on the receiver, under the name of the interface dof where it comes from.</summary>
    private static RouteForces AtTheSource(RouteMeasurement route, RouteForces forces) => forces with
    {
        Forces = forces.Forces with
        {
            Dofs = [.. forces.Forces.Dofs.Select(dof => dof with { Point = route.Mounts.FirstOrDefault(mount => mount.ReceiverPoint == dof.Point)?.SourcePoint ?? dof.Point })],
        },
    };

    private BenchStiffness? Compare(string name, RouteForces forces)
    {
        IdentifiedOperation operation = result.Operations.First(each => each.Name == name);
        bool comparable = operation.Phase == PhaseReference.Common && result.Interface.All(forces.Forces.Dofs.Contains);
        if (!comparable)
        {
            return null;
        }

        int[] order = [.. result.Interface.Select(dof => forces.Forces.Dofs.ToList().IndexOf(dof))];
        var ordered = new SpectrumSet(forces.Forces.Axis, result.Interface, [.. order.Select(i => forces.Forces.Values[i])]);
        return BenchStiffnessCheck.FromForces(ordered, LinePick.On(operation.Forces[0], ordered.Axis));
    }
}
