using MemberScan.Model.Verdicts;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Requests;

/// <summary>What a modeler is asked for one candidate that was not checked.</summary>
/// <param name="Member">The candidate.</param>
/// <param name="Reason">Why it was not checked.</param>
public sealed record RequestLine(MemberResult Member, Reason Reason)
{
    /// <summary>What would make it checkable.</summary>
    public string Request => Reason.Code.Request();

    /// <summary>The lines of a record: by reason, then in the order of the model.</summary>
    public static IReadOnlyList<RequestLine> Of(ScreeningRecord record)
    {
        SoundRecord.ThrowUnlessSound(record);
        return [.. record.Members.Where(m => m.Verdict == Verdict.NotChecked).Select(m => new RequestLine(m, m.Reason!)).OrderBy(l => l.Reason.Code)];
    }
}
