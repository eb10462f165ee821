using System.Collections.Immutable;
using MemberScan.Mechanics.Edges;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Mechanics.Profiles;

/// <summary>Any section by its outline: an outer ring and holes of straight lines and arcs, moved so that its centroid is the origin.</summary>
public sealed record OutlineSection : CrossSection
{
    /// <summary>Most corners that are read.</summary>
    public const int MostVertices = 400;

    /// <summary>An outline of rings in any place and of any turn [m]; the first is the outer one.</summary>
    /// <exception cref="ArgumentException">The rings break a rule of <see cref="Fault"/>.</exception>
    public OutlineSection(string name, ImmutableArray<ImmutableArray<OutlineVertex>> rings)
    {
        ArgumentNullException.ThrowIfNull(name);
        ThrowOn(Fault(rings));
        Name = name;
        var turned = rings.Select((ring, i) => RingGeometry.Turned(ring, counterClockwise: i == 0)).ToArray();
        (GivenY, GivenZ) = OutlineIntegrals.Of(RingGeometry.Edges(turned)).Centroid;
        Rings = [.. turned.Select(ring => ring.Select(v => new OutlineVertex(v.Y - GivenY, v.Z - GivenZ, v.Bulge)).ToImmutableArray())];
        Edges = RingGeometry.Edges(Rings);
        (LeastY, LargestY, LeastZ, LargestZ) = RingGeometry.Bounds(Edges);
    }

    /// <summary>What the outline is called.</summary>
    public string Name { get; }

    /// <summary>The rings about the centroid, the outer one to the left, holes to the right [m].</summary>
    public ImmutableArray<ImmutableArray<OutlineVertex>> Rings { get; }

    /// <summary>Where the centroid lay along y in the rings that were given [m].</summary>
    public double GivenY { get; }

    /// <summary>Where the centroid lay along z in the rings that were given [m].</summary>
    public double GivenZ { get; }

    /// <inheritdoc/>
    public override string Kind => "outline";

    /// <inheritdoc/>
    public override double ExtentY => LargestY - LeastY;

    /// <inheritdoc/>
    public override double ExtentZ => LargestZ - LeastZ;

    /// <inheritdoc/>
    public override string Designation => $"outline {Name}";

    /// <summary>Least y [m].</summary>
    public double LeastY { get; }

    /// <summary>Largest y [m].</summary>
    public double LargestY { get; }

    /// <summary>Least z [m].</summary>
    public double LeastZ { get; }

    /// <summary>Largest z [m].</summary>
    public double LargestZ { get; }

    /// <summary>All edges, the material to their left.</summary>
    internal ImmutableArray<EdgeCurve> Edges { get; }

    /// <summary>What is wrong with rings; null when nothing is.</summary>
    public static SectionFault? Fault(ImmutableArray<ImmutableArray<OutlineVertex>> rings) => RingGeometry.Fault(rings, MostVertices);

    /// <summary>Equal where name and rings are, corner by corner.</summary>
    public bool Equals(OutlineSection? other) => other is not null && Name == other.Name
        && Rings.Length == other.Rings.Length && Rings.Zip(other.Rings).All(pair => pair.First.AsSpan().SequenceEqual(pair.Second.AsSpan()));

    /// <inheritdoc/>
    public override int GetHashCode()
    {
        var hash = new HashCode();
        hash.Add(Name);
        foreach (var vertex in Rings[0]) hash.Add(vertex);
        return hash.ToHashCode();
    }
}
