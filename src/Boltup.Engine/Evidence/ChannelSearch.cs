namespace Boltup.Engine.Evidence;

/// <summary>
/// Finds the corrections that make channels agree, in two ways: one by one, by the single factor or exchange that helps most, which is sharp
/// for one fault; and by leaving out whatever disturbs the others most and judging it by what the rest predicts, which withstands several.
/// Either way keeps only what matters by itself, and the simpler explanation wins unless the other leaves much less unexplained.
/// </summary>
internal sealed class ChannelSearch(ChannelFit fit, int forces)
{
    /// <summary>Share of the misfit that a channel must account for to be left out for a closer look.</summary>
    private const double LeaveOutShare = 0.2;

    /// <summary>Share of the misfit that a factor or an exchange must take away to be tried.</summary>
    private const double SingleShare = 0.15;

    /// <summary>Factor by which undoing a correction must raise the misfit, or it is dropped.</summary>
    private const double Decisive = 1.5;

    /// <summary>A factor this close to 1 is calibration, not a fault.</summary>
    private const double Calibration = 0.15;

    /// <summary>Share of a channel that a factor must explain, or the channel counts as unrelated.</summary>
    private const double Explained = 0.5;

    /// <summary>An exchange must fit this much better than the channels in their own places.</summary>
    private const double SwapShare = 0.25;

    /// <summary>Fewest channels beyond the forces with which leaving some out still leaves a check.</summary>
    private const int RobustRedundancy = 4;

    private const int MostSingles = 6;

    /// <summary>Squared relative misfit of perfect data in double precision.</summary>
    private const double Nothing = 1e-24;

    private readonly int _redundancy = fit.Channels - forces;

    /// <summary>The corrections and, for each, the factor by which the misfit rises without it.</summary>
    public IReadOnlyList<(ChannelCorrection Correction, double Rise)> Find()
    {
        List<(ChannelCorrection Correction, double Rise)> sharp = Search([]);
        if (_redundancy < RobustRedundancy)
        {
            return sharp;
        }

        List<(ChannelCorrection Correction, double Rise)> robust = Search(Explain(Disturbing()));
        return Cost(robust) < Cost(sharp) ? robust : sharp;
    }

    private List<(ChannelCorrection Correction, double Rise)> Search(List<ChannelCorrection> start)
    {
        AddSingles(start);
        return Confirm(start);
    }

    /// <summary>What is left unexplained, doubled by every correction that it takes.</summary>
    private double Cost(List<(ChannelCorrection Correction, double Rise)> found)
    {
        fit.Apply(found.Select(entry => entry.Correction));
        return Math.ScaleB(Math.Max(fit.Misfit(), Nothing), found.Count);
    }

    /// <summary>The channels without which the others agree.</summary>
    private List<int> Disturbing()
    {
        var left = new List<int>();
        while (left.Count < _redundancy / 2)
        {
            fit.Apply(LeaveOut(left));
            (double gain, int channel) = Enumerable.Range(0, fit.Channels).Select(i => (fit.GainOfLeavingOut(i), i)).Max();
            double misfit = fit.Misfit();
            if (misfit <= Nothing || gain < LeaveOutShare * misfit)
            {
                break;
            }

            left.Add(channel);
        }

        TakeBack(left);
        return left;
    }

    /// <summary>Channels left out because of others agree once those are gone.</summary>
    private void TakeBack(List<int> left)
    {
        int[] innocent;
        do
        {
            innocent = [.. left.Where(channel => IsRight(PredictionFromRest(left, channel)))];
            left.RemoveAll(innocent.Contains);
        }
        while (innocent.Length > 0 && left.Count > 0);
    }

    private static bool IsRight(ChannelPrediction prediction) =>
        Math.Abs(prediction.Factor - 1) < Calibration && prediction.Explained > Explained;

    private ChannelPrediction PredictionFromRest(List<int> left, int channel)
    {
        fit.Apply(LeaveOut(left.Where(other => other != channel)));
        return fit.Predict(channel);
    }

    private static IEnumerable<ChannelCorrection> LeaveOut(IEnumerable<int> channels) => channels.Select(ChannelCorrection.LeaveOut);

    /// <summary>Exchanges first, then factors, and what neither explains stays out.</summary>
    private List<ChannelCorrection> Explain(List<int> left)
    {
        Dictionary<int, ChannelPrediction> predictions = left.ToDictionary(channel => channel, channel => PredictionFromRest(left, channel));
        var corrections = new List<ChannelCorrection>();
        foreach ((int first, int second) in Pairs(left))
        {
            if (!corrections.Exists(done => done.Touches(first) || done.Touches(second)) && IsSwap(predictions[first], predictions[second]))
            {
                corrections.Add(ChannelCorrection.Swap(first, second));
            }
        }

        corrections.AddRange(left
            .Where(channel => !corrections.Exists(done => done.Touches(channel)))
            .Select(channel => predictions[channel].Explained > Explained
                ? ChannelCorrection.Scale(channel, 1 / predictions[channel].Factor)
                : ChannelCorrection.LeaveOut(channel))
            .ToArray());
        return corrections;
    }

    private static bool IsSwap(ChannelPrediction first, ChannelPrediction second)
    {
        double own = first.MisfitOf(first.Measured) + second.MisfitOf(second.Measured);
        double exchanged = first.MisfitOf(second.Measured) + second.MisfitOf(first.Measured);
        return exchanged < SwapShare * own && exchanged < 1;
    }

    private static IEnumerable<(int First, int Second)> Pairs(IReadOnlyList<int> channels) =>
        channels.SelectMany((first, i) => channels.Skip(i + 1).Select(second => (first, second)));

    private void AddSingles(List<ChannelCorrection> corrections)
    {
        for (int step = 0; step < MostSingles; step++)
        {
            fit.Apply(corrections);
            double misfit = fit.Misfit();
            int[] channels = [.. Enumerable.Range(0, fit.Channels).Where(i => !corrections.Exists(done => done.IsLeftOut && done.Channel == i))];
            (ChannelCorrection best, double gain) = BestFactor(channels);
            (ChannelCorrection swap, double swapGain) = BestSwap(channels);
            (best, gain) = swapGain > gain ? (swap, swapGain) : (best, gain);
            if (misfit <= Nothing || gain < SingleShare * misfit)
            {
                break;
            }

            Add(best, corrections);
        }
    }

    private (ChannelCorrection Correction, double Gain) BestFactor(int[] channels)
    {
        (ChannelCorrection Correction, double Gain) best = default;
        foreach (int channel in channels)
        {
            (double factor, double gain) = fit.BestFactor(channel);
            if (gain > best.Gain && Math.Abs(1 / factor - 1) >= Calibration)
            {
                bool unrelated = gain < Explained * fit.GainOfLeavingOut(channel);
                best = (unrelated ? ChannelCorrection.LeaveOut(channel) : ChannelCorrection.Scale(channel, factor), gain);
            }
        }

        return best;
    }

    private (ChannelCorrection Correction, double Gain) BestSwap(int[] channels)
    {
        (ChannelCorrection Correction, double Gain) best = default;
        foreach ((int first, int second) in Pairs(channels))
        {
            double gain = fit.GainOfSwapping(first, second);
            best = gain > best.Gain ? (ChannelCorrection.Swap(first, second), gain) : best;
        }

        return best;
    }

    /// <summary>Joins a factor with an earlier one of the same channel.</summary>
    private static void Add(ChannelCorrection correction, List<ChannelCorrection> corrections)
    {
        int earlier = correction.IsSwap ? -1 : corrections.FindIndex(done => !done.IsSwap && done.Channel == correction.Channel);
        if (earlier < 0)
        {
            corrections.Add(correction);
            return;
        }

        corrections[earlier] = correction with { Factor = correction.Factor * corrections[earlier].Factor };
    }

    /// <summary>Drops, weakest first, what does not matter by itself while all others are in place.</summary>
    private List<(ChannelCorrection Correction, double Rise)> Confirm(List<ChannelCorrection> corrections)
    {
        Refit(corrections);
        while (corrections.Count > 0)
        {
            fit.Apply(corrections);
            double misfit = Math.Max(fit.Misfit(), Nothing);
            List<(ChannelCorrection Correction, double Rise)> rises = [.. corrections.Select(correction => (correction, MisfitWithout(correction, corrections) / misfit))];
            (ChannelCorrection weakest, double rise) = rises.MinBy(entry => entry.Rise);
            if (rise >= Decisive)
            {
                return rises;
            }

            corrections.Remove(weakest);
            Refit(corrections);
        }

        return [];
    }

    private double MisfitWithout(ChannelCorrection correction, List<ChannelCorrection> corrections)
    {
        fit.Apply(corrections.Where(other => other != correction));
        return fit.Misfit();
    }

    /// <summary>Takes each factor anew from what all other channels, corrected, predict; one that became calibration goes.</summary>
    private void Refit(List<ChannelCorrection> corrections)
    {
        for (int i = 0; i < corrections.Count; i++)
        {
            ChannelCorrection correction = corrections[i];
            if (!correction.IsSwap && !correction.IsLeftOut)
            {
                fit.Apply(corrections.Where(other => other != correction));
                corrections[i] = correction with { Factor = 1 / fit.Predict(correction.Channel).Factor };
            }
        }

        corrections.RemoveAll(correction => !correction.IsSwap && Math.Abs(1 / correction.Factor - 1) < Calibration);
    }
}
