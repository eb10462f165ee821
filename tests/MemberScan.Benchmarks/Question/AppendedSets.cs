using System.Globalization;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Part21;
using MemberScan.Part21.Edits;

namespace MemberScan.Benchmarks.Question;

/// <summary>Adds a property set of three properties to every member and saves to a new file, waiting for the disk or not.</summary>
internal static class AppendedSets
{
    public static int Write(string path, string target, bool toDisk)
    {
        using var index = Part21Index.Open(path, ["IFCMEMBER"], new DiagnosticList());
        var lookup = index.CreateLookup();
        var edits = new Part21Edits(index);
        var number = 0;
        foreach (var offset in index.OffsetsOf("IFCMEMBER"))
        {
            if (!lookup.TryReadAt(offset, out var member)) continue;

            number++;
            var utilization = edits.Append($"IFCPROPERTYSINGLEVALUE('Utilization',$,IFCRATIOMEASURE({Part21Text.Real(number / 32768.0)}),$)");
            var status = edits.Append("IFCPROPERTYSINGLEVALUE('Status',$,IFCLABEL('NOT CHECKED'),$)");
            var reason = edits.Append("IFCPROPERTYSINGLEVALUE('Reason',$,IFCTEXT('no-forces'),$)");
            var set = edits.Append(string.Create(CultureInfo.InvariantCulture, $"IFCPROPERTYSET('1Landing{number:00000000000000}',$,'Landing_Check',$,(#{utilization},#{status},#{reason}))"));
            edits.Append(string.Create(CultureInfo.InvariantCulture, $"IFCRELDEFINESBYPROPERTIES('2Landing{number:00000000000000}',$,$,$,(#{member.Id}),#{set})"));
        }

        edits.Save(target, toDisk);
        Console.WriteLine($"{number} sets");
        return 0;
    }
}
