using System.Globalization;
using System.Text;
using System.Text.Json;
using System.Text.Json.Nodes;
using MemberScan.Model.Verdicts;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Tests;

public sealed class RunRecordTests
{
    [Fact]
    public void Begins_with_the_format()
    {
        var text = Encoding.UTF8.GetString(RunRecord.Write(FerryLanding.Small()));

        Assert.StartsWith("{\n  \"format\": \"memberscan-run/1\",\n  \"screening\": {\n    \"version\": \"0.1.0\",\n", text, StringComparison.Ordinal);
        Assert.EndsWith("}\n", text, StringComparison.Ordinal);
    }

    [Fact]
    public void Spells_verdicts_reasons_and_letters_for_readers()
    {
        var root = JsonDocument.Parse(RunRecord.Write(FerryLanding.Small())).RootElement.GetProperty("screening");

        var members = root.GetProperty("members");
        Assert.Equal("OVERSTRESSED", members[0].GetProperty("verdict").GetString());
        Assert.Equal("thread-unknown", members[5].GetProperty("reason").GetProperty("code").GetString());
        Assert.Equal("von-mises", members[0].GetProperty("governing").GetProperty("point").GetProperty("measure").GetString());
        Assert.Equal("warning", root.GetProperty("findings")[0].GetProperty("severity").GetString());
        Assert.Contains("渡船缆绳吊杆", Encoding.UTF8.GetString(RunRecord.Write(FerryLanding.Small())), StringComparison.Ordinal);
    }

    [Fact]
    public void Writes_every_property_of_the_record()
    {
        var root = JsonDocument.Parse(RunRecord.Write(FerryLanding.Small())).RootElement.GetProperty("screening");

        Assert.Equal(Names<ScreeningRecord>(), root.EnumerateObject().Select(p => p.Name));
        Assert.Equal(Names<MemberResult>(), root.GetProperty("members")[0].EnumerateObject().Select(p => p.Name));
        Assert.Equal(Names<Governing>(), root.GetProperty("members")[0].GetProperty("governing").EnumerateObject().Select(p => p.Name));
    }

    [Fact]
    public void Reads_back_to_an_equal_record()
    {
        var record = FerryLanding.Small();
        record = record with { Members = record.Members.SetItem(0, record.Members[0].As(stepId: ulong.MaxValue) with { Length = 0.1 + 0.2, Strength = 5e-324 }) };

        var read = RunRecord.Read(RunRecord.Write(record));

        Deep.Equal(record, read);
        Assert.Equal(RunRecord.Write(record), RunRecord.Write(read));
    }

    [Fact]
    public void Reads_every_verdict_and_reason_back()
    {
        var record = FerryLanding.Record([.. Enum.GetValues<ReasonCode>().Select(code => FerryLanding.Open(code.Text(), "", code, "why"))]);

        var read = RunRecord.Read(RunRecord.Write(record));

        Assert.Equal(Enum.GetValues<ReasonCode>(), read.Members.Select(m => m.Reason!.Code));
    }

    // Every single property is left out once, at every depth that the first members show: no absent number may read as zero.
    [Fact]
    public void Refuses_a_file_in_which_any_property_is_missing()
    {
        var bytes = RunRecord.Write(FerryLanding.Record(FerryLanding.Rail("Rail", "Rail", 1.32e3)));
        var count = Objects(JsonNode.Parse(bytes)!).Sum(o => o.Count);

        for (var index = 0; index < count; index++)
        {
            var root = JsonNode.Parse(bytes)!;
            var name = RemoveNumber(root, index);
            var refused = Assert.Throws<InvalidDataException>(() => RunRecord.Read(Encoding.UTF8.GetBytes(root.ToJsonString())));
            Assert.Contains(name, refused.Message, StringComparison.Ordinal);
        }
    }

    [Theory]
    [InlineData("\"memberscan-run/1\"", "\"memberscan-run/2\"")]
    [InlineData("\"OVERSTRESSED\"", "\"overstressed\"")]
    [InlineData("\"OVERSTRESSED\"", "1")]
    [InlineData("\"no-forces\"", "\"no-force\"")]
    [InlineData("\"von-mises\"", "0")]
    [InlineData("\"hasDamage\": false", "\"hasDamage\": false, \"more\": 1")]
    [InlineData("\"hasDamage\": false", "\"hasDamage\": false, \"hasDamage\": false")]
    [InlineData("\"hasDamage\": false", "\"hasDamage\": null")]
    [InlineData("\"runId\": \"5f1d0c2ab97e4438\"", "\"runId\": null")]
    [InlineData("\"station\": 1.25", "\"station\": \"NaN\"")]
    [InlineData("\"withinLimit\": 3", "\"withinLimit\": 4")]
    public void Refuses_what_is_not_of_the_format(string old, string replacement)
    {
        var text = Encoding.UTF8.GetString(RunRecord.Write(FerryLanding.Small()));
        Assert.Contains(old, text, StringComparison.Ordinal);

        var changed = Encoding.UTF8.GetBytes(text.Replace(old, replacement, StringComparison.Ordinal));

        Assert.Throws<InvalidDataException>(() => RunRecord.Read(changed));
    }

    [Fact]
    public void Names_line_and_place_of_what_it_refuses()
    {
        var text = Encoding.UTF8.GetString(RunRecord.Write(FerryLanding.Small())).Replace("\"timestamp\": \"2031-04-02T08:15:00Z\"", "\"timestamp\": 7", StringComparison.Ordinal);

        var refused = Assert.Throws<InvalidDataException>(() => RunRecord.Read(Encoding.UTF8.GetBytes(text)));

        Assert.Contains("line 6", refused.Message, StringComparison.Ordinal);
        Assert.Contains("timestamp", refused.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("")]
    [InlineData("null")]
    [InlineData("[]")]
    [InlineData("{")]
    public void Refuses_bytes_that_hold_no_record(string text) =>
        Assert.Throws<InvalidDataException>(() => RunRecord.Read(Encoding.UTF8.GetBytes(text)));

    [Fact]
    public void Refuses_to_write_a_number_that_is_not_finite()
    {
        var rail = FerryLanding.Rail("Rail", "Rail", 1.32e3) with { Length = double.NaN };

        Assert.Throws<ArgumentException>(() => RunRecord.Write(FerryLanding.Record(rail)));
    }

    [Fact]
    public void Gives_the_same_bytes_under_a_culture_with_a_decimal_comma()
    {
        var plain = RunRecord.Write(FerryLanding.Small());
        var before = CultureInfo.CurrentCulture;

        byte[] german;
        try
        {
            CultureInfo.CurrentCulture = new CultureInfo("de-DE");
            german = RunRecord.Write(FerryLanding.Small());
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }

        Assert.Equal(plain, german);
    }

    private static IEnumerable<string> Names<T>() => typeof(T).GetProperties().Where(p => p.CanWrite).Select(p => JsonNamingPolicy.CamelCase.ConvertName(p.Name));

    private static IEnumerable<JsonObject> Objects(JsonNode? node) => node switch
    {
        JsonObject o => o.SelectMany(p => Objects(p.Value)).Prepend(o),
        JsonArray a => a.SelectMany(Objects),
        _ => [],
    };

    private static string RemoveNumber(JsonNode root, int index)
    {
        foreach (var o in Objects(root).ToList())
        {
            if (index < o.Count)
            {
                var name = o.ElementAt(index).Key;
                o.Remove(name);
                return name;
            }

            index -= o.Count;
        }

        throw new ArgumentOutOfRangeException(nameof(index));
    }
}
