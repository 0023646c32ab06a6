using System.Text;
using System.Text.Json;
using SpecLint.Tests.Physics.Magnetics;

namespace SpecLint.Tests.Review.Catalogue;

/// <summary>A machine of Reference/axial.json written as a spec, with ideal steel or with its real discs.</summary>
internal static class ReferenceMachine
{
    public const int Turns = 50;

    /// <summary>Poles of the rotor; a linear row is given as twelve.</summary>
    public static int PolePairs(ReferenceCase c) => c.IsLinear ? 6 : c.Inputs.GetProperty("pole_pairs").GetInt32();

    /// <summary>The spec: three coils to a pole pair, so that all coils of a phase are in step.</summary>
    public static string SpecOf(ReferenceCase c, bool ideal, double? discThickness = null)
    {
        string arrangement = c.Kind switch
        {
            "linear_row" => "single-sided",
            "axial_twin_magnet_rotors" => "twin-rotor",
            "axial_one_magnet_rotor_plus_plain_steel_disc" => "rotor-and-return-plate",
            _ => "single-rotor",
        };
        int pairs = PolePairs(c);
        var text = new StringBuilder(Machines.Text($$"""
            spec: 1
            title: reference machine
            machine: {role: generator, topology: {{(c.IsLinear ? "linear" : "axial-flux")}}, arrangement: {{arrangement}}, stator: coreless, poles: {{2 * pairs}}, phases: 3}
            magnets:
              {{Magnets(c)}}
              thickness: {{Mm(c, "magnet_thickness_m")}}
              material: {remanence: {{c.Remanence}} T, recoil-permeability: {{(ideal ? 1.0 : 1.05)}} }
            rotor:
              back-iron: {{Behind(c, ideal, discThickness)}}

            """));
        if (arrangement == "rotor-and-return-plate")
        {
            text.Append(Machines.Text($"  return-plate: {Plate(c, ideal, "plain_disc_thickness_m", null)}\n"));
        }

        double thickness = c.Number("coil_axial_thickness_m");
        double near = c.Number("coil_mid_height_above_magnet_face_m") - (0.5 * thickness);
        text.Append(Machines.Text($$"""
            winding:
              coils: {{3 * pairs}}
              turns: {{Turns}}
              strands: 1
              wire: {size: 1.0 mm, enamel: grade-2, thermal-class: 180, material: copper}
              connection: star
              coil:
                {{Coil(c)}}
                thickness: {{Machines.Millimetres(thickness)}}
            gap:
              clearance: {{Machines.Millimetres(near)}}
              cover: 0 mm

            """));
        if (c.Inputs.TryGetProperty("magnet_face_to_plain_steel_gap_m", out JsonElement gap))
        {
            text.Append(Machines.Text($"  far-clearance: {Machines.Millimetres(gap.GetDouble() - near - thickness)}\n"));
        }

        return text.ToString();
    }

    private static string Magnets(ReferenceCase c)
    {
        if (c.IsLinear)
        {
            return Machines.Text($"shape: block\n  length: {Mm(c, "magnet_depth_m")}\n  width: {Mm(c, "magnet_length_along_motion_m")}\n  pole-pitch: {Mm(c, "pole_pitch_m")}");
        }

        return c.Inputs.GetProperty("magnet_shape").GetString() switch
        {
            "rectangular_block" => Machines.Text($"shape: block\n  length: {Mm(c, "magnet_radial_length_m")}\n  width: {Mm(c, "magnet_tangential_width_m")}\n  pitch-radius: {Mm(c, "magnet_pitch_radius_m")}"),
            "round_disc" => Machines.Text($"shape: disc\n  diameter: {Mm(c, "magnet_diameter_m")}\n  pitch-radius: {Mm(c, "magnet_pitch_radius_m")}"),
            _ => Machines.Text($"shape: sector\n  inner-radius: {Mm(c, "magnet_inner_radius_m")}\n  outer-radius: {Mm(c, "magnet_outer_radius_m")}\n  arc: {c.Number("magnet_arc_fraction_of_pole_pitch")}"),
        };
    }

    private static string Coil(ReferenceCase c)
    {
        string place = c.Inputs.TryGetProperty("coil_centre_radius_m", out JsonElement centre)
            ? $"\n    pitch-radius: {Machines.Millimetres(centre.GetDouble())}"
            : "";
        switch (c.Inputs.GetProperty("coil_shape").GetString())
        {
            case "round_ring":
                return Machines.Text($"shape: round\n    inner-radius: {Mm(c, "coil_inner_radius_m")}\n    outer-radius: {Mm(c, "coil_outer_radius_m")}{place}");
            case "rectangle":
                string length = c.IsLinear ? "coil_hole_depth_m" : "coil_hole_radial_length_m";
                string width = c.IsLinear ? "coil_hole_along_motion_m" : "coil_hole_tangential_width_m";
                return Machines.Text($"shape: rectangle\n    hole-length: {Mm(c, length)}\n    hole-width: {Mm(c, width)}\n    leg-width: {Mm(c, "coil_leg_width_m")}{place}");
            default:
                double inner = c.Number("coil_hole_inner_distance_from_axis_m");
                double outer = c.Number("coil_hole_outer_distance_from_axis_m");
                double leg = c.Number("coil_leg_width_m");
                double half = c.Number("coil_leg_centreline_half_angle_mech_deg") * Math.PI / 180.0;
                double middle = 0.5 * (inner + outer);
                double hole = 2.0 * ((middle * Math.Tan(half)) - (0.5 * leg / Math.Cos(half)));
                return Machines.Text($"shape: keystone\n    hole-length: {Machines.Millimetres(outer - inner)}\n    hole-width: {Machines.Millimetres(hole)}\n    leg-width: {Machines.Millimetres(leg)}\n    pitch-radius: {Machines.Millimetres(middle)}");
        }
    }

    private static string Behind(ReferenceCase c, bool ideal, double? thickness) =>
        c.IsLinear && !c.Inputs.GetProperty("steel_back_plate").GetBoolean() ? "none"
        : Plate(c, ideal || c.IsLinear, "magnet_disc_thickness_m", thickness);

    private static string Plate(ReferenceCase c, bool ideal, string key, double? thickness)
    {
        if (ideal)
        {
            return "{material: ideal}";
        }

        JsonElement steel = c.Inputs.GetProperty("finite_steel_only");
        double Of(string name) => steel.GetProperty(name).GetDouble();
        return Machines.Text($$"""{material: {relative-permeability: {{Of("steel_relative_permeability")}} }, thickness: {{Machines.Millimetres(thickness ?? Of(key))}}, inner-radius: {{Machines.Millimetres(Of("disc_inner_radius_m"))}}, outer-radius: {{Machines.Millimetres(Of("disc_outer_radius_m"))}} }""");
    }

    private static string Mm(ReferenceCase c, string key) => Machines.Millimetres(c.Number(key));
}
