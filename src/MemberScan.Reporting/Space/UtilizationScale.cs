using System.Collections.Immutable;
using System.Text.Json;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Space;

/// <summary>Colours of members by utilization: pale to dark blue-green up to the limit, rust above, near-white where nothing is known.</summary>
/// <remarks>
/// Each step is darker than the one before, so the order holds in grey and for every kind of colour vision; beyond the limit a hatch is laid over,
/// and what was not checked is dotted: colour never stands alone.
/// </remarks>
public static class UtilizationScale
{
    /// <summary>Steps up to the limit, rising.</summary>
    public static ImmutableArray<ScaleStep> UpToLimit { get; } =
    [
        new(0.25, "0 to 0.25", "#bdd5d2"), new(0.5, "0.25 to 0.5", "#93bac0"), new(0.75, "0.5 to 0.75", "#6799aa"),
        new(0.9, "0.75 to 0.9", "#3d758e"), new(1, "0.9 to 1", "#184560"),
    ];

    /// <summary>Overstressed, up to 1.5 and above; hatched.</summary>
    public static ImmutableArray<ScaleStep> OverLimit { get; } =
    [
        new(1.5, "1 to 1.5", "#b5561b"), new(double.PositiveInfinity, "above 1.5", "#6e2408"),
    ];

    /// <summary>Not checked; dotted.</summary>
    public static ScaleStep NotChecked { get; } = new(double.NaN, "not checked", "#f4efd9");

    /// <summary>All steps: up to the limit, over it, not checked.</summary>
    public static ImmutableArray<ScaleStep> All { get; } = [.. UpToLimit, .. OverLimit, NotChecked];

    /// <summary>Place in <see cref="All"/> of a candidate: by its verdict first, so that a small figure on an unchecked one does not look like an answer.</summary>
    public static int StepOf(MemberResult member)
    {
        ArgumentNullException.ThrowIfNull(member);
        if (member.Verdict == Verdict.NotChecked || member.Governing is not { } governing) return All.Length - 1;
        var (steps, first) = member.Verdict == Verdict.Overstressed ? (OverLimit, UpToLimit.Length) : (UpToLimit, 0);
        for (var i = 0; i < steps.Length - 1; i++)
            if (governing.Utilization <= steps[i].To) return first + i;
        return first + steps.Length - 1;
    }

    /// <summary>The steps for the script.</summary>
    internal static void Write(Utf8JsonWriter json)
    {
        json.WriteStartArray("scale");
        foreach (var step in All)
        {
            json.WriteStartObject();
            json.WriteString("words", step.Words);
            json.WriteString("colour", step.Colour);
            json.WriteEndObject();
        }

        json.WriteEndArray();
    }
}
