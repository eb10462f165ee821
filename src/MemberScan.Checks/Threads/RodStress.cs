using System.Collections.Immutable;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Forces;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Threads;

/// <summary>Stresses in the thread of a rod against a given allowable stress, and what besides tension acts in it.</summary>
/// <remarks>
/// Plain mechanics. Tension on the named area; bending, shear and torsion on the root diameter, their largest values taken as if they
/// met at one point, which is cautious. The allowable stress is the reviewer's.
/// </remarks>
public static class RodStress
{
    /// <summary>Forces below this share of the others are rounding of zero.</summary>
    private const double ZeroShare = 1e-9;

    /// <summary>Where the tension check comes from.</summary>
    public static Clause TensionClause { get; } = new("", "tension on the named area of the thread ≤ allowable stress", "", FromMemory: false);

    /// <summary>Where the combined check comes from.</summary>
    public static Clause CombinedClause { get; } = new("", "equivalent stress on the root diameter ≤ allowable stress", "", FromMemory: false);

    /// <summary>The checks of a rod at a given allowable stress.</summary>
    /// <param name="rod">The rod.</param>
    /// <param name="area">Area that tension is divided by.</param>
    /// <param name="allowable">Allowable stress before temperature [Pa], &gt; 0.</param>
    /// <param name="limitKind">Kind of situation that the allowable stress is given for.</param>
    /// <param name="allowableSource">Where it comes from, in words.</param>
    /// <returns>Tension; beside it the equivalent stress when anything else acts, with a note.</returns>
    /// <exception cref="ArgumentException">A value of the rod is out of its range.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The allowable stress is not above zero.</exception>
    public static CheckSet Check(RodCase rod, ThreadArea area, double allowable, SituationKind limitKind, string allowableSource)
    {
        ArgumentNullException.ThrowIfNull(rod);
        rod.ThrowUnlessUsable();
        if (!double.IsFinite(allowable) || allowable <= 0)
            throw new ArgumentOutOfRangeException(nameof(allowable), allowable, "the allowable stress must be a finite number above zero");
        if (KindRule.Refusal(TensionClause, limitKind, rod.Kind) is { } refusal) return CheckSet.Refused("rod-tension", "tension in the thread", refusal);

        var checks = ImmutableArray.CreateBuilder<NamedCheck>();
        if (rod.Forces.N >= 0) checks.Add(new("rod-tension", "tension in the thread", CheckStanding.Decides, Tension(rod, area, allowable, allowableSource)));
        if (OtherThanTension(rod) is not { } other) return new CheckSet(checks.ToImmutable(), []);

        checks.Add(new("rod-combined", "equivalent stress in the thread", CheckStanding.Decides, Combined(rod, allowable, allowableSource)));
        if (rod.Forces.N < 0) checks.Add(Compressed);
        return new CheckSet(checks.ToImmutable(), [other]);
    }

    /// <summary>The stress that tension makes on an area of the thread.</summary>
    /// <param name="thread">The thread.</param>
    /// <param name="area">The area.</param>
    /// <param name="tension">Tension [N].</param>
    /// <returns>The stress [Pa].</returns>
    public static double Of(ThreadDesignation thread, ThreadArea area, double tension)
    {
        ArgumentNullException.ThrowIfNull(thread);
        return tension / AreaOf(thread, area);
    }

    /// <summary>A note that names whatever acts besides tension, whatever its size; null for pure tension.</summary>
    public static string? OtherThanTension(RodCase rod)
    {
        ArgumentNullException.ThrowIfNull(rod);
        var f = rod.Forces;
        var d = rod.Thread.Nominal;
        var scale = ZeroShare * (Math.Abs(f.N) + Math.Abs(f.Vy) + Math.Abs(f.Vz) + (Math.Abs(f.T) + Math.Abs(f.My) + Math.Abs(f.Mz)) / d);
        var parts = new List<string>();
        if (f.N < -scale) parts.Add($"compression of {Shown.KN(-f.N)} kN");
        if (double.Hypot(f.Vy, f.Vz) > scale) parts.Add($"shear of {Shown.KN(double.Hypot(f.Vy, f.Vz))} kN");
        if (double.Hypot(f.My, f.Mz) > scale * d) parts.Add($"bending of {Shown.Number(double.Hypot(f.My, f.Mz))} N·m");
        if (Math.Abs(f.T) > scale * d) parts.Add($"torsion of {Shown.Number(Math.Abs(f.T))} N·m");
        return parts.Count == 0 ? null : $"a threaded {rod.Role} is meant for tension alone; here acts {string.Join(", ", parts)}";
    }

    /// <summary>Compression in a threaded rod: never within a limit by stress alone.</summary>
    internal static NamedCheck Compressed { get; } = new("rod-compression", "compression of a threaded rod", CheckStanding.Decides,
        new CheckResult.NotEvaluated(CombinedClause, new Reason(ReasonCode.StabilityNotChecked, "The threaded rod is compressed; its stability is not checked by its stresses.")));

    /// <summary>The lines of thread and area that every rule begins with.</summary>
    internal static IEnumerable<TraceLine> AreaLines(RodCase rod, ThreadArea area)
    {
        var thread = rod.Thread;
        yield return new("d", "", thread.Nominal, "m", $"{thread}, {rod.ThreadSource}");
        yield return new("P", "", thread.Pitch, "m", thread.PitchSource);
        var (symbol, formula, source) = (area, thread.Series) switch
        {
            (ThreadArea.Nominal, _) => ("A_nom", $"π/4·d² = π/4·{Shown.Mm(thread.Nominal)}²", "nominal area"),
            (ThreadArea.Stress, ThreadSeries.Metric) => ("A_s", $"π/4·((d2 + d3)/2)² = π/4·(({Shown.Mm(thread.PitchDiameter)} + {Shown.Mm(thread.RootDiameter)})/2)²", "stress area, ISO 898-1 and ISO 724 (from memory)"),
            (ThreadArea.Stress, _) => ("A_s", $"π/4·(d − 0.9743P)² = π/4·{Shown.Mm(thread.StressDiameter)}²", "stress area, ASME B1.1 (from memory)"),
            (_, ThreadSeries.Metric) => ("A_root", $"π/4·(d − 1.22687P)² = π/4·{Shown.Mm(thread.RootDiameter)}²", "root area, ISO 724 (from memory)"),
            _ => ("A_root", $"π/4·(d − 1.2990P)² = π/4·{Shown.Mm(thread.RootDiameter)}²", "root area, ASME B1.1 (from memory)"),
        };
        yield return new(symbol, $"{formula} = {Shown.Mm2(AreaOf(thread, area))} mm²", AreaOf(thread, area), "m²", source);
    }

    internal static double AreaOf(ThreadDesignation thread, ThreadArea area) => area switch
    {
        ThreadArea.Nominal => thread.NominalArea,
        ThreadArea.Stress => thread.StressArea,
        _ => thread.RootArea,
    };

    private static CheckResult.Evaluated Tension(RodCase rod, ThreadArea area, double allowable, string source)
    {
        var stress = Of(rod.Thread, area, rod.Forces.N);
        var limit = rod.TemperatureFactor * allowable;
        return new Calculation(TensionClause)
            .With(AreaLines(rod, area))
            .Given("N", rod.Forces.N, "N", "section force, tension positive")
            .Found("σ", $"N/A = {Shown.KN(rod.Forces.N)} kN / {Shown.Mm2(AreaOf(rod.Thread, area))} mm²", stress, "Pa", $"on the {area.ToString().ToLowerInvariant()} area")
            .With(LimitLines(rod, allowable, limit, source))
            .Utilization($"σ/limit = {Shown.MPa(stress)}/{Shown.MPa(limit)}", stress / limit);
    }

    /// <summary>Largest values on the root diameter, taken as meeting at one point.</summary>
    internal static (double Normal, double Shear) RootStresses(ThreadDesignation thread, in SectionForces forces)
    {
        var d = thread.RootDiameter;
        var normal = Math.Abs(forces.N) / thread.RootArea + 32 * double.Hypot(forces.My, forces.Mz) / (Math.PI * d * d * d);
        var shear = 4 * double.Hypot(forces.Vy, forces.Vz) / (3 * thread.RootArea) + 16 * Math.Abs(forces.T) / (Math.PI * d * d * d);
        return (normal, shear);
    }

    private static CheckResult.Evaluated Combined(RodCase rod, double allowable, string source)
    {
        var (f, thread) = (rod.Forces, rod.Thread);
        var (normal, shear) = RootStresses(thread, f);
        var equivalent = Math.Sqrt(normal * normal + 3 * shear * shear);
        var limit = rod.TemperatureFactor * allowable;
        return new Calculation(CombinedClause)
            .With(AreaLines(rod, ThreadArea.Root))
            .Given("N", f.N, "N", "section force, tension positive")
            .Given("M", double.Hypot(f.My, f.Mz), "N·m", "resultant bending moment")
            .Given("V", double.Hypot(f.Vy, f.Vz), "N", "resultant shear force")
            .Given("T", f.T, "N·m", "torsional moment")
            .Found("d_root", "root diameter", thread.RootDiameter, "m", "thread")
            .Found("σ", "|N|/A_root + 32M/(π·d_root³)", normal, "Pa", "extreme fibre of the root")
            .Found("τ", "4V/(3A_root) + 16|T|/(π·d_root³)", shear, "Pa", "largest values added")
            .Found("σvM", $"√(σ² + 3τ²) = √({Shown.MPa(normal)}² + 3·{Shown.MPa(shear)}²) MPa", equivalent, "Pa", "equivalent stress of von Mises")
            .With(LimitLines(rod, allowable, limit, source))
            .Utilization($"σvM/limit = {Shown.MPa(equivalent)}/{Shown.MPa(limit)}", equivalent / limit);
    }

    private static TraceLine[] LimitLines(RodCase rod, double allowable, double limit, string source) =>
    [
        new("allowable", "", allowable, "Pa", source),
        new("k_T", "", rod.TemperatureFactor, "-", rod.TemperatureSource),
        new("limit", $"k_T·allowable = {Shown.Number(rod.TemperatureFactor)}·{Shown.MPa(allowable)} = {Shown.MPa(limit)} MPa", limit, "Pa", "allowable stress at temperature"),
    ];
}
