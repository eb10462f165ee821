using System.Globalization;
using System.Text;
using MemberScan.Foundation.Diagnostics;
using MemberScan.OpenModels;
using MemberScan.Part21.Sources;
using MemberScan.Part21.Streaming;
using MemberScan.Part21.Tests.Sources;

namespace MemberScan.Part21.Tests;

/// <summary>The index against the reader of whole texts: the same instances, the same findings, whatever the text.</summary>
public sealed class Part21IndexTests
{
    private static string Filler(int id) =>
        string.Create(CultureInfo.InvariantCulture, $"#{id}=POST('a''b;',#3,1.5,.T.,(1.,-2.E-3),IFCLABEL('x'),$,*);\n");

    [Fact]
    public void Open_models_read_the_same()
    {
        OpenModel.SkipIfAbsent();
        foreach (var path in OpenModel.All)
        {
            var (bytes, _) = ModelContainer.Read(path);

            AssertAgrees(bytes, 4096, 1024, 1);
            AssertAgrees(bytes, 65_536, 8192, 3);
        }
    }

    [Theory]
    [InlineData("#1=HANGER(1.25,'a',#2,$,*,.T.,(1,2),());")]
    [InlineData("#1= HANGER(1.);\n#2 =HANGER(2.);\n#3=HANGER (3.);\n#4=HANGER( 4. , 5. ) ;\n")]
    [InlineData("/* a; */ #1=/*b*/HANGER/*c(*/(/*)*/1./*'*/)/*;*/;\r\n#2=HANGER(2.);")]
    [InlineData("#1=HANGER(1.,2\n,3.\n);\n#2=HANGER(\n1.,\n\n2.);")]
    [InlineData("#1=hanger(1e5,.t.);#2=Hanger(1E5,2.E-7,1.E+308,1.E309,.5,1.2.3,1.#INF,-,+1,--1,1.E,12A);")]
    [InlineData("#1=A(''),B('x'));#2=A(IFCREAL(1.),IFCREAL(),IFCREAL(1.,2.),IFCLIST((1,2)),X(Y(1)));")]
    [InlineData("#1=A(1),(2);#2=A((1);#3=A(1));#4=A();#5=A(,);#6=A(1,);#7=A(,1);#8=A(1,,2);")]
    [InlineData("#1=(A(1)B(2));#2=&SCOPE #3=A();ENDSCOPE B();#4=A(\"0F\",\"4F\",\"\");#5=A(.A1.,.1A.,.T,T.,.T.U.);")]
    [InlineData("#1=A('\\S\\'');#2=A('\\S\\''');#3=A('\\X2\\00E4\\X0\\');#4=A('it''s','');#5=A('a'b);#6=A('a''b''');")]
    [InlineData("#1=A(#2,#,#x,#4294967295,#4294967296,#99999999999,#99999999999999999999999,# 3,#1.5,#1E5);")]
    [InlineData("#4294967295=A();#4294967296=A();#0=A();#007=A();#99999999999999999999999=A();\n#8=A();")]
    [InlineData("#9=A();#3=B();#9=C();#1=D();#3=E();#3=F();#10=G();")]
    [InlineData("#1=A('never closed);\n#2=B(1);\n#3=C('x');\n#4=D(2);")]
    [InlineData("#1=A(1);/* never closed #2=B();\n#3=C();")]
    [InlineData("#1=\u007FA(1);\n#2=\tB(2);\n#3=_C(\u007F1,\0 2);\n#4= \u007FD();")]
    [InlineData("#1=A(1)\n#2=B(2);;#3=C(3);\nrubbish; #4=D(4);")]
    [InlineData("#1=A(1);ENDSEC;\nDATA;\n#2=B(2);\nENDSEC;\nREFERENCE;#5=<x>;ENDSEC;DATA;#3=C();")]
    [InlineData("#1=A();\nENDSEC;\nHEADER;\nFILE_SCHEMA(('IFC9'));ENDSEC;DATA;#2=B();")]
    [InlineData("#1=A('line\nbreak','tab\tx','\u00e4');\n#2=B(\u00e4);")]
    public void Small_texts_read_the_same(string data)
    {
        var bytes = Encoding.Latin1.GetBytes(Sample.Model(data));

        for (var shift = 0; shift < 130; shift++)
        {
            // The same data at every place within a stride of the scan.
            var comment = Encoding.ASCII.GetBytes("#77=FILL('" + new string('x', shift * 5) + "');");
            var at = Sample.Header.Length;
            AssertAgrees([.. bytes[..at], .. comment, .. bytes[at..]], 4096, 1024, 1);
        }
    }

    [Theory]
    [InlineData("ISO-10303-21;\nDATA;\n#1=A();\nENDSEC;\nHEADER;\nFILE_SCHEMA(('IFC4'));\nENDSEC;\nDATA;\n#2=B();\nENDSEC;\nEND-ISO-10303-21;")]
    [InlineData("rubbish\nISO-10303-21;HEADER;ENDSEC;DATA;#1=A();ENDSEC;END-ISO-10303-21;\nISO-10303-21;\nHEADER;")]
    [InlineData("ISO-10303-21;HEADER;FILE_NAME('x;DATA;#1=A();ENDSEC;")]
    [InlineData("ISO-10303-21;HEADER;ENDSEC;DATA;#1=A();ENDSEC;END-ISO-10303-21;SIGNATURE;AA==;ENDSEC;")]
    [InlineData("ISO-10303-21;HEADER;ENDSEC;DATA.;#1=A();ENDSEC;END-ISO-10303-21;")]
    [InlineData("no model at all")]
    [InlineData("")]
    public void Odd_structures_read_the_same(string text)
    {
        AssertAgrees(Encoding.Latin1.GetBytes(text), 4096, 1024, 1);
    }

    [Fact]
    public void Random_changes_to_a_model_read_the_same()
    {
        var text = new StringBuilder(Sample.Header);
        for (var id = 1; id < 400; id++) text.Append(Filler(id % 50 == 0 ? id - 30 : id));
        var bytes = Encoding.ASCII.GetBytes(text + Sample.Footer);

        var random = new Random(210301);
        for (var i = 0; i < 3000; i++) AssertAgrees(Mutations.Next(random, bytes), 4096, 1024, 2);
    }

    [Fact]
    public void Random_changes_to_open_models_read_the_same()
    {
        OpenModel.SkipIfAbsent();
        var random = new Random(210302);
        foreach (var path in OpenModel.All)
        {
            var (bytes, _) = ModelContainer.Read(path);
            if (bytes.Length > 600_000) continue;

            for (var i = 0; i < Math.Clamp(1_000_000 / bytes.Length, 2, 100); i++) AssertAgrees(Mutations.Next(random, bytes), 8192, 2048, 2);
        }
    }

    [Fact]
    public void Numbers_in_no_order_are_all_found()
    {
        var text = new StringBuilder(Sample.Header);
        for (uint i = 1; i < 3000; i++) text.Append(CultureInfo.InvariantCulture, $"#{(i * 2_654_435_761) % uint.MaxValue}=POST({i});\n");

        AssertAgrees(Encoding.ASCII.GetBytes(text + Sample.Footer), 8192, 4096, 2);
    }

    [Fact]
    public void Any_number_of_threads_gives_the_same_index()
    {
        var text = new StringBuilder(Sample.Header);
        for (var id = 1; id < 3000; id++)
        {
            // Safe-looking places that are none: in strings and comments across the borders of stretches.
            if (id % 40 == 0) text.Append("/* ;\n#1=A();\n#2=B(); */");
            if (id % 55 == 0) text.Append(CultureInfo.InvariantCulture, $"#{id}00000=POST('{string.Concat(Enumerable.Repeat("x;#7=A();", 900))}');\n");
            text.Append(Filler(id));
        }

        var bytes = Encoding.ASCII.GetBytes(text + Sample.Footer);

        foreach (var threads in (int[])[1, 2, 5]) AssertAgrees(bytes, 4096, 4096, threads);
    }

    [Theory]
    [InlineData(1)]
    [InlineData(4)]
    public void Wanted_instances_are_taken_as_they_pass_by(int threads)
    {
        var text = new StringBuilder(Sample.Header);
        for (var id = 1; id < 2000; id++)
        {
            if (id % 40 == 0) text.Append(CultureInfo.InvariantCulture, $"/* ;\n#1=HANGER(); */#{id}=hanger('{id}');\n");
            else if (id % 7 == 0) text.Append(CultureInfo.InvariantCulture, $"#{id}=HANGER('{id};');\n");
            else text.Append(Filler(id));
        }

        var bytes = Encoding.ASCII.GetBytes(text + Sample.Footer);
        using var index = Part21Index.Over(
            new MemorySource(bytes), "landing.ifc", ["HANGER"], new DiagnosticList(), new Part21Index.Options(Part21File.ShippedLimits, 4096, 4096, threads), () => new Texts());

        var taken = index.Takers.Cast<Texts>().SelectMany(t => t.Taken).ToList();
        Assert.Equal(index.OffsetsOf("HANGER").ToArray(), taken.Select(t => t.Offset));
        foreach (var (offset, instance) in taken) Assert.Equal(Encoding.ASCII.GetString(bytes, (int)offset, instance.Length), instance);
        Assert.All(taken, t => Assert.EndsWith(");", t.Text, StringComparison.Ordinal));
    }

    [Fact]
    public void A_file_beyond_four_gibibytes_is_indexed()
    {
        // A hole in the middle: zeros part tokens, and take no room on the disk.
        var path = Path.Combine(Path.GetTempPath(), Path.GetRandomFileName());
        const long Far = (4L << 30) + 12_345;
        try
        {
            using (var file = new FileStream(path, FileMode.CreateNew))
            {
                file.Write(Encoding.ASCII.GetBytes(Sample.Header + "#1=POST(#2);\n"));
                file.SetLength(Far);
                file.Position = Far;
                file.Write(Encoding.ASCII.GetBytes("#2=HANGER('far');\n" + Sample.Footer));
            }

            var told = new DiagnosticList();
            using var index = Part21Index.Open(path, ["HANGER"], told);

            Assert.Empty(told.Items);
            Assert.Equal([Far], index.OffsetsOf("HANGER").ToArray());
            Assert.True(index.CreateLookup().TryFind(2, out var hanger));
            Assert.Equal(Far, hanger.Offset);
            Assert.Equal(2, index.Count);
        }
        finally
        {
            File.Delete(path);
        }
    }

    [Fact]
    public void A_text_longer_than_the_limit_is_refused_by_name()
    {
        var thrown = Assert.Throws<InvalidDataException>(() => Part21Index.Over(
            new EndlessSource(), "landing.ifc", [], new DiagnosticList(), Part21Index.Options.Shipped(1)));

        Assert.Contains(Part21Index.MaxBytes.ToString(CultureInfo.InvariantCulture), thrown.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Archives_and_other_encodings_are_told_apart_on_disk()
    {
        OpenModel.SkipIfAbsent();
        using var index = Part21Index.Open(OpenModel.Path("stair-railings-ifc2x3.ifczip"), ["IFCRAILING"], new DiagnosticList());
        var json = Path.Combine(Path.GetTempPath(), Path.GetRandomFileName());
        File.WriteAllText(json, " {}");

        var thrown = Assert.Throws<InvalidDataException>(() => Part21Index.Open(json, [], new DiagnosticList()));
        File.Delete(json);

        Assert.Equal(13, index.OffsetsOf("IFCRAILING").Length);
        Assert.Contains("JSON", thrown.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_number_beyond_what_the_index_holds_is_told_and_passed_over()
    {
        var told = new DiagnosticList();
        using var index = Part21Index.Over(Encoding.ASCII.GetBytes(Sample.Model("#4294967296=A();\n#4294967295=A();")), "landing.ifc", ["A"], told);

        Assert.Equal("P21-0036", Assert.Single(told.Items).Code);
        Assert.True(index.HasDamage);
        Assert.Equal(1, index.Count);
        Assert.True(index.CreateLookup().TryFind(uint.MaxValue, out _));
    }

    [Fact]
    public void Limits_are_the_same_and_told()
    {
        var limits = Part21File.ShippedLimits with { Depth = 3, StringLength = 20, InstanceLength = 3000, KeywordLength = 8 };
        var data = $"#1=A((((1))));\n#2=A('{new string('x', 30)}');\n#3=ABCDEFGHIJ();\n#4=A({string.Join(',', Enumerable.Repeat("'abcdefg'", 400))});\n#5=A((1),'ok');";
        var bytes = Encoding.ASCII.GetBytes(Sample.Model(data));

        var toldOfFile = new DiagnosticList();
        _ = Part21File.Read(bytes, "landing.ifc", toldOfFile, limits);
        var toldOfIndex = new DiagnosticList();
        using var index = Part21Index.Over(bytes, "landing.ifc", ["A"], toldOfIndex, new Part21Index.Options(limits, 4096, 1024, 1));

        Assert.Equal(Shown(toldOfFile, []), Shown(toldOfIndex, []));
        Assert.Superset(new HashSet<string>(["P21-0029", "P21-0030", "P21-0031", "P21-0032"]), toldOfIndex.Items.Select(d => d.Code).ToHashSet());
    }

    [Fact]
    public void Reading_stops_where_there_are_too_many_instances()
    {
        var text = Sample.Model(string.Concat(Enumerable.Range(1, 900).Select(Filler)));
        var told = new DiagnosticList();
        using var index = Part21Index.Over(
            Encoding.ASCII.GetBytes(text), "landing.ifc", [], told, new Part21Index.Options(Part21File.ShippedLimits with { Instances = 100 }, 4096, 1024, 2));

        Assert.Equal("P21-0034", Assert.Single(told.Items).Code);
        Assert.False(index.ReadToEnd);
        Assert.InRange(index.Count, 100, 200);
    }

    internal static void AssertAgrees(byte[] bytes, int stretch, int window, int threads)
    {
        var toldOfFile = new DiagnosticList();
        var file = Part21File.Read(bytes, "landing.ifc", toldOfFile);
        var records = file.Records.ToList();
        string[] wanted = [.. file.CountByKeyword.Keys, "NOWHERE"];
        var toldOfIndex = new DiagnosticList();
        using var index = Part21Index.Over(
            bytes, "landing.ifc", wanted, toldOfIndex, new Part21Index.Options(Part21File.ShippedLimits, stretch, window, threads));

        // References to nothing are found when followed; numbers beyond 32 bits have no place in the index.
        var large = records.Count(r => r.Id > uint.MaxValue);
        string[] apart = large > 0 ? ["P21-0028", "P21-0027", "P21-0036"] : ["P21-0028"];
        Assert.Equal(Shown(toldOfFile, apart), Shown(toldOfIndex, apart));
        Assert.Equal(records.Count - large, index.Count);
        Assert.Equal(file.InsertionOffset, index.InsertionOffset);
        Assert.Equal(file.ReadToEnd, index.ReadToEnd);
        Assert.Equal(file.Header.Schemas, index.Header.Schemas);
        Assert.Equal(file.Header.Name, index.Header.Name);
        foreach (var keyword in wanted)
        {
            Assert.Equal(
                file.RecordsOf(keyword).Where(r => r.Id <= uint.MaxValue).Select(r => r.Span.Offset).ToArray(),
                index.OffsetsOf(keyword).ToArray());
        }

        var lookup = index.CreateLookup();
        foreach (var record in records)
        {
            if (record.Id > uint.MaxValue) continue;

            Assert.True(file.TryFind(record.Id, out var first));
            Assert.True(lookup.TryFind((uint)record.Id, out var instance), $"#{record.Id} is not found.");
            AssertSame(first, instance);
            if (record.Keyword.Length == 0) continue;

            Assert.True(lookup.TryReadAt(record.Span.Offset, out instance));
            AssertSame(record, instance);
        }

        foreach (var absent in (uint[])[0, 5, 123_456_789, uint.MaxValue])
            Assert.Equal(file.TryFind(absent, out _), lookup.TryFind(absent, out _));
    }

    private static IEnumerable<string> Shown(DiagnosticList told, string[] apart) =>
        told.Items.Where(d => !apart.Contains(d.Code)).Select(d => $"{d.Code} {told.CountOf(d)} {d.Span}").Order(StringComparer.Ordinal);

    private static void AssertSame(Part21Record record, Part21Instance instance)
    {
        Assert.Equal(record.Span.Offset, instance.Offset);
        Assert.Equal(record.Id, instance.Id);
        Assert.True(record.Text.SequenceEqual(instance.Text));
        Assert.Equal((record.IsComplex, record.IsDamaged), (instance.IsComplex, instance.IsDamaged));
        if (!record.IsDamaged) Assert.Equal(record.Keyword, Encoding.ASCII.GetString(instance.Keyword).ToUpperInvariant());
        AssertSame(record.Arguments(), instance.Arguments);
    }

    private static void AssertSame(IReadOnlyList<Part21Value> values, Part21Cursor cursor)
    {
        foreach (var value in values)
        {
            Assert.True(cursor.MoveNext());
            Assert.Equal(value.Kind, cursor.Kind);
            Assert.True(value.Text.SequenceEqual(cursor.Text));
            AssertSame(value.Items, value.Kind == Part21ValueKind.List ? cursor.Items : default);
            Assert.Equal((value.TryReal(out var real), real), (cursor.TryReal(out var sameReal), sameReal));
            Assert.Equal((value.TryText(out var text), text), (cursor.TryText(out var sameText), sameText));
            Assert.Equal(value.TypeName, Encoding.ASCII.GetString(cursor.TypeName).ToUpperInvariant());
        }

        Assert.False(cursor.MoveNext());
    }

    private sealed class Texts : IPart21Taker
    {
        public List<(long Offset, string Text)> Taken { get; } = [];

        public void Take(in Part21Instance instance) => Taken.Add((instance.Offset, Encoding.ASCII.GetString(instance.Text)));
    }
}
