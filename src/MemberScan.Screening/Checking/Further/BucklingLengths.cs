using MemberScan.Checks.Stability;
using MemberScan.Model;
using MemberScan.Screening.Contacts;

namespace MemberScan.Screening.Checking.Further;

/// <summary>Buckling lengths: from the settings, else by role and by what the ends meet.</summary>
/// <remarks>That an end meets another member does not say that the other one holds it; such lengths are marked assumed.</remarks>
internal sealed class BucklingLengths(Lazy<ContactList?> contacts)
{
    /// <summary>The buckling length for bending about both axes, or why it is not known; where the compression is too small to need one, as long as the rule of 4 % takes it.</summary>
    /// <param name="line">The member.</param>
    public Finding<BucklingLength> Of(CheckedLine line) => line.Compression.NeedsStability ? Ruled(line) : OrCautious(line);

    private Finding<BucklingLength> Ruled(CheckedLine line)
    {
        var (member, stability) = (line.Subject.Member, line.Subject.Limits.Stability);
        var factor = stability.FactorOf(member.Role);
        var hold = factor is null && stability.EndsFromContacts ? Hold(member.Role, member.Key, line.Subject.Length) : EndHold.Unknown;
        return BucklingLengthRule.Find(member.Role, hold, line.Compression.Length, factor);
    }

    private Finding<BucklingLength> OrCautious(CheckedLine line)
    {
        if (Ruled(line) is Finding<BucklingLength>.Found found) return found;

        const string source = "assumed: as long as in the rule of 4 % of the Euler load";
        var length = line.Compression.AssumedLength;
        return new Finding<BucklingLength>.Found(new BucklingLength(length, length / line.Compression.Length, IsAssumed: true, source), source);
    }

    // The top of a post meets a rail that sways with it.
    private EndHold Hold(string role, string key, double length)
    {
        if (string.Equals(role, BucklingLengthRule.Post, StringComparison.OrdinalIgnoreCase)) return EndHold.BaseOnly;
        if (contacts.Value is not { } list) return EndHold.Unknown;

        var ends = list.Of(key).Where(c => c is { IsCertain: true, Kind: ContactKind.EndToEnd or ContactKind.EndToSide }).Select(c => c.At(key) / length).ToList();
        return ends.Exists(at => at < 0.1) && ends.Exists(at => at > 0.9) ? EndHold.BothEnds : EndHold.Unknown;
    }
}
