using System.Text.Json;
using SpecLint.Physics.Geometry;
using SpecLint.Physics.Magnetics;

namespace SpecLint.Tests.Physics.Magnetics;

/// <summary>One machine of Reference/axial.json, turned into the inputs of the kernels.</summary>
public sealed class ReferenceCase
{
    private static readonly JsonElement Root =
        JsonDocument.Parse(File.ReadAllText(Path.Combine(AppContext.BaseDirectory, "Reference", "axial.json"))).RootElement;

    private readonly JsonElement _case;

    private ReferenceCase(JsonElement element) => _case = element;

    public static TheoryData<string> AxialIds => Ids("axial");

    public static TheoryData<string> LinearIds => Ids("linear");

    public string Kind => _case.GetProperty("kind").GetString()!;

    public bool IsOpen => Kind.EndsWith("open", StringComparison.Ordinal) || IsLinear;

    public bool IsLinear => Kind == "linear_row";

    public JsonElement Inputs => _case.GetProperty("inputs");

    public JsonElement Spread => _case.GetProperty("method_spread");

    public double Remanence => Inputs.GetProperty("magnet_remanence_T").GetDouble();

    public MagnetRow Magnets => IsLinear
        ? MagnetRow.LinearBlock(Number("pole_pitch_m"), Number("magnet_depth_m"), Number("magnet_length_along_motion_m"))
        : Inputs.GetProperty("magnet_shape").GetString() switch
        {
            "rectangular_block" => MagnetRow.AxialBlock(
                PolePairs, Number("magnet_pitch_radius_m"), Number("magnet_radial_length_m"), Number("magnet_tangential_width_m")),
            "round_disc" => MagnetRow.AxialDisc(PolePairs, Number("magnet_pitch_radius_m"), Number("magnet_diameter_m")),
            _ => MagnetRow.AxialSector(
                PolePairs, Number("magnet_inner_radius_m"), Number("magnet_outer_radius_m"), Number("magnet_arc_fraction_of_pole_pitch")),
        };

    public CoilOutline Coil => Inputs.GetProperty("coil_shape").GetString() switch
    {
        "round_ring" => Coils.Round(
            IsLinear ? 0.0 : Number("coil_centre_radius_m"), Number("coil_inner_radius_m"), Number("coil_outer_radius_m")),
        "keystone_radial_legs" => Coils.KeystoneByAngle(
            Number("coil_hole_inner_distance_from_axis_m"),
            Number("coil_hole_outer_distance_from_axis_m"),
            Number("coil_leg_width_m"),
            Number("coil_leg_centreline_half_angle_mech_deg") * Math.PI / 180.0),
        _ => IsLinear
            ? Coils.Rectangle(0.0, Number("coil_hole_depth_m"), Number("coil_hole_along_motion_m"), Number("coil_leg_width_m"))
            : Coils.Rectangle(
                Number("coil_centre_radius_m"),
                Number("coil_hole_radial_length_m"),
                Number("coil_hole_tangential_width_m"),
                Number("coil_leg_width_m")),
    };

    public CoilLayer Layer => new() { MidHeight = Number("coil_mid_height_above_magnet_face_m"), Thickness = Number("coil_axial_thickness_m") };

    private int PolePairs => Inputs.GetProperty("pole_pairs").GetInt32();

    public static ReferenceCase Load(string id)
    {
        foreach (JsonElement element in Root.GetProperty("cases").EnumerateArray())
        {
            if (element.GetProperty("id").GetString() == id)
            {
                return new ReferenceCase(element);
            }
        }

        throw new ArgumentException("no such case", nameof(id));
    }

    public JsonElement Result(string name) => _case.GetProperty("results").GetProperty(name);

    public bool Has(string name) => _case.GetProperty("results").TryGetProperty(name, out _);

    public double[] Linkage(string result)
    {
        JsonElement harmonics = Result(result).GetProperty("psi_per_turn_harmonics_Wb");
        return [.. harmonics.EnumerateObject().Select(p => p.Value.GetDouble())];
    }

    public double Number(string key) => Inputs.GetProperty(key).GetDouble();

    public MagneticLayers IdealStack(double recoilPermeability) => Stack(recoilPermeability, SteelPlate.Ideal, SteelPlate.Ideal);

    public MagneticLayers SteelStack(double recoilPermeability)
    {
        JsonElement steel = Inputs.GetProperty("finite_steel_only");
        double mu = steel.GetProperty("steel_relative_permeability").GetDouble();
        double plain = steel.TryGetProperty("plain_disc_thickness_m", out JsonElement plate) ? plate.GetDouble() : 0.0;
        return Stack(
            recoilPermeability,
            new SteelPlate { Thickness = steel.GetProperty("magnet_disc_thickness_m").GetDouble(), RelativePermeability = mu },
            new SteelPlate { Thickness = plain, RelativePermeability = mu });
    }

    public SpectralField Field(MagneticLayers stack)
    {
        WaveNumberGrid grid = WaveNumberGrid.For(Magnets, Coil);
        return new SpectralField(new MagnetTransform(Magnets, grid), new CoilTransform(Coil, grid), stack, Layer);
    }

    private MagneticLayers Stack(double recoilPermeability, SteelPlate behind, SteelPlate plain)
    {
        bool twin = Inputs.TryGetProperty("magnet_face_to_magnet_face_gap_m", out JsonElement twinGap);
        bool plate = Inputs.TryGetProperty("magnet_face_to_plain_steel_gap_m", out JsonElement plateGap);
        bool bare = Inputs.TryGetProperty("steel_back_plate", out JsonElement back) && !back.GetBoolean();
        return new MagneticLayers
        {
            MagnetThickness = Number("magnet_thickness_m"),
            RecoilPermeability = recoilPermeability,
            Behind = bare ? SteelPlate.None : behind,
            Opposite = twin ? OppositeSide.Magnets : plate ? OppositeSide.Plate : OppositeSide.Open,
            Gap = twin ? twinGap.GetDouble() : plate ? plateGap.GetDouble() : 0.0,
            OppositePlate = plate ? plain : SteelPlate.None,
        };
    }

    private static TheoryData<string> Ids(string prefix)
    {
        TheoryData<string> ids = [];
        foreach (JsonElement element in Root.GetProperty("cases").EnumerateArray())
        {
            if (element.GetProperty("kind").GetString()!.StartsWith(prefix, StringComparison.Ordinal))
            {
                ids.Add(element.GetProperty("id").GetString()!);
            }
        }

        return ids;
    }
}
