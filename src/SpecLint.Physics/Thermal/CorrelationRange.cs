namespace SpecLint.Physics.Thermal;

/// <summary>Where a correlation was asked relative to the range it was measured in.</summary>
public enum CorrelationRange
{
    /// <summary>Inside the published range.</summary>
    Inside,

    /// <summary>Below it; the value is held by a bound where one exists.</summary>
    Below,

    /// <summary>Above it.</summary>
    Above,
}
