namespace SpecLint.Tests.Physics.Electrical;

public sealed class FilamentOracleTests
{
    // Maxwell, Treatise, art. 701, values worked by hand: circles of 25 cm radius.
    [Theory]
    [InlineData(0.04, 606.07e-9)]
    [InlineData(0.10, 337.68e-9)]
    [InlineData(0.20, 167.09e-9)]
    [InlineData(0.25, 123.52e-9)]
    public void CoaxialCircles_QuarterMetreRadius_MatchPublishedValues(double distance, double expected) =>
        Assert.Equal(expected, FilamentOracle.CoaxialCircles(0.25, 0.25, distance), 0.006e-9);

    [Fact]
    public void Polygons_ManySidedCircles_TendToMaxwell()
    {
        double[][] lower = Circle(0.05, 0.0);
        double[][] upper = Circle(0.04, 0.03);

        Assert.Equal(FilamentOracle.CoaxialCircles(0.05, 0.04, 0.03), FilamentOracle.Polygons(lower, upper), 2e-3 * FilamentOracle.CoaxialCircles(0.05, 0.04, 0.03));
    }

    private static double[][] Circle(double radius, double height) => [.. Enumerable.Range(0, 96)
        .Select(i => new[] { radius * Math.Cos(Math.PI * i / 48), radius * Math.Sin(Math.PI * i / 48), height })];
}
