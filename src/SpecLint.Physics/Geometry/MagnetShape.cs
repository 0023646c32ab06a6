namespace SpecLint.Physics.Geometry;

/// <summary>Plan form of a magnet, seen along the gap.</summary>
public enum MagnetShape
{
    /// <summary>Rectangle, two sides parallel to the radius through its centre.</summary>
    Block,

    /// <summary>Circular disc.</summary>
    Disc,

    /// <summary>Annular sector bounded by two radii and two rays.</summary>
    Sector,
}
