namespace Boltup.Engine.Identification;

/// <summary>Finds the λ of Tikhonov at one line from singular values and what the data carry in each singular direction.</summary>
/// <param name="values">Singular values σ.</param>
/// <param name="powers">|uᵢᴴu|² for each, summed over columns.</param>
/// <param name="outside">Power of the data outside the range of the FRFs, which no forces explain.</param>
/// <param name="rows">Number of indicators.</param>
internal sealed class DampingSearch(double[] values, double[] powers, double outside, int rows)
{
    private const int Steps = 80;
    private const int Refinements = 40;

    /// <summary>Damping below this share of the largest singular value is no damping in double precision.</summary>
    private const double SmallestShare = 1e-8;

    /// <summary>λ of the least ‖Yf−u‖²/(m − Σφ)².</summary>
    public double CrossValidated()
    {
        double best = Candidate(0);
        double bestStep = 0;
        for (int step = 1; step < Steps; step++)
        {
            if (CrossValidation(Candidate(step)) < CrossValidation(best))
            {
                (best, bestStep) = (Candidate(step), step);
            }
        }

        return Refine(bestStep);
    }

    /// <summary>λ of the largest curvature of lg‖Yf−u‖ against lg‖f‖; the smallest candidate when the curve has no corner.</summary>
    public double LCurveCorner()
    {
        double best = Candidate(0), bestCurvature = 0;
        for (int step = 1; step < Steps - 1; step++)
        {
            double curvature = Curvature(Point(step - 1), Point(step), Point(step + 1));
            if (curvature > bestCurvature)
            {
                (best, bestCurvature) = (Candidate(step), curvature);
            }
        }

        return best;
    }

    private double Candidate(double step) => values.Max() * Math.Pow(SmallestShare, 1 - step / (Steps - 1));

    private double CrossValidation(double lambda)
    {
        double residual = outside, freedom = rows;
        for (int i = 0; i < values.Length; i++)
        {
            double passed = Passed(values[i], lambda);
            residual += (1 - passed) * (1 - passed) * powers[i];
            freedom -= passed;
        }

        return residual / (freedom * freedom);
    }

    /// <summary>Golden section between the neighbours of the best candidate.</summary>
    private double Refine(double bestStep)
    {
        const double golden = 0.6180339887498949;
        double low = Math.Max(0, bestStep - 1), high = Math.Min(Steps - 1, bestStep + 1);
        for (int i = 0; i < Refinements; i++)
        {
            double first = high - golden * (high - low), second = low + golden * (high - low);
            bool left = CrossValidation(Candidate(first)) < CrossValidation(Candidate(second));
            (low, high) = left ? (low, second) : (first, high);
        }

        return Candidate((low + high) / 2);
    }

    /// <summary>lg of residual and solution norms.</summary>
    private (double Residual, double Solution) Point(int step)
    {
        double lambda = Candidate(step), residual = outside, solution = 0;
        for (int i = 0; i < values.Length; i++)
        {
            double passed = Passed(values[i], lambda);
            residual += (1 - passed) * (1 - passed) * powers[i];
            solution += values[i] > 0 ? passed * passed * powers[i] / (values[i] * values[i]) : 0;
        }

        return (Math.Log10(residual) / 2, Math.Log10(solution) / 2);
    }

    private static double Passed(double value, double lambda) => value == 0 ? 0 : 1 / (1 + lambda / value * (lambda / value));

    /// <summary>Curvature of the circle through three points, positive where the curve bends like an L.</summary>
    private static double Curvature((double X, double Y) a, (double X, double Y) b, (double X, double Y) c)
    {
        double area = (b.X - a.X) * (c.Y - a.Y) - (b.Y - a.Y) * (c.X - a.X);
        double lengths = Distance(a, b) * Distance(b, c) * Distance(a, c);
        return lengths > 0 ? 2 * area / lengths : 0;
    }

    private static double Distance((double X, double Y) a, (double X, double Y) b) =>
        Math.Sqrt((a.X - b.X) * (a.X - b.X) + (a.Y - b.Y) * (a.Y - b.Y));
}
