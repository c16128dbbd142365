using Boltup.Reports.Pictures;

namespace Boltup.Tests.Reports.Pictures;

/// <summary>
/// Colours as a dichromat sees them: the matrices of Machado, Oliveira and Fernandes, "A Physiologically-based Model for Simulation of
/// Color Vision Deficiency", IEEE TVCG 15 (2009), severity 1.0, on linear RGB (from memory); CIE 1976 L*a*b* under D65.
/// </summary>
internal static class ColourSight
{
    private static readonly double[] White = [0.95047, 1, 1.08883];

    private static readonly double[][] ToXyz =
    [
        [0.4124564, 0.3575761, 0.1804375],
        [0.2126729, 0.7151522, 0.0721750],
        [0.0193339, 0.1191920, 0.9503041],
    ];

    private static readonly double[][] Deutan =
    [
        [0.367322, 0.860646, -0.227968],
        [0.280085, 0.672501, 0.047413],
        [-0.011820, 0.042940, 0.968881],
    ];

    private static readonly double[][] Protan =
    [
        [0.152286, 1.052583, -0.204868],
        [0.114503, 0.786281, 0.099216],
        [-0.003882, -0.048116, 1.051998],
    ];

    public static double[] Lab(Rgb colour, ColourVision vision)
    {
        double[] linear = [Rgb.Linear(colour.Red), Rgb.Linear(colour.Green), Rgb.Linear(colour.Blue)];
        double[] seen = vision switch
        {
            ColourVision.Deutan => Multiply(Deutan, linear),
            ColourVision.Protan => Multiply(Protan, linear),
            _ => linear,
        };
        double[] f = [.. Multiply(ToXyz, [.. seen.Select(part => Math.Clamp(part, 0, 1))]).Zip(White, (part, white) => Response(part / white))];
        return [116 * f[1] - 16, 500 * (f[0] - f[1]), 200 * (f[1] - f[2])];
    }

    public static double Distance(double[] first, double[] second) => Math.Sqrt(first.Zip(second, (a, b) => (a - b) * (a - b)).Sum());

    private static double[] Multiply(double[][] matrix, double[] vector) => [.. matrix.Select(row => row.Zip(vector, (a, b) => a * b).Sum())];

    private static double Response(double t) => t > 216.0 / 24389 ? Math.Cbrt(t) : (24389.0 / 27 * t + 16) / 116;
}
