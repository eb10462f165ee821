using System.Text;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Inputs.SettingsFiles;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Forces;
using MemberScan.Model.Rules;
using MemberScan.Model.Rules.Combinations;
using MemberScan.Model.Rules.PropertySets;

namespace MemberScan.Inputs.Tests.SettingsFiles.Forces;

public sealed class ForceRulesTests
{
    [Fact]
    public void Combinations_sets_and_tags_are_read_and_shown()
    {
        var settings = Read("""
            {"forces": {"missingCoefficients": "one", "caseCoefficients": "in-results", "convention": "detect", "torsion": "centroid",
             "combinations": [{"name": "ULS 1", "kind": "design", "factors": {"Q": 1.5, "G": 1.35}}],
             "combinationSets": ["en1990-6.10", "asce7-22-2.4"],
             "caseTags": [{"pattern": "G*", "tag": "permanent"}, {"pattern": "Snow", "tag": "snow"}]}}
            """);
        var forces = settings.Reading.Forces;

        Assert.True(forces.MissingCoefficientsAreOne);
        Assert.Equal((CaseCoefficients.InResults, ForceConvention.Detect), (forces.CaseCoefficients, forces.Convention));
        Assert.Equal(TorsionAxis.Centroid, forces.Torsion);
        var combination = Assert.Single(forces.Combinations);
        Assert.Equal(("ULS 1", SituationKind.Design, "settings"), (combination.Name, combination.Kind, combination.Rule));
        Assert.Equal([new CaseFactor("Q", 1.5), new CaseFactor("G", 1.35)], combination.Factors);
        Assert.Equal([CombinationSet.En1990Eq610, CombinationSet.Asce7Allowable], forces.CombinationSets);
        Assert.Equal([new CaseTag("G*", ActionTag.Permanent), new CaseTag("Snow", ActionTag.Snow)], forces.CaseTags);
        Assert.Equal("\"ULS 1\" design: 1.35 \"G\" + 1.5 \"Q\"", Value(settings, "forces.combinations[1]"));
        Assert.Equal("en1990-6.10, asce7-22-2.4", Value(settings, "forces.combinationSets"));
        Assert.Equal("\"G*\" permanent", Value(settings, "forces.caseTags[1]"));
        Assert.Equal(("one", "in-results", "detect"), (Value(settings, "forces.missingCoefficients"), Value(settings, "forces.caseCoefficients"), Value(settings, "forces.convention")));
    }

    [Fact]
    public void A_mapping_of_property_sets_is_read_and_shown()
    {
        var settings = Read("""
            {"forces": {"propertySets": [{"set": "Forces *", "kind": "service", "situations": "load-cases", "results": "linear", "convention": "end-forces",
             "components": {"N": {"property": "N {station}", "unit": "kN"}, "My": {"property": "My {station}"}},
             "stations": "name", "station": {"unit": "mm"}, "stationWords": {"start": 0, "end": 100}},
             {"set": "Results", "situation": "S", "components": {"T": {"property": "Tors?"}}, "stations": "list", "station": {"property": "Place", "unit": "%"}}]}}
            """);
        var (first, second) = (settings.Reading.Forces.PropertySets[0], settings.Reading.Forces.PropertySets[1]);

        Assert.Equal(("Forces *", null, SituationKind.Service, true, true, ForceConvention.EndForces), (first.Set, first.Situation, first.Kind, first.IsLoadCase, first.IsLinear, first.Convention));
        Assert.Equal([new ComponentMapping(ForceComponent.N, "N {station}", 1000, "kN"), new ComponentMapping(ForceComponent.My, "My {station}", null, "")], first.Components);
        Assert.Equal((StationSource.Name, 0.001, false), (first.Stations, first.StationFactor, first.StationIsShare));
        Assert.Equal((0.0, 1.0), (first.StationWords["START"], first.StationWords["end"]));
        Assert.Equal((StationSource.List, "Place", 0.01, true), (second.Stations, second.StationProperty, second.StationFactor, second.StationIsShare));
        Assert.Equal("\"Forces *\", service, load cases, linear, end-forces, N \"N {station}\" in kN, My \"My {station}\", stations name, in 0.001 m, \"end\" at 1, \"start\" at 0",
            Value(settings, "forces.propertySets[1]"));
        Assert.Equal("\"Results\", situation \"S\", T \"Tors?\", stations list, of \"Place\", in 0.01 of the length", Value(settings, "forces.propertySets[2]"));
    }

    [Theory]
    [InlineData("""{"forces": {"combinations": [{"name": "A", "kind": "design"}]}}""", "INP-0109", "lacks the key 'factors'")]
    [InlineData("""{"forces": {"combinations": [{"name": "A", "kind": "desing", "factors": {"G": 1}}]}}""", "INP-0105", "did you mean 'design'?")]
    [InlineData("""{"forces": {"combinations": [{"name": "A", "kind": "design", "factors": {"G": 101}}]}}""", "INP-0106", "from -100 to 100")]
    [InlineData("""{"forces": {"combinations": [{"name": "A", "kind": "design", "factors": {}}]}}""", "INP-0109", "names no case")]
    [InlineData("""{"forces": {"combinations": [{"name": "A", "kind": "design", "factors": {"G": 1, "G": 2}}]}}""", "INP-0103", "twice")]
    [InlineData("""{"forces": {"combinations": [{"name": "A", "kind": "design", "factors": {"G": 1}}, {"name": "A", "kind": "design", "factors": {"G": 1}}]}}""", "INP-0112", "of an earlier one")]
    [InlineData("""{"forces": {"combinationSets": ["en1990-6.1"]}}""", "INP-0105", "en1990-6.10")]
    [InlineData("""{"forces": {"combinationSets": ["en1990-6.10", "en1990-6.10"]}}""", "INP-0112", "already")]
    [InlineData("""{"forces": {"caseTags": [{"pattern": "G", "tag": "dead"}]}}""", "INP-0105", "permanent")]
    [InlineData("""{"forces": {"caseTags": [{"pattern": "G", "tag": "live"}, {"pattern": "g", "tag": "wind"}]}}""", "INP-0112", "of an earlier one")]
    [InlineData("""{"forces": {"propertySets": [{"set": "F", "stations": "constant"}]}}""", "INP-0109", "lacks the key 'components'")]
    [InlineData("""{"forces": {"propertySets": [{"set": "F", "stations": "constant", "components": {}}]}}""", "INP-0109", "maps no section force")]
    [InlineData("""{"forces": {"propertySets": [{"set": "F", "stations": "constant", "components": {"Nx": {"property": "N"}}}]}}""", "INP-0102", "'Nx' is not a key")]
    [InlineData("""{"forces": {"propertySets": [{"set": "F", "stations": "constant", "components": {"N": {"property": "N", "unit": "kNm"}}}]}}""", "INP-0108", "not of force")]
    [InlineData("""{"forces": {"propertySets": [{"set": "F", "stations": "list", "components": {"N": {"property": "N"}}}]}}""", "INP-0109", "names no list of stations")]
    [InlineData("""{"forces": {"propertySets": [{"set": "F", "stations": "name", "components": {"N": {"property": "N"}}}]}}""", "INP-0107", "has no {station}")]
    [InlineData("""{"forces": {"propertySets": [{"set": "F", "stations": "table", "components": {"N": {"property": "N {station}"}}}]}}""", "INP-0107", "set \"stations\": \"name\"")]
    [InlineData("""{"forces": {"propertySets": [{"set": "F", "stations": "table", "convention": "detect", "components": {"N": {"property": "N"}}}]}}""", "INP-0105", "end-forces")]
    [InlineData("""{"forces": {"propertySets": [{"set": "F", "stations": "name", "stationWords": {"a": 101}, "components": {"N": {"property": "{station}"}}}]}}""", "INP-0106", "from 0 to 100")]
    [InlineData("""{"forces": {"propertySets": [{"set": "F", "stations": "name", "stationWords": {"a": 1, "A": 2}, "components": {"N": {"property": "{station}"}}}]}}""", "INP-0112", "case does not tell")]
    public void What_is_wrong_is_refused_with_code_and_remedy(string text, string code, string words)
    {
        var diagnostics = new DiagnosticList();

        Assert.Null(SettingsFile.Read(Encoding.UTF8.GetBytes(text), "s.json", diagnostics));
        Assert.Contains(diagnostics.Items, d => d.Code == code && d.Message.Contains(words, StringComparison.Ordinal) && d.Span is { Line: 1, Column: > 1 });
    }

    [Fact]
    public void More_combinations_cases_or_mappings_than_the_limits_are_refused()
    {
        AssertLimit("combinations", Enumerable.Range(1, 2001).Select(i => $"{{\"name\": \"C{i}\", \"kind\": \"design\", \"factors\": {{\"G\": 1}}}}"));
        AssertLimit("combinations", ["{\"name\": \"C\", \"kind\": \"design\", \"factors\": {" + string.Join(", ", Enumerable.Range(1, 101).Select(i => $"\"G{i}\": 1")) + "}}"]);
        AssertLimit("propertySets", Enumerable.Repeat("""{"set": "F", "stations": "constant", "components": {"N": {"property": "N"}}}""", 101));

        static void AssertLimit(string key, IEnumerable<string> entries)
        {
            var diagnostics = new DiagnosticList();
            Assert.Null(SettingsFile.Read(Encoding.UTF8.GetBytes("{\"forces\": {\"" + key + "\": [" + string.Join(", ", entries) + "]}}"), "s.json", diagnostics));
            Assert.Contains(diagnostics.Items, d => d.Code == "INP-0106" && d.Message.Contains("more than", StringComparison.Ordinal));
        }
    }

    private static string Value(Settings settings, string key) => settings.Effective.Single(line => line.Key == key).Value;

    private static Settings Read(string text)
    {
        var diagnostics = new DiagnosticList();
        return SettingsFile.Read(Encoding.UTF8.GetBytes(text), "s.json", diagnostics)
            ?? throw new InvalidOperationException(string.Join("; ", diagnostics.Items));
    }
}
