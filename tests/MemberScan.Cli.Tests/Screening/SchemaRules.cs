using System.Text.Json;
using System.Text.RegularExpressions;
using MemberScan.Part21;

namespace MemberScan.Cli.Tests.Screening;

/// <summary>The published attribute tables of a schema: what an instance of each class must look like.</summary>
internal sealed partial class SchemaRules
{
    private readonly JsonElement _schema;
    private readonly Dictionary<string, JsonProperty> _entities;

    private SchemaRules(JsonElement schema)
    {
        _schema = schema;
        _entities = schema.GetProperty("entities").EnumerateObject().ToDictionary(e => e.Name.ToUpperInvariant());
    }

    /// <summary>The tables of a schema; skips, saying so, where the file is absent.</summary>
    public static SchemaRules Of(string schema)
    {
        for (var folder = new DirectoryInfo(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
            if (Path.Combine(folder.FullName, "shared", "ifc", "attributes.json") is var path && File.Exists(path))
                return new SchemaRules(JsonDocument.Parse(File.ReadAllBytes(path)).RootElement.GetProperty(schema == "IFC4X3" ? "IFC4X3_ADD2" : schema));
        Assert.Skip("the attribute tables (shared/ifc/attributes.json) are absent");
        return null!;
    }

    /// <summary>What is wrong with an instance: number of arguments, presence, type of each.</summary>
    public IEnumerable<string> Faults(Part21File file, Part21Record record)
    {
        if (!_entities.TryGetValue(record.Keyword, out var entity)) return [$"{record.Keyword} is no class of the schema"];

        var attributes = entity.Value.GetProperty("attributes").EnumerateArray().ToArray();
        var arguments = record.Arguments();
        if (attributes.Length != arguments.Count) return [$"{record.Keyword} has {arguments.Count} arguments, not {attributes.Length}"];
        return attributes.Zip(arguments).Where(pair => !Fits(file, pair.First, pair.Second))
            .Select(pair => $"#{record.Id} {record.Keyword}.{pair.First.GetProperty("name")} is no {pair.First.GetProperty("type")}: {System.Text.Encoding.Latin1.GetString(pair.Second.Text)}");
    }

    private bool Fits(Part21File file, JsonElement attribute, Part21Value value)
    {
        if (attribute.GetProperty("derived").GetBoolean()) return value.Kind == Part21ValueKind.Derived;
        return value.Kind == Part21ValueKind.Unset ? attribute.GetProperty("optional").GetBoolean() : Fits(file, attribute.GetProperty("type").GetString()!, value);
    }

    private bool Fits(Part21File file, string type, Part21Value value)
    {
        if (Aggregate().Match(type) is { Success: true } aggregate)
            return value.Kind == Part21ValueKind.List && value.ItemCount >= int.Parse(aggregate.Groups[1].Value, System.Globalization.CultureInfo.InvariantCulture)
                && value.Items.All(i => Fits(file, aggregate.Groups[2].Value, i));
        if (_schema.GetProperty("enumerations").TryGetProperty(type, out var literals))
            return value.TryEnumeration(out var literal) && literals.EnumerateArray().Any(l => l.GetString() == literal);
        if (_schema.GetProperty("definedTypes").TryGetProperty(type, out var underlying)) return FitsSimple(underlying.GetString()!, value);
        if (_schema.GetProperty("selects").TryGetProperty(type, out var choices))
            return value.Kind == Part21ValueKind.Typed ? IsMember(type, value.TypeName, value.Inner) : choices.EnumerateArray().Any(c => Fits(file, c.GetString()!, value));
        return value.TryReference(out var id) && file.TryFind(id, out var target) && IsA(target.Keyword, type);
    }

    // A typed value must be one of the select's types, at any depth of selects, and fit that type.
    private bool IsMember(string select, string typeName, Part21Value inner) => _schema.GetProperty("selects").GetProperty(select).EnumerateArray().Select(c => c.GetString()!).Any(choice =>
        _schema.GetProperty("selects").TryGetProperty(choice, out _) ? IsMember(choice, typeName, inner)
        : _schema.GetProperty("definedTypes").TryGetProperty(choice, out var underlying) && choice.Equals(typeName, StringComparison.OrdinalIgnoreCase) && FitsSimple(underlying.GetString()!, inner));

    private bool FitsSimple(string underlying, Part21Value value)
    {
        if (_schema.GetProperty("definedTypes").TryGetProperty(underlying, out var further)) return FitsSimple(further.GetString()!, value);
        if (underlying == "REAL" || underlying == "NUMBER") return value.Kind == Part21ValueKind.Real;
        if (underlying == "INTEGER") return value.Kind == Part21ValueKind.Integer;
        var length = Length().Match(underlying);
        return length.Success && value.TryText(out var text) && (!length.Groups[1].Success || text.Length <= int.Parse(length.Groups[1].Value, System.Globalization.CultureInfo.InvariantCulture));
    }

    private bool IsA(string keyword, string type)
    {
        for (string? name = keyword; name is not null && _entities.TryGetValue(name.ToUpperInvariant(), out var entity); name = entity.Value.GetProperty("supertype").GetString())
            if (name.Equals(type, StringComparison.OrdinalIgnoreCase)) return true;
        return false;
    }

    [GeneratedRegex(@"^(?:SET|LIST) \[(\d+):[^\]]*\] OF (?:UNIQUE )?(.*)$")]
    private static partial Regex Aggregate();

    [GeneratedRegex(@"^STRING(?:\((\d+)\))?")]
    private static partial Regex Length();
}
