namespace MemberScan.SampleModels.Writing;

/// <summary>Writes materials, their properties as each schema holds them, and profile sets.</summary>
public sealed class MaterialWriter
{
    private readonly ModelWriter _model;

    internal MaterialWriter(ModelWriter model) => _model = model;

    /// <summary>A material; what is null is not written.</summary>
    /// <param name="name">Name, such as a grade.</param>
    /// <param name="yield">Yield strength [Pa].</param>
    /// <param name="ultimate">Ultimate strength [Pa].</param>
    /// <param name="modulus">Modulus of elasticity [Pa].</param>
    /// <param name="poisson">Poisson's ratio [-].</param>
    /// <param name="category">Category, from IFC4 on.</param>
    public int Material(string name, double? yield = null, double? ultimate = null, double? modulus = null, double? poisson = null, string? category = null)
    {
        if (_model.Schema == SchemaVersion.Ifc2X3)
        {
            var old = _model.Add("IFCMATERIAL", Spelling.Text(name));
            if ((yield ?? ultimate ?? modulus ?? poisson) is not null)
            {
                _model.Add("IFCMECHANICALSTEELMATERIALPROPERTIES", Spelling.Reference(old), Spelling.Unset, Modulus(modulus), Spelling.Unset, Ratio(poisson),
                    Spelling.Unset, Pressure(yield), Pressure(ultimate), Spelling.Unset, Spelling.Unset, Spelling.Unset, Spelling.Unset, Spelling.Unset);
            }

            return old;
        }

        var material = _model.Add("IFCMATERIAL", Spelling.Text(name), Spelling.Unset, Spelling.Text(category));
        Properties(material, "Pset_MaterialMechanical",
            ("YoungModulus", "IFCMODULUSOFELASTICITYMEASURE", Modulus(modulus)), ("PoissonRatio", "IFCPOSITIVERATIOMEASURE", Ratio(poisson)));
        Properties(material, "Pset_MaterialSteel",
            ("YieldStress", "IFCPRESSUREMEASURE", Pressure(yield)), ("UltimateStress", "IFCPRESSUREMEASURE", Pressure(ultimate)));
        return material;
    }

    /// <summary>A profile set of one profile, as type objects carry it; from IFC4 on.</summary>
    public int ProfileSet(string name, int material, int profile)
    {
        if (_model.Schema == SchemaVersion.Ifc2X3) throw new InvalidOperationException("IFC2X3 has no material profile sets.");

        var one = _model.Add("IFCMATERIALPROFILE", Spelling.Text(name), Spelling.Unset, Spelling.Reference(material), Spelling.Reference(profile), Spelling.Unset, Spelling.Unset);
        return _model.Add("IFCMATERIALPROFILESET", Spelling.Text(name), Spelling.Unset, Spelling.References([one]), Spelling.Unset);
    }

    /// <summary>The use of a profile set by an occurrence; cardinal point 5 is the middle of the bounding box, 10 the centroid.</summary>
    public int ProfileSetUsage(int profileSet, int? cardinalPoint = 10) => _model.Add("IFCMATERIALPROFILESETUSAGE", Spelling.Reference(profileSet),
        cardinalPoint is { } point ? Spelling.Integer(point) : Spelling.Unset, Spelling.Unset);

    private void Properties(int material, string setName, params (string Name, string Measure, string Value)[] properties)
    {
        var given = properties.Where(p => p.Value != Spelling.Unset).Select(p => _model.Property(p.Name, Spelling.Typed(p.Measure, p.Value))).ToArray();
        if (given.Length > 0) _model.Add("IFCMATERIALPROPERTIES", Spelling.Text(setName), Spelling.Unset, Spelling.References(given), Spelling.Reference(material));
    }

    private string Pressure(double? pascals) => pascals is { } value ? _model.Units.PressureText(value) : Spelling.Unset;

    private string Modulus(double? pascals) => pascals is { } value ? _model.Units.ModulusText(value) : Spelling.Unset;

    private static string Ratio(double? ratio) => ratio is { } value ? Spelling.Real(value) : Spelling.Unset;
}
