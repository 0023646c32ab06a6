namespace SpecLint.Physics.Electrical;

/// <summary>How equal coils are set beside each other.</summary>
public enum CoilArrangement
{
    /// <summary>Equally spaced round the shaft.</summary>
    Ring,

    /// <summary>Equally spaced along a straight row with two ends.</summary>
    Row,
}
