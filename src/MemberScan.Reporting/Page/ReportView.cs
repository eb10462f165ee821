using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Model.Verdicts;
using MemberScan.Reporting.Display;
using MemberScan.Reporting.Drawing;
using MemberScan.Screening.Comparison;
using MemberScan.Screening.Record;
using MemberScan.Screening.Sheets;

namespace MemberScan.Reporting.Page;

/// <summary>A record in the order in which the page shows it.</summary>
public sealed class ReportView
{
    /// <summary>Candidates in the list of the worst.</summary>
    public const int WorstShown = 10;

    /// <summary>Overstressed candidates that get a sheet, the worst first; the others are rows of the list.</summary>
    public const int LargestNumberOfSheets = 500;

    /// <summary>Sheets that are printed in full, the worst first; each other overstressed candidate is printed on a quarter of a page.</summary>
    public const int SheetsPrintedInFull = 10;

    /// <summary>Candidates that moved since an earlier run and are listed; the compare command tells of all.</summary>
    public const int LargestNumberOfMovements = 200;

    /// <summary>Stations of a sheet's table of forces.</summary>
    public const int LargestNumberOfStations = 200;

    /// <summary>Situations of a sheet's ranking.</summary>
    public const int LargestNumberOfSituations = 50;

    /// <summary>Lines of a sheet's calculation.</summary>
    public const int LargestNumberOfTraceLines = 300;

    private readonly ImmutableArray<PlacedMember> _placed;

    /// <summary>Orders a record.</summary>
    /// <param name="record">The record.</param>
    /// <param name="changes">What changed against an earlier run; null when none is given.</param>
    /// <param name="sheets">Makes what sheets draw; null where only the record is at hand.</param>
    public ReportView(ScreeningRecord record, ComparisonRecord? changes = null, SheetMaker? sheets = null)
    {
        ArgumentNullException.ThrowIfNull(record);
        (Record, Changes, Units) = (record, changes, UnitSet.Of(record));
        var anchors = MemberAnchors.OfAll(record.Members.Select(m => m.Key));
        var rings = record.Sections.GroupBy(s => s.Designation, StringComparer.Ordinal).Where(g => g.Count() == 1).ToDictionary(g => g.Key, g => g.First().Rings, StringComparer.Ordinal);
        var placed = record.Members.Select((member, index) => new PlacedMember(member, anchors[index])
        {
            Rings = member.Governing is { } governing ? rings.GetValueOrDefault(governing.Section, []) : [],
            Contacts = record.Contacts,
            Sheets = sheets,
        }).ToImmutableArray();

        _placed = placed;

        // A stable sort keeps the order of the model where utilizations are equal.
        var ranked = placed.OrderByDescending(p => p.Utilization ?? double.NegativeInfinity).ToImmutableArray();
        Worst = [.. ranked.Where(p => p.Utilization is not null).Take(WorstShown)];
        Overstressed = [.. ranked.Where(p => p.Member.Verdict == Verdict.Overstressed).Select((p, rank) => p with { HasSheet = rank < LargestNumberOfSheets })];
        WithinLimit = [.. ranked.Where(p => p.Member.Verdict == Verdict.WithinLimit)];
        NotChecked =
        [
            .. ranked.Where(p => p.Member.Verdict == Verdict.NotChecked)
                .GroupBy(p => p.Member.Reason!.Code)
                .OrderByDescending(group => group.Count()).ThenBy(group => group.Key)
                .Select(group => new ReasonGroup(group.Key, [.. group])),
        ];
        Spread = UtilizationSpread.Of(record.Members);
        var withSheet = Overstressed.Where(p => p.HasSheet).ToDictionary(p => p.Anchor, StringComparer.Ordinal);
        Placed = [.. placed.Select(p => withSheet.GetValueOrDefault(p.Anchor, p))];
    }

    /// <summary>The record.</summary>
    public ScreeningRecord Record { get; }

    /// <summary>What changed against an earlier run; null when none is given.</summary>
    public ComparisonRecord? Changes { get; }

    /// <summary>Units in which the page shows the values of the record.</summary>
    public UnitSet Units { get; }

    /// <summary>All candidates in the order of the model.</summary>
    public ImmutableArray<PlacedMember> Placed { get; }

    /// <summary>The candidates of largest utilization, whatever their verdict, worst first; at most <see cref="WorstShown"/>.</summary>
    public ImmutableArray<PlacedMember> Worst { get; }

    /// <summary>Overstressed candidates, worst first.</summary>
    public ImmutableArray<PlacedMember> Overstressed { get; }

    /// <summary>Candidates that were not checked, by reason, the most frequent first.</summary>
    public ImmutableArray<ReasonGroup> NotChecked { get; }

    /// <summary>Candidates within their limit, largest utilization first.</summary>
    public ImmutableArray<PlacedMember> WithinLimit { get; }

    /// <summary>How the utilizations spread.</summary>
    public UtilizationSpread Spread { get; }

    /// <summary>The candidates with a known stress whose sheets are not written out.</summary>
    public ImmutableArray<PlacedMember> WithoutSheet =>
        [.. Overstressed.Skip(LargestNumberOfSheets), .. NotChecked.SelectMany(g => g.Members).Where(p => p.Member.Governing is not null), .. WithinLimit];

    /// <summary>A candidate with its place; null when it is none of the record's.</summary>
    public PlacedMember? Find(MemberResult member) => _placed.FirstOrDefault(p => ReferenceEquals(p.Member, member));

    /// <summary>The three counts and their sum, in words.</summary>
    public string SumLine
    {
        get
        {
            var counts = Record.Counts;
            return $"{Figures.Count(counts.WithinLimit)} within limit + {Figures.Count(counts.Overstressed)} overstressed"
                + $" + {Figures.Count(counts.NotChecked)} not checked = {Figures.Count(counts.Candidates)} candidates";
        }
    }

    /// <summary>The style class of a verdict.</summary>
    public static string StyleOf(Verdict verdict) => verdict switch
    {
        Verdict.WithinLimit => "within",
        Verdict.Overstressed => "over",
        _ => "open",
    };

    /// <summary>What a candidate is called: its name, else its tag, else its class and number.</summary>
    public static string TitleOf(MemberResult member)
    {
        ArgumentNullException.ThrowIfNull(member);
        if (member.Name.Length > 0) return ForeignText.Name(member.Name);
        return member.Tag.Length > 0
            ? ForeignText.Name(member.Tag)
            : string.Create(CultureInfo.InvariantCulture, $"{ForeignText.Name(member.Class)} #{member.StepId}");
    }
}
