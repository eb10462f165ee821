using System.Collections.Immutable;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Ifc.Analysis;
using MemberScan.Ifc.Analysis.Loads;
using MemberScan.Ifc.Geometry;
using MemberScan.Ifc.Schema;
using MemberScan.Ifc.Units;
using MemberScan.Model.Loads;
using MemberScan.Model.Rules;
using MemberScan.Part21;

namespace MemberScan.Ifc.Tests.Analysis.Loads;

/// <summary>The load readers over a model that was written: its groups, its analytical members and their loads.</summary>
internal sealed class ReadLoads
{
    private readonly AnalyticalMemberReader _members;
    private readonly MemberLoadReader _loads;

    public ReadLoads(ModelWriter model, ForceRules? rules = null)
    {
        var diagnostics = new DiagnosticList();
        var instances = new Instances(Part21File.Read(model.Build(), "landing.ifc", diagnostics));
        var schema = SchemaName.Resolve(instances.File.Header.Schemas, diagnostics)!.Value;
        var units = ModelUnits.Read(instances, new UnitReader(instances, diagnostics), new ReadingRules(), diagnostics);
        var (relations, placements) = (new Relations(instances), new PlacementReader(instances, units));
        _members = new AnalyticalMemberReader(instances, relations, placements, units, schema, diagnostics);
        Tree = new LoadTree(instances, rules ?? new ForceRules());
        _loads = new MemberLoadReader(instances, relations, new ActivityPlaces(instances, placements, units), Tree, units, schema);
    }

    public LoadTree Tree { get; }

    public AnalyticalMember Member(int id) => _members.Read((ulong)id)!;

    public ImmutableArray<MemberLoad> On(int member) => _loads.On(Member(member));
}
