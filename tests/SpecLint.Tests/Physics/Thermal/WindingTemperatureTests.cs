using CsCheck;
using SpecLint.Physics.Electrical;
using SpecLint.Physics.Thermal;

namespace SpecLint.Tests.Physics.Thermal;

public sealed class WindingTemperatureTests
{
    private static readonly WindingHeat Heat = new()
    {
        CopperLossCold = 100.0,
        TemperatureCoefficient = 0.00393,
        FaceArea = 0.03,
        Thickness = 0.013,
        WindingConductivity = 0.6,
        CoverThickness = 0.0005,
        CoverConductivity = 0.25,
        SurfaceCoefficient = 40.0,
        Ambient = 313.15,
    };

    // Without eddy loss the balance is linear: rise = P(ambient) R/(1 - P0 alpha R).
    [Fact]
    public void Steady_CopperOnly_IsClosedForm() => Gen.Select(Gen.Double[1.0, 200.0], Gen.Double[10.0, 80.0]).Sample((loss, film) =>
    {
        WindingHeat heat = Heat with { CopperLossCold = loss, SurfaceCoefficient = film };
        double resistance = WindingTemperature.ThermalResistance(heat);
        double feedback = loss * 0.00393 * resistance;
        double rise = WindingTemperature.LossAt(heat, heat.Ambient) * resistance / (1.0 - feedback);
        bool expected = feedback < 1.0 && rise < WindingTemperature.LargestRise;

        bool found = WindingTemperature.TrySteady(heat, out WindingTemperatures result);

        Assert.Equal(expected, found);
        if (found)
        {
            Assert.Equal(heat.Ambient + rise, result.Mean, 1e-6);
        }
    });

    [Fact]
    public void Steady_LossOutgrowsCooling_HasNoSolution() =>
        Assert.False(WindingTemperature.TrySteady(Heat with { CopperLossCold = 5000.0 }, out _));

    [Fact]
    public void Steady_NoLoss_IsAmbient()
    {
        Assert.True(WindingTemperature.TrySteady(Heat with { CopperLossCold = 0.0 }, out WindingTemperatures result));

        Assert.Equal(313.15, result.Mean, 1e-6);
        Assert.Equal(313.15, result.HotSpot, 1e-6);
        Assert.Equal(0.0, result.Loss, 1e-12);
    }

    // Slab with even heat: numerical solution of k T'' = -q between films, mean and middle.
    [Fact]
    public void Steady_Parabola_MatchesFiniteDifferences()
    {
        WindingHeat heat = Heat with { TemperatureCoefficient = 0.0 };
        Assert.True(WindingTemperature.TrySteady(heat, out WindingTemperatures result));
        const int cells = 400;
        double source = heat.CopperLossCold / (heat.FaceArea * heat.Thickness);
        double step = heat.Thickness / cells;
        double film = heat.CoverThickness / heat.CoverConductivity + 1.0 / heat.SurfaceCoefficient;

        // March from the face: flux at depth x is q (t/2 - x).
        double temperature = heat.Ambient + 0.5 * source * heat.Thickness * film;
        double sum = 0.0;
        double middle = 0.0;
        for (int cell = 0; cell < cells; cell++)
        {
            double flux = source * (0.5 * heat.Thickness - (cell + 0.5) * step);
            double next = temperature + flux * step / heat.WindingConductivity;
            sum += 0.5 * (temperature + next) * step;
            temperature = next;
            middle = cell == cells / 2 - 1 ? next : middle;
        }

        Assert.Equal(sum / heat.Thickness, result.Mean, 1e-3);
        Assert.Equal(middle, result.HotSpot, 1e-3);
        Assert.Equal(heat.Ambient + 0.5 * source * heat.Thickness / heat.SurfaceCoefficient, result.Surface, 1e-9);
    }

    [Fact]
    public void Steady_Eddy_FallsWithTemperature()
    {
        WindingHeat heat = Heat with { EddyLossCold = 50.0 };
        Assert.True(WindingTemperature.TrySteady(heat, out WindingTemperatures result));

        double factor = 1.0 + 0.00393 * (result.Mean - 293.15);
        Assert.Equal(100.0 * factor + 50.0 / factor, result.Loss, 1e-6);
        Assert.Equal(result.Loss * WindingTemperature.ThermalResistance(heat), result.Mean - heat.Ambient, 1e-6);
    }

    [Fact]
    public void Steady_Ordering_IsSurfaceMeanHotSpot()
    {
        Assert.True(WindingTemperature.TrySteady(Heat, out WindingTemperatures result));

        Assert.True(result.Surface > Heat.Ambient && result.Mean > result.Surface && result.HotSpot > result.Mean);
    }

    // Copper at 10 A/mm²: 1.7241e-8 x 1e14/(8890 x 385) = 0.504 K/s at 20 C.
    [Fact]
    public void Adiabatic_TenAmperesPerSquareMillimetre_IsHalfKelvinPerSecond() =>
        Assert.Equal(0.504, WindingTemperature.AdiabaticRate(ConductorMaterial.Copper, 1e7, 293.15), 1e-3);

    [Fact]
    public void Adiabatic_Time_MatchesSteppedRate()
    {
        const double density = 2e7;
        double temperature = 313.15;
        double time = 0.0;
        const double step = 1e-3;
        while (temperature < 428.15)
        {
            double half = temperature + 0.5 * step * WindingTemperature.AdiabaticRate(ConductorMaterial.Copper, density, temperature);
            temperature += step * WindingTemperature.AdiabaticRate(ConductorMaterial.Copper, density, half);
            time += step;
        }

        Assert.Equal(time, WindingTemperature.AdiabaticTime(ConductorMaterial.Copper, density, 313.15, 428.15), 2.0 * step);
    }
}
