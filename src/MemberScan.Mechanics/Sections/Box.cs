namespace MemberScan.Mechanics.Sections;

/// <summary>A rectangular tube of uniform wall; outer and inner corner radii are independent and may be zero (sharp).</summary>
public sealed record Box : CrossSection
{
    /// <summary>Outer width along y, outer depth along z, wall, corner radii outside and inside [m].</summary>
    /// <exception cref="ArgumentException">The dimensions break a rule of <see cref="Fault"/>.</exception>
    public Box(double width, double depth, double wall, double outerRadius = 0, double innerRadius = 0)
    {
        ThrowOn(Fault(width, depth, wall, outerRadius, innerRadius));
        (Width, Depth, Wall, OuterRadius, InnerRadius) = (width, depth, wall, outerRadius, innerRadius);
    }

    /// <summary>Outer width b along y [m].</summary>
    public double Width { get; }

    /// <summary>Outer depth h along z [m].</summary>
    public double Depth { get; }

    /// <summary>Wall thickness t [m].</summary>
    public double Wall { get; }

    /// <summary>Corner radius outside [m], ≥ 0.</summary>
    public double OuterRadius { get; }

    /// <summary>Corner radius inside [m], ≥ 0.</summary>
    public double InnerRadius { get; }

    /// <inheritdoc/>
    public override string Kind => "box";

    /// <inheritdoc/>
    public override double ExtentY => Width;

    /// <inheritdoc/>
    public override double ExtentZ => Depth;

    /// <inheritdoc/>
    public override string Designation => OuterRadius == 0 && InnerRadius == 0
        ? $"box {MmText(Width)}x{MmText(Depth)}x{MmText(Wall)} mm"
        : $"box {MmText(Width)}x{MmText(Depth)}x{MmText(Wall)} mm ro {MmText(OuterRadius)} ri {MmText(InnerRadius)}";

    /// <summary>What is wrong with the dimensions [m]; null when nothing is.</summary>
    /// <remarks>The outer corner must not cut through the wall: <c>(ro − ri)·(√2 − 1) &lt; t·√2</c> keeps material in the corner.</remarks>
    public static SectionFault? Fault(double width, double depth, double wall, double outerRadius = 0, double innerRadius = 0)
    {
        if (NotPositive(width, depth, wall) is { } fault) return fault;
        if (!double.IsFinite(outerRadius) || outerRadius < 0 || !double.IsFinite(innerRadius) || innerRadius < 0)
            return new SectionFault(SectionFaultKind.NotPositive, "a corner radius is negative or not a finite number");

        var side = Math.Min(width, depth);
        if (2 * wall >= side)
            return new SectionFault(SectionFaultKind.WallOverRadius, $"two walls of {MmText(wall)} mm leave no hole in {MmText(side)} mm");

        // Distance across the corner along its diagonal, from the inner arc to the outer one.
        var acrossCorner = Math.Sqrt(2) * wall - (outerRadius - innerRadius) * (Math.Sqrt(2) - 1);
        var fits = 2 * outerRadius <= side * (1 + 1e-12) && 2 * innerRadius <= (side - 2 * wall) * (1 + 1e-12) && acrossCorner > 0;
        return fits
            ? null
            : new SectionFault(SectionFaultKind.RadiusTooLarge, $"corner radii of {MmText(outerRadius)} mm outside and {MmText(innerRadius)} mm inside do not fit {MmText(width)}x{MmText(depth)}x{MmText(wall)} mm");
    }
}
