namespace MemberScan.Mechanics.Sections;

/// <summary>A section that changes evenly from one to another of its kind along a member: round, tube or rectangle.</summary>
public sealed record Taper
{
    /// <summary>Largest slope of a side against the axis for which the formulas of a straight bar are used (common practice, about 10°) [-].</summary>
    public const double LargestSlope = 0.18;

    private Taper(CrossSection start, CrossSection end) => (Start, End) = (start, end);

    /// <summary>The section at the start.</summary>
    public CrossSection Start { get; }

    /// <summary>The section at the end.</summary>
    public CrossSection End { get; }

    /// <summary>A taper; null where the two are not of one kind that is covered.</summary>
    public static Taper? Of(CrossSection start, CrossSection end) => (start, end) switch
    {
        (Round, Round) or (Tube, Tube) or (Rectangle, Rectangle) => new Taper(start, end),
        _ => null,
    };

    /// <summary>The section at a share of the length, from 0 to 1; dimensions change evenly.</summary>
    public CrossSection At(double share)
    {
        double Between(double from, double to) => from + share * (to - from);
        return (Start, End) switch
        {
            (Round a, Round b) => new Round(Between(a.Radius, b.Radius)),
            (Tube a, Tube b) => new Tube(Between(a.OuterRadius, b.OuterRadius), Between(a.Wall, b.Wall)),
            (Rectangle a, Rectangle b) => new Rectangle(Between(a.Width, b.Width), Between(a.Depth, b.Depth)),
            _ => throw new InvalidOperationException("no taper of this kind"),
        };
    }

    /// <summary>The steepest slope of a side against the axis [-].</summary>
    /// <param name="length">Length [m], &gt; 0.</param>
    public double SlopeOver(double length) => Math.Max(Math.Abs(Start.ExtentY - End.ExtentY), Math.Abs(Start.ExtentZ - End.ExtentZ)) / 2 / length;
}
