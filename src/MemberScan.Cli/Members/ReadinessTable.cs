using System.Globalization;
using System.Text;
using MemberScan.Model.Verdicts;
using MemberScan.Reporting;
using MemberScan.Screening.Readiness;

namespace MemberScan.Cli.Members;

/// <summary>The readiness of a model as comma-separated values, one line per candidate; fields are written as in the table of the screening.</summary>
internal static class ReadinessTable
{
    /// <summary>The first line, without its end.</summary>
    public const string Header = "key,globalId,item,tag,name,class,predefinedType,typeName,roleGuess,storey,storeyPath,assembly,layer,section,sectionSource,material,strength[MPa],strengthSource,length[m],lengthSource,"
        + "situations,stations,forcesSource,ready,missing,missingInWords,notes";

    /// <summary>The table as bytes: UTF-8, lines end with CR LF.</summary>
    public static byte[] Write(ReadinessRecord record)
    {
        var table = new StringBuilder(Header).Append("\r\n");
        foreach (var member in record.Members) table.AppendJoin(',', Fields(member).Select(MembersTable.Field)).Append("\r\n");
        return Encoding.UTF8.GetBytes(table.ToString());
    }

    private static string[] Fields(MemberReadiness m) =>
    [
        m.Key, m.Identity.GlobalId, m.Identity.ItemNumber > 0 ? Number(m.Identity.ItemNumber) : "", m.Identity.Tag, m.Name, m.Class, m.Identity.PredefinedType,
        m.Identity.TypeName, m.RoleGuess, m.Identity.Storey, m.Identity.StoreyPath, m.Identity.Assembly, m.Identity.Layer, m.Section, m.SectionSource, m.Material,
        m.Strength is { } strength ? Number(strength / 1e6) : "", m.StrengthSource, m.Length is { } length ? Number(length) : "", m.LengthSource,
        Number(m.Situations), Number(m.Stations), m.ForcesSource, m.IsReady ? "yes" : "no",
        string.Join("; ", m.Missing.Select(r => r.Code.Text())), string.Join("; ", m.Missing.Select(r => r.Message)), string.Join("; ", m.Notes),
    ];

    private static string Number(double value) => double.Parse(value.ToString("G10", CultureInfo.InvariantCulture), CultureInfo.InvariantCulture).ToString("R", CultureInfo.InvariantCulture);
}
