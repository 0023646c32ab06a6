namespace SpecLint.Physics.Magnetics;

/// <summary>Outline of one air-cored coil seen along the machine's gap.</summary>
public enum CoilShape
{
    /// <summary>Legs whose centre lines lie on rays from the machine axis, closed by straight end bars.</summary>
    Keystone,

    /// <summary>Nested mitred rectangles.</summary>
    Rectangle,

    /// <summary>Ring.</summary>
    Round,
}
