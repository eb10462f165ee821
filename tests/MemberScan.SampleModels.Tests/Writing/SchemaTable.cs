using System.Text.Json;
using System.Text.RegularExpressions;

namespace MemberScan.SampleModels.Tests.Writing;

/// <summary>The attribute tables of the three schemas, derived from the published EXPRESS files; the check of written files against them.</summary>
internal sealed partial class SchemaTable
{
    private static readonly Lazy<JsonDocument?> s_tables = new(() =>
        RepositoryFolder.Reference("ifc", "attributes.json") is { } path ? JsonDocument.Parse(File.ReadAllBytes(path)) : null);

    private readonly JsonElement _schema;
    private readonly Dictionary<string, JsonElement> _entities;

    private SchemaTable(JsonElement schema)
    {
        _schema = schema;
        _entities = schema.GetProperty("entities").EnumerateObject().ToDictionary(e => e.Name.ToUpperInvariant(), e => e.Value);
    }

    /// <summary>The tables of a schema; skips the running test, saying so, where they are absent.</summary>
    public static SchemaTable Of(string schema)
    {
        Assert.SkipWhen(s_tables.Value is null, "the attribute tables (shared/ifc/attributes.json) are absent");
        return new SchemaTable(s_tables.Value!.RootElement.GetProperty(schema));
    }

    /// <summary>Everything in a file that breaks the tables: counts, optional and derived slots, kinds of values, classes of references.</summary>
    public List<string> Faults(WrittenFile file)
    {
        var faults = new List<string>();
        foreach (var (id, (keyword, parameters)) in file.Instances)
        {
            if (!_entities.TryGetValue(keyword, out var entity))
            {
                faults.Add($"#{id} {keyword}: not in the schema");
                continue;
            }

            if (entity.GetProperty("abstract").GetBoolean()) faults.Add($"#{id} {keyword}: abstract");
            var attributes = entity.GetProperty("attributes").EnumerateArray().ToArray();
            if (attributes.Length != parameters.Length) faults.Add($"#{id} {keyword}: {parameters.Length} parameters, not {attributes.Length}");
            foreach (var (attribute, parameter) in attributes.Zip(parameters))
            {
                if (Fault(file, attribute, parameter) is { } fault)
                    faults.Add($"#{id} {keyword}.{attribute.GetProperty("name").GetString()} = {parameter}: {fault}");
            }
        }

        return faults;
    }

    private string? Fault(WrittenFile file, JsonElement attribute, string parameter)
    {
        if (attribute.GetProperty("derived").GetBoolean() != (parameter == "*")) return "derived slots and no others are *";
        if (parameter == "*") return null;
        if (parameter == "$") return attribute.GetProperty("optional").GetBoolean() ? null : "mandatory";
        return Fault(file, attribute.GetProperty("type").GetString()!, parameter);
    }

    private string? Fault(WrittenFile file, string type, string value)
    {
        if (Aggregate().Match(type) is { Success: true } aggregate)
        {
            if (!value.StartsWith('(')) return "a list is needed";

            var items = WrittenFile.List(value);
            var (least, most) = (int.Parse(aggregate.Groups[1].ValueSpan, null), aggregate.Groups[2].Value);
            if (items.Length < least || (most != "?" && items.Length > int.Parse(most, null))) return $"{items.Length} items";
            return items.Select(item => Fault(file, aggregate.Groups[3].Value, item)).FirstOrDefault(f => f is not null);
        }

        if (_entities.ContainsKey(type.ToUpperInvariant())) return value.StartsWith('#') ? ReferenceFault(file, type, value) : "a reference is needed";
        if (_schema.GetProperty("enumerations").TryGetProperty(type, out var literals))
            return literals.EnumerateArray().Any(l => value == $".{l.GetString()}.") ? null : "no such literal";
        if (_schema.GetProperty("selects").TryGetProperty(type, out var choices))
            return choices.EnumerateArray().Any(c => SelectFault(file, c.GetString()!, value) is null) ? null : "in none of the choices";
        if (_schema.GetProperty("definedTypes").TryGetProperty(type, out var defined)) return Fault(file, defined.GetString()!, value);

        return type.Split('(')[0].Split(' ')[0] switch
        {
            "REAL" => RealToken().IsMatch(value) ? null : "a REAL is needed",
            "NUMBER" => RealToken().IsMatch(value) || IntegerToken().IsMatch(value) ? null : "a NUMBER is needed",
            "INTEGER" => IntegerToken().IsMatch(value) ? null : "an INTEGER is needed",
            "STRING" => value.StartsWith('\'') && value.EndsWith('\'') ? null : "a STRING is needed",
            "BOOLEAN" => value is ".T." or ".F." ? null : "a BOOLEAN is needed",
            "LOGICAL" => value is ".T." or ".F." or ".U." ? null : "a LOGICAL is needed",
            _ => $"type {type} is not understood",
        };
    }

    private string? SelectFault(WrittenFile file, string choice, string value)
    {
        if (_schema.GetProperty("selects").TryGetProperty(choice, out _)) return Fault(file, choice, value);
        if (_entities.ContainsKey(choice.ToUpperInvariant())) return value.StartsWith('#') ? ReferenceFault(file, choice, value) : "not a reference";
        return value.StartsWith(choice.ToUpperInvariant() + "(", StringComparison.Ordinal) ? Fault(file, choice, value[(choice.Length + 1)..^1]) : "another type";
    }

    private string? ReferenceFault(WrittenFile file, string type, string value)
    {
        if (!file.Instances.TryGetValue(WrittenFile.Id(value), out var target)) return "refers to nothing";

        var wanted = type.ToUpperInvariant();
        for (var name = target.Keyword; name is not null && _entities.TryGetValue(name, out var entity); name = entity.GetProperty("supertype").GetString()?.ToUpperInvariant())
            if (name == wanted) return null;
        return $"refers to {target.Keyword}, not {type}";
    }

    [GeneratedRegex(@"^(?:LIST|SET|ARRAY|BAG) \[(\d+):(\d+|\?)\] OF (?:UNIQUE )?(.+)$")]
    private static partial Regex Aggregate();

    [GeneratedRegex(@"^-?\d+\.\d*(E[+-]?\d+)?$")]
    private static partial Regex RealToken();

    [GeneratedRegex(@"^-?\d+$")]
    private static partial Regex IntegerToken();
}
