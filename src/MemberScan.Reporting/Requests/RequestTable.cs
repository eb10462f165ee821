using System.Text;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Requests;

/// <summary>The information request as comma-separated values (RFC 4180), one line per candidate that was not checked; fields are written as in <see cref="MembersTable"/>.</summary>
public static class RequestTable
{
    /// <summary>The first line, without its end.</summary>
    public const string Header = "key,globalId,tag,name,class,role,storey,reasonCode,reason,request";

    /// <summary>The table as bytes: UTF-8, lines end with CR LF.</summary>
    public static byte[] Write(ScreeningRecord record)
    {
        var table = new StringBuilder(Header).Append("\r\n");
        foreach (var line in RequestLine.Of(record))
        {
            var m = line.Member;
            string[] fields = [m.Key, m.GlobalId, m.Tag, m.Name, m.Class, m.Role, m.Storey, line.Reason.Code.Text(), line.Reason.Message, line.Request];
            table.AppendJoin(',', fields.Select(MembersTable.Field)).Append("\r\n");
        }

        return Encoding.UTF8.GetBytes(table.ToString());
    }
}
