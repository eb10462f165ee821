using MemberScan.Model;
using MemberScan.Model.Verdicts;

namespace MemberScan.Checks.Stability;

/// <summary>Buckling length of a member: from the settings, else by its ends and role, else not known.</summary>
/// <remarks>
/// Held at both ends: the system length. Held at the base only: twice the length (Euler's first case, a fixed base); a post of which
/// nothing else is known counts as held so. Anything else has no length here. An elastic base makes the length longer than this.
/// </remarks>
public static class BucklingLengthRule
{
    /// <summary>The role whose members are taken as held at the base only.</summary>
    public const string Post = "post";

    /// <summary>The buckling length.</summary>
    /// <param name="role">Role of the member, such as <c>post</c>.</param>
    /// <param name="hold">How its ends are held.</param>
    /// <param name="length">Member length [m], &gt; 0.</param>
    /// <param name="settingFactor">Buckling length over member length from the settings [-], &gt; 0; null when they give none.</param>
    /// <returns>The length with its source; <see cref="ReasonCode.StabilityNotChecked"/> when it is not known.</returns>
    /// <exception cref="ArgumentOutOfRangeException">A length or factor is not above zero.</exception>
    public static Finding<BucklingLength> Find(string role, EndHold hold, double length, double? settingFactor)
    {
        ArgumentNullException.ThrowIfNull(role);
        ThrowUnlessPositive(length, nameof(length));
        if (settingFactor is { } factor)
        {
            ThrowUnlessPositive(factor, nameof(settingFactor));
            return Found(factor, isAssumed: false, "settings");
        }

        return hold switch
        {
            EndHold.BothEnds => Found(1, isAssumed: true, "assumed: system length, both ends held"),
            EndHold.BaseOnly => Found(2, isAssumed: true, "assumed: 2 × the length, held at the base only"),
            _ when string.Equals(role, Post, StringComparison.OrdinalIgnoreCase) => Found(2, isAssumed: true, "assumed: 2 × the length, a post held at its base only"),
            _ => new Finding<BucklingLength>.Missing(new Reason(ReasonCode.StabilityNotChecked,
                $"The buckling length of the {role} is not known: its ends are not known to be held and the settings give none.")),
        };

        Finding<BucklingLength> Found(double value, bool isAssumed, string source) =>
            new Finding<BucklingLength>.Found(new BucklingLength(value * length, value, isAssumed, source), source);
    }

    private static void ThrowUnlessPositive(double value, string name)
    {
        if (!double.IsFinite(value) || value <= 0)
            throw new ArgumentOutOfRangeException(name, value, "the value must be a finite number above zero");
    }
}
