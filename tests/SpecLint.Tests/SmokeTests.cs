namespace SpecLint.Tests;

public sealed class SmokeTests
{
    [Fact]
    public void Build_Targets_Net10() => Assert.Equal(10, Environment.Version.Major);
}
