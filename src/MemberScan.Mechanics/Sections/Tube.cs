namespace MemberScan.Mechanics.Sections;

/// <summary>A round tube.</summary>
public sealed record Tube : CrossSection
{
    /// <summary>A tube of outer radius and wall [m], both &gt; 0, the wall thinner than the radius.</summary>
    /// <exception cref="ArgumentException">The dimensions break a rule of <see cref="Fault"/>.</exception>
    public Tube(double outerRadius, double wall)
    {
        ThrowOn(Fault(outerRadius, wall));
        (OuterRadius, Wall) = (outerRadius, wall);
    }

    /// <summary>Outer radius [m].</summary>
    public double OuterRadius { get; }

    /// <summary>Wall thickness [m].</summary>
    public double Wall { get; }

    /// <summary>Inner radius [m], &gt; 0.</summary>
    public double InnerRadius => OuterRadius - Wall;

    /// <inheritdoc/>
    public override string Kind => "tube";

    /// <inheritdoc/>
    public override double ExtentY => 2 * OuterRadius;

    /// <inheritdoc/>
    public override double ExtentZ => 2 * OuterRadius;

    /// <inheritdoc/>
    public override string Designation => $"tube {MmText(2 * OuterRadius)}x{MmText(Wall)} mm";

    /// <summary>What is wrong with the dimensions [m]; null when nothing is.</summary>
    public static SectionFault? Fault(double outerRadius, double wall) =>
        NotPositive(outerRadius, wall) ?? (wall >= outerRadius
            ? new SectionFault(SectionFaultKind.WallOverRadius, $"the wall of {MmText(wall)} mm leaves no hole in a radius of {MmText(outerRadius)} mm")
            : null);
}
