using SpecLint.Spec.Units;

namespace SpecLint.Spec.Documents;

/// <summary>Sizes that cannot stand together, so that any figure computed from them would mean nothing.</summary>
internal static class Contradictions
{
    private static readonly (string Inner, string Outer)[] Pairs =
    [
        ("magnets.inner-radius", "magnets.outer-radius"),
        ("winding.coil.inner-radius", "winding.coil.outer-radius"),
        ("rotor.back-iron.inner-radius", "rotor.back-iron.outer-radius"),
        ("rotor.return-plate.inner-radius", "rotor.return-plate.outer-radius"),
        ("stator.hub-radius", "stator.housing-radius"),
    ];

    private static readonly (string Low, string High)[] Ranges =
    [
        ("environment.ambient.min", "environment.ambient.max"),
        ("load.voltage.min", "load.voltage.max"),
    ];

    internal static IEnumerable<SpecFault> Find(Func<string, SpecValue?> find)
    {
        foreach (var (inner, outer) in Pairs)
        {
            if (find(inner) is { } small && find(outer) is { } large && large.Number <= small.Number)
            {
                yield return Between(large, small, $"{outer} is {large.Text}; more than {inner}, {small.Text}, is expected");
            }
        }

        foreach (var (low, high) in Ranges)
        {
            if (find(low) is { } small && find(high) is { } large && large.Number < small.Number)
            {
                yield return Between(large, small, $"{high} is {large.Text}; at least {low}, {small.Text}, is expected");
            }
        }

        if (find("machine.topology")?.Text is not "axial-flux")
        {
            yield break;
        }

        if (Coil(find) is { } coil)
        {
            yield return coil;
        }

        if (find("magnets.pitch-radius") is { } pitch
            && (find("magnets.shape")?.Text is "disc" ? find("magnets.diameter") : find("magnets.length")) is { } extent
            && pitch.Number - (extent.Number / 2) <= 0)
        {
            yield return Between(extent, pitch, $"{extent.Key} is {extent.Text}, which reaches past the shaft's axis at {pitch.Key} {pitch.Text}");
        }
    }

    private static SpecFault? Coil(Func<string, SpecValue?> find)
    {
        if (PitchRadius(find) is not var (pitch, place))
        {
            return null;
        }

        if (find("winding.coil.shape")?.Text is "round")
        {
            return find("winding.coil.outer-radius") is { } radius && pitch - radius.Number <= 0
                ? Reaches(radius, place, pitch, pitch - radius.Number)
                : null;
        }

        return find("winding.coil.hole-length") is { } hole && find("winding.coil.leg-width") is { } leg && pitch - (hole.Number / 2) - leg.Number <= 0
            ? Reaches(hole, place, pitch, pitch - (hole.Number / 2) - leg.Number)
            : null;
    }

    private static (double Radius, SpecValue Place)? PitchRadius(Func<string, SpecValue?> find)
    {
        if ((find("winding.coil.pitch-radius") ?? find("magnets.pitch-radius")) is { } stated)
        {
            return (stated.Number, stated);
        }

        return find("magnets.inner-radius") is { } inner && find("magnets.outer-radius") is { } outer
            ? ((inner.Number + outer.Number) / 2, outer)
            : null;
    }

    private static SpecFault Reaches(SpecValue size, SpecValue place, double pitch, double left) => Between(
        size,
        place,
        $"{size.Key} is {size.Text}: at a pitch radius of {UnitDisplay.Format(pitch, "mm")} the coil's inner edge lies {UnitDisplay.Format(left, "mm")} from the shaft's axis; more than 0 mm is expected");

    private static SpecFault Between(SpecValue blamed, SpecValue other, string message) =>
        new(blamed.Key, message, blamed.ValueRegion) { Related = other.ValueRegion, RelatedMessage = $"{other.Key} is {other.Text}" };
}
