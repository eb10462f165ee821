using MemberScan.Checks.Walls;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Checks.En1993.Sections;

/// <summary>EN 1993-1-1:2005, 5.5 and Table 5.2: class of bars, tubes and boxes; EN 1993-1-4:2006, Table 5.2 for stainless steel.</summary>
/// <remarks>
/// From memory. c = side − 3t (common practice). Under bending about both axes, and in stainless steel, every wall that may be
/// compressed is taken as compressed evenly, which is cautious.
/// </remarks>
public static class Classification
{
    private const double Tolerance = 1e-9;

    /// <summary>Moments below this share of the other are none.</summary>
    private const double NoMoment = 1e-9;

    /// <summary>Where the limits come from.</summary>
    public static Clause Clause { get; } = Clauses.Of("5.5, Table 5.2");

    /// <summary>Largest c/t of an internal part in a class, for the plastic share α and the elastic ratio ψ.</summary>
    /// <param name="number">Class, 1 to 3.</param>
    /// <param name="alpha">Share α of the part that is compressed when plastic [-], in [0, 1].</param>
    /// <param name="psi">Ratio ψ of the elastic end stresses [-], ≤ 1.</param>
    /// <param name="epsilon">ε [-].</param>
    /// <returns>The limit [-].</returns>
    public static double InternalPartLimit(int number, double alpha, double psi, double epsilon) => number switch
    {
        1 => alpha > 0.5 ? 396 * epsilon / (13 * alpha - 1) : 36 * epsilon / alpha,
        2 => alpha > 0.5 ? 456 * epsilon / (13 * alpha - 1) : 41.5 * epsilon / alpha,
        3 => SlenderWall.InternalPartLimit(psi, epsilon),
        _ => throw new ArgumentOutOfRangeException(nameof(number), number, "classes 1 to 3 have limits"),
    };

    /// <summary>Largest c/t of an evenly compressed internal part of stainless steel: EN 1993-1-4:2006, Table 5.2.</summary>
    /// <param name="number">Class, 1 to 3.</param>
    /// <param name="epsilon">ε of stainless steel [-].</param>
    public static double StainlessPartLimit(int number, double epsilon) => number switch
    {
        1 => 25.7 * epsilon,
        2 => 26.7 * epsilon,
        3 => 30.7 * epsilon,
        _ => throw new ArgumentOutOfRangeException(nameof(number), number, "classes 1 to 3 have limits"),
    };

    /// <summary>Largest d/t of a tube in a class: 50ε², 70ε², 90ε².</summary>
    /// <param name="number">Class, 1 to 3.</param>
    /// <param name="epsilon">ε [-].</param>
    public static double TubeLimit(int number, double epsilon) => number is >= 1 and <= 3
        ? (30 + 20 * number) * epsilon * epsilon
        : throw new ArgumentOutOfRangeException(nameof(number), number, "classes 1 to 3 have limits");

    /// <summary>ε = √(235/f_y), of stainless steel √(235/f_y · E/210 000).</summary>
    /// <param name="f_y">Yield or proof strength [Pa], &gt; 0.</param>
    /// <param name="E">Modulus [Pa], &gt; 0.</param>
    /// <param name="steel">Carbon or stainless.</param>
    public static double Epsilon(double f_y, double E, SteelKind steel) =>
        steel == SteelKind.Carbon ? SlenderWall.Epsilon(f_y) : Math.Sqrt(235e6 / f_y * (E / 210e9));

    /// <summary>The class of a section under its forces.</summary>
    /// <param name="c">The section and its forces; bar, tube or box.</param>
    /// <returns>The class; 1 for solid bars and where nothing is compressed.</returns>
    /// <exception cref="ArgumentException">The kind of section has no rule here, or a value is out of its range.</exception>
    public static SectionClass Of(SectionCase c)
    {
        ArgumentNullException.ThrowIfNull(c);
        c.ThrowUnlessUsable();
        return c.Section switch
        {
            _ when c.IsSolid => new SectionClass(1, "solid bar without walls", []),
            Tube tube => OfTube(c, tube),
            Box box => OfBox(c, box),
            _ => throw new ArgumentException($"there is no class for a section of the kind {c.Section.Kind}", nameof(c)),
        };
    }

    private static SectionClass OfTube(SectionCase c, Tube tube)
    {
        var bending = double.Hypot(c.Forces.My, c.Forces.Mz) / c.Properties.WelY;
        var axial = c.Forces.N / c.Properties.Area;
        if (!SlenderWall.IsCompressed(axial - bending, Math.Abs(axial) + bending)) return Uncompressed;

        var epsilon = Epsilon(c.Yield, c.Modulus, c.Steel);
        var slenderness = 2 * tube.OuterRadius / tube.Wall;
        var number = NumberOf(slenderness, n => TubeLimit(n, epsilon));
        return new SectionClass(number, "tube wall",
        [
            EpsilonLine(c, epsilon),
            new("d/t", $"{Shown.Mm(2 * tube.OuterRadius)}/{Shown.Mm(tube.Wall)} = {Shown.Number(slenderness)}", slenderness, "-", "section"),
            new("class", $"limits 50ε², 70ε², 90ε² = {Limits(n => TubeLimit(n, epsilon))}", number, "-", SourceOf(c)),
        ]);
    }

    private static SectionClass OfBox(SectionCase c, Box box)
    {
        var epsilon = Epsilon(c.Yield, c.Modulus, c.Steel);
        SectionClass? worst = null;
        var worstRatio = double.NegativeInfinity;
        foreach (var wall in SlenderWall.WallsOf(box, c.Properties, c.Forces))
        {
            if (Alpha(c, box, wall) is not { } alpha) continue;

            double Limit(int n) => c.Steel == SteelKind.Stainless
                ? StainlessPartLimit(n, epsilon)
                : InternalPartLimit(n, alpha, IsBiaxial(c.Forces) ? 1 : wall.Psi, epsilon);

            var slenderness = wall.FlatWidth / wall.Thickness;
            var number = NumberOf(slenderness, Limit);
            var ratio = number + slenderness / Limit(Math.Min(number, 3)) / 10;
            if (ratio <= worstRatio) continue;

            worstRatio = ratio;
            worst = new SectionClass(number, wall.Name,
            [
                EpsilonLine(c, epsilon),
                new("c/t", $"(side − 3t)/t = ({Shown.Mm(wall.Side)} − 3·{Shown.Mm(wall.Thickness)})/{Shown.Mm(wall.Thickness)} = {Shown.Number(slenderness)}", slenderness, "-", $"{wall.Name}, common practice"),
                new("α", "", alpha, "-", "share of the wall that is compressed when plastic"),
                new("class", $"limits of classes 1 to 3 = {Limits(Limit)}", number, "-", SourceOf(c)),
            ]);
        }

        return worst ?? Uncompressed;
    }

    /// <summary>Plastic share α of a wall; null where it is not compressed.</summary>
    private static double? Alpha(SectionCase c, Box box, WallStress wall)
    {
        var f = c.Forces;
        var scale = Math.Abs(f.N) / c.Properties.Area + Math.Abs(f.My) / c.Properties.WelY + Math.Abs(f.Mz) / c.Properties.WelZ;
        if (IsBiaxial(f)) return f.N / c.Properties.Area >= scale / 2 ? null : 1;
        if (!SlenderWall.IsCompressed(wall.Compressed, scale)) return null;

        var isWeb = Math.Abs(wall.Other - wall.Compressed) > 1e-6 * Math.Abs(wall.Compressed);
        if (!isWeb || wall.FlatWidth == 0) return 1;

        // Two webs take the axial force when plastic; compression widens their compressed part.
        var share = 0.5 * (1 - f.N / (2 * wall.FlatWidth * box.Wall * c.Yield));
        return Math.Clamp(share, 1e-3, 1);
    }

    private static bool IsBiaxial(in SectionForces f) => Math.Min(Math.Abs(f.My), Math.Abs(f.Mz)) > NoMoment * Math.Max(Math.Abs(f.My), Math.Abs(f.Mz));

    private static int NumberOf(double slenderness, Func<int, double> limit)
    {
        for (var number = 1; number <= 3; number++)
            if (slenderness <= limit(number) * (1 + Tolerance)) return number;
        return 4;
    }

    private static string Limits(Func<int, double> limit) => string.Join(", ", Enumerable.Range(1, 3).Select(n => Shown.Number(limit(n))));

    private static TraceLine EpsilonLine(SectionCase c, double epsilon) => c.Steel == SteelKind.Carbon
        ? new("ε", $"√(235/f_y) = √(235/{Shown.MPa(c.Yield)}) = {Shown.Number(epsilon)}", epsilon, "-", SourceOf(c))
        : new("ε", $"√(235/f_y·E/210000) = √(235/{Shown.MPa(c.Yield)}·{Shown.MPa(c.Modulus)}/210000) = {Shown.Number(epsilon)}", epsilon, "-", SourceOf(c));

    private static string SourceOf(SectionCase c) => (c.Steel == SteelKind.Carbon ? Clause : Clauses.OfStainless("5.2.1, Table 5.2")).ToString();

    private static SectionClass Uncompressed { get; } = new(1, "no compressed part", []);
}
