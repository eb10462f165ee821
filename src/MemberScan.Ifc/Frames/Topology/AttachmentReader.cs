using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Frames.Topology;

/// <summary>Lays the joints of a curve member on its course: at its ends, or in between.</summary>
internal sealed class AttachmentReader(NodePool nodes, double tolerance)
{
    /// <summary>The ties of a member in rising order, its ends and corners among them; null with the reason when a joint fits nowhere.</summary>
    /// <param name="name">The member, for messages.</param>
    /// <param name="course">Its course.</param>
    /// <param name="joints">Its joints.</param>
    /// <param name="connections">The connections with their nodes.</param>
    /// <param name="why">The reason.</param>
    public List<Attachment>? Read(
        string name, Course course, IReadOnlyList<Joint> joints, IReadOnlyDictionary<ulong, (PointConnection Connection, int Node)> connections, out Reason? why)
    {
        why = null;
        var length = course.Length;
        var ties = new List<Attachment>();
        foreach (var joint in joints)
        {
            if (!connections.TryGetValue(joint.Connection, out var entry))
            {
                why = new Reason(ReasonCode.NoForces, $"{name} is joined to the connection #{joint.Connection}, which is not read");
                return null;
            }

            var (connection, node) = entry;
            var (at, beside) = Nearest(course, connection.Position + joint.Offset);
            if (beside > tolerance)
            {
                why = new Reason(ReasonCode.NoForces, string.Create(CultureInfo.InvariantCulture, $"{name} is joined to the connection {connection.Name}, which lies {beside * 1e3:0.###} mm off it{(joint.Offset == Vector3.Zero ? ", and no eccentricity says how" : " by its eccentricity")}"));
                return null;
            }

            if (at <= tolerance) at = 0;
            else if (at >= length - tolerance) at = length;
            if (ties.FindIndex(t => Math.Abs(t.At - at) <= tolerance) is var twice and >= 0)
            {
                if (ties[twice].Node == node && ties[twice].Relation is { } earlier && earlier.Id == joint.Relation.Id) continue;

                why = new Reason(ReasonCode.NoForces, $"{name} has two joints at one place, by #{ties[twice].Relation?.Id} and #{joint.Relation.Id}");
                return null;
            }

            ties.Add(new Attachment(at, node, joint.Offset, joint.Relation));
        }

        AddCorners(name, course, ties);
        ties.Sort((a, b) => a.At.CompareTo(b.At));
        return ties;
    }

    /// <summary>The point of a course at a distance from its start [m].</summary>
    public static Vector3 PointAt(Course course, double at)
    {
        var from = 0.0;
        for (var i = 1; i < course.Points.Length; i++)
        {
            var (a, b) = (course.Points[i - 1], course.Points[i]);
            var stretch = (b - a).Length;
            if (at <= from + stretch || i == course.Points.Length - 1) return a + (at - from) / stretch * (b - a);

            from += stretch;
        }

        return course.Points[^1];
    }

    private void AddCorners(string name, Course course, List<Attachment> ties)
    {
        var at = 0.0;
        for (var i = 0; i < course.Points.Length; i++)
        {
            if (i > 0) at += (course.Points[i] - course.Points[i - 1]).Length;
            if (ties.Exists(t => Math.Abs(t.At - at) <= tolerance)) continue;

            var isEnd = i == 0 || i == course.Points.Length - 1;
            var node = isEnd
                ? nodes.At(course.Points[i])
                : nodes.Apart(course.Points[i], string.Create(CultureInfo.InvariantCulture, $"{name}, corner at {at:0.####} m"));
            ties.Add(new Attachment(at, node, Vector3.Zero, null));
        }
    }

    private static (double At, double Beside) Nearest(Course course, Vector3 point)
    {
        var (best, least, from) = (0.0, double.PositiveInfinity, 0.0);
        for (var i = 1; i < course.Points.Length; i++)
        {
            var (a, along) = (course.Points[i - 1], course.Points[i] - course.Points[i - 1]);
            var stretch = along.Length;
            var at = Math.Clamp((point - a).Dot(along) / (stretch * stretch), 0, 1);
            var beside = (point - a - at * along).Length;
            if (beside < least) (best, least) = (from + at * stretch, beside);
            from += stretch;
        }

        return (best, least);
    }
}
