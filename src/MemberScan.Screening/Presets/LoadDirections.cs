using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Screening.Presets;

/// <summary>Directions in which a load of any direction is tried, in the member's axes.</summary>
/// <remarks>
/// The normal stress at a fibre (y, z) is linear in the direction of the load, so it is largest along its gradient
/// <c>(±1/A, k·y/Iz, k·z/Iy)</c>, k being the lever. Tried are the gradients of the corners of the section's extents, with and without the part
/// along the member, the two axes of the section and both senses along the member. The reverse of a direction gives the same stresses with the
/// other sign, so one of the two is enough, except along the member, where stability asks for compression.
/// </remarks>
internal static class LoadDirections
{
    /// <summary>The directions, unit vectors.</summary>
    /// <param name="shape">The section.</param>
    /// <param name="properties">Its properties.</param>
    /// <param name="lever">Largest bending moment per unit of load [m].</param>
    public static ImmutableArray<Vector3> Of(CrossSection shape, SectionProperties properties, double lever)
    {
        var directions = ImmutableArray.CreateBuilder<Vector3>();
        directions.AddRange(Vector3.UnitY, Vector3.UnitZ, Vector3.UnitX, -Vector3.UnitX);
        var (y, z) = (shape.ExtentY / 2, shape.ExtentZ / 2);
        IEnumerable<(double Y, double Z)> fibres = shape is Round or Tube ? [(y, 0)] : [(y, z), (y, -z)];
        foreach (var fibre in fibres)
            foreach (var along in (double[])[0, 1, -1])
            {
                var gradient = new Vector3(along / properties.Area, lever * fibre.Y / properties.Iz, lever * fibre.Z / properties.Iy);
                if (gradient.TryNormalize(out var unit) && !directions.Any(d => d.Cross(unit).Length < 1e-9 && d.Dot(unit) > 0)) directions.Add(unit);
            }

        return directions.ToImmutable();
    }
}
