using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Stress;
using MemberScan.Screening.Sheets;

namespace MemberScan.Reporting.Sheets.Pictures;

/// <summary>Numbers as they are handed to the script for pictures alone: five significant digits, a blank between.</summary>
internal static class Handed
{
    /// <summary>Most points of a line; of more, every so manieth and the extremes are kept.</summary>
    public const int MostPoints = 24;

    /// <summary>Numbers.</summary>
    public static string Numbers(params ReadOnlySpan<double> values)
    {
        var texts = new string[values.Length];
        for (var i = 0; i < texts.Length; i++) texts[i] = (values[i] + 0.0).ToString("G5", CultureInfo.InvariantCulture);
        return string.Join(' ', texts);
    }

    /// <summary>The six forces [N], [N·m].</summary>
    public static string Forces(in SectionForces f) => Numbers(f.N, f.Vy, f.Vz, f.T, f.My, f.Mz);

    /// <summary>A state [MPa].</summary>
    public static string State(in StressState s) => Numbers(s.Sigma / 1e6, s.TauXY / 1e6, s.TauXZ / 1e6);

    /// <summary>The three directions of a member.</summary>
    public static string Axes(MemberAxes a) => Numbers(a.X.X, a.X.Y, a.X.Z, a.Y.X, a.Y.Y, a.Y.Z, a.Z.X, a.Z.Y, a.Z.Z);

    /// <summary>The points of lines: <c>x N Vy Vz T My Mz</c> and whether a station; a comma between points, a bar between lines.</summary>
    public static string Points(SituationLine line) => string.Join('|', line.Lines.Select(points => string.Join(',', Kept(line, points).Select(p =>
        Numbers(p.X, p.Forces.N, p.Forces.Vy, p.Forces.Vz, p.Forces.T, p.Forces.My, p.Forces.Mz, p.IsStation ? 1 : 0)))));

    private static IEnumerable<LinePoint> Kept(SituationLine line, IReadOnlyList<LinePoint> points)
    {
        var extremes = Enum.GetValues<ForceComponent>().SelectMany(c => new[] { line.Extremes(c).Least, line.Extremes(c).Largest }).ToHashSet();
        var every = Math.Max(1, (points.Count + MostPoints - 1) / MostPoints);
        return points.Where((p, i) => i == 0 || i == points.Count - 1 || extremes.Contains(p) || (i % every == 0 && !IsBetween(points, i)));
    }

    // A point between two on whose straight line it lies says nothing; stations have their mark.
    private static bool IsBetween(IReadOnlyList<LinePoint> points, int i)
    {
        if (points[i].IsStation) return false;

        var (a, b, p) = (points[i - 1], points[i + 1], points[i]);
        var share = b.X > a.X ? (p.X - a.X) / (b.X - a.X) : 0;
        return Enum.GetValues<ForceComponent>().All(c =>
        {
            var (from, to) = (SituationLine.Value(a.Forces, c), SituationLine.Value(b.Forces, c));
            return Math.Abs(from + share * (to - from) - SituationLine.Value(p.Forces, c)) <= 1e-9 * Math.Max(Math.Abs(from), Math.Abs(to));
        });
    }
}
