using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Verdicts;
using MemberScan.Reporting.Tests;
using MemberScan.Screening.Record;

namespace MemberScan.Browser.Tests.Data;

/// <summary>A long landing of generated members: rails on four decks, hanger rods between them, struts, some without forces.</summary>
internal static class GeneratedLanding
{
    /// <summary>Members on a deck before the next bay begins.</summary>
    private const int Bays = 40;

    private static readonly string[] s_decks = ["Pontoon −1.20", "Gangway ±0.00", "Deck +3.20", "Mast head +6.40"];

    /// <summary>A finished screening of so many members, the overstressed and the unchecked spread evenly among them.</summary>
    /// <param name="count">Candidates in all.</param>
    /// <param name="overstressed">Overstressed among them.</param>
    /// <param name="notChecked">Not checked among them.</param>
    public static ScreeningRecord Of(int count, int overstressed, int notChecked)
    {
        var (over, open) = (0, 0);
        var members = ImmutableArray.CreateBuilder<MemberResult>(count);
        for (var i = 0; i < count; i++)
        {
            var isOver = ((long)i * overstressed + count / 2) / count > over;
            var isOpen = !isOver && (i + 1L) * notChecked / count > open;
            (over, open) = (over + (isOver ? 1 : 0), open + (isOpen ? 1 : 0));
            members.Add(Placed(Member(i, isOver, isOpen), i));
        }

        return FerryLanding.Record(members.ToImmutable().AsSpan());
    }

    private static MemberResult Member(int i, bool isOver, bool isOpen)
    {
        var key = Key(i);
        if (isOpen)
            return FerryLanding.Open(key, Name("Trapeze strut", i), i % 3 == 0 ? ReasonCode.ThreadUnknown : ReasonCode.NoForces, "No row of landing-forces.csv and no result of the model names the member.");
        if (i % 2 == 0) return FerryLanding.Hanger(key, Name("Hanger rod", i), isOver ? 72e3 + 60 * (i * 31 % 997) : 4e3 + 60 * (i * 37 % 991));
        return FerryLanding.Rail(key, Name("Gangway rail", i), isOver ? 1.05e3 + (i * 29 % 499) : 60 + 0.9 * (i * 41 % 983));
    }

    private static MemberResult Placed(MemberResult member, int i)
    {
        var (deck, place) = (i % s_decks.Length, i / s_decks.Length);
        var start = new Vector3(2.5 * (place % Bays), 1.6 * (place / Bays), -1.2 + 3.2 * deck);
        var axes = member.Role == "hanger" ? MemberAxes.From(start, Vector3.UnitZ, Vector3.UnitX) : MemberAxes.From(start, Vector3.UnitX, Vector3.UnitZ);
        return member with
        {
            Identity = member.Identity with { Storey = s_decks[deck], Tag = string.Create(CultureInfo.InvariantCulture, $"L-{i % 700:D3}"), StepId = (ulong)(1000 + 7 * i) },
            Axes = i % 211 == 5 ? null : axes,
            Length = member.Role == "hanger" ? 2.6 : 2.4,
            Situations = member.Verdict == Verdict.Overstressed ? Situations(member) : [],
        };
    }

    private static ImmutableArray<SituationResult> Situations(MemberResult member)
    {
        var governing = member.Governing!;
        return
        [
            .. Enumerable.Range(0, 6).Select(k => new SituationResult(
                k == 0 ? governing.Situation : string.Create(CultureInfo.InvariantCulture, $"Combination {k}"), "service", true, governing.Utilization * (1 - 0.11 * k), "", "landing-forces.csv, lines 12 to 16", "",
                [.. Enumerable.Range(0, 5).Select(s => new ForceStation(0.6 * s, governing.Forces))])),
        ];
    }

    private static string Name(string kind, int i) => string.Create(CultureInfo.InvariantCulture, $"{kind} {i + 1:D5}");

    // Twenty-two letters of the alphabet of GlobalIds, spread by a multiplier so that they do not pack better than real ones.
    private static string Key(int i)
    {
        const string Alphabet = "0123456789ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz_$";
        var state = (ulong)i * 0x9E3779B97F4A7C15 + 0x1234567;
        return string.Create(22, state, (text, seed) =>
        {
            for (var at = 0; at < text.Length; at++)
            {
                seed = seed * 6364136223846793005 + 1442695040888963407;
                text[at] = Alphabet[at == 0 ? (int)(seed >> 62) : (int)(seed >> 58)];
            }
        });
    }
}
