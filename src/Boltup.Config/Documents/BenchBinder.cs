using Boltup.Config.Binding;
using Boltup.Config.Yaml;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Evidence;
using Boltup.Engine.Identification;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;

namespace Boltup.Config.Documents;

/// <summary>Turns the validated nodes of a bench file into a document.</summary>
internal sealed class BenchBinder(DiagnosticBag diagnostics)
{
    public BenchDocument Bind(YamlMap root)
    {
        var @interface = (YamlMap)root["interface"]!;
        return new BenchDocument(
            root.Source,
            root["title"]?.MarkedText(),
            root["frequencies"] is YamlMap frequencies ? FrequencyBinder.Bind(frequencies, diagnostics) : null,
            [.. root["points"].Entries().Select(point => PointBinder.Bind(point, diagnostics))],
            VirtualPointBinder.Bind(root["virtual_points"], diagnostics),
            BindNames(@interface["points"]),
            [.. @interface["directions"].Items().Select(item => item.Direction())],
            @interface["mounts_belong_to"]?.Text() is { } side ? side == "source" : null,
            [.. root["installed_frf"].Items().Cast<YamlMap>().Select(BindFrf)],
            BindNames(root["indicators"]),
            BindNames(root["validation"]),
            [.. root["operations"].Entries().Select(BindSpectra)],
            root["solve"] is YamlMap solve ? new(BindSolve(solve), solve.Span) : new(SolveChoice.Plain, root.Span),
            root["second_installation"] is YamlMap second ? BindSecond(second) : null,
            root["model"] is YamlMap model ? new BenchModelDocument(model["assembly"]!.File(), model["source"]!.MarkedText()) : null,
            [.. root["routes"].Entries().Select(BindRoute)]);
    }

    private static Marked<string>[] BindNames(YamlNode? list) => [.. list.Items().Select(item => item.MarkedText())];

    private static BenchFrfDocument BindFrf(YamlMap map) => new(
        FrfFileBinder.Bind(map),
        map["coherence"]?.File(),
        map["averages"] is YamlNode averages ? new(averages.Integer(), averages.Span) : null);

    private static BenchSpectraDocument BindSpectra(YamlEntry entry)
    {
        var map = (YamlMap)entry.Value;
        YamlNode? single = map["file"] ?? map["cross_spectra"];
        return new BenchSpectraDocument(
            entry.MarkedKey(),
            single is null ? [.. map["runs"].Items().Select(run => run.File())] : [single.File()],
            map["phase"]?.Text() == "free" ? PhaseReference.Free : PhaseReference.Common,
            map["cross_spectra"] is not null,
            map["quantity"] is YamlNode quantity ? new(MotionNamed(quantity.Text()), quantity.Span) : null,
            map["amplitude"] is YamlNode amplitude
                ? new(amplitude.Text() == "peak" ? Amplitude.Peak : Amplitude.Rms, amplitude.Span)
                : null);
    }

    private static Quantity MotionNamed(string name) => name switch
    {
        "velocity" => Quantity.Velocity,
        "displacement" => Quantity.Displacement,
        _ => Quantity.Acceleration,
    };

    private SolveChoice BindSolve(YamlMap map)
    {
        string method = map["method"]!.Text();
        RefuseKeyOf(map, "below", "truncated", method);
        RefuseKeyOf(map, "damping", "tikhonov", method);
        RefuseKeyOf(map, "damping_by", "tikhonov", method);
        return method switch
        {
            "truncated" => new SolveChoice(SolveMethod.Truncated, map["below"]?.Number()),
            "tikhonov" => BindTikhonov(map),
            _ => SolveChoice.Plain,
        };
    }

    private SolveChoice BindTikhonov(YamlMap map)
    {
        if (map["damping"] is null == map["damping_by"] is null)
        {
            diagnostics.Error(ConfigCodes.NeedsOtherKey, "`tikhonov` needs either `damping` or `damping_by`", map.Span,
                "write `damping: 0.01`, or `damping_by: gcv`, or `damping_by: l_curve`");
        }

        DampingRule rule = map["damping_by"]?.Text() switch
        {
            "gcv" => DampingRule.CrossValidation,
            "l_curve" => DampingRule.LCurve,
            _ => DampingRule.Fixed,
        };
        return new SolveChoice(SolveMethod.Tikhonov, Rule: rule, Damping: map["damping"]?.Number() ?? 0);
    }

    private void RefuseKeyOf(YamlMap map, string key, string method, string chosen)
    {
        if (map.Find(key) is { } entry && chosen != method)
        {
            diagnostics.Error(ConfigCodes.NeedsOtherKey, $"`{key}` belongs to the method `{method}`, and the method is `{chosen}`", entry.KeySpan,
                $"remove `{key}`, or write `method: {method}`");
        }
    }

    private static SecondInstallationDocument BindSecond(YamlMap map) => new(
        map["title"]?.MarkedText(),
        [.. map["installed_frf"].Items().Cast<YamlMap>().Select(FrfFileBinder.Bind)],
        BindNames(map["sensors"]),
        [.. map["operations"].Entries().Select(BindSpectra)]);

    private RouteDocument BindRoute(YamlEntry entry)
    {
        var map = (YamlMap)entry.Value;
        YamlNode method = map["method"]!;
        ForceRoute route = method.Text() switch
        {
            "mount_stiffness" => ForceRoute.MountStiffness,
            "contact_force" => ForceRoute.Direct,
            _ => ForceRoute.FreeVelocity,
        };
        if (map["source"] is null == (route == ForceRoute.FreeVelocity))
        {
            diagnostics.Error(ConfigCodes.NeedsOtherKey, "`source` and the method `free_velocity` belong together", map.Span,
                "`free_velocity` needs the part file of the free source with `source`; the other methods take none");
        }

        return new RouteDocument(
            entry.MarkedKey(), new(route, method.Span), map["source"]?.File(), [.. map["operations"].Entries().Select(BindSpectra)]);
    }
}
