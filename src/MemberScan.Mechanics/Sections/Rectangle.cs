namespace MemberScan.Mechanics.Sections;

/// <summary>A solid rectangle with sharp corners.</summary>
public sealed record Rectangle : CrossSection
{
    /// <summary>A rectangle of width along y and depth along z [m], both &gt; 0, whichever is larger.</summary>
    /// <exception cref="ArgumentException">The dimensions break a rule of <see cref="Fault"/>.</exception>
    public Rectangle(double width, double depth)
    {
        ThrowOn(Fault(width, depth));
        (Width, Depth) = (width, depth);
    }

    /// <summary>Width b along y [m].</summary>
    public double Width { get; }

    /// <summary>Depth h along z [m].</summary>
    public double Depth { get; }

    /// <inheritdoc/>
    public override string Kind => "rectangle";

    /// <inheritdoc/>
    public override double ExtentY => Width;

    /// <inheritdoc/>
    public override double ExtentZ => Depth;

    /// <inheritdoc/>
    public override string Designation => $"rectangle {MmText(Width)}x{MmText(Depth)} mm";

    /// <summary>What is wrong with the dimensions [m]; null when nothing is.</summary>
    public static SectionFault? Fault(double width, double depth) => NotPositive(width, depth);
}
