using System.Globalization;
using MemberScan.Checks;
using MemberScan.Checks.Stability;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Properties;

namespace MemberScan.Screening.Checking.Further;

/// <summary>The largest compression of a situation against 4 % of the Euler load.</summary>
internal sealed class Compression
{
    private readonly SituationFindings _findings;
    private readonly CheckResult? _result;

    /// <summary>Holds the compression against the rule and notes what came out.</summary>
    /// <param name="findings">Takes note and bar.</param>
    /// <param name="line">The forces.</param>
    /// <param name="properties">Properties of the weakest section.</param>
    /// <param name="subject">The member.</param>
    /// <param name="length">Length [m].</param>
    public Compression(SituationFindings findings, ForceLine line, SectionProperties properties, Subject subject, double length)
    {
        (_findings, Length) = (findings, length);
        var stability = subject.Limits.Stability;
        var factor = stability.FactorOf(subject.Member.Role) ?? stability.LengthFactor;
        var least = line.Stations.Min(s => SituationChecker.Cleaned(s.Forces, subject.Section.Shape).N);
        var (modulus, why) = subject.Material.Modulus.TryGet(out var found, out var reason) ? (found.Value, "") : ((double?)null, reason.Message);
        Modulus = modulus;
        AssumedLength = factor * length;
        _result = CompressionRule.Check(least, modulus, why, properties.IMin, length, factor);
        if (_result is CheckResult.Evaluated within)
            findings.Note(string.Create(CultureInfo.InvariantCulture, $"compression is {4 * within.Utilization:0.00} % of the Euler load for a buckling length of {factor:0.##} × the member length; up to 4 % no stability check is needed ({within.Clause})"));
    }

    /// <summary>Length of the member [m].</summary>
    public double Length { get; }

    /// <summary>Modulus of elasticity [Pa]; null where it is not known.</summary>
    public double? Modulus { get; }

    /// <summary>The cautious buckling length of the rule of 4 % [m].</summary>
    public double AssumedLength { get; }

    /// <summary>Whether a check of stability is required.</summary>
    public bool NeedsStability => _result is CheckResult.NotEvaluated;

    /// <summary>Bars a verdict where a check of stability is required and none is made.</summary>
    public void Bar()
    {
        if (_result is CheckResult.NotEvaluated barred) _findings.Bar(barred.Why);
    }
}
