using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Walls;

/// <summary>Whether compressed walls of hollow steel sections are within class 3: EN 1993-1-1:2005, Table 5.2, from memory.</summary>
/// <remarks>
/// The utilization is a slenderness over its limit; it does not grow with the load. It must not be ranked among stress utilizations.
/// </remarks>
public static class SlenderWall
{
    private const double Tolerance = 1e-9;

    /// <summary>Where the rule comes from.</summary>
    public static Clause Clause { get; } = new("EN 1993-1-1:2005", "Table 5.2, class 3", "", FromMemory: true);

    /// <summary>Factor of the yield strength on slenderness limits.</summary>
    /// <param name="fy">Yield strength [Pa], &gt; 0.</param>
    /// <returns><c>ε = √(235 MPa / fy)</c> [-].</returns>
    public static double Epsilon(double fy) => Math.Sqrt(235e6 / fy);

    /// <summary>Largest d/t of a tube of class 3.</summary>
    /// <param name="epsilon">ε [-].</param>
    /// <returns><c>90ε²</c> [-].</returns>
    public static double TubeLimit(double epsilon) => 90 * epsilon * epsilon;

    /// <summary>Largest c/t of an internal part of class 3 in bending and compression.</summary>
    /// <param name="psi">Ratio ψ of the end stresses, the more compressed end below the bar [-], ≤ 1.</param>
    /// <param name="epsilon">ε [-].</param>
    /// <returns>The limit [-].</returns>
    public static double InternalPartLimit(double psi, double epsilon) => psi > -1
        ? 42 * epsilon / (0.67 + 0.33 * psi)
        : 62 * epsilon * (1 - psi) * Math.Sqrt(-psi);

    /// <summary>Holds the walls of a section against class 3 under the normal stresses of the given forces.</summary>
    /// <param name="section">The section.</param>
    /// <param name="properties">Its properties.</param>
    /// <param name="forces">Section forces; finite. N, My and Mz count.</param>
    /// <param name="fy">Yield strength [Pa], &gt; 0.</param>
    /// <returns>
    /// Null for solid sections and where nothing is compressed (no rule applies); else the slenderness over its limit, up to 1;
    /// not evaluated, <see cref="ReasonCode.SlenderWall"/>, beyond it or for a section without a rule.
    /// </returns>
    /// <exception cref="ArgumentException">A force is not finite.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The strength is not above zero.</exception>
    public static CheckResult? Check(CrossSection section, SectionProperties properties, in SectionForces forces, double fy)
    {
        ArgumentNullException.ThrowIfNull(section);
        ArgumentNullException.ThrowIfNull(properties);
        if (!forces.IsFinite) throw new ArgumentException("the section forces must be finite numbers", nameof(forces));
        if (!double.IsFinite(fy) || fy <= 0)
            throw new ArgumentOutOfRangeException(nameof(fy), fy, "the strength must be a finite number above zero");

        return section switch
        {
            Round or Rectangle or RoundedRectangle => null,
            Tube tube => OfTube(tube, properties, forces, fy),
            Box box => OfBox(box, properties, forces, fy),
            _ => NotChecked($"There is no slenderness rule for a section of the kind {section.Kind}."),
        };
    }

    private static CheckResult? OfTube(Tube tube, SectionProperties properties, in SectionForces forces, double fy)
    {
        var bending = Math.Sqrt(forces.My * forces.My + forces.Mz * forces.Mz) * tube.OuterRadius / properties.Iy;
        var axial = forces.N / properties.Area;
        if (!IsCompressed(axial - bending, Math.Abs(axial) + bending)) return null;

        var epsilon = Epsilon(fy);
        var (slenderness, limit) = (2 * tube.OuterRadius / tube.Wall, TubeLimit(epsilon));
        if (slenderness > limit * (1 + Tolerance))
            return NotChecked($"The tube has d/t = {Shown.Number(slenderness)}, more than 90ε² = {Shown.Number(limit)}; local buckling is not checked.");

        return new CheckResult.Evaluated(Clause, slenderness / limit,
        [
            new("σmin", $"N/A − M·R/I = {Shown.MPa(axial)} − {Shown.MPa(bending)} MPa = {Shown.MPa(axial - bending)} MPa", axial - bending, "Pa", "most compressed fibre"),
            .. EpsilonLines(fy, epsilon),
            new("d/t", $"{Shown.Mm(2 * tube.OuterRadius)}/{Shown.Mm(tube.Wall)} = {Shown.Number(slenderness)}", slenderness, "-", "section"),
            new("limit", $"90ε² = 90·{Shown.Number(epsilon)}² = {Shown.Number(limit)}", limit, "-", Clause.ToString()),
            Last("(d/t)/limit", slenderness, limit),
        ]);
    }

    private static CheckResult? OfBox(Box box, SectionProperties properties, in SectionForces forces, double fy)
    {
        var epsilon = Epsilon(fy);
        var scale = Math.Abs(forces.N) / properties.Area + Math.Abs(forces.My) * box.Depth / 2 / properties.Iy
            + Math.Abs(forces.Mz) * box.Width / 2 / properties.Iz;
        WallStress? worst = null;
        var worstRatio = double.NegativeInfinity;
        foreach (var wall in WallsOf(box, properties, forces))
        {
            if (!IsCompressed(wall.Compressed, scale)) continue;

            var ratio = wall.FlatWidth / wall.Thickness / InternalPartLimit(wall.Psi, epsilon);
            if (ratio <= worstRatio) continue;
            (worst, worstRatio) = (wall, ratio);
        }

        return worst is { } decisive ? OfWall(decisive, fy, epsilon) : null;
    }

    private static CheckResult OfWall(WallStress wall, double fy, double epsilon)
    {
        var slenderness = wall.FlatWidth / wall.Thickness;
        var limit = InternalPartLimit(wall.Psi, epsilon);
        if (slenderness > limit * (1 + Tolerance))
        {
            return NotChecked($"The {wall.Name} has c/t = {Shown.Number(slenderness)}, more than {Shown.Number(limit)} "
                + $"at ψ = {Shown.Number(wall.Psi)}; local buckling is not checked.");
        }

        var formula = wall.Psi > -1
            ? $"42ε/(0.67 + 0.33ψ) = 42·{Shown.Number(epsilon)}/(0.67 + 0.33·{Shown.Factor(wall.Psi)}) = {Shown.Number(limit)}"
            : $"62ε(1 − ψ)√(−ψ) = 62·{Shown.Number(epsilon)}·(1 − {Shown.Factor(wall.Psi)})·√{Shown.Number(-wall.Psi)} = {Shown.Number(limit)}";
        return new CheckResult.Evaluated(Clause, slenderness / limit,
        [
            new("σ1", "", wall.Compressed, "Pa", $"{wall.Name}, more compressed end of its flat part"),
            new("σ2", "", wall.Other, "Pa", $"{wall.Name}, other end of its flat part"),
            new("ψ", $"σ2/σ1 = {Shown.MPa(wall.Other)}/{Shown.MPa(wall.Compressed)} = {Shown.Number(wall.Psi)}", wall.Psi, "-", "ratio of the end stresses"),
            .. EpsilonLines(fy, epsilon),
            new("c", $"side − 3t = {Shown.Mm(wall.Side)} − 3·{Shown.Mm(wall.Thickness)} mm = {Shown.Mm(wall.FlatWidth)} mm",
                wall.FlatWidth, "m", "common practice; not less than 0"),
            new("c/t", $"{Shown.Mm(wall.FlatWidth)}/{Shown.Mm(wall.Thickness)} = {Shown.Number(slenderness)}", slenderness, "-", "section"),
            new("limit", formula, limit, "-", Clause.ToString()),
            Last("(c/t)/limit", slenderness, limit),
        ]);
    }

    internal static WallStress[] WallsOf(Box box, SectionProperties properties, SectionForces forces)
    {
        var acrossY = WallStress.FlatWidthOf(box.Width, box.Wall) / 2;
        var acrossZ = WallStress.FlatWidthOf(box.Depth, box.Wall) / 2;
        var (middleY, middleZ) = ((box.Width - box.Wall) / 2, (box.Depth - box.Wall) / 2);
        return
        [
            Wall("wall at +z", box.Width, (-acrossY, middleZ), (acrossY, middleZ)),
            Wall("wall at -z", box.Width, (-acrossY, -middleZ), (acrossY, -middleZ)),
            Wall("wall at +y", box.Depth, (middleY, -acrossZ), (middleY, acrossZ)),
            Wall("wall at -y", box.Depth, (-middleY, -acrossZ), (-middleY, acrossZ)),
        ];

        WallStress Wall(string name, double side, (double Y, double Z) from, (double Y, double Z) to)
        {
            var (one, two) = (Sigma(from.Y, from.Z), Sigma(to.Y, to.Z));
            return new WallStress(name, side, box.Wall, Math.Min(one, two), Math.Max(one, two));
        }

        double Sigma(double y, double z) =>
            forces.N / properties.Area + forces.My * z / properties.Iy - forces.Mz * y / properties.Iz;
    }

    // A stress that is zero but for rounding is no compression: it is measured by the terms it is the difference of.
    internal static bool IsCompressed(double stress, double scale) => stress < -Tolerance * scale;

    private static TraceLine[] EpsilonLines(double fy, double epsilon) =>
    [
        new("fy", "", fy, "Pa", "material of the member"),
        new("ε", $"√(235/fy) = √(235/{Shown.MPa(fy)}) = {Shown.Number(epsilon)}", epsilon, "-", Clause.ToString()),
    ];

    private static TraceLine Last(string symbol, double slenderness, double limit) =>
        new("utilization", $"{symbol} = {Shown.Number(slenderness)}/{Shown.Number(limit)} = {Shown.Number(slenderness / limit)}",
            slenderness / limit, "-", Clause.ToString());

    private static CheckResult.NotEvaluated NotChecked(string sentence) =>
        new(Clause, new Reason(ReasonCode.SlenderWall, sentence));
}
