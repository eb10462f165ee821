using System.Globalization;
using System.Text;
using System.Xml;
using MemberScan.Model.Verdicts;
using MemberScan.Reporting.Display;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Requests;

/// <summary>The information request as an Information Delivery Specification (IDS 1.0): what it can express of what was missing, for exactly the members that lack it.</summary>
/// <remarks>
/// A missing strength becomes a demand for a material. The format knows neither profiles nor bodies nor forces, and a demand for a text that the reader of the
/// next model does not take would be an empty promise: such gaps are told in the description and stand in the list.
/// </remarks>
public static class RequestIds
{
    private const string Namespace = "http://standards.buildingsmart.org/IDS", SchemaNamespace = "http://www.w3.org/2001/XMLSchema", InstanceNamespace = "http://www.w3.org/2001/XMLSchema-instance";

    private static readonly ReasonCode[] s_material = [ReasonCode.NoStrength, ReasonCode.StrengthImplausible];

    /// <summary>The file; null when nothing that was missing can be expressed, since the format demands a specification.</summary>
    public static byte[]? Write(ScreeningRecord record)
    {
        var groups = RequestLine.Of(record).GroupBy(l => l.Reason.Code).ToList();
        if (!groups.Exists(g => IsExpressible(g.Key))) return null;

        using var stream = new MemoryStream();
        using (var xml = XmlWriter.Create(stream, new XmlWriterSettings { Encoding = new UTF8Encoding(false), Indent = true, NewLineChars = "\n" }))
        {
            xml.WriteStartElement("ids", "ids", Namespace);
            xml.WriteAttributeString("xmlns", "xs", null, SchemaNamespace);
            xml.WriteAttributeString("xmlns", "xsi", null, InstanceNamespace);
            xml.WriteAttributeString("schemaLocation", InstanceNamespace, Namespace + " http://standards.buildingsmart.org/IDS/1.0/ids.xsd");
            Info(xml, record, [.. groups.Select(g => (g.Key, g.Count()))]);
            Start(xml, "specifications");
            foreach (var group in groups.Where(g => IsExpressible(g.Key))) Specification(xml, record, group.Key, [.. group.Select(l => l.Member)]);
            xml.WriteEndElement();
            xml.WriteEndElement();
        }

        return stream.ToArray();
    }

    private static bool IsExpressible(ReasonCode code) => s_material.Contains(code);

    private static void Info(XmlWriter xml, ScreeningRecord record, List<(ReasonCode Code, int Count)> groups)
    {
        Start(xml, "info");
        Element(xml, "title", ForeignText.Name($"Information request: {record.Model.FileName}"));
        Element(xml, "version", ForeignText.Name(record.RunId));
        var others = groups.Where(g => !IsExpressible(g.Code)).Select(g => string.Create(CultureInfo.InvariantCulture, $"{g.Code.Text()}: {g.Count}"));
        Element(xml, "description", "What members lack before their stresses can be checked. Not expressible here, see the list: " + (string.Join(", ", others) is { Length: > 0 } text ? text : "none") + ".");
        if (DateTimeOffset.TryParse(record.Timestamp, CultureInfo.InvariantCulture, DateTimeStyles.AssumeUniversal, out var time))
            Element(xml, "date", time.UtcDateTime.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture));
        Element(xml, "purpose", "Stress screening of members");
        xml.WriteEndElement();
    }

    private static void Specification(XmlWriter xml, ScreeningRecord record, ReasonCode code, List<MemberResult> members)
    {
        Start(xml, "specification");
        xml.WriteAttributeString("name", string.Create(CultureInfo.InvariantCulture, $"{code.Text()}: {members.Count}"));
        xml.WriteAttributeString("ifcVersion", record.Model.ReadAs switch { "IFC2X3" => "IFC2X3", "IFC4" => "IFC4", _ => "IFC4X3_ADD2" });
        xml.WriteAttributeString("identifier", code.Text());
        xml.WriteAttributeString("instructions", code.Request());
        Start(xml, "applicability");
        xml.WriteAttributeString("minOccurs", "0");
        xml.WriteAttributeString("maxOccurs", "unbounded");
        Start(xml, "entity");
        Start(xml, "name");
        Choice(xml, members.Select(m => m.Class.ToUpperInvariant()));
        xml.WriteEndElement();
        xml.WriteEndElement();
        Start(xml, "attribute");
        Start(xml, "name");
        Element(xml, "simpleValue", "GlobalId");
        xml.WriteEndElement();
        Start(xml, "value");
        Choice(xml, members.Select(m => ForeignText.Name(m.GlobalId)));
        xml.WriteEndElement();
        xml.WriteEndElement();
        xml.WriteEndElement();
        Start(xml, "requirements");
        Material(xml);
        xml.WriteEndElement();
        xml.WriteEndElement();
    }

    private static void Material(XmlWriter xml)
    {
        Start(xml, "material");
        xml.WriteAttributeString("cardinality", "required");
        xml.WriteAttributeString("instructions", "Name a known grade, or give the yield strength in the material's properties.");
        xml.WriteEndElement();
    }

    private static void Choice(XmlWriter xml, IEnumerable<string> values)
    {
        xml.WriteStartElement("xs", "restriction", SchemaNamespace);
        xml.WriteAttributeString("base", "xs:string");
        foreach (var value in values.Distinct(StringComparer.Ordinal).Order(StringComparer.Ordinal))
        {
            xml.WriteStartElement("xs", "enumeration", SchemaNamespace);
            xml.WriteAttributeString("value", value);
            xml.WriteEndElement();
        }

        xml.WriteEndElement();
    }

    private static void Start(XmlWriter xml, string name) => xml.WriteStartElement("ids", name, Namespace);

    private static void Element(XmlWriter xml, string name, string value) => xml.WriteElementString("ids", name, Namespace, value);
}
