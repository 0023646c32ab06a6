using SpecLint.Reporting.Output;

namespace SpecLint.Tests.Reporting;

public sealed class RelativePathTests
{
    [Theory]
    [InlineData("specs/a.yaml", "", "specs/a.yaml")]
    [InlineData("./specs//b/../a.yaml", "", "specs/a.yaml")]
    [InlineData("../a.yaml", "", "../a.yaml")]
    [InlineData("/home/x/a.yaml", "", "a.yaml")]
    [InlineData("/w/specs/a.yaml", "/w", "specs/a.yaml")]
    [InlineData("../w/specs/a.yaml", "/w", "specs/a.yaml")]
    [InlineData("/other/a.yaml", "/w", "../other/a.yaml")]
    [InlineData("C:/specs/a.yaml", "", "a.yaml")]
    public void Of_Path_IsToldFromTheWorkingFolder(string path, string folder, string expected) => Assert.Equal(expected, RelativePath.Of(path, folder));

    [Theory]
    [InlineData("a b/c#d?.yaml", "a%20b/c%23d%3F.yaml")]
    [InlineData("../größe.yaml", "../gr%C3%B6%C3%9Fe.yaml")]
    [InlineData("a:b.yaml", "a%3Ab.yaml")]
    public void Escape_Path_IsAUriReference(string path, string expected) => Assert.Equal(expected, RelativePath.Escape(path));
}
