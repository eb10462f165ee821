namespace MemberScan.Mechanics.Forces;

/// <summary>The stretch between two neighbouring stations of one situation; never across a jump.</summary>
/// <param name="Start">Left station.</param>
/// <param name="End">Right station, farther from the member's start.</param>
/// <param name="Kind">What is known in between.</param>
public readonly record struct ForceInterval(ForceStation Start, ForceStation End, IntervalKind Kind)
{
    /// <summary>Section forces at a share of the way from the left station to the right one.</summary>
    /// <param name="share">0 at the left station, 1 at the right one.</param>
    /// <remarks>
    /// Linear in all six, with the moments of a uniform load on top where that was inferred:
    /// <c>M(s) = linear + (dM/dx at the left − mean slope)·L·s·(1 − s)</c>, from <c>dMy/dx = Vz</c>, <c>dMz/dx = −Vy</c>.
    /// </remarks>
    public SectionForces At(double share)
    {
        var linear = Start.Forces + share * (End.Forces - Start.Forces);
        if (Kind != IntervalKind.UniformLoadInferred) return linear;

        var length = End.X - Start.X;
        var bulge = 0.5 * length * share * (1 - share);
        return linear with
        {
            My = linear.My + bulge * (Start.Forces.Vz - End.Forces.Vz),
            Mz = linear.Mz - bulge * (Start.Forces.Vy - End.Forces.Vy),
        };
    }

    /// <summary>
    /// The end states with the largest bulge of the moments added. All states in between lie within the span of these two and the two
    /// stations, so a measure that is convex in the forces is nowhere larger than at one of the four.
    /// </summary>
    public (SectionForces Start, SectionForces End) Enclosing
    {
        get
        {
            var bulge = At(0.5) - (Start.Forces + 0.5 * (End.Forces - Start.Forces));
            return (Start.Forces + bulge, End.Forces + bulge);
        }
    }
}
