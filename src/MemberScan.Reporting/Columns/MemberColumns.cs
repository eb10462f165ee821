using System.Collections.Immutable;
using MemberScan.Model.Verdicts;
using MemberScan.Reporting.Display;

namespace MemberScan.Reporting.Columns;

/// <summary>The columns of the typed tables, in order: the same in workbook and Parquet file.</summary>
public static class MemberColumns
{
    private static readonly ShownUnit s_metre = new("m", 1);

    /// <summary>All of them.</summary>
    public static ImmutableArray<MemberColumn> All { get; } =
    [
        MemberColumn.Text("key", m => m.Key),
        MemberColumn.Text("globalId", m => m.GlobalId),
        MemberColumn.Integer("item", m => m.ItemNumber > 0 ? m.ItemNumber : null),
        MemberColumn.Text("tag", m => m.Tag),
        MemberColumn.Text("name", m => m.Name),
        MemberColumn.Text("class", m => m.Class),
        MemberColumn.Text("role", m => m.Role),
        MemberColumn.Text("storey", m => m.Storey),
        MemberColumn.Text("section", m => m.Section),
        MemberColumn.Text("sectionSource", m => m.SectionSource),
        MemberColumn.Text("material", m => m.Material),
        MemberColumn.Number("strength", ShownUnit.Stress, "_Pa", m => m.Strength),
        MemberColumn.Text("strengthSource", m => m.StrengthSource),
        MemberColumn.Number("length", s_metre, "_m", m => m.Length),
        MemberColumn.Text("lengthSource", m => m.LengthSource),
        MemberColumn.Text("status", m => m.Verdict.Word()),
        MemberColumn.Text("reasonCode", m => m.Reason?.Code.Text()),
        MemberColumn.Text("reason", m => m.Reason?.Message),
        MemberColumn.Number("utilization", null, "", m => m.Governing?.Utilization),
        MemberColumn.Text("criterion", m => m.Governing?.Criterion),
        MemberColumn.Text("clause", m => m.Governing?.Clause),
        MemberColumn.Number("stress", ShownUnit.Stress, "_Pa", m => m.Governing?.Stress),
        MemberColumn.Number("limit", ShownUnit.Stress, "_Pa", m => m.Governing?.Limit),
        MemberColumn.Text("situation", m => m.Governing?.Situation),
        MemberColumn.Text("kind", m => m.Governing?.Kind),
        MemberColumn.Number("station", s_metre, "_m", m => m.Governing?.Station),
        MemberColumn.Number("y", ShownUnit.Dimension, "_m", m => m.Governing?.Point.Y),
        MemberColumn.Number("z", ShownUnit.Dimension, "_m", m => m.Governing?.Point.Z),
        MemberColumn.Text("place", m => m.Governing?.Point.Place),
        MemberColumn.Number("N", ShownUnit.Force, "_N", m => m.Governing?.Forces.N),
        MemberColumn.Number("Vy", ShownUnit.Force, "_N", m => m.Governing?.Forces.Vy),
        MemberColumn.Number("Vz", ShownUnit.Force, "_N", m => m.Governing?.Forces.Vz),
        MemberColumn.Number("T", ShownUnit.Moment, "_Nm", m => m.Governing?.Forces.T),
        MemberColumn.Number("My", ShownUnit.Moment, "_Nm", m => m.Governing?.Forces.My),
        MemberColumn.Number("Mz", ShownUnit.Moment, "_Nm", m => m.Governing?.Forces.Mz),
        MemberColumn.Text("forcesSource", m => m.Governing?.ForcesSource),
        MemberColumn.Text("shearModel", m => m.Governing?.ShearModel),
        MemberColumn.Text("reviewDecision", m => m.Decision?.Shown),
        MemberColumn.Text("reviewNote", m => m.Decision?.ShownNote),
    ];
}
