using BenchmarkDotNet.Running;
using Boltup.Benchmarks.Files;
using Boltup.Benchmarks.Kernels;

if (args is ["ratios"])
{
    NumPyRatios.Run(Console.Out);
    return;
}

if (args is ["files"])
{
    FileRates.Run(Console.Out);
    return;
}

BenchmarkSwitcher.FromAssembly(typeof(Program).Assembly).Run(args);
