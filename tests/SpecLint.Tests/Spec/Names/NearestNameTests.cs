using SpecLint.Spec.Names;

namespace SpecLint.Tests.Spec.Names;

public sealed class NearestNameTests
{
    [Theory]
    [InlineData("clearence", "clearance")]
    [InlineData("claerance", "clearance")]
    [InlineData("Hole_Length", "hole-length")]
    [InlineData("hole-widht", "hole-width")]
    public void Of_Slip_IsTheNameMeant(string written, string meant) =>
        Assert.Equal(meant, NearestName.Of(written, ["gap", "hole-length", "hole-width", "clearance"]));

    [Theory]
    [InlineData("")]
    [InlineData("thickness")]
    public void Of_NothingNear_IsNull(string written) => Assert.Null(NearestName.Of(written, ["gap", "hole-length", "clearance"]));

    [Fact]
    public void Of_EquallyNear_IsTheFirstInOrdinalOrder()
    {
        Assert.Equal("A-1", NearestName.Of("A-9", ["A-2", "A-1", "A-3"]));
        Assert.Equal("A-1", NearestName.Of("A-9", ["A-1", "A-2", "A-3"]));
    }

    [Fact]
    public void Suggestion_Slip_IsAPhrase() => Assert.Equal("; did you mean gap?", NearestName.Suggestion("gpa", ["gap"]));
}
