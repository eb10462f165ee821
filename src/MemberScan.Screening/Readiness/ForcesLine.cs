using MemberScan.Mechanics.Forces;
using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;

namespace MemberScan.Screening.Readiness;

/// <summary>What was found of one situation on one candidate.</summary>
/// <param name="Situation">The situation.</param>
/// <param name="Stations">Number of stations.</param>
/// <param name="From">Place of the first [m]; 0 without stations.</param>
/// <param name="To">Place of the last [m]; 0 without stations.</param>
/// <param name="Least">Least value of each section force.</param>
/// <param name="Largest">Largest value of each section force.</param>
/// <param name="Source">File and lines, or STEP ids, in words.</param>
/// <param name="Conversion">How the values were turned, in words; empty when they were not.</param>
/// <param name="Unusable">Why they cannot be used; null when they can.</param>
public sealed record ForcesLine(
    Situation Situation, int Stations, double From, double To, SectionForces Least, SectionForces Largest, string Source, string Conversion, Reason? Unusable)
{
    internal static ForcesLine Of(MemberForces forces)
    {
        var stations = forces.Stations;
        SectionForces Extreme(Func<IEnumerable<double>, double> pick) => stations.IsEmpty ? default : new(
            pick(stations.Select(s => s.Forces.N)), pick(stations.Select(s => s.Forces.Vy)), pick(stations.Select(s => s.Forces.Vz)),
            pick(stations.Select(s => s.Forces.T)), pick(stations.Select(s => s.Forces.My)), pick(stations.Select(s => s.Forces.Mz)));
        return new ForcesLine(
            forces.Situation, stations.Length, stations.IsEmpty ? 0 : stations.Min(s => s.X), stations.IsEmpty ? 0 : stations.Max(s => s.X),
            Extreme(Enumerable.Min), Extreme(Enumerable.Max), forces.Source, forces.Conversion, forces.Unusable);
    }
}
