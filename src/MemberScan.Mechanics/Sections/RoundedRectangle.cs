namespace MemberScan.Mechanics.Sections;

/// <summary>A solid rectangle whose four corners are quarter circles.</summary>
public sealed record RoundedRectangle : CrossSection
{
    /// <summary>Width along y, depth along z, corner radius [m], all &gt; 0, the radius at most half the shorter side.</summary>
    /// <exception cref="ArgumentException">The dimensions break a rule of <see cref="Fault"/>.</exception>
    public RoundedRectangle(double width, double depth, double cornerRadius)
    {
        ThrowOn(Fault(width, depth, cornerRadius));
        (Width, Depth, CornerRadius) = (width, depth, cornerRadius);
    }

    /// <summary>Width b along y [m].</summary>
    public double Width { get; }

    /// <summary>Depth h along z [m].</summary>
    public double Depth { get; }

    /// <summary>Radius of the corners [m].</summary>
    public double CornerRadius { get; }

    /// <inheritdoc/>
    public override string Kind => "rounded rectangle";

    /// <inheritdoc/>
    public override double ExtentY => Width;

    /// <inheritdoc/>
    public override double ExtentZ => Depth;

    /// <inheritdoc/>
    public override string Designation => $"rectangle {MmText(Width)}x{MmText(Depth)} mm r {MmText(CornerRadius)}";

    /// <summary>What is wrong with the dimensions [m]; null when nothing is.</summary>
    public static SectionFault? Fault(double width, double depth, double cornerRadius) =>
        NotPositive(width, depth, cornerRadius) ?? (2 * cornerRadius > Math.Min(width, depth) * (1 + 1e-12)
            ? new SectionFault(SectionFaultKind.RadiusTooLarge, $"the corner radius of {MmText(cornerRadius)} mm is more than half of {MmText(Math.Min(width, depth))} mm")
            : null);
}
