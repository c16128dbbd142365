using System.Globalization;
using BenchmarkDotNet.Running;
using Boltup.Benchmarks.Comparing;
using Boltup.Benchmarks.Files;
using Boltup.Benchmarks.Kernels;
using Boltup.Benchmarks.Paths;

if (args is ["ratios", .. string[] orders])
{
    NumPyRatios.Run(Console.Out, [.. orders.Select(order => int.Parse(order, CultureInfo.InvariantCulture))]);
    return;
}

if (args is ["inverses"])
{
    InverseRatios.Run(Console.Out);
    return;
}

if (args is ["files"])
{
    FileRates.Run(Console.Out);
    return;
}

if (args is ["paths"])
{
    PathTimes.Run(Console.Out);
    return;
}

if (args is ["compare"])
{
    CompareTimes.Run(Console.Out);
    return;
}

BenchmarkSwitcher.FromAssembly(typeof(Program).Assembly).Run(args);
