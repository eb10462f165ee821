using System.Globalization;
using MemberScan.Checks;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Stress;

namespace MemberScan.Screening.Checking;

/// <summary>The lines that lead from section and forces to the stresses at the governing point, for following by hand.</summary>
internal static class Derivation
{
    /// <summary>Section properties, section forces, and the parts of each stress with their numbers.</summary>
    public static IEnumerable<TraceLine> Lines(Found found, string forcesSource)
    {
        var (field, forces, point) = (found.Field, found.Forces, found.Point);
        var properties = field.Properties;
        var section = field.Section.Designation;
        yield return new TraceLine("A", "", properties.Area, "m²", section);
        yield return new TraceLine("Iy", "", properties.Iy, "m⁴", section);
        yield return new TraceLine("Iz", "", properties.Iz, "m⁴", section);
        if (properties.Iyz != 0) yield return new TraceLine("Iyz", "", properties.Iyz, "m⁴", section);
        if (properties.J is { } j) yield return new TraceLine("J", "", j, "m⁴", $"{section}; {properties.JSource}");
        if (properties.Wt is { } wt) yield return new TraceLine("Wt", "", wt, "m³", section);

        yield return new TraceLine("x", "", found.X, "m", "distance of the station from the member's start");
        yield return new TraceLine("N", "", forces.N, "N", forcesSource);
        yield return new TraceLine("Vy", "", forces.Vy, "N", forcesSource);
        yield return new TraceLine("Vz", "", forces.Vz, "N", forcesSource);
        yield return new TraceLine("T", "", forces.T, "N·m", (properties.ShearCentreY, properties.ShearCentreZ) is (0, 0)
            ? forcesSource
            : Text($"{forcesSource}; about the shear centre at y {properties.ShearCentreY * 1e3:0.###} mm, z {properties.ShearCentreZ * 1e3:0.###} mm"));
        yield return new TraceLine("My", "", forces.My, "N·m", forcesSource);
        yield return new TraceLine("Mz", "", forces.Mz, "N·m", forcesSource);
        yield return new TraceLine("y", "", point.Y, "m", point.Place);
        yield return new TraceLine("z", "", point.Z, "m", point.Place);

        yield return new TraceLine("N/A", Text($"{forces.N / 1e3:0.####} kN / {properties.Area * 1e6:0.###} mm²"), forces.N / properties.Area, "Pa", "axial force");
        foreach (var line in Bending(properties, forces, point)) yield return line;

        foreach (var line in Shear(field, forces with { N = 0, My = 0, Mz = 0, T = 0 }, point, "V", ShearRule(field))) yield return line;
        if (field.CarriesTorsion)
            foreach (var line in Shear(field, new SectionForces(0, 0, 0, forces.T, 0, 0), point, "T", TorsionRule(field)))
                yield return line;
    }

    private static IEnumerable<TraceLine> Bending(SectionProperties properties, SectionForces forces, GoverningPoint point)
    {
        if (properties.Iyz != 0)
        {
            var determinant = properties.Iy * properties.Iz - properties.Iyz * properties.Iyz;
            var (perZ, perY) = ((forces.My * properties.Iz + forces.Mz * properties.Iyz) / determinant, -(forces.Mz * properties.Iy + forces.My * properties.Iyz) / determinant);
            yield return new TraceLine("(My·Iz + Mz·Iyz)·z/(Iy·Iz − Iyz²)", "", perZ * point.Z, "Pa", "bending, product of inertia counted");
            yield return new TraceLine("−(Mz·Iy + My·Iyz)·y/(Iy·Iz − Iyz²)", "", perY * point.Y, "Pa", "bending, product of inertia counted");
            yield break;
        }

        var bendingY = forces.My * point.Z / properties.Iy;
        var bendingZ = -forces.Mz * point.Y / properties.Iz;
        yield return new TraceLine("My·z/Iy", Text($"{forces.My / 1e3:0.#####} kN·m · {point.Z * 1e3:0.###} mm / {properties.Iy * 1e12:0.####} mm⁴"), bendingY, "Pa", "bending about y");
        yield return new TraceLine("−Mz·y/Iz", Text($"−({forces.Mz / 1e3:0.#####} kN·m) · {point.Y * 1e3:0.###} mm / {properties.Iz * 1e12:0.####} mm⁴"), bendingZ, "Pa", "bending about z");
    }

    /// <summary>A line of the check with what it does not know: how the stresses came about, and where the strength comes from.</summary>
    public static TraceLine Completed(TraceLine line, Found found, string yieldSource)
    {
        var hasShear = found.Forces.Vy != 0 || found.Forces.Vz != 0;
        var hasTorsion = found.Forces.T != 0 && found.Field.CarriesTorsion;
        return line.Symbol switch
        {
            "fy" or "f_y" => line with { Source = yieldSource },
            "σ" => line with { Formula = found.Field.Properties.Iyz == 0 ? "N/A + My·z/Iy − Mz·y/Iz" : "N/A + [(My·Iz + Mz·Iyz)·z − (Mz·Iy + My·Iyz)·y]/(Iy·Iz − Iyz²)" },
            "τxy" or "τxz" when hasShear && hasTorsion => line with { Formula = $"{line.Symbol}(V) + {line.Symbol}(T)" },
            "τxy" or "τxz" when hasShear => line with { Formula = $"{line.Symbol}(V)" },
            "τxy" or "τxz" when hasTorsion => line with { Formula = $"{line.Symbol}(T)" },
            "τxy" or "τxz" => line with { Formula = "no shear force, no torsion" },
            _ => line,
        };
    }

    private static IEnumerable<TraceLine> Shear(StressField field, SectionForces forces, GoverningPoint point, string cause, string rule)
    {
        if (forces == default) yield break;

        var state = field.At(forces, point.Y, point.Z);
        yield return new TraceLine($"τxy({cause})", rule, state.TauXY, "Pa", $"{Model(field)}, at the governing point");
        yield return new TraceLine($"τxz({cause})", rule, state.TauXZ, "Pa", $"{Model(field)}, at the governing point");
    }

    private static string Model(StressField field) => field.Model == ShearModel.Elementary
        ? "elementary shear model"
        : Text($"elasticity, ν = {field.Poisson:0.###}");

    private static string ShearRule(StressField field) => (field.Section, field.Model) switch
    {
        (Round, ShearModel.Elementary) => "(4/3)(V/A)(1 − s²/r²) along the resultant V, s measured along V",
        (Tube, ShearModel.Elementary) => "V·Q/(I·2t), Q = ⅔(b³ − a³)·sin ϑ, tangential, ϑ from the direction of V",
        (Rectangle, ShearModel.Elementary) => "1.5·V/A·(1 − (2s/h)²), s and h in the direction of V, each axis apart",
        (RoundedRectangle, ShearModel.Elementary) => "V·Q/(I·b(s)), each axis apart",
        (Box, ShearModel.Elementary) => "V·Q/(I·2t) along the wall's middle line, zero at the axis of symmetry, each axis apart",
        (OpenProfile, ShearModel.Elementary) => "flow from the free ends of the walls, V·Q/(I·t), uniform over the thickness",
        (Round, _) => "Saint-Venant flexure, closed form (Timoshenko and Goodier)",
        (Tube, _) => "Saint-Venant flexure, closed form",
        (Rectangle, _) => "Saint-Venant flexure, series (Timoshenko and Goodier)",
        _ => "Saint-Venant flexure, numerical field (finite elements)",
    };

    private static string TorsionRule(StressField field) => (field.Section, field.Model) switch
    {
        (Round or Tube, _) => "T·r/J, tangential",
        (Rectangle, _) => "Saint-Venant torsion, series (Timoshenko and Goodier)",
        (Box, ShearModel.Elementary) => "T/Wt, along the wall",
        (OpenProfile, ShearModel.Elementary) => "2·n·T/J, J = Σbt³/3, n from the wall's middle line",
        _ => "Saint-Venant torsion, numerical field (finite elements)",
    };

    private static string Text(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
