using System.Collections.Immutable;
using System.Text;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Ifc.Members;
using MemberScan.Mechanics.Sections;
using MemberScan.Model;
using MemberScan.Model.Forces;
using MemberScan.Model.Members;
using MemberScan.Model.Rules;
using MemberScan.Model.Verdicts;
using MemberScan.Part21;

namespace MemberScan.Ifc.Tests;

/// <summary>A model that was written and read back: its candidates, their forces and the findings.</summary>
internal sealed class Reading
{
    private Reading(IfcModel model, MemberCatalog catalog, ImmutableArray<MemberForces> forces, DiagnosticList diagnostics) =>
        (Model, Catalog, Forces, Diagnostics) = (model, catalog, forces, diagnostics);

    public IfcModel Model { get; }

    public MemberCatalog Catalog { get; }

    public ImmutableArray<MemberForces> Forces { get; }

    public DiagnosticList Diagnostics { get; }

    /// <summary>The one candidate.</summary>
    public Member Only => Assert.Single(Catalog.Members);

    /// <summary>The forces of the one candidate in the one situation.</summary>
    public MemberForces OnlyForces => Assert.Single(Forces);

    public static Reading Of(ModelWriter model, ReadingRules? rules = null, Func<ElementIdentity, bool>? isNamed = null) =>
        Of(model.Build(), rules, isNamed);

    public static Reading Of(ReadOnlyMemory<byte> bytes, ReadingRules? rules = null, Func<ElementIdentity, bool>? isNamed = null)
    {
        var diagnostics = new DiagnosticList();
        var model = IfcModel.Open(Part21File.Read(bytes, "landing.ifc", diagnostics), rules ?? new ReadingRules(), diagnostics);
        Assert.NotNull(model);
        var catalog = model.ReadMembers(isNamed ?? (_ => false));
        return new Reading(model, catalog, model.ReadForces(catalog.Members), diagnostics);
    }

    /// <summary>A file of the given instances and nothing else.</summary>
    public static byte[] Text(Release release, params IEnumerable<string> instances) => Encoding.UTF8.GetBytes(
        $"ISO-10303-21;\nHEADER;\nFILE_DESCRIPTION((''),'2;1');\nFILE_NAME('landing.ifc','2026-01-15T08:00:00',(''),(''),'','','');\n"
        + $"FILE_SCHEMA(('{Schemas.Header(release)}'));\nENDSEC;\nDATA;\n{string.Join('\n', instances)}\nENDSEC;\nEND-ISO-10303-21;\n");

    public Member Named(string name) => Assert.Single(Catalog.Members, m => m.Element.Name == name);

    public MemberForces ForcesOf(string name, string? situation = null) =>
        Assert.Single(Forces, f => f.MemberKey == Named(name).Key && (situation is null || f.Situation.Name == situation));

    public int CountOf(string code) => Diagnostics.Items.Where(d => d.Code == code).Sum(Diagnostics.CountOf);

    public void AssertTold(string code, Severity severity, string words)
    {
        var finding = Assert.Single(Diagnostics.Items, d => d.Code == code);
        Assert.Equal(severity, finding.Severity);
        Assert.Contains(words, finding.Message, StringComparison.Ordinal);
    }

    /// <summary>The value of a finding; fails with the reason when there is none.</summary>
    public static T Value<T>(Finding<T> finding)
    {
        Assert.True(finding.TryGet(out var found, out var why), why?.ToString());
        return found!.Value;
    }

    /// <summary>The reason of a finding that has no value.</summary>
    public static Reason Why<T>(Finding<T> finding)
    {
        Assert.False(finding.TryGet(out var found, out var why), found?.ToString());
        return why!;
    }

    /// <summary>The one shape of a section.</summary>
    public static CrossSection Shape(Member member) => Assert.Single(Value(member.Section).Shapes);

    public static void AssertNear(double expected, double actual, double relative = 1e-9) =>
        Assert.True(Math.Abs(actual - expected) <= relative * Math.Max(Math.Abs(expected), 1e-9), FormattableString.Invariant($"expected {expected:R}, got {actual:R}"));
}
