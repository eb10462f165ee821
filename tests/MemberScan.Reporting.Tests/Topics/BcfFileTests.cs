using System.Buffers.Binary;
using System.Globalization;
using System.IO.Compression;
using System.Text;
using System.Xml.Linq;
using MemberScan.Foundation.Geometry;
using MemberScan.Reporting.Topics;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Tests.Topics;

public sealed class BcfFileTests
{
    public static TheoryData<BcfVersion> Versions => [BcfVersion.Bcf21, BcfVersion.Bcf30];

    [Theory]
    [MemberData(nameof(Versions))]
    public void Forty_posts_of_one_cause_make_one_topic_with_forty_components_and_a_camera_within_the_box_of_the_model(BcfVersion version)
    {
        // Forty posts on two sides of a landing of 28.5 m by 6 m, and two hangers of 8 m above it that are within their limit.
        var posts = Posts(40).Members.Select((m, i) => m with { Axes = MemberAxes.From(new Vector3(1.5 * (i / 2), i % 2 == 0 ? -3.2 : 2.8, 4.05), Vector3.UnitZ, Vector3.UnitX) }).ToList();
        var hangers = new[] { 0.0, 28.5 }.Select((x, i) => FerryLanding.Hanger(string.Create(CultureInfo.InvariantCulture, $"2O2Fr$t4X7Zf8NOew3H{i:D3}"), "Hanger", 1e3) with
        {
            Axes = MemberAxes.From(new Vector3(x, -0.2, 4.05), Vector3.UnitZ, Vector3.UnitX),
            Length = 8,
        });
        var record = FerryLanding.Record([.. posts, .. hangers]);

        var files = Unzipped(BcfFile.Write(record, version));

        var topic = Assert.Single(files.Keys.Select(n => n.Split('/')).Where(p => p.Length == 2).Select(p => p[0]).Distinct(StringComparer.Ordinal));
        Assert.Matches("^[0-9a-f]{8}-[0-9a-f]{4}-8[0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$", topic);      // RFC 9562: version 8, variant 10
        var view = Xml(files[topic + "/viewpoint.bcfv"]);
        var selected = view.Descendants("Selection").Elements("Component").Select(c => c.Attribute("IfcGuid")!.Value).ToList();
        Assert.Equal(40, selected.Count);
        Assert.Equal(posts.Select(m => m.GlobalId).Order(StringComparer.Ordinal), selected.Order(StringComparer.Ordinal));
        AssertStandsIn(record.Members, posts, view.Descendants("PerspectiveCamera").Single(), leastSide: 0, leastSeen: 0.6);
        Assert.All(view.Descendants("PerspectiveCamera").Elements("FieldOfView"), f => Assert.InRange(double.Parse(f.Value, CultureInfo.InvariantCulture), 45, 60));
        var folder = version == BcfVersion.Bcf21 ? "bcf-2.1" : "bcf-3.0";
        Assert.Empty(SchemaFiles.Faults(files[topic + "/viewpoint.bcfv"], folder, "visinfo.xsd"));
        Assert.Empty(SchemaFiles.Faults(files[topic + "/markup.bcf"], folder, "markup.xsd"));
    }

    [Fact]
    public void A_row_in_one_plane_is_seen_from_beside_it_within_a_room_of_three_metres()
    {
        var record = Posts(40);

        var camera = Xml(Unzipped(BcfFile.Write(record, BcfVersion.Bcf21)).Single(f => f.Key.EndsWith(".bcfv", StringComparison.Ordinal)).Value).Descendants("PerspectiveCamera").Single();

        AssertStandsIn(record.Members, record.Members, camera, leastSide: 3, leastSeen: 0.9);
        Assert.NotEqual(-3.2, Vector(camera.Element("CameraViewPoint")!).Y, 1.0);
    }

    [Fact]
    public void Where_the_model_leaves_room_all_members_of_a_topic_are_seen()
    {
        var stay = FerryLanding.Hanger("2O2Fr$t4X7Zf8NOew3FH00", "Stay", 1e3) with { Axes = MemberAxes.From(new Vector3(-30, -60, 0), new Vector3(0.6, 0.8, 0), Vector3.UnitZ), Length = 150 };
        var high = FerryLanding.Hanger("2O2Fr$t4X7Zf8NOew3FH01", "Stay", 1e3) with { Axes = MemberAxes.From(new Vector3(0, 0, 0), Vector3.UnitZ, Vector3.UnitX), Length = 40 };
        var posts = Posts(5).Members;
        var record = FerryLanding.Record([.. posts, stay, high]);

        var camera = Xml(Unzipped(BcfFile.Write(record, BcfVersion.Bcf30)).Single(f => f.Key.EndsWith(".bcfv", StringComparison.Ordinal)).Value).Descendants("PerspectiveCamera").Single();

        AssertStandsIn(record.Members, posts, camera, leastSide: 0, leastSeen: 1);
    }

    [Fact]
    public void A_single_upright_post_has_a_camera_that_is_not_inside_it()
    {
        var record = Posts(1);

        var camera = Xml(Unzipped(BcfFile.Write(record, BcfVersion.Bcf21)).Single(f => f.Key.EndsWith(".bcfv", StringComparison.Ordinal)).Value).Descendants("PerspectiveCamera").Single();

        AssertStandsIn(record.Members, record.Members, camera, leastSide: 3, leastSeen: 1);
        Assert.InRange((Vector(camera.Element("CameraViewPoint")!) - new Vector3(0, -3.2, 4.6)).Length, 1, 2.6);
    }

    [Theory]
    [MemberData(nameof(Versions))]
    public void Every_file_is_valid_by_its_schema(BcfVersion version)
    {
        var folder = version == BcfVersion.Bcf21 ? "bcf-2.1" : "bcf-3.0";
        foreach (var record in new[] { FerryLanding.Small(), Posts(3), FerryLanding.Record(), Hostile() })
            foreach (var (name, content) in Unzipped(BcfFile.Write(record, version)))
            {
                var schema = Path.GetExtension(name) switch { ".version" => "version.xsd", ".bcf" => "markup.xsd", ".bcfv" => "visinfo.xsd", ".xml" => "extensions.xsd", _ => null };
                if (schema is not null) Assert.Empty(SchemaFiles.Faults(content, folder, schema));
            }
    }

    [Fact]
    public void Labels_dates_due_and_assignees_are_left_to_people()
    {
        var markup = Xml(Unzipped(BcfFile.Write(Posts(2), BcfVersion.Bcf21)).Single(f => f.Key.EndsWith("markup.bcf", StringComparison.Ordinal)).Value);

        Assert.DoesNotContain(markup.Descendants(), e => e.Name.LocalName is "Labels" or "DueDate" or "AssignedTo" or "Priority");
    }

    [Fact]
    public void A_later_run_updates_a_topic_and_does_not_double_it()
    {
        var first = Names(BcfFile.Write(Posts(4), BcfVersion.Bcf30));
        var later = Names(BcfFile.Write(Posts(7) with { RunId = "0123456789abcdef" }, BcfVersion.Bcf30));

        Assert.Equal(first, later);

        static IEnumerable<string> Names(byte[] file) => Unzipped(file).Keys.Order(StringComparer.Ordinal);
    }

    [Theory]
    [MemberData(nameof(Versions))]
    public void The_same_record_gives_the_same_bytes(BcfVersion version) =>
        Assert.Equal(BcfFile.Write(FerryLanding.Small(), version), BcfFile.Write(FerryLanding.Small(), version));

    [Fact]
    public void Each_section_and_situation_has_a_topic_of_its_own()
    {
        var members = Posts(4).Members;
        members = members.SetItem(1, members[1] with { Governing = members[1].Governing! with { Section = "tube 60.3x2.9 mm" } });
        members = members.SetItem(2, members[2] with { Governing = members[2].Governing! with { Situation = "Wind" } });

        var topics = Topic.Of(FerryLanding.Record([.. members]));

        Assert.Equal(3, topics.Length);
        Assert.Equal(4, topics.Sum(t => t.Members.Length));
    }

    [Fact]
    public void Names_of_any_alphabet_come_back()
    {
        var record = Hostile();

        var markup = Xml(Unzipped(BcfFile.Write(record, BcfVersion.Bcf21)).Single(f => f.Key.EndsWith("markup.bcf", StringComparison.Ordinal)).Value);

        Assert.Contains("Geländer 橋の手すり O'Neill 🛟 C:\\landing <b>&", markup.Descendants("Description").Single().Value, StringComparison.Ordinal);
    }

    [Fact]
    public void A_malformed_GlobalId_is_told_and_not_selected()
    {
        var record = Posts(2);
        record = FerryLanding.Record(record.Members[0].As(globalId: "short"), record.Members[1]);

        var topic = Assert.Single(Topic.Of(record));

        Assert.Equal([record.Members[1].GlobalId], topic.Components);
        Assert.Contains("1 have a malformed GlobalId", topic.Description(record), StringComparison.Ordinal);
    }

    // Read by the rules of ISO/IEC 15948: chunk lengths, CRC by the table-free definition, and the pixels themselves.
    [Fact]
    public void The_picture_is_a_sound_PNG_that_shows_the_members_of_the_topic()
    {
        var record = Posts(3);
        var picture = Unzipped(BcfFile.Write(record, BcfVersion.Bcf30)).Single(f => f.Key.EndsWith(".png", StringComparison.Ordinal)).Value;

        Assert.Equal([0x89, 0x50, 0x4E, 0x47, 0x0D, 0x0A, 0x1A, 0x0A], picture[..8]);
        var chunks = new List<(string Type, byte[] Content)>();
        for (var at = 8; at < picture.Length;)
        {
            var length = BinaryPrimitives.ReadInt32BigEndian(picture.AsSpan(at));
            Assert.Equal(Crc(picture.AsSpan(at + 4, length + 4)), BinaryPrimitives.ReadUInt32BigEndian(picture.AsSpan(at + 8 + length)));
            chunks.Add((Encoding.ASCII.GetString(picture, at + 4, 4), picture.AsSpan(at + 8, length).ToArray()));
            at += 12 + length;
        }

        Assert.Equal(["IHDR", "IDAT", "IEND"], chunks.Select(c => c.Type));
        Assert.Equal((800, 600), (BinaryPrimitives.ReadInt32BigEndian(chunks[0].Content), BinaryPrimitives.ReadInt32BigEndian(chunks[0].Content.AsSpan(4))));
        using var pixels = new MemoryStream();
        new ZLibStream(new MemoryStream(chunks[1].Content), CompressionMode.Decompress).CopyTo(pixels);
        var bytes = pixels.ToArray();
        Assert.Equal(600 * (1 + 3 * 800), bytes.Length);
        var strong = Enumerable.Range(0, 600 * 800).Count(i => bytes.AsSpan(i / 800 * 2401 + 1 + 3 * (i % 800), 3).SequenceEqual(new byte[] { 158, 42, 110 }));
        Assert.InRange(strong, 1000, 60_000);
    }

    private static uint Crc(ReadOnlySpan<byte> bytes)
    {
        var crc = uint.MaxValue;
        foreach (var unit in bytes)
        {
            crc ^= unit;
            for (var k = 0; k < 8; k++) crc = (crc & 1) != 0 ? 0xEDB88320 ^ crc >> 1 : crc >> 1;
        }

        return ~crc;
    }

    // Metres in project coordinates: the camera stands within the box around the axes of all candidates (thin sides widened to the least one about their middle), looks
    // at the middle of the topic's box, has all its ends before it, and sees the share of them by its angle.
    private static void AssertStandsIn(IEnumerable<MemberResult> model, IEnumerable<MemberResult> topic, XElement camera, double leastSide, double leastSeen)
    {
        var (position, direction, up) = (Vector(camera.Element("CameraViewPoint")!), Vector(camera.Element("CameraDirection")!), Vector(camera.Element("CameraUpVector")!));
        Assert.Equal(1, direction.Length, 1e-12);
        Assert.Equal(1, up.Length, 1e-12);
        Assert.Equal(0, direction.Dot(up), 1e-12);
        var all = Ends(model).ToList();
        Assert.All(new Func<Vector3, double>[] { v => v.X, v => v.Y, v => v.Z }, of =>
        {
            var (least, most) = (all.Min(of), all.Max(of));
            var widened = Math.Max(0, leastSide - (most - least)) / 2;
            Assert.InRange(of(position), least - widened, most + widened);
        });
        var ends = Ends(topic).ToList();
        var middle = 0.5 * new Vector3(ends.Min(e => e.X) + ends.Max(e => e.X), ends.Min(e => e.Y) + ends.Max(e => e.Y), ends.Min(e => e.Z) + ends.Max(e => e.Z));
        Assert.Equal(0, (middle - position).Cross(direction).Length, 1e-9);
        Assert.All(ends, end => Assert.True((end - position).Dot(direction) >= 0));
        var seen = ends.Count(end => (end - position) is var to && to.Dot(direction) > 0 && Math.Abs(to.Dot(up)) <= to.Dot(direction) * Math.Tan(Math.PI / 6)
            && Math.Abs(to.Dot(direction.Cross(up))) <= to.Dot(direction) * Math.Tan(Math.PI / 6) * 4 / 3);
        Assert.InRange(seen, leastSeen * ends.Count, ends.Count);
    }

    private static IEnumerable<Vector3> Ends(IEnumerable<MemberResult> members) => members.SelectMany(m => new[] { m.Axes!.Origin, m.Axes.Origin + m.Length!.Value * m.Axes.X });

    private static Vector3 Vector(XElement e) => new(Number(e, "X"), Number(e, "Y"), Number(e, "Z"));

    private static double Number(XElement e, string name) => double.Parse(e.Element(name)!.Value, CultureInfo.InvariantCulture);

    private static ScreeningRecord Posts(int count) => FerryLanding.Record([.. Enumerable.Range(0, count).Select(i =>
        FerryLanding.Rail(string.Create(CultureInfo.InvariantCulture, $"2O2Fr$t4X7Zf8NOew3{i:D4}"), "Gangway post", 1.32e3) with
        {
            Axes = MemberAxes.From(new Vector3(1.5 * i, -3.2, 4.05), Vector3.UnitZ, Vector3.UnitX),
            Length = 1.1,
        })]);

    private static ScreeningRecord Hostile() => FerryLanding.Record(FerryLanding.Rail("2O2Fr$t4X7Zf8NOew3FL01", "Geländer 橋の手すり O'Neill 🛟 C:\\landing <b>& \u0001\uD800", 1.32e3) with { Axes = null });

    private static Dictionary<string, byte[]> Unzipped(byte[] file)
    {
        using var zip = new ZipArchive(new MemoryStream(file));
        return zip.Entries.ToDictionary(e => e.FullName, e =>
        {
            using var content = new MemoryStream();
            using var stream = e.Open();
            stream.CopyTo(content);
            return content.ToArray();
        });
    }

    private static XElement Xml(byte[] content) => XDocument.Load(new MemoryStream(content)).Root!;
}
