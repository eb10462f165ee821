namespace MemberScan.Mechanics.Sections;

/// <summary>A solid round bar.</summary>
public sealed record Round : CrossSection
{
    /// <summary>A bar of the given radius [m], &gt; 0.</summary>
    /// <exception cref="ArgumentException">The dimensions break a rule of <see cref="Fault"/>.</exception>
    public Round(double radius)
    {
        ThrowOn(Fault(radius));
        Radius = radius;
    }

    /// <summary>Radius [m].</summary>
    public double Radius { get; }

    /// <inheritdoc/>
    public override string Kind => "round";

    /// <inheritdoc/>
    public override double ExtentY => 2 * Radius;

    /// <inheritdoc/>
    public override double ExtentZ => 2 * Radius;

    /// <inheritdoc/>
    public override string Designation => $"round {MmText(2 * Radius)} mm";

    /// <summary>What is wrong with the dimensions [m]; null when nothing is.</summary>
    public static SectionFault? Fault(double radius) => NotPositive(radius);
}
