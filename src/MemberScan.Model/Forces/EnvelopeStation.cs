using MemberScan.Mechanics.Forces;

namespace MemberScan.Model.Forces;

/// <summary>Least and largest value of each section force at one place, each by itself: which of them act together is lost.</summary>
/// <param name="X">Distance from the member's start [m].</param>
/// <param name="Least">Least values.</param>
/// <param name="Largest">Largest values; none below its least.</param>
public readonly record struct EnvelopeStation(double X, SectionForces Least, SectionForces Largest)
{
    /// <summary>Most corners of a station: two values for each of six components.</summary>
    public const int MostCorners = 64;

    /// <summary>The corners of the box of all values, each once: 64 at most, fewer where least and largest of a component are one.</summary>
    public IEnumerable<SectionForces> Corners()
    {
        var (a, b) = (Least, Largest);
        for (var corner = 0; corner < MostCorners; corner++)
        {
            if (Repeats(corner, 0, a.N, b.N) || Repeats(corner, 1, a.Vy, b.Vy) || Repeats(corner, 2, a.Vz, b.Vz)
                || Repeats(corner, 3, a.T, b.T) || Repeats(corner, 4, a.My, b.My) || Repeats(corner, 5, a.Mz, b.Mz)) continue;

            yield return new SectionForces(
                Pick(corner, 0, a.N, b.N), Pick(corner, 1, a.Vy, b.Vy), Pick(corner, 2, a.Vz, b.Vz),
                Pick(corner, 3, a.T, b.T), Pick(corner, 4, a.My, b.My), Pick(corner, 5, a.Mz, b.Mz));
        }
    }

    private static bool Repeats(int corner, int bit, double least, double largest) => (corner >> bit & 1) == 1 && least.Equals(largest);

    private static double Pick(int corner, int bit, double least, double largest) => (corner >> bit & 1) == 0 ? least : largest;
}
