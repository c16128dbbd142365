using System.Numerics;
using Boltup.Engine.Mounts;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;
using CsCheck;

namespace Boltup.Tests.Engine.Mounts;

public class RelaxingMountTests
{
    private const double Static = 2e5;

    /// <summary>Standard linear solid as springs and a dashpot (any textbook on viscoelasticity): k₀ beside k₁ and c in series.</summary>
    [Fact]
    public void Zener_AnyFrequency_IsASpringBesideASpringAndDashpotInSeries()
    {
        const double stiffening = 3;
        const double time = 0.002;
        double second = Static * (stiffening - 1);
        MountLaw composed = new ParallelMount(
            [Chain.Mount(Static, 0), new SeriesMount([Chain.Mount(second, 0), Chain.Mount(0, 0, time * second)])]);
        foreach (double hz in new[] { 1.0, 80, 4000 })
        {
            Near.Equal(MountAt.Entry(composed, hz), MountAt.Entry(Relaxing(stiffening, time, 1), hz), 1e-14);
        }
    }

    /// <summary>Peak of the Zener loss factor: (d − 1)/(2√d) at ωτ = 1/√d, where |k| = k₀√d (from the closed form).</summary>
    [Fact]
    public void Zener_AtItsLossPeak_HasTheClosedFormLossFactor()
    {
        double peakHz = 1 / Math.Sqrt(4) / 0.002 / (2 * Math.PI);
        Complex k = MountAt.Entry(Relaxing(4, 0.002, 1), peakHz);
        Assert.Equal(0.75, k.Imaginary / k.Real, 1e-13);
        Assert.Equal(2 * Static, Complex.Abs(k), 1e-13 * Static);
    }

    /// <summary>
    /// Peak of the loss factor of the fractional Zener model: (d − 1) sin(απ/2) / (2√d + (d + 1) cos(απ/2)) at (ωτ)^α = 1/√d
    /// (Pritz, J. Sound Vib. 195 (1996) 103; from memory, and it follows from the law).
    /// </summary>
    [Theory]
    [InlineData(2.5, 0.3)]
    [InlineData(6, 0.6)]
    [InlineData(20, 0.85)]
    public void FractionalZener_AroundItsLossPeak_HasTheClosedFormMaximum(double d, double order)
    {
        double expected = (d - 1) * Math.Sin(order * Math.PI / 2) / (2 * Math.Sqrt(d) + (d + 1) * Math.Cos(order * Math.PI / 2));
        double peakHz = Math.Pow(d, -0.5 / order) / 0.002 / (2 * Math.PI);
        MountLaw mount = Relaxing(d, 0.002, order);
        Assert.Equal(expected, LossFactor(mount, peakHz), 1e-13);
        Assert.True(LossFactor(mount, 1.2 * peakHz) < expected);
        Assert.True(LossFactor(mount, peakHz / 1.2) < expected);
    }

    [Fact]
    public void FractionalZener_FarFromRelaxation_IsStaticOrStiffened()
    {
        MountLaw mount = Relaxing(2.5, 0.01, 0.5);
        Near.Equal(new Complex(Static, 0), MountAt.Entry(mount, 1e-12), 1e-5);
        Near.Equal(new Complex(2.5 * Static, 0), MountAt.Entry(mount, 1e14), 1e-5);
    }

    [Fact]
    public void FractionalZener_StiffeningOfOne_IsAPlainSpring() =>
        Near.Equal(new Complex(Static, 0), MountAt.Entry(Relaxing(1, 0.01, 0.5), 77), 1e-15);

    /// <summary>A causal, passive law stiffens with frequency and never gives power.</summary>
    [Fact]
    public void FractionalZener_AnyParameters_StiffensAndDissipates() => Gen.Select(Gen.Double[1, 50], Gen.Double[0.05, 1], Gen.Double[0.1, 5000])
        .Sample((d, order, hz) =>
        {
            MountLaw mount = Relaxing(d, 1e-3, order);
            Complex low = MountAt.Entry(mount, hz);
            Complex high = MountAt.Entry(mount, 1.3 * hz);
            Assert.True(low.Imaginary >= 0);
            Assert.True(Complex.Abs(high) >= Complex.Abs(low) * (1 - 1e-14));
        });

    private static double LossFactor(MountLaw mount, double hz)
    {
        Complex k = MountAt.Entry(mount, hz);
        return k.Imaginary / k.Real;
    }

    private static RelaxingMount Relaxing(double stiffening, double time, double order) =>
        new(Chain.Mount(Static, 0), new Relaxation(stiffening, time, order));
}
