namespace MemberScan.Mechanics.Profiles;

/// <summary>A straight wall of an open profile by its middle line, walked from its free end, or from the flanges that feed it.</summary>
/// <param name="Name">The wall in words.</param>
/// <param name="Y">Start of the middle line along y from the centroid [m].</param>
/// <param name="Z">Start of the middle line along z [m].</param>
/// <param name="DirectionY">Unit direction, along y [-].</param>
/// <param name="DirectionZ">Unit direction, along z [-].</param>
/// <param name="Length">Length [m].</param>
/// <param name="Thickness">Thickness [m].</param>
/// <param name="FedBy">Walls, by number, whose flow runs into the start.</param>
internal sealed record ProfileWall(
    string Name, double Y, double Z, double DirectionY, double DirectionZ, double Length, double Thickness, params int[] FedBy)
{
    /// <summary>The place of a point along the wall and to the left of it [m].</summary>
    public (double S, double N) Locate(double y, double z)
    {
        var (dy, dz) = (y - Y, z - Z);
        return (dy * DirectionY + dz * DirectionZ, dz * DirectionY - dy * DirectionZ);
    }

    /// <summary>The point at a place.</summary>
    public (double Y, double Z) At(double s, double n) => (Y + s * DirectionY - n * DirectionZ, Z + s * DirectionZ + n * DirectionY);

    /// <summary>First moments of the wall's area from its start to a place: <c>∫y·t ds</c>, <c>∫z·t ds</c> [m³].</summary>
    public (double Y, double Z) Moments(double s) => (
        Thickness * s * (Y + 0.5 * s * DirectionY), Thickness * s * (Z + 0.5 * s * DirectionZ));
}
