using SpecLint.Review.Figures;

namespace SpecLint.Tests.Review.Catalogue;

/// <summary>
/// Two facing rows of very long magnets on ideal steel, where the plane solution is exact: Bumby and Martin, "Axial-flux
/// permanent-magnet air-cored generator for small-scale wind turbines", IEE Proc. Electr. Power Appl. 152(5), 2005, 1065.
/// </summary>
public sealed class LongMagnetTests
{
    private const double PolePitch = Math.PI * 0.125 / 6;
    private const double Width = 30e-3;
    private const double Thickness = 10e-3;
    private const double Remanence = 1.25;
    private const double CoilThickness = 13e-3;
    private const double HoleLength = 200e-3;
    private const double HoleWidth = 25e-3;
    private const double LegWidth = 14e-3;

    [Theory]
    [InlineData(18e-3, 0.5013)]
    [InlineData(16e-3, 0.5364)]
    public void Fundamental_AtMidGap_IsThePlaneSolution(double gap, double published)
    {
        double actual = Figures(gap, 1.0).Value("field.mid-coil.fundamental");

        Assert.Equal(published, actual, 5.1e-5);
        Machines.Near(Amplitude(1, gap, 0), actual, 1e-5);
    }

    [Fact]
    public void Formula_OffTheMiddle_PrintedValueBelongsToTheNarrowerGap() =>
        Assert.Equal(0.5627, Amplitude(1, 16e-3, 6.5e-3), 5.1e-5);

    [Theory]
    [InlineData(18e-3)]
    [InlineData(16e-3)]
    public void PoleCentre_AtMiddleAndFacesOfCoil_IsTheSumOfThePlaneHarmonics(double gap)
    {
        FigureGraph figures = Figures(gap, 1.0);
        double middle = 0;
        double face = 0;
        for (int n = 1; n < 400; n += 2)
        {
            middle += Amplitude(n, gap, 0);
            face += Amplitude(n, gap, 0.5 * CoilThickness);
        }

        Machines.Near(middle, figures.Value("field.mid-coil.centre"), 1e-5);
        Machines.Near(middle, figures.Value("field.coil.lowest"), 1e-5);
        Machines.Near(face, figures.Value("field.coil.highest"), 1e-5);
    }

    [Fact]
    public void Linkage_RectangleInsideTheMagnets_IsThePlaneFieldOverEachTurn()
    {
        const double Gap = 18e-3;
        FigureGraph figures = Figures(Gap, 1.0);
        double fundamental = Linkage(1, Gap);

        Machines.Near(fundamental, figures.Value("linkage.turn.fundamental"), 1e-5);
        for (int n = 3; n <= 15; n += 2)
        {
            Assert.Equal(Linkage(n, Gap) / fundamental, figures.Value($"linkage.turn.harmonic-{n}") / fundamental, 1e-5);
        }
    }

    [Fact]
    public void FluxAndForce_PerMetreOfMagnet_ArePlaneFluxAndMaxwellStress()
    {
        const double Gap = 18e-3;
        const int Poles = 12;
        double fluxPerMetre = 0;
        double stress = 0;
        for (int n = 1; n < 400; n += 2)
        {
            double amplitude = Amplitude(n, Gap, 0);
            fluxPerMetre += 2 * amplitude * PolePitch / (n * Math.PI) * (n % 4 == 1 ? 1 : -1);
            stress += amplitude * amplitude / (4 * 4e-7 * Math.PI);
        }

        FigureGraph shorter = Figures(Gap, 0.6);
        FigureGraph longer = Figures(Gap, 1.0);

        Machines.Near(0.4 * fluxPerMetre, longer.Value("flux.pole") - shorter.Value("flux.pole"), 1e-4);
        Machines.Near(0.4 * Poles * PolePitch * stress, longer.Value("force.attraction") - shorter.Value("force.attraction"), 1e-4);
    }

    private static FigureGraph Figures(double gap, double length) => Machines.Figures(Machines.Text($$"""
        spec: 1
        title: long magnets
        machine: {role: generator, topology: linear, arrangement: double-sided, stator: coreless, poles: 12, phases: 3}
        magnets:
          shape: block
          length: {{Machines.Millimetres(length)}}
          width: {{Machines.Millimetres(Width)}}
          thickness: {{Machines.Millimetres(Thickness)}}
          pole-pitch: {{Machines.Millimetres(PolePitch)}}
          material: {remanence: {{Remanence}} T, recoil-permeability: 1.0}
        rotor:
          back-iron: {material: ideal}
        winding:
          coils: 9
          turns: 10
          wire: {size: 1.0 mm}
          coil: {shape: rectangle, hole-length: {{Machines.Millimetres(HoleLength)}}, hole-width: {{Machines.Millimetres(HoleWidth)}}, leg-width: {{Machines.Millimetres(LegWidth)}}, thickness: {{Machines.Millimetres(CoilThickness)}} }
        gap: {clearance: {{Machines.Millimetres(0.5 * (gap - CoilThickness))}}, cover: 0 mm}

        """));

    /// <summary>B_n(y) = 4/(nπ)·Br·sin(nαπ/2)·sinh(uh)/sinh(u(h + g/2))·cosh(uy), u = nπ/τ, y from the middle of the gap.</summary>
    private static double Amplitude(int n, double gap, double y)
    {
        double u = n * Math.PI / PolePitch;
        double strength = 4 / (n * Math.PI) * Remanence * Math.Sin(n * Width / PolePitch * Math.PI / 2);
        double depth = Thickness + (0.5 * gap);

        // sinh(uh)·cosh(uy)/sinh(ud) without overflow.
        return strength * Math.Exp(u * (Thickness + y - depth))
            * (1 - Math.Exp(-2 * u * Thickness)) * (1 + Math.Exp(-2 * u * y)) / (2 * (1 - Math.Exp(-2 * u * depth)));
    }

    /// <summary>Mean over the nested turns of the field's integral over their area, mean over the thickness.</summary>
    private static double Linkage(int n, double gap)
    {
        const int Steps = 4000;
        double u = n * Math.PI / PolePitch;
        double overThickness = Math.Sinh(0.5 * u * CoilThickness) / (0.5 * u * CoilThickness);
        double sum = 0;
        for (int i = 0; i < Steps; i++)
        {
            double inward = (i + 0.5) / Steps * LegWidth;
            sum += (HoleLength + (2 * inward)) * 2 * Math.Sin(u * ((0.5 * HoleWidth) + inward)) / u;
        }

        return Amplitude(n, gap, 0) * overThickness * sum / Steps;
    }
}
