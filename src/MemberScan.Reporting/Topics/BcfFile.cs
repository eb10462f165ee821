using System.IO.Compression;
using System.Text;
using MemberScan.Reporting.Pictures;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Topics;

/// <summary>The overstressed members as topics in the BIM Collaboration Format: one topic per cause, with camera and picture.</summary>
/// <remarks>The same record gives the same bytes. Labels, due date and assignee are left to people.</remarks>
public static class BcfFile
{
    /// <summary>Time of the entries: the earliest that a zip file knows; the run's own stands in the topics.</summary>
    private static readonly DateTimeOffset s_entryTime = new(1980, 1, 1, 0, 0, 0, TimeSpan.Zero);

    /// <summary>The zip file.</summary>
    /// <param name="record">The finished screening.</param>
    /// <param name="version">Release of the format.</param>
    /// <exception cref="ArgumentException">The record contradicts itself: see <see cref="SoundRecord"/>.</exception>
    public static byte[] Write(ScreeningRecord record, BcfVersion version)
    {
        SoundRecord.ThrowUnlessSound(record);
        using var file = new MemoryStream();
        using (var zip = new ZipArchive(file, ZipArchiveMode.Create, leaveOpen: true, Encoding.UTF8))
        {
            Add(zip, "bcf.version", BcfXml.Version(version));
            if (version == BcfVersion.Bcf30) Add(zip, "extensions.xml", BcfXml.Extensions());
            var topics = Topic.Of(record);
            for (var i = 0; i < topics.Length; i++) Add(zip, record, topics[i], i, version);
        }

        return file.ToArray();
    }

    private static void Add(ZipArchive zip, ScreeningRecord record, Topic topic, int index, BcfVersion version)
    {
        string[] cause = [record.Model.ProjectName, topic.Role, topic.Section, topic.Criterion, topic.Situation];
        var ids = (Topic: TopicIds.Of(["topic", .. cause]), Viewpoint: TopicIds.Of(["viewpoint", record.RunId, .. cause]));
        var box = Box.Around(topic.Members) ?? Box.Around(record.Members);
        Add(zip, ids.Topic + "/markup.bcf", BcfXml.Markup(record, topic, ids, index, version, hasPicture: box is not null));
        if (box is null) return;

        var camera = Camera.On(box, Box.Around(record.Members)!.AsRoom());
        Add(zip, ids.Topic + "/viewpoint.bcfv", BcfXml.Viewpoint(topic, ids.Viewpoint, camera, version));
        Add(zip, ids.Topic + "/snapshot.png", Snapshot.Draw(camera, box, topic.Members, record.Members));
    }

    private static void Add(ZipArchive zip, string name, byte[] content)
    {
        var entry = zip.CreateEntry(name, CompressionLevel.Optimal);
        entry.LastWriteTime = s_entryTime;
        using var stream = entry.Open();
        stream.Write(content);
    }
}
