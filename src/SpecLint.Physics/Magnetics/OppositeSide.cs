namespace SpecLint.Physics.Magnetics;

/// <summary>What the magnets face across the gap.</summary>
public enum OppositeSide
{
    /// <summary>Equal magnets on equal steel, opposite poles facing.</summary>
    Magnets,

    /// <summary>A plain steel plate.</summary>
    Plate,

    /// <summary>Free space.</summary>
    Open,
}
