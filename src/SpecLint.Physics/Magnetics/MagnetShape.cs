namespace SpecLint.Physics.Magnetics;

/// <summary>Outline of one permanent magnet seen along its magnetisation.</summary>
public enum MagnetShape
{
    /// <summary>Rectangle; two sides parallel to the radius (axial) or to the travel (linear).</summary>
    Block,

    /// <summary>Circle.</summary>
    Disc,

    /// <summary>Annular sector about the machine axis.</summary>
    Sector,
}
