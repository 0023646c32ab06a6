using SpecLint.Physics.Geometry;
using SpecLint.Physics.Magnetics;

namespace SpecLint.Tests.Physics.Magnetics;

public sealed class MagneticLayersTests
{
    private static readonly MagneticLayers Twin = new()
    {
        MagnetThickness = 0.01, RecoilPermeability = 1.05, Gap = 0.017, Opposite = OppositeSide.Magnets, Behind = SteelPlate.Ideal,
    };

    [Theory]
    [InlineData(1.0)]
    [InlineData(50.0)]
    [InlineData(400.0)]
    public void Response_FacingMagnets_IsPublishedForm(double k)
    {
        double t = Math.Tanh(k * 0.01);
        double y = 1.0 / Math.Tanh(0.5 * k * 0.017);

        LayerResponse r = Twin.Response(k);

        Assert.Equal(y * t / (1.05 + (y * t)), r.Face, 1e-12);
        Assert.Equal(r.Face * Math.Cosh(k * 0.002) / Math.Cosh(k * 0.0085), r.Normal(0.0065), 1e-12);
        Assert.Equal(r.Face * Math.Sinh(k * 0.002) / Math.Cosh(k * 0.0085), r.InPlane(0.0065), 1e-12);
    }

    [Theory]
    [InlineData(1.0)]
    [InlineData(200.0)]
    public void Response_NoSteel_IsPublishedForm(double k)
    {
        MagneticLayers bare = Twin with { Opposite = OppositeSide.Open, Behind = SteelPlate.None };

        Assert.Equal(1.0 / (1.0 + (1.05 / Math.Tanh(0.5 * k * 0.01))), bare.Response(k).Face, 1e-12);
    }

    [Theory]
    [InlineData(3.0)]
    [InlineData(120.0)]
    public void Response_PlainPlate_IsPublishedForm(double k)
    {
        MagneticLayers plate = Twin with { Opposite = OppositeSide.Plate, OppositePlate = SteelPlate.Ideal };
        double t = Math.Tanh(k * 0.01);
        double y = 1.0 / Math.Tanh(k * 0.017);

        LayerResponse r = plate.Response(k);

        Assert.Equal(y * t / (1.05 + (y * t)), r.Face, 1e-12);
        Assert.Equal(r.Face * r.Face / Math.Pow(Math.Cosh(k * 0.017), 2.0), r.Pull, 1e-12);
    }

    [Fact]
    public void Response_ShortWave_IsHalfTheMagnetisation()
    {
        MagneticLayers unit = Twin with { RecoilPermeability = 1.0 };

        Assert.Equal(0.5, unit.Response(1e5).Face, 1e-12);
        Assert.Equal(0.0, unit.Response(1e5).Normal(0.005), 1e-12);
    }

    [Fact]
    public void Response_VeryPermeableThickPlate_ApproachesIdealSteel()
    {
        SteelPlate plate = new() { Thickness = 0.05, RelativePermeability = 1e9 };

        Assert.Equal(Twin.Response(50.0).Face, (Twin with { Behind = plate }).Response(50.0).Face, 1e-7);
    }

    [Fact]
    public void Response_PlateOfUnitPermeability_IsNoSteel()
    {
        SteelPlate plate = new() { Thickness = 0.05, RelativePermeability = 1.0 };
        MagneticLayers bare = Twin with { Behind = SteelPlate.None };

        Assert.Equal(bare.Response(50.0).Face, (Twin with { Behind = plate }).Response(50.0).Face, 1e-12);
    }

    [Theory]
    [InlineData(0.0199)]
    [InlineData(0.0201)]
    public void MeanNormal_BothSidesOfSeriesSwitch_IsMeanOfNormal(double phase)
    {
        const double Thickness = 0.01;
        LayerResponse r = Twin.Response(phase / Thickness);
        double sum = 0.0;
        const int Steps = 2000;
        for (int i = 0; i < Steps; i++)
        {
            sum += r.Normal(0.0085 + (Thickness * (((i + 0.5) / Steps) - 0.5))) / Steps;
        }

        Assert.Equal(1.0, r.MeanNormal(0.0085, Thickness) / sum, 1e-9);
    }

    [Fact]
    public void DomainFault_BadValues_AreNamed()
    {
        Assert.Null(Twin.DomainFault);
        Assert.NotNull((Twin with { Gap = 0.0 }).DomainFault);
        Assert.NotNull((Twin with { RecoilPermeability = double.NaN }).DomainFault);
        Assert.NotNull((Twin with { MagnetThickness = -0.01 }).DomainFault);
        Assert.NotNull((Twin with { Behind = new SteelPlate { Thickness = 0.01, RelativePermeability = 0.5 } }).DomainFault);
        Assert.False(CoilGeometry.IsBuildable(Coils.Keystone(0.05, 0.06, 0.01, 0.01)));
        Assert.NotNull(MagnetRow.AxialBlock(0, 0.1, 0.02, 0.02).DomainFault);
        Assert.NotNull(MagnetRow.AxialSector(4, 0.05, 0.08, 1.2).DomainFault);
    }

    [Fact]
    public void Keystone_ByAngle_HasThatAngle()
    {
        const double Angle = 11.0 * Math.PI / 180.0;

        Assert.Equal(Angle, CoilGeometry.LegHalfAngle(Coils.KeystoneByAngle(0.1, 0.15, 0.014, Angle)), 1e-12);
    }
}
