namespace MemberScan.Checks.Walls;

/// <summary>One flat wall of a box with the normal stresses at the two ends of its flat part, on its middle line.</summary>
/// <param name="Name">The wall in words, such as "wall at +z".</param>
/// <param name="Side">Outer side of the box along the wall [m].</param>
/// <param name="Thickness">Wall thickness [m].</param>
/// <param name="Compressed">The more compressed end's stress [Pa], tension positive.</param>
/// <param name="Other">The other end's stress [Pa], tension positive.</param>
internal readonly record struct WallStress(string Name, double Side, double Thickness, double Compressed, double Other)
{
    /// <summary>Width c of the flat part [m], taken as side − 3t.</summary>
    public double FlatWidth => FlatWidthOf(Side, Thickness);

    /// <summary>Ratio ψ of the end stresses [-], 1 for uniform compression, ≤ 1; of meaning for a compressed wall.</summary>
    public double Psi => Other / Compressed;

    public static double FlatWidthOf(double side, double thickness) => Math.Max(0, side - 3 * thickness);
}
