using System.Diagnostics;
using Boltup.Engine.Kernels;

namespace Boltup.Tests.Engine.Kernels;

/// <summary>
/// Runs the kernel and coupling tests again in a child process that believes itself on a lesser machine: without AVX-512, without AVX2,
/// and without any vector instructions.
/// </summary>
public class OtherMachineTests
{
    private const string ChildMarker = "BOLTUP_TESTS_EXPECT_KERNELS";
    private const int PatienceMilliseconds = 300_000;

    [Theory]
    [InlineData("DOTNET_EnableAVX512", "vector256")]
    [InlineData("DOTNET_EnableAVX2", "vector128")]
    [InlineData("DOTNET_EnableHWIntrinsic", "scalar")]
    public async Task Kernels_WithInstructionsSwitchedOff_PassTheSameTests(string variable, string widest)
    {
        if (Environment.GetEnvironmentVariable(ChildMarker) is not null || KernelChoice.Available.All(variant => KernelChoice.NameOf(variant) != widest))
        {
            return;
        }

        var start = new ProcessStartInfo(
            "dotnet",
            [
                "vstest",
                typeof(OtherMachineTests).Assembly.Location,
                "--TestCaseFilter:FullyQualifiedName~Engine.Kernels|FullyQualifiedName~Engine.Coupling|FullyQualifiedName~TruthTable",
            ])
        {
            RedirectStandardOutput = true,
            RedirectStandardError = true,
        };
        start.Environment[variable] = "0";
        start.Environment[ChildMarker] = widest;
        using Process child = Process.Start(start)!;
        Task<string> output = child.StandardOutput.ReadToEndAsync();
        Task<string> error = child.StandardError.ReadToEndAsync();
        using var patience = new CancellationTokenSource(PatienceMilliseconds);
        await child.WaitForExitAsync(patience.Token);
        Assert.True(child.ExitCode == 0, await output + await error);
    }

    /// <summary>In the child: the switch must have worked, or the run would prove nothing.</summary>
    [Fact]
    public void KernelChoice_InTheChildProcess_IsTheLesserMachine()
    {
        string? expected = Environment.GetEnvironmentVariable(ChildMarker);
        Assert.True(expected is null || KernelChoice.Name == expected, $"expected {expected}, found {KernelChoice.Name}");
    }
}
