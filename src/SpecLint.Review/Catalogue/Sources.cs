using SpecLint.Review.Figures;

namespace SpecLint.Review.Catalogue;

/// <summary>The sources that several figures cite.</summary>
internal static class Sources
{
    public static Basis Geometry { get; } = new(BasisKind.Derived, "plane geometry of the parts as specified");

    public static Basis Arithmetic { get; } = new(BasisKind.Derived, "follows from its inputs by definition");

    public static Basis MagnetTable { get; } = new(
        BasisKind.Published, "trade-grade data in rules/tables/magnets.yaml, where each row carries its source, or the spec's own material data");

    public static Basis PracticeTable { get; } = new(BasisKind.CommonPractice, "");

    public static Basis Field { get; } = new(
        BasisKind.Published,
        "Harmonic solution between layered boundaries: Furlani, Permanent Magnet and Electromechanical Devices (2001), ch. 4; "
        + "Bumby and Martin, IEE Proc. Electr. Power Appl. 152 (2005) 1065; exact for planes of infinite permeability");

    public static Basis FreeMagnet { get; } = new(
        BasisKind.Published, "Furlani, Permanent Magnet and Electromechanical Devices (2001), ch. 4: uniformly magnetised block and cylinder");

    public static Basis Emf { get; } = new(BasisKind.Derived, "Faraday's law applied to the harmonics of the flux linkage");

    public static Basis StarOfSlots { get; } = new(
        BasisKind.Published, "star of slots: Pyrhönen, Jokinen, Hrabovcová, Design of Rotating Electrical Machines, ch. 2");

    public static Basis Ohm { get; } = new(BasisKind.Standard, "IEC 60028 (copper, resistivity and its temperature coefficient)");

    public static Basis Inductance { get; } = new(
        BasisKind.Published, "Hurley and Duffy, IEEE Trans. Magn. 31 (1995) 1972: planar coils between magnetic planes");

    public static Basis StrandEddy { get; } = new(
        BasisKind.Published, "Sullivan, IEEE Trans. Power Electron. 14 (1999) 283, appendix: round wire in a transverse alternating field");

    public static Basis Heat { get; } = new(
        BasisKind.Published,
        "Boutarfa and Harmand, Exp. Fluids 38 (2005) 209 and Howey, Childs, Holmes, IEEE Trans. Ind. Electron. 59 (2012) 1367: rotor-stator gaps");

    public static Basis Bridge { get; } = new(
        BasisKind.Published, "six-pulse bridge with smooth direct current: Mohan, Undeland, Robbins, Power Electronics, ch. 5 (from memory)");
}
