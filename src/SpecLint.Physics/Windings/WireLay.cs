namespace SpecLint.Physics.Windings;

/// <summary>Copper fill and how many wires lie in a cross-section in whole layers.</summary>
public static class WireLay
{
    private const double WholeTolerance = 1e-9;
    private const double MostWires = 1e9;

    /// <summary>Copper fill that a number of wires needs.</summary>
    /// <param name="space">Cross-section and wire.</param>
    /// <param name="wires">Turns times strands, >= 0.</param>
    /// <returns>Copper section over cross-section.</returns>
    public static double CopperFill(in WireSpace space, double wires) =>
        wires * 0.25 * Math.PI * space.BareDiameter * space.BareDiameter / (space.Width * space.Thickness);

    /// <summary>Wires that fit in square lay.</summary>
    /// <param name="space">Cross-section and wire.</param>
    /// <returns>Whole wires per layer times whole layers.</returns>
    /// <remarks>Each layer's wires sit on top of the last layer's; limit pi/4 of the overall section.</remarks>
    public static long SquareCapacity(in WireSpace space) =>
        Whole(space.Width / space.OverallDiameter) * Whole(space.Thickness / space.OverallDiameter);

    /// <summary>Wires that fit in nested lay.</summary>
    /// <param name="space">Cross-section and wire.</param>
    /// <returns>The better of layers along the width and along the thickness.</returns>
    /// <remarks>Layers sqrt(3)/2 of a diameter apart, every second one half a diameter aside; limit pi/(2 sqrt(3)) of the overall section. Hand winding rarely holds it at the crossovers.</remarks>
    public static long NestedCapacity(in WireSpace space) => Math.Max(
        Nested(space.Width, space.Thickness, space.OverallDiameter),
        Nested(space.Thickness, space.Width, space.OverallDiameter));

    /// <summary>Layers of square lay needed across the leg.</summary>
    /// <param name="space">Cross-section and wire.</param>
    /// <param name="wires">Turns times strands, >= 0.</param>
    /// <returns>Least whole layers, each as thick as the winding allows; 0 if not one wire fits the thickness.</returns>
    public static long LayersNeeded(in WireSpace space, long wires)
    {
        long perLayer = Whole(space.Thickness / space.OverallDiameter);
        return perLayer == 0 ? 0 : (wires + perLayer - 1) / perLayer;
    }

    private static long Nested(double alongLayer, double acrossLayers, double diameter)
    {
        if (alongLayer < diameter * (1.0 - WholeTolerance) || acrossLayers < diameter * (1.0 - WholeTolerance))
        {
            return 0;
        }

        long layers = 1 + Whole((acrossLayers - diameter) / (0.5 * Math.Sqrt(3.0) * diameter));
        long straight = Whole(alongLayer / diameter);
        long aside = Whole(alongLayer / diameter - 0.5);
        return (layers + 1) / 2 * straight + layers / 2 * aside;
    }

    private static long Whole(double ratio) => (long)Math.Min(MostWires, Math.Floor(ratio + WholeTolerance));
}
