using System.Collections.Immutable;
using System.Globalization;
using System.Text;
using MemberScan.Foundation.Geometry;
using MemberScan.Reporting.Drawing;
using MemberScan.Reporting.Pictures;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Space;

/// <summary>The members as lines on an upright plane, ready to be drawn: the plane is the one on which the model is wider.</summary>
public sealed class Elevation
{
    /// <summary>Width of the picture [picture unit].</summary>
    public const double Width = 640;

    /// <summary>Largest height of the picture [picture unit].</summary>
    public const double MostHeight = 420;

    /// <summary>Room around the members for marks and numbers [picture unit].</summary>
    public const double Margin = 26;

    /// <summary>Levels that are written at the edge.</summary>
    public const int MostLevels = 12;

    private readonly Func<Vector3, double> _across;
    private readonly double _scale, _left, _top;

    private Elevation(Box box, ImmutableArray<MemberResult> members)
    {
        var alongX = box.Most.X - box.Least.X >= box.Most.Y - box.Least.Y;
        Across = alongX ? "X" : "Y";
        _across = alongX ? v => v.X : v => v.Y;
        var (wide, high) = (Math.Max(_across(box.Most) - _across(box.Least), 0.5), Math.Max(box.Most.Z - box.Least.Z, 0.5));
        _scale = Math.Min((Width - 2 * Margin) / wide, (MostHeight - 2 * Margin) / high);
        (_left, _top) = (_across(box.Least), box.Most.Z);
        Height = high * _scale + 2 * Margin;
        Wide = wide;
        Paths = [.. UtilizationScale.All.Select((step, i) => (step, PathOf(members.Where(m => UtilizationScale.StepOf(m) == i))))];
        Marks = MarksOf(members);
        Levels = LevelsOf(members);
        WithoutPlace = members.Count(m => AxisLine.Of(m) is null);
    }

    /// <summary>The horizontal axis of the project that runs to the right: X or Y.</summary>
    public string Across { get; }

    /// <summary>Height of the picture [picture unit].</summary>
    public double Height { get; }

    /// <summary>Width of the model on the plane [m].</summary>
    public double Wide { get; }

    /// <summary>Path data of the members of each step of the scale; empty where there are none.</summary>
    public ImmutableArray<(ScaleStep Step, string Path)> Paths { get; }

    /// <summary>Path data of a triangle at the middle of each overstressed member.</summary>
    public string Marks { get; }

    /// <summary>Storeys with the lowest start of their members [m] and its place in the picture.</summary>
    public ImmutableArray<(string Name, double Level, double At)> Levels { get; }

    /// <summary>Candidates whose place is not known and that are not in the picture.</summary>
    public int WithoutPlace { get; }

    /// <summary>The elevation of a record; null when no member has a known place.</summary>
    public static Elevation? Of(ScreeningRecord record)
    {
        ArgumentNullException.ThrowIfNull(record);
        return Box.Around(record.Members) is { } box ? new Elevation(box, record.Members) : null;
    }

    private string PathOf(IEnumerable<MemberResult> members)
    {
        var path = new StringBuilder();
        foreach (var member in members)
        {
            if (AxisLine.Of(member) is not var (start, end)) continue;
            path.Append('M').Append(Place(start)).Append('L').Append(Place(end));
        }

        return path.ToString();
    }

    private string MarksOf(ImmutableArray<MemberResult> members)
    {
        var path = new StringBuilder();
        foreach (var member in members.Where(m => m.Verdict == Model.Verdicts.Verdict.Overstressed))
        {
            if (AxisLine.Of(member) is not var (start, end)) continue;
            var (x, y) = (Right(0.5 * (start + end)), Down(0.5 * (start.Z + end.Z)));
            path.Append(CultureInfo.InvariantCulture, $"M{C(x)} {C(y - 5)}l4.5 8h-9z");
        }

        return path.ToString();
    }

    private ImmutableArray<(string, double, double)> LevelsOf(ImmutableArray<MemberResult> members) =>
    [
        .. members.Where(m => m.Storey.Length > 0).Select(m => (m.Storey, Line: AxisLine.Of(m))).Where(m => m.Line is not null)
            .GroupBy(m => m.Storey, StringComparer.Ordinal).Select(g => (g.Key, Level: g.Min(m => Math.Min(m.Line!.Value.Start.Z, m.Line.Value.End.Z))))
            .OrderBy(l => l.Level).Take(MostLevels).Select(l => (l.Key, l.Level, Down(l.Level))),
    ];

    private string Place(Vector3 point) => C(Right(point)) + " " + C(Down(point.Z));

    private double Right(Vector3 point) => Margin + (_across(point) - _left) * _scale;

    private double Down(double z) => Margin + (_top - z) * _scale;

    private static string C(double value) => SectionPath.Coordinate(Math.Round(value, 1));
}
