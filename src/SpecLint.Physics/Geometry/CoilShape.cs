namespace SpecLint.Physics.Geometry;

/// <summary>Plan form of a coreless coil, seen along the gap.</summary>
public enum CoilShape
{
    /// <summary>Legs whose centre lines lie on rays from the shaft axis, closed by straight end bars.</summary>
    Keystone,

    /// <summary>Nested mitred rectangles, legs parallel.</summary>
    Rectangle,

    /// <summary>Ring between an inner and an outer radius.</summary>
    Round,
}
