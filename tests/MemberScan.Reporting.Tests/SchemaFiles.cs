using System.Xml;
using System.Xml.Schema;

namespace MemberScan.Reporting.Tests;

/// <summary>The published XSD files of BCF and IDS, in a folder beside the project; never copied into it.</summary>
internal static class SchemaFiles
{
    /// <summary>Validates a document and gives what the schemas object to; skips, saying so, where the folder is absent.</summary>
    public static List<string> Faults(byte[] document, string folder, params string[] schemas)
    {
        var set = new XmlSchemaSet { XmlResolver = new XmlUrlResolver() };
        var faults = new List<string>();
        set.ValidationEventHandler += (_, e) =>
        {
            if (e.Severity == XmlSeverityType.Error) faults.Add(e.Message);
        };
        foreach (var schema in schemas) set.Add(null, Path.Combine(Folder(), folder, schema));
        var settings = new XmlReaderSettings { ValidationType = ValidationType.Schema, Schemas = set };
        settings.ValidationEventHandler += (_, e) => faults.Add(e.Message);
        using var reader = XmlReader.Create(new MemoryStream(document), settings);
        while (reader.Read()) { }
        return faults;
    }

    private static string Folder()
    {
        for (var folder = new DirectoryInfo(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
            if (Path.Combine(folder.FullName, "shared", "ifc", "schemas") is var path && Directory.Exists(path)) return path;
        Assert.Skip("the schema files (shared/ifc/schemas) are absent");
        return "";
    }
}
