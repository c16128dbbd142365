using System.Numerics;
using Boltup.Engine;
using Boltup.Engine.Diagnostics;
using Boltup.Engine.Evidence;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Evidence;

public class ChannelOutliersTests
{
    private const double Gravity = 9.80665;

    private static readonly Lazy<FrfMatrix> CleanFrf = new(() => Frf("clean"));
    private static readonly Lazy<FrfMatrix> NoisyFrf = new(() => Frf("noisy"));
    private static readonly Lazy<SpectrumSet> CleanSpectra = new(() => Spectra("clean"));
    private static readonly Lazy<SpectrumSet> NoisySpectra = new(() => Spectra("noisy"));

    [Fact]
    public void Find_CleanBench_SuspectsNobody()
    {
        ChannelReport report = ChannelOutliers.Find(CleanFrf.Value, CleanSpectra.Value)!;
        Assert.Empty(report.Suspects);
        Assert.InRange(report.Misfit, 0, 1e-6);
    }

    [Fact]
    public void Find_NoisyBench_SuspectsNobody()
    {
        ChannelReport report = ChannelOutliers.Find(NoisyFrf.Value, NoisySpectra.Value)!;
        Assert.Empty(report.Suspects);
        Assert.Equal(report.Misfit, report.CorrectedMisfit);
    }

    /// <summary>Up to noise that leaves little to identify: then nothing is suspected rather than anything.</summary>
    [Theory]
    [InlineData(0.01, 1)]
    [InlineData(0.01, 2)]
    [InlineData(0.1, 3)]
    [InlineData(0.3, 4)]
    public void Find_NoiseOnEverything_SuspectsNobody(double noise, int seed) => Assert.Empty(Find(noise, seed, []));

    [Fact]
    public void Find_EachChannelFlippedInTurn_NamesIt()
    {
        for (int channel = 0; channel < 24; channel += 3)
        {
            ChannelSuspect suspect = Assert.Single(Find(CleanFrf.Value, CleanSpectra.Value, (channel, -1)));
            Assert.Equal((ChannelFault.Flipped, BenchData.Indicators[channel]), (suspect.Fault, suspect.Channel));
            Assert.Equal(-1, suspect.Factor, 3);
        }
    }

    [Theory]
    [InlineData(Gravity, ChannelFault.InG)]
    [InlineData(1 / Gravity, ChannelFault.InG)]
    [InlineData(-Gravity, ChannelFault.InG)]
    [InlineData(-1, ChannelFault.Flipped)]
    [InlineData(2.5, ChannelFault.Scaled)]
    [InlineData(0.5, ChannelFault.Scaled)]
    public void Find_EachChannelScaledInTurnAmongNoise_NamesItAndItsFactor(double factor, ChannelFault expected)
    {
        for (int channel = 1; channel < 24; channel += 13)
        {
            ChannelSuspect suspect = Assert.Single(Find(NoisyFrf.Value, NoisySpectra.Value, (channel, factor)));
            Assert.Equal((expected, BenchData.Indicators[channel]), (suspect.Fault, suspect.Channel));
            Assert.InRange(suspect.Factor / factor, 0.95, 1.05);
        }
    }

    [Fact]
    public void Find_FlippedChannelAmongOnePerCentNoise_NamesIt()
    {
        for (int channel = 1; channel < 24; channel += 11)
        {
            ChannelSuspect suspect = Assert.Single(Find(0.01, channel, [(channel, -1)]));
            Assert.Equal((ChannelFault.Flipped, BenchData.Indicators[channel]), (suspect.Fault, suspect.Channel));
        }
    }

    [Fact]
    public void Find_ChannelsExchanged_NamesThePairOrNobody()
    {
        int named = 0;
        for (int first = 0; first < 24; first += 4)
        {
            int second = (first + 7) % 24;
            IReadOnlyList<ChannelSuspect> suspects = ChannelOutliers.Find(NoisyFrf.Value, Swapped(NoisySpectra.Value, first, second))!.Suspects;
            Assert.All(suspects, suspect => Assert.Equal(
                (ChannelFault.Swapped, BenchData.Indicators[Math.Min(first, second)], BenchData.Indicators[Math.Max(first, second)]),
                (suspect.Fault, suspect.Channel, suspect.Other)));
            named += suspects.Count;
        }

        Assert.Equal(6, named);
    }

    [Fact]
    public void Find_SeveralFaultsAtOnce_NamesThemAll()
    {
        SpectrumSet spoilt = Swapped(Scaled(NoisySpectra.Value, (3, -1), (12, Gravity), (20, 2)), 7, 14);
        IReadOnlyList<ChannelSuspect> suspects = ChannelOutliers.Find(NoisyFrf.Value, spoilt)!.Suspects;
        Assert.Equal(
            [(ChannelFault.Flipped, 3), (ChannelFault.InG, 12), (ChannelFault.Scaled, 20), (ChannelFault.Swapped, 7)],
            suspects.Select(suspect => (suspect.Fault, Array.IndexOf(BenchData.Indicators, suspect.Channel))).OrderBy(entry => entry.Fault));
    }

    [Fact]
    public void Find_ChannelOfAnotherSensor_IsUnrelated()
    {
        var random = new Random(7);
        SpectrumSet clean = NoisySpectra.Value;
        Complex[][] values = [.. clean.Values];
        double size = Math.Sqrt(values[5].Average(value => value.Magnitude * value.Magnitude));
        values[5] = [.. values[5].Select(_ => size * new Complex(random.NextDouble() - 0.5, random.NextDouble() - 0.5))];
        ChannelSuspect suspect = Assert.Single(ChannelOutliers.Find(NoisyFrf.Value, clean with { Values = values })!.Suspects);
        Assert.Equal((ChannelFault.Unrelated, BenchData.Indicators[5]), (suspect.Fault, suspect.Channel));
        Assert.True(double.IsNaN(suspect.Factor));
    }

    [Fact]
    public void Find_SilentChannel_IsUnrelated()
    {
        Complex[][] values = [.. CleanSpectra.Value.Values];
        values[9] = new Complex[values[9].Length];
        ChannelSuspect suspect = Assert.Single(ChannelOutliers.Find(CleanFrf.Value, CleanSpectra.Value with { Values = values })!.Suspects);
        Assert.Equal((ChannelFault.Unrelated, BenchData.Indicators[9]), (suspect.Fault, suspect.Channel));
    }

    /// <summary>One channel more than forces: leaving one out leaves no check, but a factor that is constant over the band still shows.</summary>
    [Fact]
    public void Find_OneChannelMoreThanForces_StillNamesAFlippedOne()
    {
        FrfMatrix frf = BenchData.Frf("bench_insitu_clean.unv", BenchData.Indicators[..13], BenchData.Interface);
        SpectrumSet spectra = BenchData.Spectra("bench_operation_clean.unv", BenchData.Indicators[..13]);
        Assert.Empty(ChannelOutliers.Find(frf, spectra)!.Suspects);
        ChannelSuspect suspect = Assert.Single(Find(frf, spectra, (4, -1)));
        Assert.Equal((ChannelFault.Flipped, BenchData.Indicators[4]), (suspect.Fault, suspect.Channel));
    }

    [Fact]
    public void Find_AsManyChannelsAsForces_CanSayNothing() => Assert.Null(ChannelOutliers.Find(
        BenchData.Frf("bench_insitu_clean.unv", BenchData.Indicators[..12], BenchData.Interface),
        BenchData.Spectra("bench_operation_clean.unv", BenchData.Indicators[..12])));

    [Fact]
    public void Judge_Suspects_SaysWhatEachLooksLike()
    {
        Dof a = Dof.Parse("s1.x");
        var diagnostics = new DiagnosticBag();
        ChannelOutliers.Judge(
            "`2400 rpm`",
            null,
            new ChannelReport(
                [
                    new ChannelSuspect(ChannelFault.Flipped, a, null, -1, 20),
                    new ChannelSuspect(ChannelFault.InG, a, null, 9.81, 20),
                    new ChannelSuspect(ChannelFault.InG, a, null, -0.102, 20),
                    new ChannelSuspect(ChannelFault.Scaled, a, null, 2.513, 20),
                    new ChannelSuspect(ChannelFault.Swapped, a, Dof.Parse("s2.y"), 1, 20),
                    new ChannelSuspect(ChannelFault.Unrelated, a, null, double.NaN, 20),
                ],
                0.2,
                0.01,
                96),
            diagnostics);
        Assert.All(diagnostics.Items, item => Assert.Equal((EngineCodes.ChannelSuspect, Severity.Warning), (item.Code, item.Severity)));
        Assert.Equal(
            [
                "`2400 rpm`: `s1.x` seems to have the opposite sign",
                "`2400 rpm`: the installed FRFs of `s1.x` seem to be in g where m/s² is stated (factor 9.81)",
                "`2400 rpm`: `s1.x` seems to be in g where m/s² is stated, with the opposite sign (factor -0.102)",
                "`2400 rpm`: `s1.x` seems to be scaled by 2.51",
                "`2400 rpm`: `s1.x` and `s2.y` seem to be exchanged",
                "`2400 rpm`: `s1.x` does not go with its FRFs by any factor",
            ],
            diagnostics.Items.Select(item => item.Message));
        Assert.Equal("relative misfit of the least squares: 0.2 as measured, 0.01 with all suspects corrected", diagnostics.Items[0].Notes[1]);
    }

    private static FrfMatrix Frf(string quality) => BenchData.Frf($"bench_insitu_{quality}.unv", BenchData.Indicators, BenchData.Interface);

    private static SpectrumSet Spectra(string quality) => BenchData.Spectra($"bench_operation_{quality}.unv", BenchData.Indicators);

    private static IReadOnlyList<ChannelSuspect> Find(FrfMatrix frf, SpectrumSet spectra, params (int Channel, double Factor)[] factors) =>
        ChannelOutliers.Find(frf, Scaled(spectra, factors))!.Suspects;

    /// <summary>The clean bench with relative noise on every number of FRFs and spectra.</summary>
    private static IReadOnlyList<ChannelSuspect> Find(double noise, int seed, (int Channel, double Factor)[] factors)
    {
        var random = new Random(seed);
        Complex Spoil(Complex value) => value * (1 + noise * new Complex(Normal(random), Normal(random)) / Math.Sqrt(2));
        FrfMatrix clean = CleanFrf.Value;
        var frf = new FrfMatrix(clean.Axis, clean.Rows, clean.Columns);
        for (int i = 0; i < frf.Rows.Count * frf.Columns.Count; i++)
        {
            (int row, int column) = (i / frf.Columns.Count, i % frf.Columns.Count);
            frf.Values.ScatterSpectrum(row, column, [.. clean.Values.GatherSpectrum(row, column).Select(Spoil)]);
        }

        SpectrumSet spectra = CleanSpectra.Value;
        return Find(frf, spectra with { Values = [.. spectra.Values.Select(values => values.Select(Spoil).ToArray())] }, factors);
    }

    /// <summary>A normal number (Box–Muller).</summary>
    private static double Normal(Random random) =>
        Math.Sqrt(-2 * Math.Log(1 - random.NextDouble())) * Math.Cos(2 * Math.PI * random.NextDouble());

    private static SpectrumSet Scaled(SpectrumSet spectra, params (int Channel, double Factor)[] factors)
    {
        Complex[][] values = [.. spectra.Values];
        foreach ((int channel, double factor) in factors)
        {
            values[channel] = [.. values[channel].Select(value => factor * value)];
        }

        return spectra with { Values = values };
    }

    private static SpectrumSet Swapped(SpectrumSet spectra, int first, int second)
    {
        Complex[][] values = [.. spectra.Values];
        (values[first], values[second]) = (values[second], values[first]);
        return spectra with { Values = values };
    }
}
