using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Checks;
using MemberScan.Foundation.Diagnostics;
using MemberScan.Foundation.Geometry;
using MemberScan.Foundation.Units;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Stress;
using MemberScan.Model.Verdicts;
using MemberScan.Screening;
using MemberScan.Screening.Record;
using MemberScan.Screening.Record.Given;

namespace MemberScan.Reporting.Tests;

/// <summary>Finished screenings of a cable-ferry landing: gangway rails, hanger rods under the deck, trapeze struts, mast stays.</summary>
internal static class FerryLanding
{
    // Circular hollow section 48.3 × 3.2: A 4.53 cm², I 11.6 cm⁴, Wel 4.80 cm³ (EN 10219-2:2006, from memory; more digits by its annex formulas).
    private const double RailArea = 4.5339e-4, RailInertia = 11.586e-8;

    public const string RailKey = "2O2Fr$t4X7Zf8NOew3FL01";

    private static MemberResult Item(MemberResult member, string globalId, int number, int count) =>
        member with { Identity = member.Identity with { GlobalId = globalId, ItemNumber = number, ItemCount = count } };

    /// <summary>Two overstressed, three within their limit, four not checked for three reasons.</summary>
    public static ScreeningRecord Small() => Record(
        Rail(RailKey, "Gangway rail north, bay 3", bending: 1.32e3),
        Item(Rail("2O2Fr$t4X7Zf8NOew3FL02/2", "Geländerpfosten „Süd“ 5' 4\"", bending: 1.05e3), "2O2Fr$t4X7Zf8NOew3FL02", 2, 3),
        Rail("2O2Fr$t4X7Zf8NOew3FL03", "Gangway rail south, bay 1", bending: 0.41e3),
        Hanger("2O2Fr$t4X7Zf8NOew3FL04", "渡船缆绳吊杆 04", tension: 48.2e3),
        Hanger("2O2Fr$t4X7Zf8NOew3FL05", "Hanger rod 05", tension: 31.7e3),
        Open("2O2Fr$t4X7Zf8NOew3FL06", "Mast stay, rod", ReasonCode.ThreadUnknown, "The rod's name speaks of a thread, and neither name nor properties give one.")
            with
        { Governing = Hanger("", "", 61.0e3).Governing },
        Open("2O2Fr$t4X7Zf8NOew3FL07", "Trapeze strut 1", ReasonCode.NoForces, "No row of landing-forces.csv and no result of the model names the member."),
        Open("2O2Fr$t4X7Zf8NOew3FL08", "Trapeze strut 2", ReasonCode.NoForces, "No row of landing-forces.csv and no result of the model names the member."),
        Open("2O2Fr$t4X7Zf8NOew3FL09", "", ReasonCode.SectionNotParametric, "The body is a mesh of 412 faces (#9107).") with { Section = "", SectionSource = "" });

    /// <summary>A screening with the given candidates.</summary>
    public static ScreeningRecord Record(params ReadOnlySpan<MemberResult> members)
    {
        ImmutableArray<MemberResult> all = [.. members];
        return new ScreeningRecord
        {
            Version = "0.1.0",
            RunId = "5f1d0c2ab97e4438",
            Timestamp = "2031-04-02T08:15:00Z",
            Model = new ModelFacts(
                "ferry-landing-east.ifc", "", "9b1c6e0f4f0a7c52d8e3b1a09f6677c1d2e4583b0a9c8d7e6f5a4b3c2d1e0f98", 1_482_903, "IFC4", "IFC4",
                "Seilfähre Ost, Anleger", "Drawing office export 3", "2031-03-28T16:40:11", true,
                [
                    new UnitLine("LENGTHUNIT", "millimetre", 1e-3, "#21"), new UnitLine("FORCEUNIT", "kilonewton", 1e3, "#25"),
                    new UnitLine("PRESSUREUNIT", "missing", 0, ""),
                ]),
            ForcesFiles =
            [
                new ForcesFile("landing-forces.csv", "0a9c8d7e6f5a4b3c2d1e0f989b1c6e0f4f0a7c52d8e3b1a09f6677c1d2e4583b", 34, 2, "positive face: forces on the cut face whose outward normal is +x"),
            ],
            Basis =
            [
                new BasisLine("service", "σvM ≤ fy/Ω with Ω = 1.67", "allowable stress", true),
                new BasisLine("design", "(σ·γM0/fy)² + 3(τ·γM0/fy)² ≤ 1 with γM0 = 1.00", "EN 1993-1-1:2005 6.2.1(5)", true),
            ],
            Settings = [new SettingLine("forces.convention", "positive-face", false), new SettingLine("basis.service.factor", "1.67", true)],
            Cautions = Cautions.Lines,
            PassedOver = [new PassedOver("IfcBuildingElementProxy", 12, "no bar-like body and no forces"), new PassedOver("IfcPipeSegment", 3, "no bar-like body and no forces")],
            Sections =
            [
                new SectionFacts("tube 48.3x3.2 mm", 3, RailArea, RailInertia, RailInertia, 4.7974e-6, 4.7974e-6, 23.171e-8, "closed form", 9.5947e-6,
                    "gives back 0.9996 of each shear force, 1 of the others", "gives back all six within 1e-12"),
            ],
            Members = all,
            Findings =
            [
                new FindingLine("P21-0007", Severity.Warning, "A string holds a control character; it was kept.", "line 88 (#412)", 3),
                new FindingLine("INP-0012", Severity.Note, "Rows of unknown members are listed, as the settings ask.", "", 2),
            ],
            Counts = new VerdictCounts(
                all.Count(m => m.Verdict == Verdict.WithinLimit), all.Count(m => m.Verdict == Verdict.Overstressed), all.Count(m => m.Verdict == Verdict.NotChecked)),
            HasDamage = false,
        };
    }

    /// <summary>A rail of tube 48.3 × 3.2, S355, bent about y in service, overstressed above fy/1.67.</summary>
    public static MemberResult Rail(string key, string name, double bending)
    {
        var forces = new SectionForces(-0.8e3, 0, 1.1e3, 0.02e3, bending, 0.06e3);
        var strength = Si.MPa(355);
        var (limit, z) = (strength / 1.67, Si.Mm(24.15));
        var sigma = forces.N / RailArea + forces.My * z / RailInertia;
        var state = new StressState(sigma, -forces.T * z / (2 * RailInertia), 0);
        var utilization = state.VonMises / limit;
        var governing = new Governing
        {
            Utilization = utilization,
            Criterion = "σvM ≤ fy/Ω, Ω = 1.67",
            Clause = "allowable stress",
            Limit = limit,
            Stress = state.VonMises,
            Situation = "Gangway crowd, 1.0·G + 1.0·Q",
            Kind = "service",
            Station = 1.25,
            Forces = forces,
            ForcesSource = "landing-forces.csv, lines 12 to 16",
            Point = new GoverningPoint(StressMeasure.VonMises, state.VonMises, 0, z, state, "extreme fibre, +z"),
            Section = "tube 48.3x3.2 mm",
            ShearModel = "elementary",
            OtherModelUtilization = utilization,
            Trace =
            [
                new TraceLine("A", "", RailArea, "m²", "closed form of the section"),
                new TraceLine("Iy", "", RailInertia, "m⁴", "closed form of the section"),
                new TraceLine("fy", "", strength, "Pa", "Pset_MaterialSteel.YieldStress (#88)"),
                new TraceLine("σ", "N/A + My·z/Iy − Mz·y/Iz", sigma, "Pa", "beam theory"),
                new TraceLine("τ", "T·r/J", state.Tau, "Pa", "Saint-Venant"),
                new TraceLine("σvM", "√(σ² + 3τ²)", state.VonMises, "Pa", "von Mises"),
                new TraceLine("fy/Ω", "fy/1.67", limit, "Pa", "allowable stress"),
                new TraceLine("U", "σvM/(fy/Ω)", utilization, "-", "allowable stress"),
            ],
        };
        return new MemberResult
        {
            Identity = new MemberIdentity
            {
                Key = key,
                GlobalId = key,
                ItemNumber = 0,
                ItemCount = 1,
                StepId = 1204,
                Tag = "GR-N-03",
                Name = name,
                Class = "IfcMember",
                PredefinedType = "MEMBER",
                TypeName = "Rail 48.3x3.2",
                Role = "rail",
                Storey = "Brücke ±0",
                StoreyPath = "Landing / Brücke ±0",
                Assembly = "Gangway",
                Layer = "S-RAIL",
            },
            Section = "tube 48.3x3.2 mm",
            SectionSource = "profile IfcCircleHollowProfileDef (#77)",
            Material = "S355J2H",
            Strength = strength,
            StrengthSource = "Pset_MaterialSteel.YieldStress (#88)",
            Length = 2.5,
            LengthSource = "extrusion depth (#91)",
            Axes = MemberAxes.From(new Vector3(12.5, -3.2, 4.05), Vector3.UnitX, Vector3.UnitZ),
            Verdict = utilization > 1 + 1e-9 ? Verdict.Overstressed : Verdict.WithinLimit,
            Reason = null,
            Governing = governing,
            Situations =
            [
                new SituationResult("Gangway crowd, 1.0·G + 1.0·Q", "service", true, utilization, "", "landing-forces.csv, lines 12 to 16", "",
                [
                    new ForceStation(0, forces with { My = 0, Vz = 2.2e3 }), new ForceStation(1.25, forces), new ForceStation(2.5, forces with { My = 0, Vz = -2.2e3 }),
                ]),
                new SituationResult("Wind on the mast", "service", true, 0.184, "uniform load inferred", "landing-forces.csv, lines 17 to 19", "turned by 90° about x", []),
            ],
            Notes = ["The elementary model gives back 0.9996 of each shear force for this wall."],
        };
    }

    /// <summary>A hanger rod of 25 mm, S235, in pure tension.</summary>
    public static MemberResult Hanger(string key, string name, double tension)
    {
        const double area = 4.908738521e-4;
        var forces = new SectionForces(tension, 0, 0, 0, 0, 0);
        var state = new StressState(tension / area, 0, 0);
        var limit = Si.MPa(235) / 1.67;
        var rail = Rail(key, name, 0.2e3);
        var governing = rail.Governing! with
        {
            Utilization = state.VonMises / limit,
            Limit = limit,
            Stress = state.VonMises,
            Situation = "Full deck",
            Station = 0,
            Forces = forces,
            Point = new GoverningPoint(StressMeasure.VonMises, state.VonMises, 0, 0, state, "everywhere alike"),
            Section = "round 25 mm",
            OtherModelUtilization = null,
            Trace = [new TraceLine("σ", "N/A", state.Sigma, "Pa", "beam theory")],
        };
        return rail.As(tag: "HR", role: "hanger") with
        {
            Section = "round 25 mm",
            Material = "S235JR",
            Strength = Si.MPa(235),
            Verdict = governing.Utilization > 1 + 1e-9 ? Verdict.Overstressed : Verdict.WithinLimit,
            Governing = governing,
            Situations = [],
            Notes = [],
        };
    }

    /// <summary>A trapeze strut that was not checked.</summary>
    public static MemberResult Open(string key, string name, ReasonCode code, string message) => Rail(key, name, 0.1e3).As(tag: "", role: "strut") with
    {
        Section = "box 60x60x3 mm ro 6 ri 3",
        SectionSource = "profile IfcRectangleHollowProfileDef (#131)",
        Axes = null,
        Verdict = Verdict.NotChecked,
        Reason = new Reason(code, message),
        Governing = null,
        Situations = [],
        Notes = [],
    };

    /// <summary>The same result of a member that is called otherwise.</summary>
    public static MemberResult As(
        this MemberResult result, string? key = null, string? globalId = null, string? tag = null, string? name = null, string? role = null, ulong? stepId = null) => result with
        {
            Identity = result.Identity with
            {
                Key = key ?? result.Key,
                GlobalId = globalId ?? result.GlobalId,
                Tag = tag ?? result.Tag,
                Name = name ?? result.Name,
                Role = role ?? result.Role,
                StepId = stepId ?? result.StepId,
            },
        };

    /// <summary>As many hangers as asked for, a few of them overstressed or without forces.</summary>
    public static ScreeningRecord Large(int count)
    {
        var members = Enumerable.Range(0, count).Select(index =>
        {
            var key = string.Create(CultureInfo.InvariantCulture, $"Hanger{index:D16}");
            return index % 100 == 7
                ? Open(key, "Hanger rod", ReasonCode.NoForces, "No row of landing-forces.csv and no result of the model names the member.")
                : Hanger(key, "Hanger rod", index % 50 == 3 ? 80e3 : 10e3 + index);
        });
        return Record([.. members]);
    }
}
