namespace SpecLint.Physics.Thermal;

/// <summary>Heat transfer of surfaces in still air, for linear machines and where cooling is not stated.</summary>
public static class StillAir
{
    /// <summary>Least coefficient of natural convection and radiation together on a painted or resin surface [W/(m² K)].</summary>
    public const double LeastCoefficient = 5.0;

    /// <summary>Most that is usually taken for it [W/(m² K)].</summary>
    public const double MostCoefficient = 10.0;

    /// <summary>Coefficient for open faces in still air.</summary>
    /// <returns>Middle of the customary 5 to 10 W/(m² K), uncertainty a third.</returns>
    /// <seealso>Incropera, DeWitt, Fundamentals of Heat and Mass Transfer, 6th ed. 2007, table 1.1 (free convection in gases 2 to 25); the narrower band is common practice, from memory.</seealso>
    public static HeatTransfer OpenFace() => new(7.5, double.NaN, CorrelationRange.Inside, 1.0 / 3.0);
}
