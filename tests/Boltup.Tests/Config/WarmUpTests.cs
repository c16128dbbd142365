using Boltup.Config;

namespace Boltup.Tests.Config;

public class WarmUpTests
{
    [Fact]
    public void Run_FromSeveralThreads_DoesNotThrow() => Parallel.For(0, 4, _ => WarmUp.Run());
}
