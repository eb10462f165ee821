using System.Globalization;
using System.Text;
using MemberScan.Model.Verdicts;
using MemberScan.Reporting.Display;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting;

/// <summary>The table of candidates, one line each in the order of the model, as comma-separated values (RFC 4180).</summary>
/// <remarks>
/// UTF-8 without byte order mark, lines end with CR LF, fields with comma, quote or line end stand in quotes. Numbers have a point as
/// decimal mark, no grouping, and are rounded to <see cref="Digits"/> significant digits; what is not known is empty. A text that a spreadsheet would
/// take for a formula (it begins with <c>= + - @</c>, tab, CR, LF or a full-width form of the four) gets an apostrophe in front. Other control
/// characters are replaced by their pictures (U+2400 and following).
/// </remarks>
public static class MembersTable
{
    /// <summary>Significant digits of a number.</summary>
    public const int Digits = 10;

    /// <summary>The first line, without its end.</summary>
    public const string Header = "key,globalId,item,tag,name,class,role,section,sectionSource,material,strength[MPa],length[m],"
        + "status,reasonCode,reason,utilization,criterion,situation,kind,station[m],y[mm],z[mm],place,"
        + "N[kN],Vy[kN],Vz[kN],T[kNm],My[kNm],Mz[kNm],forcesSource";

    private const string LineEnd = "\r\n";
    private const string FormulaStarts = "=+-@\t\r\n＝＋－＠";

    /// <summary>The table as bytes.</summary>
    /// <exception cref="ArgumentException">The record contradicts itself: see <see cref="SoundRecord"/>.</exception>
    /// <exception cref="ArgumentOutOfRangeException">A number is not finite.</exception>
    public static byte[] Write(ScreeningRecord record)
    {
        SoundRecord.ThrowUnlessSound(record);
        var table = new StringBuilder(Header).Append(LineEnd);
        foreach (var member in record.Members) table.AppendJoin(',', Fields(member)).Append(LineEnd);
        return Encoding.UTF8.GetBytes(table.ToString());
    }

    /// <summary>A text as one field: quoted where it must be, guarded against being taken for a formula, without control characters.</summary>
    public static string Field(string text)
    {
        ArgumentNullException.ThrowIfNull(text);
        return Text(text);
    }

    private static IEnumerable<string> Fields(MemberResult member) =>
    [
        Text(member.Key), Text(member.GlobalId), member.ItemNumber > 0 ? member.ItemNumber.ToString(CultureInfo.InvariantCulture) : "",
        Text(member.Tag), Text(member.Name), Text(member.Class), Text(member.Role),
        Text(member.Section), Text(member.SectionSource), Text(member.Material), Number(member.Strength, ShownUnit.Stress), Number(member.Length),
        member.Verdict.Word(), member.Reason?.Code.Text() ?? "", Text(member.Reason?.Message ?? ""),
        .. member.Governing is { } governing ? Fields(governing) : Enumerable.Repeat("", 15),
    ];

    private static string[] Fields(Governing governing) =>
    [
        Number(governing.Utilization), Text(governing.Criterion), Text(governing.Situation), Text(governing.Kind), Number(governing.Station),
        Number(governing.Point.Y, ShownUnit.Dimension), Number(governing.Point.Z, ShownUnit.Dimension), Text(governing.Point.Place),
        Number(governing.Forces.N, ShownUnit.Force), Number(governing.Forces.Vy, ShownUnit.Force), Number(governing.Forces.Vz, ShownUnit.Force),
        Number(governing.Forces.T, ShownUnit.Moment), Number(governing.Forces.My, ShownUnit.Moment), Number(governing.Forces.Mz, ShownUnit.Moment),
        Text(governing.ForcesSource),
    ];

    private static string Number(double? si, ShownUnit? unit = null)
    {
        if (si is not { } value) return "";
        if (!double.IsFinite(value)) throw new ArgumentOutOfRangeException(nameof(si), "A number of the record is not finite.");

        var rounded = double.Parse((value / (unit?.Size ?? 1)).ToString("E" + (Digits - 1), CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
        return (rounded + 0.0).ToString("R", CultureInfo.InvariantCulture);
    }

    private static string Text(string text)
    {
        var field = new StringBuilder(text.Length + 3);
        if (text.Length > 0 && FormulaStarts.Contains(text[0], StringComparison.Ordinal)) field.Append('\'');
        foreach (var unit in text)
        {
            if (unit < 0x20 && unit is not ('\t' or '\r' or '\n')) field.Append((char)(0x2400 + unit));
            else field.Append(unit == '\u007F' ? '\u2421' : unit);
        }

        return field.ToString().AsSpan().IndexOfAny(",\"\r\n") < 0
            ? field.ToString()
            : field.Replace("\"", "\"\"").Insert(0, '"').Append('"').ToString();
    }
}
