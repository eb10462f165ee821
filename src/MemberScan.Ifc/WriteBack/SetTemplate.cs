using System.Collections.Immutable;

namespace MemberScan.Ifc.WriteBack;

/// <summary>What an <c>IfcPropertySetTemplate</c> says about the set: each property with its measure and meaning.</summary>
internal static class SetTemplate
{
    /// <summary>Name, measure type and meaning of each property, in the order of the set.</summary>
    public static ImmutableArray<(string Name, string Measure, string Meaning)> Properties { get; } =
    [
        ("Status", "IfcLabel", "WITHIN LIMIT, OVERSTRESSED or NOT CHECKED"),
        ("Reason", "IfcText", "Why the member was not checked"),
        ("Utilization", "IfcRatioMeasure", "Stress over limit in root form"),
        ("Criterion", "IfcLabel", "Criterion that decides"),
        ("StressLimit", "IfcPressureMeasure", "Stress limit"),
        ("EquivalentStress", "IfcPressureMeasure", "Equivalent stress at the governing point"),
        ("NormalStress", "IfcPressureMeasure", "Normal stress there, tension positive"),
        ("ShearStress", "IfcPressureMeasure", "Shear stress there"),
        ("EquivalentStressText", "IfcLabel", "Equivalent stress with its unit"),
        ("Situation", "IfcLabel", "Governing situation"),
        ("Station", "IfcLengthMeasure", "Distance of the governing section from the start of the member"),
        ("PointY", "IfcLengthMeasure", "Governing point along y from the centroid"),
        ("PointZ", "IfcLengthMeasure", "Governing point along z from the centroid"),
        ("PointName", "IfcLabel", "Governing point in words"),
        ("ForcesSource", "IfcLabel", "Where the section forces come from"),
        ("SectionSource", "IfcLabel", "Where the section comes from"),
        ("ShearModel", "IfcLabel", "Shear model that decides"),
        ("Item", "IfcLabel", "Key of the worst item of an element that has several"),
        ("ItemCount", "IfcInteger", "Number of items of an element that has several"),
        ("RunId", "IfcIdentifier", "Identifier of the run"),
        ("Program", "IfcLabel", "Program and version"),
        ("ReviewDecision", "IfcLabel", "Decision of a person"),
        ("ReviewNote", "IfcText", "Note of that person"),
    ];
}
