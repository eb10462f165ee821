using System.Globalization;
using System.Text;
using CsCheck;
using MemberScan.Foundation.Diagnostics;
using MemberScan.OpenModels;

namespace MemberScan.Part21.Tests;

public sealed class PropertyTests
{
    private static readonly Gen<string> s_text = Gen.OneOf(
        Gen.String[Gen.Char[' ', '~'], 0, 12],
        Gen.String[Gen.OneOf(Gen.Char['\u0000', '\uD7FF'], Gen.Char['\uE000', '\uFFFF']), 0, 8],
        Choice("'", "''", @"\", @"\S\", @"\S\'", @"\X2\", "\U0001F6A2", "a;b", "(", ")", "/*", "#1=A();"));

    private static readonly Gen<Node> s_leaf = Gen.OneOf(
        Gen.Double.Where(double.IsFinite).Select(d => (Node)new Real(d)),
        Gen.Long.Select(n => (Node)new Whole(n)),
        s_text.Select(t => (Node)new Text(t)),
        Gen.ULong[1, 9].Select(id => (Node)new Reference(id)),
        Choice("T", "F", "RIGID_JOINED_MEMBER", "_A1").Select(e => (Node)new Literal(e)),
        Choice("$", "*").Select(s => (Node)new Sign(s)));

    private static readonly Gen<Node> s_tree = Gen.Recursive<Node>((depth, inner) => depth >= 4
        ? s_leaf
        : Gen.Frequency(
            (4, s_leaf),
            (1, inner.Array[0, 4].Select(items => (Node)new Row(items))),
            (1, inner.Select(value => (Node)new Typed("IFCMEASURE", value)))));

    private abstract record Node;

    private sealed record Real(double Value) : Node;

    private sealed record Whole(long Value) : Node;

    private sealed record Text(string Value) : Node;

    private sealed record Reference(ulong Id) : Node;

    private sealed record Literal(string Value) : Node;

    private sealed record Sign(string Value) : Node;

    private sealed record Row(Node[] Items) : Node;

    private sealed record Typed(string Name, Node Value) : Node;

    [Fact]
    public void Reals_read_back_the_same()
    {
        Gen.Double.Where(double.IsFinite).Sample(
            number =>
            {
                var spelling = Part21Text.Real(number);
                Assert.Matches(@"^-?[0-9]+\.[0-9]*(E[+-]?[0-9]+)?$", spelling);
                Assert.True(Sample.Value(spelling).TryReal(out var value));
                Assert.Equal(number == 0 ? 0 : number, value);
            },
            iter: 2000);
    }

    [Fact]
    public void Texts_are_ascii_and_read_back_the_same()
    {
        s_text.Sample(
            text =>
            {
                var spelling = Part21Text.String(text);
                Assert.All(spelling, c => Assert.InRange(c, ' ', '~'));
                Assert.True(Sample.Value(spelling).TryText(out var value));
                Assert.Equal(text, value);
            },
            iter: 2000);
    }

    [Fact]
    public void Trees_of_values_read_back_the_same()
    {
        var model = Gen.Select(s_tree.Array[0, 5].Array[1, 9], Gen.Int, (trees, seed) => (trees, seed));
        model.Sample(
            given =>
            {
                var blanks = Blanks(given.seed);
                var data = string.Concat(given.trees.Select((arguments, i) => $"#{i + 1}{blanks()}={blanks()}POST{blanks()}({Spell(arguments, blanks)}){blanks()};{blanks()}\n"))
                    + string.Concat(Enumerable.Range(given.trees.Length + 1, 9).Select(i => $"#{i}=RAIL();"));

                var (file, told) = Sample.Read(Sample.Model(data));

                Assert.Empty(told.Items);
                Assert.True(file.ReadToEnd);
                foreach (var (arguments, i) in given.trees.Select((t, i) => (t, i)))
                {
                    Assert.True(file.TryFind((ulong)i + 1, out var record));
                    Assert.Equal(arguments.Length, record.ArgumentCount);
                    for (var n = 0; n < arguments.Length; n++) AssertSame(arguments[n], record[n]);
                }

                AssertAgreesWithPlainTokenizer(file);
            },
            iter: 1000);
    }

    [Fact]
    public void Random_changes_to_small_files_never_throw_and_leave_a_sound_index()
    {
        const string Data = "#1=POST('it''s \\X2\\00C4\\X0\\',(1.,-2.E-3),$,*);/* c */\n#2=(A(#1)B(.T.,\"0F\"));\n#3=IFCBEAM(IFCLABEL('\\S\\D'),#1,#2,(),((1,2),(3,4)));\n#4=HANGER('\\S\\'''); #5=POST(#3);\n#4=POST();";
        var bytes = Encoding.ASCII.GetBytes(Sample.Model(Data));

        Mutation(bytes.Length).Sample(mutation => AssertSound(Mutated(bytes, mutation)), iter: 20_000);
    }

    [Fact]
    public void Random_changes_to_open_models_never_throw_and_leave_a_sound_index()
    {
        OpenModel.SkipIfAbsent();
        foreach (var path in OpenModel.All)
        {
            var (bytes, _) = ModelContainer.Read(path);
            var iterations = Math.Clamp(1_000_000 / bytes.Length, 1, 200);

            Mutation(bytes.Length).Sample(mutation => AssertSound(Mutated(bytes, mutation)), iter: iterations);
        }
    }

    private static Gen<string> Choice(params string[] choices) => Gen.Int[0, choices.Length - 1].Select(i => choices[i]);

    private static Gen<(int At, int Length, byte[] New)[]> Mutation(int length)
    {
        var telling = Choice("'", "(", ")", ",", ";", "#", "=", "/*", "*/", "\\", "\"", ".", "\0", "\n", "#1=A();", "ENDSEC;", "DATA;", "END-ISO-10303-21;", "\\S\\'", "\uFEFF")
            .Select(Encoding.UTF8.GetBytes);
        var patch = Gen.OneOf(telling, Gen.Byte.Array[0, 3]);
        return Gen.Select(Gen.Int[0, length], Gen.Int[0, 3], patch).Array[1, 4];
    }

    private static byte[] Mutated(byte[] bytes, (int At, int Length, byte[] New)[] mutation)
    {
        foreach (var (at, length, patch) in mutation)
        {
            var start = Math.Min(at, bytes.Length);
            bytes = [.. bytes[..start], .. patch, .. bytes[Math.Min(start + length, bytes.Length)..]];
        }

        return bytes;
    }

    private static void AssertSound(byte[] bytes)
    {
        var told = new DiagnosticList();
        var file = Part21File.Read(bytes, "landing.ifc", told);

        Assert.Equal(file.HasDamage, told.Items.Any(d => d.Code is not ("P21-0010" or "P21-0011" or "P21-0013" or "P21-0020")));
        Assert.Equal(!file.ReadToEnd, told.HasErrors);
        if (file.InsertionOffset >= 0) Assert.Equal("ENDSEC", Encoding.ASCII.GetString(bytes, (int)file.InsertionOffset, 6), ignoreCase: true);
        Assert.True(!file.ReadToEnd || file.InsertionOffset >= 0);

        var end = 0L;
        foreach (var record in file.Records)
        {
            Assert.True(record.Span.Offset >= end && record.Text.Length > 1 && record.Text[0] == '#');
            end = record.Span.Offset + record.Text.Length;
            Assert.True(record.Id <= file.HighestId);
            Assert.True(file.TryFind(record.Id, out var found) && (found == record) != record.IsDuplicate);
            foreach (var argument in record.Arguments()) Walk(argument);
        }

        Assert.Equal(file.Records.Count(r => r.Keyword.Length > 0), file.CountByKeyword.Keys.Sum(k => file.RecordsOf(k).Count()));
        if (file.ReadToEnd && !file.HasDamage && !Encoding.Latin1.GetString(bytes).Contains(@"\S\'", StringComparison.Ordinal)) AssertAgreesWithPlainTokenizer(file);
    }

    private static void Walk(Part21Value value)
    {
        _ = value.TryText(out _) | value.TryReal(out _) | value.TryInteger(out _) | value.TryReference(out _) | value.TryEnumeration(out _);
        Assert.Equal(value.ItemCount, value.Items.Count);
        foreach (var item in value.Items) Walk(item);
        if (value.Kind == Part21ValueKind.Typed) Walk(value.Inner);
    }

    private static void AssertAgreesWithPlainTokenizer(Part21File file)
    {
        var text = Encoding.Latin1.GetString(file.Bytes.Span);
        Assert.Equal(
            PlainTokenizer.Instances(text).Select(i => $"{i.Id} {i.Keyword} {string.Join('\u0001', i.Arguments)}"),
            file.Records.Where(r => !r.IsComplex).Select(r => $"{r.Id} {r.Keyword} {string.Join('\u0001', r.Arguments().Select(a => PlainTokenizer.WithoutComments(Encoding.Latin1.GetString(a.Text))))}"));
    }

    private static Func<string> Blanks(int seed)
    {
        var random = new Random(seed);
        string[] choices = ["", "", "", " ", "\n", "\r\n\t", "/* a;b( */", "/**/ "];
        return () => choices[random.Next(choices.Length)];
    }

    private static string Spell(Node[] nodes, Func<string> blanks) =>
        string.Join(',', nodes.Select(n => blanks() + Spell(n, blanks) + blanks()));

    private static string Spell(Node node, Func<string> blanks) => node switch
    {
        Real real => Part21Text.Real(real.Value),
        Whole whole => whole.Value.ToString(CultureInfo.InvariantCulture),
        Text text => Part21Text.String(text.Value),
        Reference reference => string.Create(CultureInfo.InvariantCulture, $"#{reference.Id}"),
        Literal literal => $".{literal.Value}.",
        Sign sign => sign.Value,
        Row row => $"({Spell(row.Items, blanks)})",
        Typed typed => $"{typed.Name}{blanks()}({blanks()}{Spell(typed.Value, blanks)}{blanks()})",
        _ => throw new InvalidOperationException(),
    };

    private static void AssertSame(Node expected, Part21Value actual)
    {
        switch (expected)
        {
            case Real real:
                Assert.Equal(Part21ValueKind.Real, actual.Kind);
                Assert.True(actual.TryReal(out var number));
                Assert.Equal(real.Value == 0 ? 0 : real.Value, number);
                break;
            case Whole whole:
                Assert.Equal(Part21ValueKind.Integer, actual.Kind);
                Assert.True(actual.TryInteger(out var integer));
                Assert.Equal(whole.Value, integer);
                break;
            case Text text:
                Assert.Equal(Part21ValueKind.Text, actual.Kind);
                Assert.True(actual.TryText(out var read));
                Assert.Equal(text.Value, read);
                break;
            case Reference reference:
                Assert.True(actual.TryReference(out var id));
                Assert.Equal(reference.Id, id);
                break;
            case Literal literal:
                Assert.True(actual.TryEnumeration(out var name));
                Assert.Equal(literal.Value, name);
                break;
            case Sign sign:
                Assert.Equal(sign.Value == "$" ? Part21ValueKind.Unset : Part21ValueKind.Derived, actual.Kind);
                break;
            case Row row:
                Assert.Equal(Part21ValueKind.List, actual.Kind);
                Assert.Equal(row.Items.Length, actual.ItemCount);
                foreach (var (item, value) in row.Items.Zip(actual.Items)) AssertSame(item, value);
                break;
            case Typed typed:
                Assert.Equal(typed.Name, actual.TypeName);
                AssertSame(typed.Value, actual.Inner);
                break;
        }
    }
}
