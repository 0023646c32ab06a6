using SpecLint.Reporting.Output;

namespace SpecLint.Tests.Reporting;

public sealed class AtomicFileTests : IDisposable
{
    private readonly string _folder = Directory.CreateTempSubdirectory("spec-lint-").FullName;

    public void Dispose() => Directory.Delete(_folder, recursive: true);

    [Fact]
    public void Write_NewFile_HasTheContentAlone()
    {
        AtomicFile.Write(At("a.txt"), s => s.Write("new"u8));
        Assert.Equal("new", File.ReadAllText(At("a.txt")));
        Assert.Single(Directory.GetFileSystemEntries(_folder));
    }

    [Fact]
    public void Write_FailureHalfWay_LeavesTheOldContentAlone()
    {
        File.WriteAllText(At("a.txt"), "old");
        Assert.Throws<InvalidOperationException>(() => AtomicFile.Write(At("a.txt"), s =>
        {
            s.Write("ne"u8);
            throw new InvalidOperationException();
        }));
        Assert.Equal("old", File.ReadAllText(At("a.txt")));
        Assert.Single(Directory.GetFileSystemEntries(_folder));
    }

    [Fact]
    public void Write_ReadOnlyTarget_IsRefused()
    {
        File.WriteAllText(At("a.txt"), "old");
        File.SetAttributes(At("a.txt"), FileAttributes.ReadOnly);
        Assert.Throws<OutputException>(() => AtomicFile.Write(At("a.txt"), s => s.Write("new"u8)));
        Assert.Equal("old", File.ReadAllText(At("a.txt")));
        File.SetAttributes(At("a.txt"), FileAttributes.Normal);
    }

    [Theory]
    [InlineData("")]
    [InlineData("absent/a.txt")]
    public void Write_FolderOrNoFolder_IsRefused(string name) =>
        Assert.Throws<OutputException>(() => AtomicFile.Write(At(name), s => s.Write("new"u8)));

    [Fact]
    public void Write_Link_WritesWhatItPointsTo()
    {
        Assert.SkipWhen(OperatingSystem.IsWindows(), "Links need a privilege there.");
        File.WriteAllText(At("a.txt"), "old");
        File.CreateSymbolicLink(At("link"), At("a.txt"));
        AtomicFile.Write(At("link"), s => s.Write("new"u8));
        Assert.Equal("new", File.ReadAllText(At("a.txt")));
        Assert.NotNull(new FileInfo(At("link")).LinkTarget);
    }

    [Fact]
    public void Write_Device_StaysADevice()
    {
        Assert.SkipWhen(OperatingSystem.IsWindows(), "There are no device files there.");
        AtomicFile.Write("/dev/null", s => s.Write("new"u8));
        Assert.Empty(File.ReadAllBytes("/dev/null"));
    }

    private string At(string name) => Path.Combine(_folder, name);
}
