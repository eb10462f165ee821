namespace MemberScan.Screening.Comparison;

/// <summary>The words of the movements.</summary>
public static class MovementText
{
    /// <summary>The movement as printed and written.</summary>
    public static string Of(Movement movement) => movement switch
    {
        Movement.BecameOverstressed => "became overstressed",
        Movement.StillOverstressed => "still overstressed",
        Movement.NoLongerChecked => "no longer checked",
        Movement.New => "new",
        Movement.Gone => "gone",
        Movement.Cured => "cured",
        Movement.NowWithinLimit => "now within limit",
        Movement.ChangedInput => "changed input",
        Movement.Unchanged => "unchanged",
        _ => throw new ArgumentOutOfRangeException(nameof(movement)),
    };
}
