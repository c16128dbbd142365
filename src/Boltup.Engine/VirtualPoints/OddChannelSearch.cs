using System.Numerics;
using Boltup.Engine.Spectra;

namespace Boltup.Engine.VirtualPoints;

/// <summary>
/// Finds the channel without which the fit improves most. In a fit a wrong channel drags the others along, so that the largest misfit may be
/// another's; the misfit that leaving a channel out removes, w|e|²/(1 − h), is largest at a single wrong one by the Cauchy-Schwarz inequality
/// (h is the channel's entry on the diagonal of R·T_u; deletion of observations as in textbooks of regression, from memory).
/// </summary>
internal sealed class OddChannelSearch(RigidTransform transform)
{
    private readonly double[] _freedom = transform.Freedom();
    private readonly (double Sum, double Sizes)[] _predicted = new (double, double)[transform.Channels.Count];
    private readonly double[] _removed = new double[transform.Channels.Count];
    private double _misfit;

    /// <param name="channel">Number of the channel.</param>
    /// <param name="measured">Its value in the data.</param>
    /// <param name="fitted">Its value by the rigid motion that fits all channels.</param>
    public void Add(int channel, Complex measured, Complex fitted)
    {
        Complex error = measured - fitted;
        double misfit = transform.Channels[channel].Weight * Square(error);
        _misfit += misfit;
        if (_freedom[channel] > 0)
        {
            Complex predicted = measured - error / _freedom[channel];
            (double sum, double sizes) = _predicted[channel];
            _predicted[channel] = (sum + Square(measured + predicted), sizes + Square(measured) + Square(predicted));
            _removed[channel] += misfit / _freedom[channel];
        }
    }

    /// <summary>The odd channel, or null when no channel is checked by the others or nothing was measured.</summary>
    public OddChannel? Find()
    {
        int[] judged = [.. Enumerable.Range(0, _freedom.Length).Where(i => _freedom[i] > 0 && _predicted[i].Sizes > 0)];
        if (judged.Length == 0)
        {
            return null;
        }

        int odd = judged.MaxBy(i => _removed[i]);
        Dof dof = transform.Channels[odd].Dof;
        return new OddChannel(dof, _predicted[odd].Sum / (2 * _predicted[odd].Sizes), _misfit > 0 ? _removed[odd] / _misfit : 0);
    }

    private static double Square(Complex value) => value.Real * value.Real + value.Imaginary * value.Imaginary;
}
