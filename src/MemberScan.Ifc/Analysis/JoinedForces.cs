using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Analysis.Loads;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Model;
using MemberScan.Model.Forces;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Analysis;

/// <summary>Joins the samples of all analytical members of a candidate in one situation, turned into its axes and laid along it.</summary>
internal static class JoinedForces
{
    /// <summary>Largest sine of the angle between an analytical member and the body that it stands for.</summary>
    public const double ParallelTolerance = 0.02;

    /// <summary>Share of the length, or one section extent if more, by which a body may stick out beyond its analytical line.</summary>
    public const double StickOut = 0.02;

    /// <summary>Share of a length within which two places are one.</summary>
    private const double SamePlace = 1e-6;

    /// <summary>Distance between the two lines from which the result says so [m].</summary>
    private const double BesideNoted = 0.001;

    /// <summary>One reaction on one analytical member.</summary>
    /// <param name="Line">The analytical member.</param>
    /// <param name="Source">Where its samples come from, in words.</param>
    /// <param name="Samples">Its samples.</param>
    /// <param name="Loads">The loads on the analytical member in the same situation.</param>
    public sealed record Part(AnalyticalMember Line, string Source, ReactionReader.Samples Samples, LineLoads Loads);

    /// <summary>Joins the samples of all analytical members of a candidate, turned into its axes and shifted along it.</summary>
    public static MemberForces Of(Member member, Situation situation, List<Part> parts)
    {
        var source = string.Join(", ", parts.Select(p => p.Source));
        MemberForces Unusable(Reason why) => new() { MemberKey = member.Key, Situation = situation, Stations = [], Source = source, Unusable = why };
        if (parts.Find(p => p.Samples.Unusable is not null) is { Samples.Unusable: { } bad }) return Unusable(bad);
        if (Overlap(parts) is { } overlap) return Unusable(overlap);
        if (parts.Find(p => p.Line.EccentricCardinalPoint is not null) is { } eccentric)
            return Unusable(new Reason(ReasonCode.AxesUnknown, $"the analytical member #{eccentric.Line.Id} runs along cardinal point {eccentric.Line.EccentricCardinalPoint} of its section, not its centroid; whether its forces are about the one or the other is not said"));

        var isOwnLine = member.Element.StepId == parts[0].Line.Id;
        if (isOwnLine)
        {
            var ownNotes = new List<string>();
            var explained = true;
            var stations = Filled(parts, ownNotes, ref explained);
            return new MemberForces
            {
                MemberKey = member.Key,
                Situation = situation,
                Stations = [.. stations],
                Source = source,
                Conversion = parts[0].Samples.Conversion,
                Notes = [.. ownNotes],
                LoadsAreKnown = explained,
            };
        }

        if (!member.IsStraight) return Unusable(new Reason(ReasonCode.AxesUnknown, "the member is bent; forces of a straight analytical member cannot be laid along it"));
        if (!member.Axes.TryGet(out var own, out var noAxes)) return Unusable(noAxes);
        if (!member.Length.TryGet(out var length, out var noLength)) return Unusable(noLength);

        var slack = Math.Max(StickOut * length.Value, member.Section is Finding<SectionFinding>.Found section ? Largest(section.Value.Shape) : 0);
        var joined = ImmutableArray.CreateBuilder<ForceStation>();
        var (words, notes, allExplained) = (new List<string>(), new List<string>(), true);
        var (from, to) = (double.PositiveInfinity, double.NegativeInfinity);

        // From start to end, so that at a shared node the left value stands before the right one, however their places are rounded.
        var chain = parts.GroupBy(p => p.Line.Id).Select(g => g.ToList()).OrderBy(g => Middle(g[0].Line, own.Value)).ToList();
        foreach (var link in chain)
        {
            var line = link[0].Line;
            if (!line.Line.TryGet(out var ends, out var noLine)) return Unusable(noLine);
            if (!LineAxes(line, member, out var lineAxes, out var noLineAxes)) return Unusable(noLineAxes!);
            if (lineAxes.X.Cross(own.Value.X).Length > ParallelTolerance)
                return Unusable(new Reason(ReasonCode.AxesUnknown, $"the analytical member #{line.Id} does not run along the member"));

            var reversed = lineAxes.X.Dot(own.Value.X) < 0;
            var start = Along(own.Value, ends.Value.Start);
            var (near, far) = InOrder(start, Along(own.Value, ends.Value.End));
            var samples = Filled(link, notes, ref allExplained);
            if (Break(chain.Count, link, samples, near, far, to, slack) is { } broken) return Unusable(broken);

            (from, to) = (Math.Min(from, near), Math.Max(to, far));
            var stations = samples.ConvertAll(s => new ForceStation(start + (reversed ? -s.X : s.X), Turned(s.Forces, lineAxes, own.Value, reversed)));
            if (reversed) stations.Reverse();
            joined.AddRange(stations);
            words.Add(Words(link[0], lineAxes, own.Value, reversed, start));
        }

        // The body may stick out a little beyond its analytical line; farther than that its ends are not covered.
        return new MemberForces
        {
            MemberKey = member.Key,
            Situation = situation,
            Stations = joined.ToImmutable(),
            Source = source,
            Conversion = string.Join("; ", words.Distinct(StringComparer.Ordinal)),
            From = from > slack ? 0 : from,
            To = to < length.Value - slack ? length.Value : to,
            Notes = [.. notes.Distinct(StringComparer.Ordinal)],
            LoadsAreKnown = allExplained,
        };
    }

    /// <summary>The stations of all reactions on one analytical member in rising order, with further ones between them where its loads are known.</summary>
    private static List<ForceStation> Filled(List<Part> parts, List<string> notes, ref bool allExplained)
    {
        var stations = parts.SelectMany(p => p.Samples.Stations).OrderBy(s => s.X).ToList();
        var (line, loads) = (parts[0].Line, parts[0].Loads);
        if (loads.Loads.IsEmpty || !line.Length.TryGet(out var length, out _))
        {
            allExplained = false;
            if (loads.WhyNot.Length > 0 && stations.Count > 1) notes.Add($"the loads of the model are not used between stations of the analytical member #{line.Id}: {loads.WhyNot}");
            return stations;
        }

        var filled = Equilibrium.Fill(stations, loads.Loads, length.Value, out var stretches);
        allExplained &= stretches.Explained == stretches.All;
        if (stretches.Explained > 0) notes.Add($"between stations by equilibrium with the loads of the model: {loads.Source}");
        if (stretches.Explained < stretches.All) notes.Add($"the loads of the model ({loads.Source}) do not explain how the forces change along the analytical member #{line.Id}");
        return [.. filled];
    }

    /// <summary>Reactions over one stretch of one analytical member: nothing says whether they act together or one replaces the other.</summary>
    private static Reason? Overlap(List<Part> parts)
    {
        foreach (var line in parts.Where(p => p.Samples.Stations.Length > 1).GroupBy(p => p.Line.Id))
        {
            var reached = double.NegativeInfinity;
            foreach (var (least, most) in line.Select(p => (p.Samples.Stations.Min(s => s.X), p.Samples.Stations.Max(s => s.X))).Order())
            {
                if (least < reached - SamePlace * Math.Abs(reached))
                    return new Reason(ReasonCode.ForcesIncomplete, $"several reactions of one situation lie over the same stretch of the analytical member #{line.Key}; whether they act together is not said");

                reached = Math.Max(reached, most);
            }
        }

        return null;
    }

    /// <summary>Where one of several analytical members of a chain leaves a stretch open, or lies over the one before: forces may jump at its ends.</summary>
    private static Reason? Break(int links, List<Part> link, List<ForceStation> samples, double near, double far, double reached, double slack)
    {
        if (links == 1) return null;

        var length = far - near;
        if (samples.Count == 0 || samples[0].X > SamePlace * length || samples[^1].X < (1 - SamePlace) * length)
            return new Reason(ReasonCode.StationsTooCoarse, $"the results on the analytical member #{link[0].Line.Id} do not reach both its ends, where forces may jump");
        if (near > reached + slack && double.IsFinite(reached))
            return new Reason(ReasonCode.StationsTooCoarse, string.Create(CultureInfo.InvariantCulture, $"no results lie between {reached:0.###} m and {near:0.###} m of the member"));
        if (near < reached - SamePlace * Math.Max(length, Math.Abs(reached)))
            return new Reason(ReasonCode.ForcesIncomplete, $"the analytical member #{link[0].Line.Id} lies over another one of the same member and situation; whether their forces act together is not said");

        return null;
    }

    private static (double Near, double Far) InOrder(double a, double b) => a <= b ? (a, b) : (b, a);

    private static double Middle(AnalyticalMember line, MemberAxes axes) =>
        line.Line is Finding<(Vector3 Start, Vector3 End)>.Found found ? Along(axes, found.Value.Start) + Along(axes, found.Value.End) : 0;

    /// <summary>Axes of the analytical member; where its Axis is missing and the section has no preferred axes, any axes along it do.</summary>
    public static bool LineAxes(AnalyticalMember line, Member member, out MemberAxes axes, out Reason? why)
    {
        if (line.Axes.TryGet(out var found, out why))
        {
            axes = found.Value;
            return true;
        }

        axes = null!;
        var isIsotropic = member.Section is Finding<SectionFinding>.Found { Value.Shape: Round or Tube };
        if (!isIsotropic || line.Line is not Finding<(Vector3 Start, Vector3 End)>.Found ends || member.Axes is not Finding<MemberAxes>.Found own) return false;

        axes = MemberAxes.From(ends.Value.Start, ends.Value.End - ends.Value.Start, own.Value.Z)!;
        return axes is not null;
    }

    /// <summary>Distance of an analytical member's line from a body's, where it is farther at its two ends [m].</summary>
    private static double Offset(AnalyticalMember line, MemberAxes own)
    {
        double Beside(Vector3 point) => (point - own.Origin - Along(own, point) * own.X).Length;
        return line.Line is Finding<(Vector3 Start, Vector3 End)>.Found ends ? Math.Max(Beside(ends.Value.Start), Beside(ends.Value.End)) : 0;
    }

    private static double Along(MemberAxes axes, Vector3 point) => (point - axes.Origin).Dot(axes.X);

    /// <summary>The same section forces in other axes along the same line: reversed where x is, then turned about x.</summary>
    /// <remarks>
    /// With x reversed and y with it, the cut face is the opposite one: force and moment vectors change sign, so N, Vy, T and My stay and
    /// Vz and Mz turn round. The lines may lie askew by the tolerance; nothing of N is laid into the shear forces for that.
    /// </remarks>
    private static SectionForces Turned(in SectionForces forces, MemberAxes from, MemberAxes to, bool reversed)
    {
        var along = reversed ? forces with { Vz = -forces.Vz, Mz = -forces.Mz } : forces;
        return along.Turned(Math.Atan2(-to.Z.Dot(reversed ? -from.Y : from.Y), to.Z.Dot(from.Z)));
    }

    private static string Words(Part part, MemberAxes line, MemberAxes own, bool reversed, double start)
    {
        var angle = Math.Atan2(own.Z.Dot(line.Y), own.Z.Dot(line.Z)) * 180 / Math.PI;
        var turn = Math.Abs(angle) < 0.01 ? "axes alike" : string.Create(CultureInfo.InvariantCulture, $"member z lies {angle:0.##}° from the analytical z towards its y");
        var sense = reversed ? ", x reversed" : "";
        var offset = Offset(part.Line, own);
        var beside = offset < BesideNoted ? "" : string.Create(CultureInfo.InvariantCulture, $", its line lies {offset * 1e3:0.#} mm beside the body's; forces taken about the section's centroid");
        return string.Create(CultureInfo.InvariantCulture, $"{part.Samples.Conversion}; analytical member #{part.Line.Id}: {turn}{sense}, starts at {Math.Round(start, 6):0.######} m of the member{beside}");
    }

    private static double Largest(CrossSection shape) => Math.Max(shape.ExtentY, shape.ExtentZ);
}
