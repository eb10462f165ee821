using System.Text.Json;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Units;
using MemberScan.Inputs.Materials;
using MemberScan.Inputs.Presets;
using MemberScan.Inputs.SettingsFiles;
using MemberScan.Inputs.SettingsFiles.Forces;
using MemberScan.Inputs.SettingsFiles.Limits;
using MemberScan.Model.Limits.Keys;

namespace MemberScan.Inputs.Tests.SettingsFiles;

public sealed class SettingsSchemaTests
{
    private static readonly JsonDocumentOptions s_lenient = new() { CommentHandling = JsonCommentHandling.Skip, AllowTrailingCommas = true };
    private readonly JsonElement _schema = JsonDocument.Parse(ShippedFiles.Read(ShippedFiles.SettingsSchema)).RootElement;

    [Fact]
    public void The_schema_has_the_keys_that_the_reader_knows()
    {
        Assert.Equal(SettingKeys.Root, Keys());
        Assert.Equal(SettingKeys.Basis, Keys("basis"));
        Assert.Equal(SettingKeys.Service, Keys("basis", "service"));
        Assert.Equal(SettingKeys.Design, Keys("basis", "design"));
        Assert.Equal(SettingKeys.Candidates, Keys("candidates"));
        Assert.Equal(SettingKeys.Sections, Keys("sections"));
        Assert.Equal(SettingKeys.RoleEntry, Keys("roles"));
        Assert.Equal(SettingKeys.Forces, Keys("forces"));
        Assert.Equal(SettingKeys.KindEntry, Keys("forces", "kinds"));
        Assert.Equal(ForceKeys.Combination, Keys("forces", "combinations"));
        Assert.Equal(ForceKeys.Tag, Keys("forces", "caseTags"));
        Assert.Equal(ForceKeys.PropertySet, Keys("forces", "propertySets"));
        Assert.Equal(ForceKeys.Components.Words, Keys("forces", "propertySets", "components"));
        Assert.Equal(ForceKeys.Station, Keys("forces", "propertySets", "station"));
        Assert.Equal(ForceKeys.Component, _schema.GetProperty("$defs").GetProperty("forceProperty").GetProperty("properties").EnumerateObject().Select(key => key.Name));
        Assert.Equal(LoadRulesReader.Keys, Keys("loads"));
        Assert.Equal(SettingKeys.UnitTypes, Keys("units"));
        Assert.Equal(SettingKeys.Materials, Keys("materials"));
        Assert.Equal(GradeReader.Keys, Keys("materials", "grades"));
        Assert.Equal(GradeReader.YieldKeys, Keys("materials", "grades", "yields"));
        Assert.Equal(SettingKeys.Stability, Keys("stability"));
        Assert.Equal(LimitKeys.Brittle, Keys("basis", "brittle"));
        Assert.Equal(LimitKeys.Checks, Keys("checks"));
        Assert.Equal(LimitKeys.Threads, Keys("threads"));
        Assert.Equal(LimitKeys.Rule, Keys("rules"));
        Assert.Equal(LimitKeys.When, Keys("rules", "when"));
        Assert.Equal(LimitKeys.Set, Keys("rules", "set"));
        Assert.Equal(LimitKeys.Weld, Definition("weld").GetProperty("properties").EnumerateObject().Select(key => key.Name));
        Assert.Equal(LimitKeys.Deflection, Definition("deflection").GetProperty("properties").EnumerateObject().Select(key => key.Name));
    }

    [Fact]
    public void The_schema_has_the_words_that_the_reader_knows()
    {
        Assert.Equal(SettingKeys.ServiceCriteria.Words, Words("basis", "service", "criterion"));
        Assert.Equal(SettingKeys.DesignCriteria.Words, Words("basis", "design", "criterion"));
        Assert.Equal(LimitKeys.Walls.Words, Words("basis", "wall"));
        Assert.Equal(SettingKeys.Kinds.Words, Words("basis", "brittle", "situations"));
        Assert.Equal(CheckKeys.All, At("checks", "off").GetProperty("items").GetProperty("enum").EnumerateArray().Select(word => word.GetString()!));
        Assert.Equal(LimitKeys.Ends.Words, Words("stability", "ends"));
        Assert.Equal(LimitKeys.Forming.Words, Words("stability", "hollowForming"));
        Assert.Equal(LimitKeys.ThreadRules.Words, Words("threads", "rule"));
        Assert.Equal(LimitKeys.Areas.Words, Words("threads", "area"));
        Assert.Equal(SettingKeys.Conventions.Words, Words("forces", "convention"));
        Assert.Equal(SettingKeys.Components.Words, Words("forces", "components"));
        Assert.Equal(SettingKeys.MissingComponents.Words, Words("forces", "missingComponents"));
        Assert.Equal(SettingKeys.UnknownMembers.Words, Words("forces", "unknownMembers"));
        Assert.Equal(SettingKeys.Kinds.Words, Words("forces", "kinds", "kind"));
        Assert.Equal(ForceKeys.TorsionAxes.Words, Words("forces", "torsion"));
        Assert.Equal(ForceKeys.MissingCoefficients.Words, Words("forces", "missingCoefficients"));
        Assert.Equal(ForceKeys.CaseCoefficientWords.Words, Words("forces", "caseCoefficients"));
        Assert.Equal(ForceKeys.Tags.Words, Words("forces", "caseTags", "tag"));
        Assert.Equal(ForceKeys.Sets.Words, At("forces", "combinationSets").GetProperty("items").GetProperty("enum").EnumerateArray().Select(word => word.GetString()!));
        Assert.Equal(SettingKeys.Kinds.Words, Words("forces", "combinations", "kind"));
        Assert.Equal(SettingKeys.Kinds.Words, Words("forces", "propertySets", "kind"));
        Assert.Equal(ForceKeys.SituationWords.Words.Order(), Words("forces", "propertySets", "situations").Order());
        Assert.Equal(ForceKeys.ResultWords.Words, Words("forces", "propertySets", "results"));
        Assert.Equal(SettingKeys.StatedConventions.Words, Words("forces", "propertySets", "convention"));
        Assert.Equal(ForceKeys.StationSources.Words, Words("forces", "propertySets", "stations"));
        Assert.Equal([.. Unit.SymbolsOf(Quantity.Length), "%"], Words("forces", "propertySets", "station", "unit"));
        Assert.Equal(SettingKeys.Displays.Words, Words("display"));
        foreach (var type in SettingKeys.UnitTypes) Assert.Equal(Unit.SymbolsOf(SettingKeys.UnitQuantities[type]), Words("units", type));
    }

    [Fact]
    public void The_schema_has_the_ranges_that_the_reader_knows()
    {
        Assert.Equal(SettingKeys.Factor, Range(At("basis", "service", "omega")));
        Assert.Equal(SettingKeys.Factor, Range(At("basis", "design", "gammaM0")));
        Assert.Equal(SettingKeys.Factor, Range(At("basis", "gammaM1")));
        Assert.Equal(SettingKeys.Factor, Range(At("basis", "gammaM2")));
        Assert.Equal(SettingKeys.LengthFactor, Range(At("stability", "factorByRole").GetProperty("additionalProperties")));
        Assert.Equal(LimitKeys.TemperatureFactor, Range(At("threads", "temperatureFactor")));
        Assert.Equal(LimitKeys.SpanOver, Range(Definition("deflection").GetProperty("properties").GetProperty("spanOver")));
        foreach (var list in new[] { At("rules"), At("deflection"), At("materials", "welds") }) Assert.Equal(LimitKeys.MostEntries, list.GetProperty("maxItems").GetInt32());
        Assert.Equal(SettingKeys.Turn, Range(At("forces", "turnDegrees")));
        Assert.Equal(SettingKeys.Turn, Range(At("forces", "turnDegreesByMember").GetProperty("additionalProperties")));
        Assert.Equal((0, GradeReader.LargestPoisson), Range(At("materials", "poisson")));
        Assert.Equal((0, GradeReader.LargestPoisson), Range(At("materials", "grades", "poisson")));
        Assert.Equal(SettingKeys.LengthFactor, Range(At("stability", "lengthFactor")));
        Assert.Equal(SettingKeys.Slope, Range(At("roles", "minSlopeDegrees")));
        Assert.Equal(SettingKeys.Slope, Range(At("roles", "maxSlopeDegrees")));
        Assert.Equal(SettingKeys.Slenderness, Range(At("roles", "minSlenderness")));
        Assert.Equal(ForceKeys.CaseFactor, Range(At("forces", "combinations", "factors").GetProperty("additionalProperties")));
        Assert.Equal(ForceKeys.StationWord, Range(At("forces", "propertySets", "stationWords").GetProperty("additionalProperties")));
        Assert.Equal(CombinationReader.MostCombinations, At("forces", "combinations").GetProperty("maxItems").GetInt32());
        Assert.Equal(CombinationReader.MostCases, At("forces", "combinations", "factors").GetProperty("maxProperties").GetInt32());
        Assert.Equal(PropertySetReader.MostMappings, At("forces", "propertySets").GetProperty("maxItems").GetInt32());
        Assert.Equal(RoleRulesReader.MostRules, At("roles").GetProperty("maxItems").GetInt32());
    }

    [Fact]
    public void Every_object_is_closed_and_every_key_described()
    {
        foreach (var node in All(_schema))
        {
            if (node.TryGetProperty("properties", out var properties))
            {
                Assert.False(node.GetProperty("additionalProperties").GetBoolean());
                Assert.All(properties.EnumerateObject(), key => Assert.NotEmpty(key.Value.GetProperty("description").GetString()!));
            }
        }
    }

    [Fact]
    public void The_defaults_of_the_schema_are_those_of_the_shipped_settings()
    {
        using var shipped = JsonDocument.Parse(ShippedFiles.Read(ShippedFiles.DefaultSettings), s_lenient);

        AssertDefaults(_schema, shipped.RootElement);
    }

    [Fact]
    public void The_shipped_settings_give_every_key()
    {
        var diagnostics = new DiagnosticList();
        using var shipped = JsonDocument.Parse(ShippedFiles.Read(ShippedFiles.DefaultSettings), s_lenient);

        var settings = SettingsFile.Read(ShippedFiles.Read(ShippedFiles.DefaultSettings), "settings.default.json", diagnostics)!;

        Assert.Empty(diagnostics.Items);
        Assert.Equal(SettingKeys.Root.Order(), shipped.RootElement.EnumerateObject().Select(key => key.Name).Order());
        Assert.Equal(["forces.kindOfAll", "units.FORCEUNIT", "units.LENGTHUNIT", "units.MODULUSOFELASTICITYUNIT", "units.PRESSUREUNIT", "units.TORQUEUNIT"],
            settings.Effective.Where(line => line.IsDefault).Select(line => line.Key).Order());
    }

    private static void AssertDefaults(JsonElement schema, JsonElement value)
    {
        if (schema.TryGetProperty("default", out var standard))
            Assert.True(JsonElement.DeepEquals(standard, value) || SameNumber(standard, value), $"{standard} against {value}");
        if (value.ValueKind != JsonValueKind.Object || !schema.TryGetProperty("properties", out var properties)) return;
        foreach (var key in value.EnumerateObject()) AssertDefaults(properties.GetProperty(key.Name), key.Value);
    }

    private static bool SameNumber(JsonElement a, JsonElement b) =>
        a.ValueKind == JsonValueKind.Number && b.ValueKind == JsonValueKind.Number && a.GetDouble().Equals(b.GetDouble());

    private static IEnumerable<JsonElement> All(JsonElement node) => node.ValueKind switch
    {
        JsonValueKind.Object => node.EnumerateObject().SelectMany(key => All(key.Value)).Prepend(node),
        JsonValueKind.Array => node.EnumerateArray().SelectMany(All),
        _ => [],
    };

    private JsonElement Definition(string name) => _schema.GetProperty("$defs").GetProperty(name);

    private IEnumerable<string> Keys(params string[] path) =>
        Inside(At(path)).GetProperty("properties").EnumerateObject().Select(key => key.Name);

    private IEnumerable<string> Words(params string[] path) => At(path).GetProperty("enum").EnumerateArray().Select(word => word.GetString()!);

    private static (double Least, double Most) Range(JsonElement node) =>
        (node.GetProperty("minimum").GetDouble(), node.GetProperty("maximum").GetDouble());

    private JsonElement At(params string[] path) =>
        path.Aggregate(_schema, (node, key) => Inside(node).GetProperty("properties").GetProperty(key));

    // A list's keys are those of its items.
    private static JsonElement Inside(JsonElement node) => node.TryGetProperty("items", out var items) ? items : node;
}
