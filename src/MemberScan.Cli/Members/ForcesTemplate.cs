using System.Globalization;
using System.Text;
using MemberScan.Screening.Readiness;

namespace MemberScan.Cli.Members;

/// <summary>The forces table to be filled for a model: both ends of every candidate, with empty fields that no run takes for zero.</summary>
internal static class ForcesTemplate
{
    /// <summary>The header of the table.</summary>
    public const string Header = "member,situation,kind,station[m],N[kN],Vy[kN],Vz[kN],T[kNm],My[kNm],Mz[kNm]";

    private static readonly string[] s_remarks =
    [
        "# Section forces on the face whose outward normal is +x, tension positive, moments as right-handed vectors, in the axes of each member.",
        "# Fill every field; repeat the rows of a member for further situations and stations. An empty number is refused, 0 is zero.",
        "# convention: positive-face",
    ];

    /// <summary>The table as bytes: UTF-8, lines end with CR LF.</summary>
    public static byte[] Write(ReadinessRecord record)
    {
        var table = new StringBuilder();
        foreach (var remark in s_remarks) table.Append(remark).Append("\r\n");
        table.Append(Header).Append("\r\n");
        foreach (var member in record.Members)
        {
            table.Append(CultureInfo.InvariantCulture, $"# member {Plain(member.Key)} '{Plain(member.Name)}', tag '{Plain(member.Identity.Tag)}', {member.Class}, {Plain(member.Section.Length > 0 ? member.Section : "no section")}");
            if (member.Length is not { } length)
            {
                table.Append(", no certain length, so it has no rows here\r\n");
                continue;
            }

            var end = double.Parse(length.ToString("G10", CultureInfo.InvariantCulture), CultureInfo.InvariantCulture).ToString("R", CultureInfo.InvariantCulture);
            table.Append(CultureInfo.InvariantCulture, $", {end} m long\r\n");
            foreach (var station in new[] { "0", end }) table.Append(CultureInfo.InvariantCulture, $"{Quoted(member.Key)},,,{station},,,,,,\r\n");
        }

        return Encoding.UTF8.GetBytes(table.ToString());
    }

    private static string Plain(string text) => string.Concat(text.Take(60).Select(c => char.IsControl(c) ? ' ' : c));

    private static string Quoted(string key) => key.AsSpan().IndexOfAny(",\"#;\t") >= 0 || key.Any(char.IsControl) ? $"\"{Plain(key).Replace("\"", "\"\"", StringComparison.Ordinal)}\"" : key;
}
