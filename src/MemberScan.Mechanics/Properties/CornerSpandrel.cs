namespace MemberScan.Mechanics.Properties;

/// <summary>What a rounded corner lacks against a sharp one: a square of the radius less a quarter circle.</summary>
/// <param name="Area">Area [m²].</param>
/// <param name="FromSide">Distance of its centroid from each of the two straight sides [m].</param>
/// <param name="OwnInertia">Second moment about its own centroid, axes parallel to the sides [m⁴].</param>
/// <remarks>Source: EN 10210-2 and EN 10219-2, annex of section properties (from memory); any text on mechanics of materials.</remarks>
internal readonly record struct CornerSpandrel(double Area, double FromSide, double OwnInertia)
{
    /// <summary>The spandrel of a radius [m], ≥ 0.</summary>
    public static CornerSpandrel Of(double radius) => new(
        (1 - Math.PI / 4) * radius * radius,
        (10 - 3 * Math.PI) / (12 - 3 * Math.PI) * radius,
        (1.0 / 3 - Math.PI / 16 - 1 / (3 * (12 - 3 * Math.PI))) * radius * radius * radius * radius);

    /// <summary>Second moment of two pairs, each pair mirrored about the middle of a side of the given length [m⁴].</summary>
    public double FourInertia(double side) =>
        4 * (OwnInertia + Area * (side / 2 - FromSide) * (side / 2 - FromSide));

    /// <summary>First moment, all four counted positive, about the middle of a side of the given length [m³].</summary>
    public double FourMoment(double side) => 4 * Area * (side / 2 - FromSide);
}
