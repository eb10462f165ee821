using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Properties;

namespace MemberScan.Checks.Walls;

/// <summary>Walls of I, L, U and T profiles against class 3: EN 1993-1-1:2005, Table 5.2, from memory.</summary>
/// <remarks>
/// Outstands are held against the limit of uniform compression whatever their stress gradient, which is the least of all; angles in
/// addition against the limits of sheet 3.
/// </remarks>
internal static class OpenProfileWalls
{
    /// <summary>Largest c/t over ε of an outstand of class 3 under uniform compression.</summary>
    private const double Outstand = 14;

    /// <summary>Largest h/t and (b + h)/2t over ε of an angle of class 3.</summary>
    private const double Leg = 15, LegSum = 11.5;

    private readonly record struct Part(string Name, double FlatWidth, double Thickness, (double Y, double Z) From, (double Y, double Z) To, bool IsInternal = false);

    private readonly record struct Held(string Name, string Rule, double Slenderness, double Allowed);

    /// <summary>Holds all compressed walls against class 3; null where none is compressed.</summary>
    public static CheckResult? Check(OpenProfile profile, SectionProperties properties, in SectionForces forces, double fy)
    {
        var epsilon = SlenderWall.Epsilon(fy);
        var worst = default(Held);
        foreach (var part in Parts(profile))
        {
            var (one, two) = (Sigma(properties, forces, part.From), Sigma(properties, forces, part.To));
            if (!SlenderWall.IsCompressed(Math.Min(one, two), Scale(profile, properties, forces))) continue;

            foreach (var held in Rules(profile, part, Math.Max(one, two) / Math.Min(one, two), epsilon))
                if (worst.Name is null || held.Slenderness / held.Allowed > worst.Slenderness / worst.Allowed) worst = held;
        }

        return worst.Name is null ? null : Result(worst, fy, epsilon);
    }

    private static IEnumerable<Held> Rules(OpenProfile profile, Part part, double psi, double epsilon)
    {
        var slenderness = part.FlatWidth / part.Thickness;
        if (part.IsInternal)
        {
            yield return new Held(part.Name, $"internal part at ψ = {Shown.Number(psi)}", slenderness, SlenderWall.InternalPartLimit(psi, epsilon));
            yield break;
        }

        yield return new Held(part.Name, "14ε", slenderness, Outstand * epsilon);
        if (profile.Shape != OpenShape.L) yield break;

        yield return new Held(part.Name, "15ε, h/t of the longer leg", Math.Max(profile.Depth, profile.Width) / profile.Web, Leg * epsilon);
        yield return new Held(part.Name, "11.5ε, (b + h)/2t", (profile.Depth + profile.Width) / (2 * profile.Web), LegSum * epsilon);
    }

    private static CheckResult Result(Held held, double fy, double epsilon)
    {
        var (slenderness, allowed) = (held.Slenderness, held.Allowed);
        if (slenderness > allowed * (1 + 1e-9))
            return SlenderWall.NotChecked($"The {held.Name} has a slenderness of {Shown.Number(slenderness)}, more than {Shown.Number(allowed)} ({held.Rule}); local buckling is not checked.");

        return new CheckResult.Evaluated(SlenderWall.Clause, slenderness / allowed,
        [
            .. SlenderWall.EpsilonLines(fy, epsilon),
            new("c/t", held.Name, slenderness, "-", "section"),
            new("limit", held.Rule, allowed, "-", SlenderWall.Clause.ToString()),
            SlenderWall.Last("(c/t)/limit", slenderness, allowed),
        ]);
    }

    // Flat widths end at the root fillets.
    private static Part[] Parts(OpenProfile p)
    {
        var (left, right, bottom, top) = (-p.CentroidY, p.Width - p.CentroidY, -p.CentroidZ, p.Depth - p.CentroidZ);
        var (upper, lower, middle) = (top - p.Flange / 2, bottom + p.Flange / 2, (left + right) / 2);
        var half = (p.Width - p.Web) / 2 - p.Root;
        var side = p.Width - p.Web - p.Root;
        var web = p.Depth - 2 * p.Flange - 2 * p.Root;
        return p.Shape switch
        {
            OpenShape.I =>
            [
                new("top flange at −y", half, p.Flange, (left, upper), (middle, upper)), new("top flange at +y", half, p.Flange, (right, upper), (middle, upper)),
                new("bottom flange at −y", half, p.Flange, (left, lower), (middle, lower)), new("bottom flange at +y", half, p.Flange, (right, lower), (middle, lower)),
                new("web", web, p.Web, (middle, bottom + p.Flange + p.Root), (middle, top - p.Flange - p.Root), IsInternal: true),
            ],
            OpenShape.U =>
            [
                new("top flange", side, p.Flange, (left, upper), (right, upper)), new("bottom flange", side, p.Flange, (left, lower), (right, lower)),
                new("web", web, p.Web, (left + p.Web / 2, bottom + p.Flange + p.Root), (left + p.Web / 2, top - p.Flange - p.Root), IsInternal: true),
            ],
            OpenShape.T =>
            [
                new("flange at −y", half, p.Flange, (left, upper), (middle, upper)), new("flange at +y", half, p.Flange, (right, upper), (middle, upper)),
                new("web", p.Depth - p.Flange - p.Root, p.Web, (middle, bottom), (middle, top - p.Flange)),
            ],
            _ =>
            [
                new("leg along z", p.Depth - p.Web - p.Root, p.Web, (left + p.Web / 2, bottom), (left + p.Web / 2, top)),
                new("leg along y", p.Width - p.Web - p.Root, p.Web, (left, bottom + p.Web / 2), (right, bottom + p.Web / 2)),
            ],
        };
    }

    private static double Scale(OpenProfile profile, SectionProperties p, in SectionForces forces) =>
        Math.Abs(forces.N) / p.Area + (Math.Abs(forces.My) * profile.Depth + Math.Abs(forces.Mz) * profile.Width) / p.IMin;

    private static double Sigma(SectionProperties p, in SectionForces forces, (double Y, double Z) at)
    {
        var determinant = p.Iy * p.Iz - p.Iyz * p.Iyz;
        return forces.N / p.Area + ((forces.My * p.Iz + forces.Mz * p.Iyz) * at.Z - (forces.Mz * p.Iy + forces.My * p.Iyz) * at.Y) / determinant;
    }
}
