using System.Collections.Frozen;
using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.ForcesTables;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Forces;
using MemberScan.Model.Members;
using MemberScan.Model.Rules;
using MemberScan.Model.Verdicts;

namespace MemberScan.Screening;

/// <summary>Lays the rows of forces tables on the candidates: by key, GlobalId or Tag. A row that fits none or several is an error.</summary>
internal sealed class TableForces
{
    private readonly ForceRules _rules;
    private readonly DiagnosticList _diagnostics;
    private readonly FrozenDictionary<string, Member> _byKey;
    private readonly FrozenDictionary<string, int> _itemsOfGlobalId;
    private readonly FrozenDictionary<string, ImmutableArray<Member>> _byTag;

    public TableForces(ImmutableArray<Member> members, ForceRules rules, DiagnosticList diagnostics)
    {
        (_rules, _diagnostics) = (rules, diagnostics);
        _byKey = members.ToFrozenDictionary(m => m.Key, StringComparer.Ordinal);
        _itemsOfGlobalId = members.Where(m => m.ItemCount > 1).GroupBy(m => m.Element.GlobalId, StringComparer.Ordinal)
            .ToFrozenDictionary(g => g.Key, g => g.Count(), StringComparer.Ordinal);
        _byTag = members.Where(m => m.Element.Tag.Length > 0).GroupBy(m => m.Element.Tag, StringComparer.Ordinal)
            .ToFrozenDictionary(g => g.Key, g => g.ToImmutableArray(), StringComparer.Ordinal);
    }

    /// <summary>Forces of one table, and how many of its rows name no candidate.</summary>
    public (ImmutableArray<MemberForces> Forces, int UnknownRows) Read(ForcesTable table)
    {
        // Numbers of rows are kept, not the rows: tables have millions of them.
        var bySituation = new Dictionary<(string Key, string Situation), List<int>>();
        var order = new List<(Member Member, List<int> Rows)>();
        var members = new Dictionary<string, Member?>(StringComparer.Ordinal);
        var unknownRows = 0;
        (string Member, string Situation, List<int>? Rows) last = ("", "", null);
        for (var i = 0; i < table.Rows.Length; i++)
        {
            ref readonly var row = ref table.Rows.ItemRef(i);
            if (last.Rows is { } same && ReferenceEquals(row.Member, last.Member) && ReferenceEquals(row.Situation, last.Situation))
            {
                same.Add(i);
                continue;
            }

            if (!members.TryGetValue(row.Member, out var member)) members[row.Member] = member = Find(row, table);
            if (member is null)
            {
                unknownRows++;
                continue;
            }

            var key = (member.Key, row.Situation);
            if (!bySituation.TryGetValue(key, out var rows))
            {
                bySituation[key] = rows = [];
                order.Add((member, rows));
            }

            rows.Add(i);
            last = (row.Member, row.Situation, rows);
        }

        return ([.. order.Select(one => Of(one.Member, [.. one.Rows.Select(i => table.Rows[i])], table))], unknownRows);
    }

    private Member? Find(ForcesRow row, ForcesTable table)
    {
        var at = SourceSpan.At(table.FileName, row.Line, 1);
        if (_byKey.TryGetValue(row.Member, out var member)) return member;

        if (_itemsOfGlobalId.TryGetValue(row.Member, out var items))
        {
            _diagnostics.Add("SCR-0002", Severity.Error, $"'{row.Member}' has {items} items; name one of them, such as '{row.Member}/1'.", at);
            return null;
        }

        if (_byTag.TryGetValue(row.Member, out var tagged))
        {
            if (tagged.Length == 1) return tagged[0];

            _diagnostics.Add("SCR-0002", Severity.Error, $"The tag '{row.Member}' names {tagged.Length} candidates; use the key, such as '{tagged[0].Key}'.", at);
            return null;
        }

        if (_rules.ListUnknownMembers)
            _diagnostics.Add("SCR-0005", Severity.Warning, $"'{row.Member}' is the key or tag of no candidate; its rows are not used (setting forces.unknownMembers).", at);
        else
            _diagnostics.Add("SCR-0001", Severity.Error, $"'{row.Member}' is the key or tag of no candidate; correct it, or set forces.unknownMembers to \"list\".", at);
        return null;
    }

    private MemberForces Of(Member member, ForcesRow[] rows, ForcesTable table)
    {
        var (first, last) = (rows.Min(r => r.Line), rows.Max(r => r.Line));
        var source = string.Create(CultureInfo.InvariantCulture, $"{table.FileName}, line{(first == last ? $" {first}" : $"s {first}-{last}")}");
        var forces = new MemberForces
        {
            MemberKey = member.Key,
            Situation = SituationOf(rows[0], table),
            Stations = [],
            TorsionAxis = table.Torsion,
            Source = source,
        };
        if (!member.Length.TryGet(out var length, out var noLength))
            return forces with { Unusable = new Reason(noLength.Code, $"{noLength.Message}, so stations cannot be placed") };

        var stations = ImmutableArray.CreateBuilder<ForceStation>(rows.Length);
        foreach (var row in rows)
        {
            var x = row.StationIsShare ? row.Station * length.Value : row.Station;
            if (x > length.Value * (1 + 1e-6))
                _diagnostics.Add("SCR-0003", Severity.Error, string.Create(CultureInfo.InvariantCulture, $"The station at {x:0.######} m is beyond the end of '{row.Member}', which is {length.Value:0.######} m long."), SourceSpan.At(table.FileName, row.Line, 1));
            stations.Add(new ForceStation(x, row.Forces));
        }

        return table.Convention == ForceConvention.EndForces
            ? FromEndForces(forces, stations, rows, length.Value, table)
            : table.IsEnvelope ? FromEnvelope(forces, stations)
            : forces with { Stations = stations.ToImmutable() };
    }

    /// <summary>The rows at one station: least and largest of each component; a single row is a magnitude and counts both ways.</summary>
    private static MemberForces FromEnvelope(MemberForces forces, IEnumerable<ForceStation> rows)
    {
        var envelope = ImmutableArray.CreateBuilder<EnvelopeStation>();
        foreach (var place in rows.GroupBy(r => r.X).OrderBy(g => g.Key))
        {
            var values = place.Select(r => r.Forces).ToList();
            if (values.Count == 1) values.Add(-1 * values[0]);
            SectionForces Of(Func<IEnumerable<double>, double> pick) => new(
                pick(values.Select(f => f.N)), pick(values.Select(f => f.Vy)), pick(values.Select(f => f.Vz)),
                pick(values.Select(f => f.T)), pick(values.Select(f => f.My)), pick(values.Select(f => f.Mz)));
            envelope.Add(new EnvelopeStation(place.Key, Of(Enumerable.Min), Of(Enumerable.Max)));
        }

        return forces with
        {
            Envelope = envelope.ToImmutable(),
            Stations = [.. envelope.SelectMany(e => new[] { new ForceStation(e.X, e.Least), new ForceStation(e.X, e.Largest) })],
            Conversion = "envelope: least and largest values by themselves, evaluated at all corners",
        };
    }

    private MemberForces FromEndForces(MemberForces forces, ImmutableArray<ForceStation>.Builder stations, ForcesRow[] rows, double length, ForcesTable table)
    {
        for (var i = 0; i < stations.Count; i++)
        {
            var isStart = Math.Abs(stations[i].X) <= 1e-6 * length;
            if (!isStart && Math.Abs(stations[i].X - length) > 1e-6 * length)
                _diagnostics.Add("SCR-0004", Severity.Error, $"A table of end forces has a station between the ends of '{rows[i].Member}'; give the ends only, or the convention positive-face.", SourceSpan.At(table.FileName, rows[i].Line, 1));
            if (isStart) stations[i] = stations[i] with { Forces = -1 * stations[i].Forces };
        }

        const string Reversed = "end forces: values at the start reversed";
        if (!table.IsEnvelope) return forces with { Stations = stations.ToImmutable(), Conversion = Reversed };

        var envelope = FromEnvelope(forces, stations);
        return envelope with { Conversion = $"{Reversed}; {envelope.Conversion}" };
    }

    private Situation SituationOf(ForcesRow row, ForcesTable table)
    {
        var (kind, source) = (row.Kind, "forces table");
        if (kind == SituationKind.Unknown)
        {
            var pattern = _rules.Kinds.FirstOrDefault(p => p.Fits(row.Situation));
            (kind, source) = pattern is not null ? (pattern.Kind, $"settings, pattern '{pattern.Pattern}'")
                : _rules.KindOfAll != SituationKind.Unknown ? (_rules.KindOfAll, "given for the run")
                : (SituationKind.Unknown, "not stated");
        }

        return new Situation(row.Situation, kind, source, table.ActsInFull, $"forces table {table.FileName}") { IsLinear = table.IsLinear };
    }
}
