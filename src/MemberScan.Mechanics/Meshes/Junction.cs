namespace MemberScan.Mechanics.Meshes;

/// <summary>Two walls that meet at a right angle about a re-entrant corner, sharp or rounded.</summary>
/// <remarks>
/// In a frame of its own the corner is the origin, the first wall runs along +a above b = −(its thickness), the second along +b beside
/// a = −(its thickness). The frame is laid into the section by the place of the corner and the senses of a and b.
/// </remarks>
/// <param name="Y">Where the two inner faces meet, along y [m].</param>
/// <param name="Z">The same along z [m].</param>
/// <param name="SenseY">+1 where a runs along +y, −1 where it runs along −y.</param>
/// <param name="SenseZ">+1 where b runs along +z, −1 where it runs along −z.</param>
/// <param name="Radius">Radius of the fillet [m], ≥ 0.</param>
/// <param name="FirstThickness">Thickness of the wall along a [m].</param>
/// <param name="FirstLength">Its length from the corner [m], longer than the radius.</param>
/// <param name="SecondThickness">Thickness of the wall along b [m].</param>
/// <param name="SecondLength">Its length from the corner [m], longer than the radius.</param>
/// <param name="IsSecondFree">Whether the wall along b ends there; that along a always does.</param>
internal readonly record struct Junction(
    double Y, double Z, int SenseY, int SenseZ, double Radius,
    double FirstThickness, double FirstLength, double SecondThickness, double SecondLength, bool IsSecondFree)
{
    /// <summary>The place in the section of a place of the frame.</summary>
    public (double Y, double Z) Place(double a, double b) => (Y + SenseY * a, Z + SenseZ * b);
}
