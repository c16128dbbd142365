using System.Globalization;
using System.Numerics;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Parts;
using Boltup.Engine.Spectra;
using MathNet.Numerics.LinearAlgebra;

namespace Boltup.Engine.VirtualPoints;

/// <summary>Judges virtual points: whether their channels see all motions, and agree with a rigid piece.</summary>
public static class VirtualPointCheck
{
    /// <summary>Consistency with the other channels below which one is a suspect: 1.6 times too large or too small, or 26° out of phase.</summary>
    private const double LeastConsistency = 0.95;

    /// <summary>Refuses points whose channels miss a motion, and warns about those that are exactly determined.</summary>
    /// <returns>False after an error in <paramref name="diagnostics"/>.</returns>
    public static bool SeesAllMotions(VirtualPoint point, SourceSpan? origin, DiagnosticBag diagnostics) =>
        SeesAllMotions(point, point.Sensors, "sensor", origin, diagnostics) & SeesAllMotions(point, point.Impacts, "impact", origin, diagnostics);

    /// <summary>Measures how rigid the neighbourhood of a point is, from every FRF that its channels have.</summary>
    /// <param name="data">The part as its data have it.</param>
    /// <returns>The sensors' figures, then the impacts'; nothing where FRFs are missing.</returns>
    public static IReadOnlyList<VirtualPointQuality> Measure(IPartModel data, VirtualPoint point, FrequencyAxis axis, DiagnosticBag diagnostics)
    {
        var found = new List<VirtualPointQuality>();
        Dof[] excitations = [.. data.Excitations.Where(dof => point.Sensors.All(sensor => data.HasFrf(sensor.Dof, dof))).Order()];
        if (point.Sensors.Count > 0 && excitations.Length > 0
            && data.Evaluate(axis, [.. point.Sensors.Select(sensor => sensor.Dof)], excitations, diagnostics) is { } sensed)
        {
            found.Add(Measure(point, point.Sensors, false, axis, excitations.Length, (line, channel, k) => sensed[line, channel, k]));
        }

        Dof[] responses = [.. data.Responses.Where(dof => point.Impacts.All(impact => data.HasFrf(dof, impact.Dof))).Order()];
        if (point.Impacts.Count > 0 && responses.Length > 0
            && data.Evaluate(axis, responses, [.. point.Impacts.Select(impact => impact.Dof)], diagnostics) is { } hit)
        {
            found.Add(Measure(point, point.Impacts, true, axis, responses.Length, (line, channel, k) => hit[line, k, channel]));
        }

        return found;
    }

    /// <summary>Says the figures of a point as a note.</summary>
    public static void Report(VirtualPointQuality quality, SourceSpan? origin, DiagnosticBag diagnostics)
    {
        string odd = quality.Odd is { } channel
            ? string.Create(CultureInfo.InvariantCulture, $"lowest with the others `{channel.Dof}` {channel.Consistency:F3}")
            : "no channel is checked by the others";
        diagnostics.Note(
            EngineCodes.VirtualPointFigures,
            string.Create(CultureInfo.InvariantCulture, $"virtual point `{quality.Point}`, {quality.Channels.Count} {(quality.OfImpacts ? "impacts" : "sensor channels")}: consistency {quality.Overall:F3}, {odd}, condition number {quality.Condition:F1}"),
            origin);
    }

    /// <summary>Names channels that do not go with the others.</summary>
    public static void Judge(VirtualPointQuality quality, SourceSpan? origin, DiagnosticBag diagnostics)
    {
        if (quality.Odd is { } odd && odd.Consistency < LeastConsistency)
        {
            diagnostics.Warning(
                EngineCodes.ChannelNotRigid,
                string.Create(CultureInfo.InvariantCulture, $"virtual point `{quality.Point}`: {(quality.OfImpacts ? "impact" : "sensor channel")} `{odd.Dof}` does not move with the rigid piece (consistency {odd.Consistency:F2})"),
                origin,
                "check its sign, direction and position; leave it out if the structure bends between it and the point",
                string.Create(CultureInfo.InvariantCulture, $"leaving it out removes {odd.Share:P0} of the misfit of all channels, whose consistency is {quality.Overall:F2}"));
        }
    }

    private static bool SeesAllMotions(
        VirtualPoint point, IReadOnlyList<MeasuredChannel> channels, string kind, SourceSpan? origin, DiagnosticBag diagnostics)
    {
        var transform = new RigidTransform(point, channels);
        if (channels.Count > 0 && transform.UnseenMotion() is { } unseen)
        {
            diagnostics.Error(
                EngineCodes.MotionNotSeen,
                $"virtual point `{point.Name}`: its {channels.Count} {kind} channels do not see the {unseen}",
                origin,
                kind == "sensor" ? "three triaxial sensors that do not lie on one line see all six motions" : "add impacts in other places and directions, at least nine");
            return false;
        }

        if (channels.Count > 0 && transform.IsExactlyDetermined)
        {
            diagnostics.Warning(
                EngineCodes.ExactlyDetermined,
                $"virtual point `{point.Name}`: six {kind} channels for six motions fit perfectly whatever they say",
                origin,
                "add channels: without them neither a flipped channel nor a flexible piece can be noticed");
        }

        SayWhatIsUnchecked(point, transform, kind, origin, diagnostics);
        return true;
    }

    private static void SayWhatIsUnchecked(
        VirtualPoint point, RigidTransform transform, string kind, SourceSpan? origin, DiagnosticBag diagnostics)
    {
        if (transform.Channels.Count <= 6)
        {
            return;
        }

        double[] freedom = transform.Freedom();
        string[] alone = [.. transform.Channels.Where((_, i) => freedom[i] == 0).Select(channel => $"`{channel.Dof}`")];
        if (alone.Length > 0)
        {
            diagnostics.Warning(
                EngineCodes.ChannelUnchecked,
                $"virtual point `{point.Name}`: no other channel checks {alone.Length} of its {transform.Channels.Count} {kind} channels",
                origin,
                kind == "sensor" ? "add a sensor outside the plane or line of the others" : "add impacts along these directions in other places",
                $"flipped or misplaced, they would fit all the same: {string.Join(", ", alone)}");
        }
    }

    private static VirtualPointQuality Measure(
        VirtualPoint point, IReadOnlyList<MeasuredChannel> channels, bool ofImpacts, FrequencyAxis axis, int frfs, Func<int, int, int, Complex> value)
    {
        var transform = new RigidTransform(point, channels);
        // û = R·T_u·u for motions; for loads the FRFs to the impacts explained by the point: T_f·Rᵀ from the right, transposed.
        Matrix<double> filter = ofImpacts
            ? (transform.ChannelsFromLoad() * transform.Rows.Transpose()).Transpose()
            : transform.Rows * transform.MotionFromChannels();
        var search = new OddChannelSearch(transform);
        var perLine = new double[axis.Count];
        var sums = new (double Sum, double Sizes)[channels.Count];
        for (int line = 0; line < axis.Count; line++)
        {
            double error = 0, power = 0;
            for (int k = 0; k < frfs; k++)
            {
                for (int channel = 0; channel < channels.Count; channel++)
                {
                    Complex measured = value(line, channel, k), filtered = Complex.Zero;
                    for (int other = 0; other < channels.Count; other++)
                    {
                        filtered += filter[channel, other] * value(line, other, k);
                    }

                    search.Add(channel, measured, filtered);
                    error += Square(measured - filtered);
                    power += Square(measured);
                    sums[channel] = (sums[channel].Sum + Square(measured + filtered), sums[channel].Sizes + Square(measured) + Square(filtered));
                }
            }

            perLine[line] = 1 - error / power;
        }

        return new VirtualPointQuality(
            point.Name, ofImpacts, axis, perLine,
            [.. channels.Select((channel, i) => (channel.Dof, sums[i].Sum / (2 * sums[i].Sizes)))], transform.Condition(), transform.IsExactlyDetermined)
        {
            Odd = search.Find(),
        };
    }

    private static double Square(Complex value) => value.Real * value.Real + value.Imaginary * value.Imaginary;
}
