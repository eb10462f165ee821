using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Tests.Analysis;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Sections;
using MemberScan.Part21;

namespace MemberScan.Ifc.Tests.Units;

/// <summary>One rail of the landing, written in the units of four offices.</summary>
public sealed class SameMemberTests
{
    private const double Radius = 0.0301625, Wall = 0.0036576, Length = 3.2004, Yield = 241.3e6, Modulus = 204.7e9;

    private static readonly SectionForces s_forces = new(-12345.678, 321.09, -2100.5, 87.65, 1234.5, -98.76);

    public static TheoryData<Release, string> Offices
    {
        get
        {
            var data = new TheoryData<Release, string>();
            foreach (var release in Enum.GetValues<Release>())
                foreach (var units in new[] { "mm-N-MPa", "m-N-Pa", "ft-lbf-psi", "in-kip-ksi" })
                    data.Add(release, units);
            return data;
        }
    }

    [Theory]
    [MemberData(nameof(Offices))]
    public void Reads_to_the_same_SI_values_whatever_the_units_of_the_file(Release release, string office)
    {
        var units = office switch
        {
            "mm-N-MPa" => FileUnits.MillimetreNewton,
            "m-N-Pa" => FileUnits.MetreNewton,
            "ft-lbf-psi" => FileUnits.FootPound,
            _ => FileUnits.InchKip,
        };

        var reading = Reading.Of(Written(release, units));

        var tube = Assert.IsType<Tube>(Reading.Shape(reading.Only));
        Reading.AssertNear(Radius, tube.OuterRadius, 1e-12);
        Reading.AssertNear(Wall, tube.Wall, 1e-12);
        Reading.AssertNear(Length, Reading.Value(reading.Only.Length), 1e-12);
        Reading.AssertNear(Yield, Reading.Value(reading.Only.Material.Yield), 1e-12);
        Reading.AssertNear(Modulus, Reading.Value(reading.Only.Material.Modulus), 1e-12);
        var station = Assert.Single(reading.OnlyForces.Stations);
        Reading.AssertNear(Length / 2, station.X, 1e-12);
        Near.Forces(s_forces, station.Forces, 1e-12);
    }

    // The numbers are spelled with all their digits here, so that nothing but the reading can lose any.
    private static ModelWriter Written(Release release, FileUnits units)
    {
        string In(double si, double factor) => Part21Text.Real(si / factor);
        string Metres(double si) => In(si, units.Length.Factor);
        var (force, moment) = (units.Force.Factor, units.MomentForce.Factor * units.MomentArm.Factor);
        var modulus = units.ModulusForce.Factor / (units.ModulusLength.Factor * units.ModulusLength.Factor);

        var model = Bars.Model(release, units);
        var profile = model.Add("IFCCIRCLEHOLLOWPROFILEDEF", ".AREA.", "'rail'", "$", Metres(Radius), Metres(Wall));
        var solid = model.Add("IFCEXTRUDEDAREASOLID", Bars.Ref(profile), "$", Bars.Ref(model.Direction(Vector3.UnitZ)), Metres(Length));
        var rail = Bars.Add(model, "R", solid, Bars.Frame(Vector3.Zero, Vector3.UnitX, Vector3.UnitY));
        Properties(model, rail, In(Yield, units.Pressure.Factor), In(Modulus, modulus));

        var analysis = model.StartAnalysis("landing", Transform3.Identity);
        var end = model.Add("IFCVERTEXPOINT", Bars.Ref(model.Add("IFCCARTESIANPOINT", $"({Metres(Length)},0.,0.)")));
        var place = model.Add("IFCVERTEXPOINT", Bars.Ref(model.Add("IFCCARTESIANPOINT", $"({Metres(Length / 2)},0.,0.)")));
        var member = Lines.CurveMember(model, "R", model.Add("IFCEDGE", Bars.Ref(model.Add("IFCVERTEXPOINT", Bars.Ref(model.Point(Vector3.Zero)))), Bars.Ref(end)), Vector3.UnitZ);
        analysis.Link(rail, member);
        var load = model.Add("IFCSTRUCTURALLOADSINGLEFORCE", "$", In(s_forces.N, force), In(s_forces.Vy, force), In(s_forces.Vz, force),
            In(s_forces.T, moment), In(s_forces.My, moment), In(s_forces.Mz, moment));
        Lines.PointReaction(model, member, load, place, analysis.ResultGroup("results", analysis.LoadCombination("CO1", "ULS")));
        return model;
    }

    private static void Properties(ModelWriter model, int rail, string yield, string modulus)
    {
        if (model.Schema == Release.Ifc2X3)
        {
            var old = model.Add("IFCMATERIAL", "'mill steel'");
            model.Add("IFCMECHANICALSTEELMATERIALPROPERTIES", Bars.Ref(old), "$", modulus, "$", "0.29", "$", yield, "$", "$", "$", "$", "$", "$");
            model.Associate(old, rail);
            return;
        }

        var material = model.Add("IFCMATERIAL", "'mill steel'", "$", "'steel'");
        var e = model.Property("YoungModulus", $"IFCMODULUSOFELASTICITYMEASURE({modulus})");
        var fy = model.Property("YieldStress", $"IFCPRESSUREMEASURE({yield})");
        model.Add("IFCMATERIALPROPERTIES", "'Pset_MaterialMechanical'", "$", Bars.Refs(e), Bars.Ref(material));
        model.Add("IFCMATERIALPROPERTIES", "'Pset_MaterialSteel'", "$", Bars.Refs(fy), Bars.Ref(material));
        model.Associate(material, rail);
    }
}
