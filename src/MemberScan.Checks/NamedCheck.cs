namespace MemberScan.Checks;

/// <summary>One check of a set: by its key it is switched on and off.</summary>
/// <param name="Key">Stable key, such as <c>en-6.2.5-y</c>; unique within its set.</param>
/// <param name="Name">What is held against what, in words.</param>
/// <param name="Standing">Whether it decides.</param>
/// <param name="Result">What came out.</param>
public sealed record NamedCheck(string Key, string Name, CheckStanding Standing, CheckResult Result)
{
    /// <summary>The utilization [-]; null when the check was not made.</summary>
    public double? Utilization => (Result as CheckResult.Evaluated)?.Utilization;
}
