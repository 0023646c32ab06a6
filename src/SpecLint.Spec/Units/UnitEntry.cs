namespace SpecLint.Spec.Units;

/// <summary>One unit of the unit table.</summary>
public sealed class UnitEntry
{
    private readonly Func<double, double> _toSi;

    internal UnitEntry(string spelling, string noun, Dimension dimension, Func<double, double> toSi)
    {
        Spelling = spelling;
        Noun = noun;
        Dimension = dimension;
        _toSi = toSi;
    }

    /// <summary>The spelling used on screen, such as <c>A/mm²</c>.</summary>
    public string Spelling { get; }

    /// <summary>What the unit measures, with its article: <c>a length</c>.</summary>
    public string Noun { get; }

    /// <summary>The dimension.</summary>
    public Dimension Dimension { get; }

    /// <summary>SI units in one of this unit.</summary>
    public double Factor => _toSi(1) - Offset;

    /// <summary>The SI value at zero on this scale: 273.15 for °C, else 0.</summary>
    public double Offset => string.Equals(Spelling, "°C", StringComparison.Ordinal) ? _toSi(0) : 0;

    /// <summary>A value on this scale in coherent SI.</summary>
    /// <param name="value">Value in this unit.</param>
    public double ToSi(double value) => double.IsFinite(value) ? _toSi(value) : value;

    /// <summary>A difference in this unit in coherent SI: the scale's offset left out.</summary>
    /// <param name="difference">Difference in this unit.</param>
    public double DifferenceToSi(double difference) => Offset > 0 ? difference * Factor : _toSi(difference);

    /// <summary>A coherent SI value on this scale.</summary>
    /// <param name="si">Value in SI.</param>
    public double FromSi(double si) => (si - Offset) / Factor;

    /// <summary>A difference in coherent SI in this unit.</summary>
    /// <param name="si">Difference in SI.</param>
    public double DifferenceFromSi(double si) => si / Factor;
}
