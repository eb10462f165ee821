using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;

namespace MemberScan.Ifc.Meshes.Runs;

/// <summary>All bars of a mesh: of each of its parts the one straight prism that it is, or the straight runs that it is made of.</summary>
/// <param name="Prisms">The bars, in the order of the mesh.</param>
/// <param name="Parts">Number of parts that share no edge.</param>
/// <param name="Faults">Why parts are no bars, in order; empty when all are.</param>
internal sealed record MeshBars(ImmutableArray<Prism> Prisms, int Parts, ImmutableArray<string> Faults)
{
    /// <summary>Reads a mesh.</summary>
    /// <param name="mesh">The mesh.</param>
    /// <param name="towardsY">Gives, for an axis, the direction that the plane's y is nearest to.</param>
    /// <param name="along">Gives a direction its sense: positive where the axis should point.</param>
    public static MeshBars Of(Mesh mesh, Func<Vector3, Vector3> towardsY, Func<Vector3, double> along)
    {
        var parts = MeshParts.Of(mesh);
        var found = new List<(Prism Prism, int Part)>();
        var faults = ImmutableArray.CreateBuilder<string>();
        for (var i = 0; i < parts.Length; i++)
        {
            var bars = OfPart(parts[i], towardsY, along, out var fault);
            found.AddRange(bars.Select(bar => (bar, i)));
            if (bars.IsEmpty) faults.Add(fault);
        }

        return IsNested(found)
            ? new MeshBars([], parts.Length, ["one of its parts lies within another, so that it may be hollow"])
            : new MeshBars([.. found.Select(f => f.Prism)], parts.Length, faults.ToImmutable());
    }

    private static ImmutableArray<Prism> OfPart(Mesh part, Func<Vector3, Vector3> towardsY, Func<Vector3, double> along, out string fault)
    {
        if (PrismFit.Of(part, towardsY, along, out fault) is { } prism) return [prism];

        var runs = RunSearch.Of(part, towardsY, along, out var whyNoRuns);
        if (whyNoRuns.Length > 0 && !string.Equals(whyNoRuns, fault, StringComparison.Ordinal)) fault = $"{fault}; as joined bars: {whyNoRuns}";
        return runs;
    }

    /// <summary>Whether the middle of one bar lies within a bar of another part: its bore drawn as a body of its own looks so.</summary>
    private static bool IsNested(List<(Prism Prism, int Part)> found)
    {
        foreach (var (outer, part) in found)
            foreach (var (inner, other) in found)
                if (part != other && Holds(outer, Middle(inner)))
                    return true;
        return false;
    }

    private static Vector3 Middle(Prism prism)
    {
        var centre = prism.Start.Point(prism.Section.Position.Origin);
        return centre + prism.Length / 2 * prism.Start.Z;
    }

    private static bool Holds(Prism prism, Vector3 point)
    {
        var shape = prism.Section.Shapes[0];
        var from = prism.Start.After(prism.Section.Position);
        var away = point - from.Origin;
        var height = away.Dot(prism.Start.Z);
        return height > 0 && height < prism.Length && Math.Abs(away.Dot(from.X)) < 0.49 * shape.ExtentY && Math.Abs(away.Dot(from.Y)) < 0.49 * shape.ExtentZ;
    }
}
