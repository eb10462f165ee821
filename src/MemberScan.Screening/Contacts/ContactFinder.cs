using System.Collections.Immutable;
using MemberScan.Model.Members;

namespace MemberScan.Screening.Contacts;

/// <summary>Finds which members touch: pairs of axes that come near each other, by a sweep along the longest side of the model.</summary>
public static class ContactFinder
{
    /// <summary>Gaps up to this multiple of the tolerance are told as contacts in doubt.</summary>
    public const double DoubtfulGap = 3;

    /// <summary>Sine of the angle below which two members run along each other.</summary>
    private const double Parallel = 0.05;

    /// <summary>The contacts between straight members that have section, length and axes.</summary>
    /// <param name="members">The members.</param>
    /// <param name="tolerance">Gap up to which they touch [m], above zero.</param>
    public static ContactList Find(ImmutableArray<Member> members, double tolerance)
    {
        ArgumentOutOfRangeException.ThrowIfNegativeOrZero(tolerance);
        var boxes = members.Select(BarLine.Of).OfType<BarLine>().Select(line => Box(line, DoubtfulGap * tolerance)).ToArray();
        if (boxes.Length < 2) return new ContactList(tolerance, []);

        var side = LongestSide(boxes);
        Array.Sort(boxes, (a, b) => a.Least[side].CompareTo(b.Least[side]) is var order and not 0 ? order : string.CompareOrdinal(a.Line.Key, b.Line.Key));
        var contacts = new List<Contact>();
        var open = new List<(BarLine Line, double[] Least, double[] Most)>();
        foreach (var box in boxes)
        {
            open.RemoveAll(other => other.Most[side] < box.Least[side]);
            foreach (var other in open)
                if (Overlap(box, other) && Between(other.Line, box.Line, tolerance) is { } contact)
                    contacts.Add(contact);
            open.Add(box);
        }

        return new ContactList(tolerance, [.. contacts.OrderBy(c => c.First, StringComparer.Ordinal).ThenBy(c => c.Second, StringComparer.Ordinal).ThenBy(c => c.FirstAt)]);
    }

    /// <summary>The contact of two members; null when their gap is wider than what is in doubt.</summary>
    private static Contact? Between(BarLine a, BarLine b, double tolerance)
    {
        var (atA, atB) = Nearest(a, b);
        var apart = b.PointAt(atB) - a.PointAt(atA);
        var distance = apart.Length;
        var gap = apart.TryNormalize(out var towards) ? distance - a.ExtentTowards(towards) - b.ExtentTowards(towards) : -Math.Min(a.Reach, b.Reach);
        if (gap > DoubtfulGap * tolerance) return null;

        var (endOfA, endOfB) = (AtEnd(a, atA, b, tolerance), AtEnd(b, atB, a, tolerance));
        var alongside = a.Axes.X.Cross(b.Axes.X).Length < Parallel && Shared(a, b) > a.Reach + b.Reach + tolerance;
        var kind = alongside ? ContactKind.Alongside : endOfA && endOfB ? ContactKind.EndToEnd : endOfA || endOfB ? ContactKind.EndToSide : ContactKind.Crossing;
        var isCertain = gap <= tolerance;

        // The one whose end it is stands first; otherwise the lesser key.
        var swap = kind == ContactKind.EndToSide ? endOfB : string.CompareOrdinal(b.Key, a.Key) < 0;
        return swap
            ? new Contact(b.Key, atB, a.Key, atA, kind, gap, distance, isCertain, b.PointAt(atB))
            : new Contact(a.Key, atA, b.Key, atB, kind, gap, distance, isCertain, a.PointAt(atA));
    }

    /// <summary>Whether a place is at an end: nearer to it than the other member is thick there.</summary>
    private static bool AtEnd(BarLine line, double at, BarLine other, double tolerance) => Math.Min(at, line.Length - at) <= other.ExtentTowards(line.Axes.X) + tolerance;

    /// <summary>Length over which two parallel members run beside each other [m].</summary>
    private static double Shared(BarLine a, BarLine b)
    {
        var (s, e) = ((b.Axes.Origin - a.Axes.Origin).Dot(a.Axes.X), (b.End - a.Axes.Origin).Dot(a.Axes.X));
        return Math.Min(a.Length, Math.Max(s, e)) - Math.Max(0, Math.Min(s, e));
    }

    /// <summary>The places at which two axes come nearest [m].</summary>
    /// <remarks>Minimum of a convex quadratic over a rectangle: the free minimum moved into it, one place at a time; for parallel axes the middle of what they share.</remarks>
    private static (double AtA, double AtB) Nearest(BarLine a, BarLine b)
    {
        var apart = b.Axes.Origin - a.Axes.Origin;
        var (p, q, cos) = (apart.Dot(a.Axes.X), apart.Dot(b.Axes.X), a.Axes.X.Dot(b.Axes.X));
        var square = 1 - cos * cos;
        var atA = square > 1e-12 ? (p - q * cos) / square : Middle(a, b);
        atA = Math.Clamp(atA, 0, a.Length);
        var atB = atA * cos - q;
        if (atB < 0 || atB > b.Length)
        {
            atB = Math.Clamp(atB, 0, b.Length);
            atA = Math.Clamp(p + atB * cos, 0, a.Length);
        }

        return (atA, atB);
    }

    private static double Middle(BarLine a, BarLine b)
    {
        var (s, e) = ((b.Axes.Origin - a.Axes.Origin).Dot(a.Axes.X), (b.End - a.Axes.Origin).Dot(a.Axes.X));
        return 0.5 * (Math.Max(0, Math.Min(s, e)) + Math.Min(a.Length, Math.Max(s, e)));
    }

    private static (BarLine Line, double[] Least, double[] Most) Box(BarLine line, double margin)
    {
        var (s, e, grow) = (line.Axes.Origin, line.End, line.Reach + margin);
        return (line,
            [Math.Min(s.X, e.X) - grow, Math.Min(s.Y, e.Y) - grow, Math.Min(s.Z, e.Z) - grow],
            [Math.Max(s.X, e.X) + grow, Math.Max(s.Y, e.Y) + grow, Math.Max(s.Z, e.Z) + grow]);
    }

    private static bool Overlap((BarLine Line, double[] Least, double[] Most) a, (BarLine Line, double[] Least, double[] Most) b) =>
        Enumerable.Range(0, 3).All(i => a.Least[i] <= b.Most[i] && b.Least[i] <= a.Most[i]);

    private static int LongestSide((BarLine Line, double[] Least, double[] Most)[] boxes) =>
        Enumerable.Range(0, 3).MaxBy(i => boxes.Max(b => b.Most[i]) - boxes.Min(b => b.Least[i]));
}
