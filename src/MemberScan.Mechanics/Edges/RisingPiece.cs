namespace MemberScan.Mechanics.Edges;

/// <summary>A piece of an edge along which z only rises or only falls.</summary>
internal readonly record struct RisingPiece(double Low, double High, double Y, double PerZ, double CentreZ, double RadiusSquared, double Sign)
{
    /// <summary>The pieces of an edge; what runs along y is left out.</summary>
    public static IEnumerable<RisingPiece> Of(EdgeCurve edge)
    {
        var places = edge.Shares();
        for (var k = 1; k < places.Count; k++)
        {
            var (a, b) = (edge.At(places[k - 1]), edge.At(places[k]));
            var middle = edge.At(0.5 * (places[k - 1] + places[k]));
            if (a.Z == b.Z) continue;

            yield return edge.IsArc
                ? new RisingPiece(Math.Min(a.Z, b.Z), Math.Max(a.Z, b.Z), edge.Centre.Y, 0, edge.Centre.Z, edge.Radius * edge.Radius, middle.Y < edge.Centre.Y ? -1 : 1)
                : new RisingPiece(Math.Min(a.Z, b.Z), Math.Max(a.Z, b.Z), a.Y, (b.Y - a.Y) / (b.Z - a.Z), a.Z, 0, 0);
        }
    }

    /// <summary>Whether a ray from a point along +y crosses the piece.</summary>
    public bool IsCrossedBeyond(double y, double z)
    {
        if (z < Low || z >= High) return false;

        var rise = z - CentreZ;
        return y < (Sign == 0 ? Y + PerZ * rise : Y + Sign * Math.Sqrt(Math.Max(0, RadiusSquared - rise * rise)));
    }
}
