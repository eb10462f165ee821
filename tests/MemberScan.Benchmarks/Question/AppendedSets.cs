using System.Globalization;
using System.Text.Unicode;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Part21;
using MemberScan.Part21.Edits;
using MemberScan.Part21.Streaming;

namespace MemberScan.Benchmarks.Question;

/// <summary>Adds a property set of three properties to every member and saves to a new file, waiting for the disk or not.</summary>
internal sealed class AppendedSets : IPart21Taker
{
    private readonly List<uint> _members = [];

    public static int Write(string path, string target, bool toDisk)
    {
        using var index = Part21Index.Open(path, ["IFCMEMBER"], new DiagnosticList(), 0, () => new AppendedSets());
        var edits = new Part21Edits(index);
        var number = 0;
        foreach (var taker in index.Takers)
            foreach (var member in ((AppendedSets)taker)._members)
                Append(edits, member, ++number);

        edits.Save(target, toDisk);
        Console.WriteLine($"{number} sets");
        return 0;
    }

    public void Take(in Part21Instance instance) => _members.Add(instance.Id);

    private static void Append(Part21Edits edits, uint member, int number)
    {
        Span<byte> text = stackalloc byte[256];
        var culture = CultureInfo.InvariantCulture;
        Utf8.TryWrite(text, culture, $"IFCPROPERTYSINGLEVALUE('Utilization',$,IFCRATIOMEASURE({Part21Text.Real(number / 32768.0)}),$)", out var length);
        var utilization = edits.Append(text[..length]);
        var status = edits.Append("IFCPROPERTYSINGLEVALUE('Status',$,IFCLABEL('NOT CHECKED'),$)"u8);
        var reason = edits.Append("IFCPROPERTYSINGLEVALUE('Reason',$,IFCTEXT('no-forces'),$)"u8);
        Utf8.TryWrite(text, culture, $"IFCPROPERTYSET('1Landing{number:00000000000000}',$,'Landing_Check',$,(#{utilization},#{status},#{reason}))", out length);
        var set = edits.Append(text[..length]);
        Utf8.TryWrite(text, culture, $"IFCRELDEFINESBYPROPERTIES('2Landing{number:00000000000000}',$,$,$,(#{member}),#{set})", out length);
        edits.Append(text[..length]);
    }
}
