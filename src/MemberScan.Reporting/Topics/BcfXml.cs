using System.Globalization;
using System.Text;
using System.Xml;
using MemberScan.Foundation.Geometry;
using MemberScan.Reporting.Display;
using MemberScan.Reporting.Pictures;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Topics;

/// <summary>The XML files of the format; the order of elements is the one of its schemas.</summary>
internal static class BcfXml
{
    private const string Author = "MemberScan", TopicType = "Issue", TopicStatus = "Open";

    /// <summary>Colour of the components: alpha, red, green, blue.</summary>
    private const string Colour = "FF9E2A6E";

    private const string NoTime = "1970-01-01T00:00:00Z";

    public static byte[] Version(BcfVersion version) => Document(xml =>
    {
        xml.WriteStartElement("Version");
        xml.WriteAttributeString("VersionId", version == BcfVersion.Bcf21 ? "2.1" : "3.0");
        if (version == BcfVersion.Bcf21) xml.WriteElementString("DetailedVersion", "2.1");
        xml.WriteEndElement();
    });

    public static byte[] Extensions() => Document(xml =>
    {
        xml.WriteStartElement("Extensions");
        Within(xml, "TopicTypes", () => xml.WriteElementString("TopicType", TopicType));
        Within(xml, "TopicStatuses", () => xml.WriteElementString("TopicStatus", TopicStatus));
        xml.WriteEndElement();
    });

    public static byte[] Markup(ScreeningRecord record, Topic topic, (string Topic, string Viewpoint) ids, int index, BcfVersion version, bool hasPicture) => Document(xml =>
    {
        xml.WriteStartElement("Markup");
        Within(xml, "Header", () =>
        {
            if (version == BcfVersion.Bcf30) xml.WriteStartElement("Files");
            xml.WriteStartElement("File");
            xml.WriteAttributeString(version == BcfVersion.Bcf30 ? "IsExternal" : "isExternal", "true");
            xml.WriteElementString("Filename", Filled(record.Model.FileName));
            xml.WriteEndElement();
            if (version == BcfVersion.Bcf30) xml.WriteEndElement();
        });
        xml.WriteStartElement("Topic");
        xml.WriteAttributeString("Guid", ids.Topic);
        xml.WriteAttributeString("TopicType", TopicType);
        xml.WriteAttributeString("TopicStatus", TopicStatus);
        xml.WriteElementString("Title", topic.Title);
        if (version == BcfVersion.Bcf21) xml.WriteElementString("Index", index.ToString(CultureInfo.InvariantCulture));
        xml.WriteElementString("CreationDate", Time(record.Timestamp));
        xml.WriteElementString("CreationAuthor", Author);
        xml.WriteElementString("Description", topic.Description(record));
        if (version == BcfVersion.Bcf30 && hasPicture) Within(xml, "Viewpoints", () => ViewpointEntry(xml, "ViewPoint", ids.Viewpoint));
        xml.WriteEndElement();
        if (version == BcfVersion.Bcf21 && hasPicture) ViewpointEntry(xml, "Viewpoints", ids.Viewpoint);
        xml.WriteEndElement();
    });

    public static byte[] Viewpoint(Topic topic, string id, Camera camera, BcfVersion version) => Document(xml =>
    {
        xml.WriteStartElement("VisualizationInfo");
        xml.WriteAttributeString("Guid", id);
        var components = topic.Components.ToList();
        Within(xml, "Components", () =>
        {
            if (components.Count > 0) Within(xml, "Selection", () => Components(xml, components));
            xml.WriteStartElement("Visibility");
            xml.WriteAttributeString("DefaultVisibility", "true");
            xml.WriteEndElement();
            if (components.Count == 0) return;

            xml.WriteStartElement("Coloring");
            xml.WriteStartElement("Color");
            xml.WriteAttributeString("Color", Colour);
            if (version == BcfVersion.Bcf30) Within(xml, "Components", () => Components(xml, components));
            else Components(xml, components);
            xml.WriteEndElement();
            xml.WriteEndElement();
        });
        Within(xml, "PerspectiveCamera", () =>
        {
            Vector(xml, "CameraViewPoint", camera.Position);
            Vector(xml, "CameraDirection", camera.Direction);
            Vector(xml, "CameraUpVector", camera.Up);
            xml.WriteElementString("FieldOfView", XmlConvert.ToString(Camera.FieldOfViewDegrees));
            if (version == BcfVersion.Bcf30) xml.WriteElementString("AspectRatio", XmlConvert.ToString(Camera.AspectRatio));
        });
        xml.WriteEndElement();
    });

    private static void ViewpointEntry(XmlWriter xml, string element, string id)
    {
        xml.WriteStartElement(element);
        xml.WriteAttributeString("Guid", id);
        xml.WriteElementString("Viewpoint", "viewpoint.bcfv");
        xml.WriteElementString("Snapshot", "snapshot.png");
        xml.WriteElementString("Index", "0");
        xml.WriteEndElement();
    }

    private static void Components(XmlWriter xml, List<string> components)
    {
        foreach (var component in components)
        {
            xml.WriteStartElement("Component");
            xml.WriteAttributeString("IfcGuid", component);
            xml.WriteEndElement();
        }
    }

    private static void Vector(XmlWriter xml, string element, Vector3 v) => Within(xml, element, () =>
    {
        xml.WriteElementString("X", XmlConvert.ToString(v.X));
        xml.WriteElementString("Y", XmlConvert.ToString(v.Y));
        xml.WriteElementString("Z", XmlConvert.ToString(v.Z));
    });

    private static void Within(XmlWriter xml, string element, Action content)
    {
        xml.WriteStartElement(element);
        content();
        xml.WriteEndElement();
    }

    private static string Filled(string text) => ForeignText.Name(text) is { Length: > 0 } name ? name : "model";

    private static string Time(string text) => DateTimeOffset.TryParse(text, CultureInfo.InvariantCulture, DateTimeStyles.AssumeUniversal, out var time)
        ? time.UtcDateTime.ToString("yyyy-MM-dd'T'HH:mm:ss'Z'", CultureInfo.InvariantCulture)
        : NoTime;

    private static byte[] Document(Action<XmlWriter> content)
    {
        using var stream = new MemoryStream();
        using (var xml = XmlWriter.Create(stream, new XmlWriterSettings { Encoding = new UTF8Encoding(false), Indent = true, NewLineChars = "\n" })) content(xml);
        return stream.ToArray();
    }
}
