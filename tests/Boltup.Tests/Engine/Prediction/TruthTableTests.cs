using System.Globalization;
using System.Numerics;
using Boltup.Engine.Coupling;
using Boltup.Engine.Parts;
using Boltup.Engine.Prediction;
using Boltup.Engine.Spectra;
using Boltup.Tests.Support;

namespace Boltup.Tests.Engine.Prediction;

/// <summary>
/// Which force on which structure (common practice of the trade), against numbers of an independent program that assembles the
/// chains directly; see Data/truth-table/README.md.
/// </summary>
public class TruthTableTests
{
    private const double Same = 1e-10;
    private const double Wrong = 0.03;

    private static readonly FrequencyAxis Axis = FrequencyAxis.FromHertz([10, 25, 40, 60, 85, 120, 160, 210, 260, 320]);
    private static readonly Dictionary<string, Complex[]> Truth = ReadTruth();

    private static readonly PlacedPart S = Chain.Part("S", [1.8, 0.7, 0.4], [9.0e5, 6.0e5], 0.02);
    private static readonly PlacedPart R = Chain.Part("R", [0.9, 3.5, 6.0], [4.0e5, 2.2e5], 0.04, (3, 8.0e4));
    private static readonly PlacedPart T = Chain.Part("T", [1.4, 2.0, 2.6, 9.0], [2.5e6, 1.8e6, 3.2e6], 0.01, (4, 5.0e6));
    private static readonly JointEnd Source = Chain.End("S", 1);
    private static readonly JointEnd Interface = Chain.End("S", 3);
    private static readonly Complex InternalForce = new(2.0, -0.5);

    [Fact]
    public void InternalForce_OnTheCoupledAssembly_IsTheReference()
    {
        Near.Equal(Truth["true_response_SR"], Coupled(R, Internal), Same);
        Near.Equal(Truth["true_response_ST"], Coupled(T, Internal), Same);
    }

    [Fact]
    public void JointForce_OfTheCoupledAssembly_IsTheContactForce()
    {
        Near.Equal(Truth["contact_force_SR"], Predict(R, Internal).JointForce(), Same);
        Near.Equal(Truth["contact_force_ST"], Predict(T, Internal).JointForce(), Same);
    }

    [Fact]
    public void JointForce_OnTheGround_IsTheBlockedForce()
    {
        PredictionResult held = Chain.Predict(
            Axis, [S], [Chain.Rigid(Interface, JointEnd.Ground)], [Internal], Chain.At(Source));
        Near.Equal(Truth["blocked_force"], held.JointForce(), Same);
    }

    [Fact]
    public void ContactForce_OnTheReceiverAlone_EqualsTheReference() =>
        Near.Equal(Truth["true_response_SR"], Alone(R, Truth["contact_force_SR"]), Same);

    [Fact]
    public void ContactForce_OnTheCoupledAssembly_IsWrong() =>
        AssertWrong("true_response_SR", Coupled(R, AtInterface(ForceKind.Applied, "contact_force_SR")));

    [Fact]
    public void BlockedForce_OnTheCoupledAssembly_EqualsTheReference() =>
        Near.Equal(Truth["true_response_SR"], Coupled(R, AtInterface(ForceKind.Blocked, "blocked_force")), Same);

    [Fact]
    public void BlockedForce_OnTheReceiverAlone_IsWrong() =>
        AssertWrong("true_response_SR", Alone(R, Truth["blocked_force"]));

    [Fact]
    public void BlockedForce_OnAnotherReceiver_EqualsItsReference() =>
        Near.Equal(Truth["true_response_ST"], Coupled(T, AtInterface(ForceKind.Blocked, "blocked_force")), Same);

    [Fact]
    public void ContactForceOfTheFirstReceiver_OnAnotherAlone_IsWrong() =>
        AssertWrong("true_response_ST", Alone(T, Truth["contact_force_SR"]));

    [Fact]
    public void ContactForceOfTheOtherReceiver_OnItAlone_EqualsTheReference() =>
        Near.Equal(Truth["true_response_ST"], Alone(T, Truth["contact_force_ST"]), Same);

    private static ForceSet Internal => Chain.Force(ForceKind.Applied, Axis, Source, InternalForce);

    private static ForceSet AtInterface(ForceKind kind, string force) => Chain.Force(kind, Axis, Interface, Truth[force]);

    private static Complex[] Coupled(PlacedPart receiver, ForceSet force) => Predict(receiver, force).Spectrum();

    private static PredictionResult Predict(PlacedPart receiver, ForceSet force) => Chain.Predict(
        Axis,
        [S, receiver],
        [Chain.Through(Chain.Mount(1.1e5, 0.15), Interface, Chain.End(receiver.Name, 1))],
        [force],
        Chain.At(Last(receiver)));

    private static Complex[] Alone(PlacedPart receiver, Complex[] force) => Chain.Predict(
        Axis,
        [receiver],
        [],
        [Chain.Force(ForceKind.Applied, Axis, Chain.End(receiver.Name, 1), force)],
        Chain.At(Last(receiver))).Spectrum();

    private static JointEnd Last(PlacedPart receiver) => Chain.End(receiver.Name, receiver.Model.Responses.Count);

    private static void AssertWrong(string truth, Complex[] response)
    {
        for (int line = 0; line < response.Length; line++)
        {
            double error = Complex.Abs(response[line] - Truth[truth][line]) / Complex.Abs(Truth[truth][line]);
            Assert.True(error > Wrong, FormattableString.Invariant($"only {error:P1} off at {Axis[line]} Hz"));
        }
    }

    private static Dictionary<string, Complex[]> ReadTruth() =>
        File.ReadLines(Repository.Data("truth-table", "truth_table.csv"))
            .Skip(1)
            .Select(row => row.Split(','))
            .GroupBy(cells => cells[0], cells => new Complex(Number(cells[2]), Number(cells[3])))
            .ToDictionary(group => group.Key, group => group.ToArray());

    private static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);
}
