using MemberScan.Part21;

namespace MemberScan.Ifc.WriteBack.Earlier;

/// <summary>The instances of earlier results in a text, and who else refers to them.</summary>
internal sealed class OwnInstances
{
    private const string OwnName = "MemberScan";
    private const int RunIdLength = 16;

    /// <summary>Keywords of what a block holds.</summary>
    private static readonly HashSet<string> s_kinds = new(StringComparer.Ordinal)
    {
        "IFCPROPERTYSINGLEVALUE", "IFCPROPERTYSET", "IFCRELDEFINESBYPROPERTIES", "IFCSIUNIT", "IFCOWNERHISTORY", "IFCPERSON", "IFCORGANIZATION", "IFCPERSONANDORGANIZATION", "IFCAPPLICATION",
        "IFCPROPERTYSETTEMPLATE", "IFCSIMPLEPROPERTYTEMPLATE", "IFCRELDEFINESBYTEMPLATE", "IFCRELDECLARES",
    };

    private readonly Part21File _file;
    private readonly HashSet<ulong> _own = [];

    private OwnInstances(Part21File file) => _file = file;

    /// <summary>What another program refers to.</summary>
    public List<OutsideReference> Outside { get; } = [];

    /// <summary>The instances, in file order.</summary>
    public IEnumerable<Part21Record> Records => _file.Records.Where(IsOwn);

    /// <summary>Whether a block holds nothing but comments and instances of the kinds that we write, each on its line; counts them.</summary>
    public static bool AreAll(ReadOnlySpan<byte> block, out int count)
    {
        count = 0;
        foreach (var range in block.SplitAny("\r\n"u8))
        {
            var line = block[range];
            if (line.IsEmpty || line.StartsWith("/* MemberScan block"u8)) continue;

            var (equals, bracket) = (line.IndexOf((byte)'='), line.IndexOf((byte)'('));
            if (line[0] != '#' || equals < 0 || bracket < equals || !s_kinds.Contains(System.Text.Encoding.ASCII.GetString(line[(equals + 1)..bracket]))) return false;
            count++;
        }

        return true;
    }

    /// <summary>Those that stand in a part of the text and are of the kinds that we write.</summary>
    public static OwnInstances In(Part21File file, Range block)
    {
        var (start, length) = block.GetOffsetAndLength(file.Bytes.Length);
        var own = new OwnInstances(file);
        foreach (var record in file.Records)
            if (s_kinds.Contains(record.Keyword) && file.Bytes.Span.Slice(start, length).Overlaps(record.Text)) own._own.Add(record.Id);
        own.FindOutside();
        return own;
    }

    /// <summary>Those that are recognised by set name, Program and RunId, with all that only they refer to.</summary>
    public static OwnInstances Recognised(Part21File file)
    {
        var own = new OwnInstances(file);
        foreach (var set in file.RecordsOf("IFCPROPERTYSET").Where(own.IsOurSet)) own._own.Add(set.Id);
        foreach (var template in file.RecordsOf("IFCPROPERTYSETTEMPLATE").Where(t => Text(t[2]) == StressCheckSet.SetName)) own._own.Add(template.Id);
        if (own._own.Count == 0) return own;

        own.AddRelations("IFCRELDEFINESBYPROPERTIES", record => record[5], record => record[4]);
        own.AddRelations("IFCRELDEFINESBYTEMPLATE", record => record[5], record => default);
        own.AddRelations("IFCRELDECLARES", record => record[5], record => default);
        own.AddResources();
        own.FindOutside();
        return own;
    }

    private bool IsOwn(Part21Record record) => _own.Contains(record.Id) && !record.IsDuplicate;

    private bool IsOurSet(Part21Record set)
    {
        if (Text(set[2]) != StressCheckSet.SetName) return false;

        var values = set[4].Items.Select(Follow).OfType<Part21Record>().Where(p => p.Keyword == "IFCPROPERTYSINGLEVALUE")
            .GroupBy(p => Text(p[0]), StringComparer.Ordinal).ToDictionary(g => g.Key, g => Text(g.First()[2]), StringComparer.Ordinal);
        return values.GetValueOrDefault("Program", "").StartsWith(OwnName + " ", StringComparison.Ordinal)
            && values.GetValueOrDefault("RunId", "") is { Length: RunIdLength } run && run.All(char.IsAsciiHexDigitLower);
    }

    // One relation per set is ours: the one with the derived GlobalId, else the only one. A relation that carries more than one object was made by somebody else.
    private void AddRelations(string keyword, Func<Part21Record, Part21Value> defining, Func<Part21Record, Part21Value> related)
    {
        var bySet = _file.RecordsOf(keyword).Select(r => (Relation: r, Target: TargetOf(defining(r)))).Where(r => _own.Contains(r.Target)).GroupBy(r => r.Target).ToList();
        foreach (var group in bySet)
        {
            var all = group.Select(g => g.Relation).ToList();
            var ours = all.Count == 1 ? all[0] : all.Find(r => IsDerived(r, related(r)));
            if (ours.Keyword.Length > 0 && related(ours).ItemCount <= 1) _own.Add(ours.Id);
        }
    }

    private static ulong TargetOf(Part21Value value) =>
        value.TryReference(out var id) || value is { Kind: Part21ValueKind.List, ItemCount: 1 } && value.Items[0].TryReference(out id) ? id : 0;

    private bool IsDerived(Part21Record relation, Part21Value related) =>
        related.ItemCount == 1 && Follow(related.Items[0]) is { } element && Text(relation[0]) == GlobalIds.From($"{StressCheckSet.SetName}|{Text(element[0])}|relation");

    // Properties, units and ownership, level by level, as long as nobody else refers to them.
    private void AddResources()
    {
        var candidates = new HashSet<ulong>();
        var open = new Queue<ulong>(_own);
        while (open.TryDequeue(out var id))
            if (_file.TryFind(id, out var record))
                ReferenceScan.Each(record.Text, target =>
                {
                    if (!_own.Contains(target) && !candidates.Contains(target) && _file.TryFind(target, out var next) && IsResource(next))
                    {
                        candidates.Add(target);
                        open.Enqueue(target);
                    }
                });

        var referrers = new Dictionary<ulong, List<ulong>>();
        foreach (var record in _file.Records)
            ReferenceScan.Each(record.Text, target =>
            {
                if (!candidates.Contains(target)) return;
                if (!referrers.TryGetValue(target, out var list)) referrers[target] = list = [];
                list.Add(record.Id);
            });
        while (candidates.FirstOrDefault(c => referrers[c].TrueForAll(_own.Contains)) is var next and not 0)
        {
            candidates.Remove(next);
            _own.Add(next);
        }
    }

    private bool IsResource(Part21Record record) => record.Keyword switch
    {
        "IFCPROPERTYSINGLEVALUE" or "IFCSIMPLEPROPERTYTEMPLATE" or "IFCSIUNIT" => true,
        "IFCOWNERHISTORY" => Follow(record[1]) is { } application && Text(application[3]) == OwnName,
        "IFCAPPLICATION" => Text(record[3]) == OwnName,
        "IFCPERSON" or "IFCORGANIZATION" => Text(record[1]) == OwnName,
        "IFCPERSONANDORGANIZATION" => Follow(record[0]) is { } person && Text(person[1]) == OwnName,
        _ => false,
    };

    private void FindOutside()
    {
        foreach (var record in _file.Records.Where(r => !IsOwn(r)))
            ReferenceScan.Each(record.Text, target =>
            {
                if (_own.Contains(target)) Outside.Add(new OutsideReference(target, record.Id, record.Keyword));
            });
    }

    private Part21Record? Follow(Part21Value value) => value.TryReference(out var id) && _file.TryFind(id, out var record) ? record : null;

    private static string Text(Part21Value value) => value.TryText(out var text) ? text : value.Kind == Part21ValueKind.Typed && value.Inner.TryText(out text) ? text : "";
}
