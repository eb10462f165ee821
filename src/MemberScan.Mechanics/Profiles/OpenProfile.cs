using System.Collections.Immutable;
using MemberScan.Mechanics.Edges;
using MemberScan.Mechanics.Sections;

namespace MemberScan.Mechanics.Profiles;

/// <summary>An open profile of straight walls: I, L, U or T; root fillets between walls, no other rounding.</summary>
public sealed record OpenProfile : CrossSection
{
    /// <summary>A profile by its dimensions [m].</summary>
    /// <param name="shape">The letter.</param>
    /// <param name="depth">Depth h along z.</param>
    /// <param name="width">Width b along y.</param>
    /// <param name="web">Thickness of the web along z; of an angle of both legs.</param>
    /// <param name="flange">Thickness of the flanges; of an angle the same as the web.</param>
    /// <param name="root">Radius of the root fillets, ≥ 0.</param>
    /// <exception cref="ArgumentException">The dimensions break a rule of <see cref="Fault"/>.</exception>
    public OpenProfile(OpenShape shape, double depth, double width, double web, double flange, double root = 0)
    {
        ThrowOn(Fault(shape, depth, width, web, flange, root));
        (Shape, Depth, Width, Web, Flange, Root) = (shape, depth, width, web, flange, root);
        var ring = Ring(shape, depth, width, web, flange, root);
        var (y, z) = OutlineIntegrals.Of(RingGeometry.Edges([ring])).Centroid;
        (CentroidY, CentroidZ) = (y, z);
        Vertices = [.. ring.Select(v => new OutlineVertex(v.Y - y, v.Z - z, v.Bulge))];
        Edges = RingGeometry.Edges([Vertices]);
    }

    /// <summary>The letter.</summary>
    public OpenShape Shape { get; }

    /// <summary>Depth h along z [m].</summary>
    public double Depth { get; }

    /// <summary>Width b along y [m].</summary>
    public double Width { get; }

    /// <summary>Thickness of the web [m].</summary>
    public double Web { get; }

    /// <summary>Thickness of the flanges [m].</summary>
    public double Flange { get; }

    /// <summary>Radius of the root fillets [m].</summary>
    public double Root { get; }

    /// <summary>Distance of the centroid from the side −y [m].</summary>
    public double CentroidY { get; }

    /// <summary>Distance of the centroid from the bottom [m].</summary>
    public double CentroidZ { get; }

    /// <summary>The outline about the centroid, to the left [m].</summary>
    public ImmutableArray<OutlineVertex> Vertices { get; }

    /// <inheritdoc/>
    public override string Kind => $"{Shape} profile";

    /// <inheritdoc/>
    public override double ExtentY => Width;

    /// <inheritdoc/>
    public override double ExtentZ => Depth;

    /// <inheritdoc/>
    public override string Designation =>
        (Shape == OpenShape.L ? $"L {MmText(Depth)}x{MmText(Width)}x{MmText(Web)} mm" : $"{Shape} {MmText(Depth)}x{MmText(Width)}x{MmText(Web)}x{MmText(Flange)} mm")
        + (Root == 0 ? "" : $" r {MmText(Root)}");

    /// <summary>All edges, the material to their left.</summary>
    internal ImmutableArray<EdgeCurve> Edges { get; }

    /// <summary>What is wrong with the dimensions [m]; null when nothing is.</summary>
    public static SectionFault? Fault(OpenShape shape, double depth, double width, double web, double flange, double root = 0)
    {
        if (NotPositive(depth, width, web, flange) is { } fault) return fault;
        if (!double.IsFinite(root) || root < 0) return new SectionFault(SectionFaultKind.NotPositive, "the root radius is negative or not a finite number");
        if (shape == OpenShape.L && web != flange) return new SectionFault(SectionFaultKind.NotPositive, "both legs of an angle have one thickness");

        var flanges = shape is OpenShape.I or OpenShape.U ? 2 : 1;
        var (freeDepth, freeWidth) = (depth - flanges * flange, width - web);
        if (freeDepth <= 0 || freeWidth <= 0)
            return new SectionFault(SectionFaultKind.WallOverRadius, "the walls are as thick as the profile");

        var outstand = shape is OpenShape.I or OpenShape.T ? freeWidth / 2 : freeWidth;
        return (flanges * root < freeDepth && root < outstand) || root == 0
            ? null
            : new SectionFault(SectionFaultKind.RadiusTooLarge, $"a root radius of {MmText(root)} mm does not fit between the walls");
    }

    // From the corner −y −z to the left; a fillet bends to the right, by a quarter turn.
    private static ImmutableArray<OutlineVertex> Ring(OpenShape shape, double h, double b, double w, double f, double r)
    {
        var quarter = -Math.Tan(Math.PI / 8);
        var (left, right) = ((b - w) / 2, (b + w) / 2);
        IEnumerable<OutlineVertex> Fillet(double y, double z, int fromY, int fromZ, int toY, int toZ) => r == 0
            ? [new OutlineVertex(y, z)]
            : [new OutlineVertex(y + fromY * r, z + fromZ * r, quarter), new OutlineVertex(y + toY * r, z + toZ * r)];

        return shape switch
        {
            OpenShape.I =>
            [
                new(0, 0), new(b, 0), new(b, f), .. Fillet(right, f, 1, 0, 0, 1), .. Fillet(right, h - f, 0, -1, 1, 0), new(b, h - f), new(b, h),
                new(0, h), new(0, h - f), .. Fillet(left, h - f, -1, 0, 0, -1), .. Fillet(left, f, 0, 1, -1, 0), new(0, f),
            ],
            OpenShape.L => [new(0, 0), new(b, 0), new(b, w), .. Fillet(w, w, 1, 0, 0, 1), new(w, h), new(0, h)],
            OpenShape.U =>
            [
                new(0, 0), new(b, 0), new(b, f), .. Fillet(w, f, 1, 0, 0, 1), .. Fillet(w, h - f, 0, -1, 1, 0), new(b, h - f), new(b, h), new(0, h),
            ],
            _ =>
            [
                new(left, 0), new(right, 0), .. Fillet(right, h - f, 0, -1, 1, 0), new(b, h - f), new(b, h), new(0, h), new(0, h - f),
                .. Fillet(left, h - f, -1, 0, 0, -1),
            ],
        };
    }

    /// <summary>Equal where all dimensions are.</summary>
    public bool Equals(OpenProfile? other) => other is not null
        && (Shape, Depth, Width, Web, Flange, Root) == (other.Shape, other.Depth, other.Width, other.Web, other.Flange, other.Root);

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(Shape, Depth, Width, Web, Flange, Root);
}
