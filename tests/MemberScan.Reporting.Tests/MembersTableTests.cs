using System.Globalization;
using System.Text;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Tests;

/// <summary>The table is read back by the rules of RFC 4180.</summary>
public sealed class MembersTableTests
{
    [Fact]
    public void Begins_with_the_agreed_header_and_no_byte_order_mark()
    {
        var bytes = MembersTable.Write(FerryLanding.Record());

        Assert.Equal(
            "key,globalId,item,tag,name,class,role,section,sectionSource,material,strength[MPa],length[m],status,reasonCode,reason,utilization,criterion,"
            + "situation,kind,station[m],y[mm],z[mm],place,N[kN],Vy[kN],Vz[kN],T[kNm],My[kNm],Mz[kNm],forcesSource\r\n",
            Encoding.UTF8.GetString(bytes));
        Assert.Equal((byte)'k', bytes[0]);
    }

    [Fact]
    public void Has_one_line_per_candidate_in_the_order_of_the_model()
    {
        var record = FerryLanding.Small();

        var rows = Read(record);

        Assert.Equal(record.Members.Select(m => m.Key), rows.Select(r => r["key"]));
        Assert.Equal(["OVERSTRESSED", "OVERSTRESSED", "WITHIN LIMIT", "WITHIN LIMIT", "WITHIN LIMIT", "NOT CHECKED", "NOT CHECKED", "NOT CHECKED", "NOT CHECKED"], rows.Select(r => r["status"]));
        Assert.Equal(["", "", "", "", "", "thread-unknown", "no-forces", "no-forces", "section-not-parametric"], rows.Select(r => r["reasonCode"]));
    }

    [Fact]
    public void Gives_numbers_in_the_units_of_the_header()
    {
        var rail = Read(FerryLanding.Small())[0];

        Assert.Equal("355", rail["strength[MPa]"]);
        Assert.Equal("2.5", rail["length[m]"]);
        Assert.Equal("1.25", rail["station[m]"]);
        Assert.Equal("0", rail["y[mm]"]);
        Assert.Equal("24.15", rail["z[mm]"]);
        Assert.Equal("-0.8", rail["N[kN]"]);
        Assert.Equal("0.02", rail["T[kNm]"]);
        Assert.Equal("1.32", rail["My[kNm]"]);
        Assert.Equal("", rail["item"]);
        Assert.Equal("2", Read(FerryLanding.Small())[1]["item"]);
    }

    [Fact]
    public void Leaves_empty_what_is_not_known()
    {
        var strut = Read(FerryLanding.Small())[6];

        Assert.All(["utilization", "criterion", "situation", "kind", "station[m]", "y[mm]", "z[mm]", "place", "N[kN]", "Mz[kNm]", "forcesSource"], column => Assert.Equal("", strut[column]));
    }

    // First characters that spreadsheets take for a formula: OWASP, "CSV Injection" (from memory).
    [Theory]
    [InlineData("=1+1", "'=1+1")]
    [InlineData("+1", "'+1")]
    [InlineData("-1", "'-1")]
    [InlineData("@SUM(A1)", "'@SUM(A1)")]
    [InlineData("\t=1", "'\t=1")]
    [InlineData("\r=1", "'\r=1")]
    [InlineData("＝1", "'＝1")]
    [InlineData("rail =1", "rail =1")]
    [InlineData("a,b \"c\"\r\nd", "a,b \"c\"\r\nd")]
    [InlineData("Geländer 渡船", "Geländer 渡船")]
    [InlineData("nul\0end", "nul␀end")]
    public void Keeps_a_text_and_lets_none_be_a_formula(string name, string read)
    {
        var row = Read(FerryLanding.Record(FerryLanding.Hanger("Key", name, 1e3)))[0];

        Assert.Equal(read, row["name"]);
        Assert.Equal("round 25 mm", row["section"]);
    }

    [Fact]
    public void Gives_the_same_bytes_under_a_culture_with_a_decimal_comma()
    {
        var plain = MembersTable.Write(FerryLanding.Small());
        var before = CultureInfo.CurrentCulture;

        byte[] german;
        try
        {
            CultureInfo.CurrentCulture = new CultureInfo("de-DE");
            german = MembersTable.Write(FerryLanding.Small());
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }

        Assert.Equal(plain, german);
    }

    [Fact]
    public void Refuses_a_number_that_is_not_finite()
    {
        var rail = FerryLanding.Rail("Rail", "Rail", 1.32e3) with { Length = double.PositiveInfinity };

        Assert.Throws<ArgumentOutOfRangeException>(() => MembersTable.Write(FerryLanding.Record(rail)));
    }

    [Fact]
    public void Refuses_an_unchecked_candidate_without_a_reason()
    {
        var strut = FerryLanding.Open("Strut", "Strut", ReasonCode.NoForces, "none") with { Reason = null };

        Assert.Throws<ArgumentException>(() => MembersTable.Write(FerryLanding.Record(strut)));
    }

    private static List<Dictionary<string, string>> Read(ScreeningRecord record)
    {
        var lines = Split(Encoding.UTF8.GetString(MembersTable.Write(record)));
        Assert.All(lines, line => Assert.Equal(30, line.Count));
        return [.. lines.Skip(1).Select(line => lines[0].Zip(line).ToDictionary(p => p.First, p => p.Second))];
    }

    private static List<List<string>> Split(string text)
    {
        var lines = new List<List<string>>();
        var (line, field, at) = (new List<string>(), new StringBuilder(), 0);
        while (at < text.Length)
        {
            if (text[at] == '"')
            {
                for (at++; text[at] != '"' || (at + 1 < text.Length && text[at + 1] == '"'); at++)
                {
                    if (text[at] == '"') at++;
                    field.Append(text[at]);
                }

                at++;
            }
            else if (text[at] == ',')
            {
                line.Add(field.ToString());
                field.Clear();
                at++;
            }
            else if (text.AsSpan(at).StartsWith("\r\n", StringComparison.Ordinal))
            {
                line.Add(field.ToString());
                field.Clear();
                lines.Add(line);
                line = [];
                at += 2;
            }
            else
            {
                field.Append(text[at++]);
            }
        }

        Assert.Empty(line);
        return lines;
    }
}
