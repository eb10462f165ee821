using System.Diagnostics;
using System.Text;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Part21.Reading;

namespace MemberScan.Part21.Tests;

public sealed class Part21LimitsTests
{
    private static readonly ReadingLimits s_tight = new(Depth: 8, InstanceLength: 200, StringLength: 50, KeywordLength: 10, Keywords: 3, Instances: 5, RescannedBytes: 500);

    [Fact]
    public void The_shipped_limits_are_in_force()
    {
        Assert.Equal(
            new ReadingLimits(64, 64 * 1024 * 1024, 16 * 1024 * 1024, 255, 65_536, 200_000_000, 256L * 1024 * 1024),
            Part21File.ShippedLimits);
    }

    [Fact]
    public void Brackets_are_followed_to_64_deep_and_no_further()
    {
        var (atLimit, nothing) = Sample.Read(Sample.Model($"#1=HANGER({Nested(63)});"));
        var (beyond, told) = Sample.Read(Sample.Model($"#1=HANGER({Nested(64)});\n#2=POST();"));

        Assert.Empty(nothing.Items);
        Assert.True(atLimit.TryFind(1, out var sound) && !sound.IsDamaged);
        Assert.Equal("P21-0029", Assert.Single(told.Items).Code);
        Assert.True(beyond.TryFind(1, out var bad) && bad.IsDamaged);
        Assert.True(beyond.TryFind(2, out var next) && !next.IsDamaged);
    }

    [Fact]
    public void Typed_values_and_complex_instances_count_towards_the_depth()
    {
        var typed = string.Concat(Enumerable.Repeat("A(", 64)) + "1" + new string(')', 64);

        Assert.Equal("P21-0029", Assert.Single(Sample.Read(Sample.Model($"#1=HANGER({typed});")).Told.Items).Code);
        Assert.Equal(["P21-0020", "P21-0029"], Sample.Read(Sample.Model($"#1=(HANGER({Nested(63)}));")).Told.Items.Select(d => d.Code));
    }

    [Fact]
    public void A_keyword_of_255_characters_is_taken_and_a_longer_one_is_not()
    {
        var (_, nothing) = Sample.Read(Sample.Model($"#1={new string('K', 255)}();"));
        var (file, told) = Sample.Read(Sample.Model($"#1={new string('K', 256)}();\n#2=POST();"));

        Assert.Empty(nothing.Items);
        Assert.Equal("P21-0032", Assert.Single(told.Items).Code);
        Assert.True(file.TryFind(1, out var bad) && bad.IsDamaged);
        Assert.True(file.TryFind(2, out _));
    }

    [Fact]
    public void A_string_beyond_16_MiB_costs_its_instance()
    {
        var text = Sample.Model($"#1=POST('{new string('x', 16 * 1024 * 1024)}');\n#2=POST('after');");

        var (file, told) = Sample.Read(text);

        Assert.Equal("P21-0031", Assert.Single(told.Items).Code);
        Assert.True(file.TryFind(1, out var bad) && bad.IsDamaged);
        Assert.True(file.TryFind(2, out var next) && !next.IsDamaged);
        Assert.True(file.ReadToEnd);
    }

    [Fact]
    public void An_instance_beyond_its_limit_costs_itself()
    {
        var (file, told) = Tight($"#1=POST({string.Join(',', Enumerable.Repeat("1.", 100))});\n#2=POST(1);");

        var found = Assert.Single(told.Items);
        Assert.Equal("P21-0030", found.Code);
        Assert.Equal(1UL, found.Span!.Value.InstanceId);
        Assert.True(file.TryFind(1, out var bad) && bad.IsDamaged);
        Assert.True(file.TryFind(2, out var next) && !next.IsDamaged);
        Assert.True(file.ReadToEnd);
    }

    [Fact]
    public void Keywords_beyond_their_number_cost_their_instances()
    {
        var (file, told) = Tight("#1=A();#2=B();#3=C();\n#4=D();\n#5=A();");

        Assert.Equal("P21-0033", Assert.Single(told.Items).Code);
        Assert.Equal([4UL], file.Records.Where(r => r.IsDamaged).Select(r => r.Id));
        Assert.Equal(2, file.RecordsOf("A").Count());
    }

    [Fact]
    public void Instances_beyond_their_number_stop_the_reading()
    {
        var (file, told) = Tight("#1=A();#2=A();#3=A();#4=A();#5=A();#6=A();");

        Assert.Contains(told.Items, d => d.Code == "P21-0034" && d.Severity == Severity.Error);
        Assert.Equal(5, file.Count);
        Assert.False(file.ReadToEnd);
    }

    [Fact]
    public void Damage_that_would_be_read_over_and_over_stops_the_reading()
    {
        var (file, told) = Tight(string.Concat(Enumerable.Range(1, 50).Select(i => $"#{i}=A(/*;\n")), s_tight with { Instances = 100 });

        Assert.Contains(told.Items, d => d.Code == "P21-0035" && d.Severity == Severity.Error);
        Assert.False(file.ReadToEnd);
    }

    [Theory]
    [InlineData("#1=A(/*;\n")]
    [InlineData("#1=A('''x;\n")]
    [InlineData("#1=A('\\S\\'x;\n")]
    [InlineData("#1=A(((((((\n")]
    [InlineData("#1=A(IFCX(IFCX(IFCX(\n")]
    [InlineData("#1=(A(\n")]
    [InlineData("/*;\n")]
    [InlineData("'\n")]
    [InlineData("#\n")]
    [InlineData("#1\n")]
    [InlineData("# = ; ENDSECX ")]
    [InlineData("#1=&SCOPE;\n")]
    [InlineData("#1=A(1;")]
    public void Repeated_damage_is_read_in_time_that_grows_with_the_length(string unit)
    {
        // 2 MB; read in quadratic time this would take minutes.
        var text = Sample.Model(string.Concat(Enumerable.Repeat(unit, 2_000_000 / unit.Length)));
        var watch = Stopwatch.StartNew();

        var (file, told) = Sample.Read(text);

        Assert.True(watch.Elapsed < TimeSpan.FromSeconds(30), $"took {watch.Elapsed}");
        Assert.True(file.HasDamage);
        Assert.NotEmpty(told.Items);
    }

    [Fact]
    public void Numbers_chosen_to_collide_cost_no_more_than_others()
    {
        // The two halves of each number cancel out in the usual hash of 64 bits; in one bucket these would take minutes.
        var numbers = Enumerable.Range(1, 100_000).Select(i => ((ulong)i << 32) | (uint)i).ToList();
        var text = Sample.Model(string.Concat(numbers.Select(n => $"#{n}=A(#{n},#7);\n")) + string.Concat(Enumerable.Repeat("#18000000000000000000=A(#18000000000000000000);\n", 100_000)));
        var watch = Stopwatch.StartNew();

        var (file, told) = Sample.Read(text);

        Assert.True(watch.Elapsed < TimeSpan.FromSeconds(30), $"took {watch.Elapsed}");
        Assert.Equal(["P21-0027", "P21-0028"], told.Items.Select(d => d.Code));
        Assert.Equal([99_999, 100_000], told.Items.Select(told.CountOf));
        Assert.All(numbers, n => Assert.True(file.TryFind(n, out _)));
    }

    private static string Nested(int depth) => new string('(', depth) + "1." + new string(')', depth);

    private static (Part21File File, DiagnosticList Told) Tight(string data, ReadingLimits? limits = null)
    {
        var told = new DiagnosticList();
        return (Part21File.Read(Encoding.Latin1.GetBytes(Sample.Model(data)), "landing.ifc", told, limits ?? s_tight), told);
    }
}
