using MemberScan.Part21;

namespace MemberScan.Ifc;

/// <summary>The relations of a model, indexed from the side that asks. Where an object is related twice, the first relation counts.</summary>
internal sealed class Relations
{
    private readonly Instances _instances;
    private readonly HashSet<ulong> _voided = [];
    private readonly Dictionary<ulong, string> _layerOf = [];
    private readonly Dictionary<ulong, ulong> _typeOf = [];
    private readonly Dictionary<ulong, List<ulong>> _materialOf = [];
    private readonly Dictionary<ulong, ulong> _containerOf = [];
    private readonly Dictionary<ulong, ulong> _wholeOf = [];
    private readonly Dictionary<ulong, List<ulong>> _partsOf = [];
    private readonly Dictionary<ulong, List<ulong>> _analyticalOf = [];
    private readonly Dictionary<ulong, List<ulong>> _physicalOf = [];
    private readonly Dictionary<ulong, List<ulong>> _activitiesOn = [];
    private readonly HashSet<ulong> _connected = [];
    private readonly Dictionary<ulong, List<ulong>> _groupsOf = [];
    private readonly Dictionary<ulong, List<(ulong Properties, Part21Value Orientation)>> _profilePropertiesOf = [];

    public Relations(Instances instances)
    {
        _instances = instances;
        Each("IFCRELDEFINESBYTYPE", r => Spread(r[4], r[5], (related, type) => _typeOf.TryAdd(related, type)));
        Each("IFCRELASSOCIATESMATERIAL", r => Spread(r[4], r[5], (related, material) => Add(_materialOf, related, material)));
        Each("IFCRELCONTAINEDINSPATIALSTRUCTURE", r => Spread(r[4], r[5], (related, container) => _containerOf.TryAdd(related, container)));
        Each("IFCRELAGGREGATES", r => Spread(r[5], r[4], AddPart));
        Each("IFCRELNESTS", r => Spread(r[5], r[4], AddPart));
        Each("IFCRELCONNECTSSTRUCTURALACTIVITY", r => Pair(r[4], r[5], (item, activity) =>
        {
            Add(_activitiesOn, item, activity);
            _connected.Add(activity);
        }));
        Each("IFCRELASSIGNSTOGROUP", r => Spread(r[4], r[6], (related, group) => Add(_groupsOf, related, group)));
        Each("IFCRELASSIGNSTOGROUPBYFACTOR", r => Spread(r[4], r[6], (related, group) => Add(_groupsOf, related, group)));
        Each("IFCRELCONNECTSSTRUCTURALELEMENT", r => Pair(r[4], r[5], Link));
        Each("IFCRELASSIGNSTOPRODUCT", r => Spread(r[4], r[6], (related, product) => LinkEitherWay(product, related)));
        Each("IFCRELASSOCIATESPROFILEPROPERTIES", AddProfileProperties);
        Each("IFCPRESENTATIONLAYERASSIGNMENT", AddLayer);
        Each("IFCPRESENTATIONLAYERWITHSTYLE", AddLayer);
        Each("IFCRELVOIDSELEMENT", r => Pair(r[4], r[5], (element, _) => _voided.Add(element)));
    }

    /// <summary>Whether anything is assigned to a layer.</summary>
    public bool HasLayers => _layerOf.Count > 0;

    /// <summary>Name of the layer of a representation or item; empty if none.</summary>
    public string LayerOf(ulong id) => _layerOf.GetValueOrDefault(id) ?? "";

    /// <summary>Whether openings are cut out of an element.</summary>
    public bool HasOpenings(ulong id) => _voided.Contains(id);

    /// <summary>The type object of an occurrence; 0 if none.</summary>
    public ulong TypeOf(ulong id) => _typeOf.GetValueOrDefault(id);

    /// <summary>Materials, sets or usages associated with an object itself.</summary>
    public IReadOnlyList<ulong> MaterialsOf(ulong id) => _materialOf.GetValueOrDefault(id) ?? [];

    /// <summary>The assembly that an object is part of; 0 if none.</summary>
    public ulong WholeOf(ulong id) => _wholeOf.GetValueOrDefault(id);

    /// <summary>Parts of an assembly.</summary>
    public IReadOnlyList<ulong> PartsOf(ulong id) => _partsOf.GetValueOrDefault(id) ?? [];

    /// <summary>Analytical members of a physical element.</summary>
    public IReadOnlyList<ulong> AnalyticalOf(ulong id) => _analyticalOf.GetValueOrDefault(id) ?? [];

    /// <summary>Physical elements of an analytical member.</summary>
    public IReadOnlyList<ulong> PhysicalOf(ulong id) => _physicalOf.GetValueOrDefault(id) ?? [];

    /// <summary>Actions and reactions on a structural item or element.</summary>
    public IReadOnlyList<ulong> ActivitiesOn(ulong id) => _activitiesOn.GetValueOrDefault(id) ?? [];

    /// <summary>Whether an action or reaction acts on anything.</summary>
    public bool IsOnSomething(ulong activity) => _connected.Contains(activity);

    /// <summary>Groups that an object is assigned to.</summary>
    public IReadOnlyList<ulong> GroupsOf(ulong id) => _groupsOf.GetValueOrDefault(id) ?? [];

    /// <summary>Profile properties of an analytical member with their orientation (IFC2X3).</summary>
    public IReadOnlyList<(ulong Properties, Part21Value Orientation)> ProfilePropertiesOf(ulong id) => _profilePropertiesOf.GetValueOrDefault(id) ?? [];

    /// <summary>The spatial container of an object, found by climbing its assemblies; 0 if none.</summary>
    public ulong ContainerOf(ulong id)
    {
        for (var steps = 0; steps < Instances.MaxDepth && id != 0; steps++)
        {
            if (_containerOf.TryGetValue(id, out var container)) return container;

            id = WholeOf(id);
        }

        return 0;
    }

    private void AddLayer(Part21Record layer)
    {
        var name = Instances.Text(layer[0]);
        foreach (var item in Instances.IdsOf(layer[2])) _layerOf.TryAdd(item, name);
    }

    private void AddPart(ulong part, ulong whole)
    {
        if (_wholeOf.TryAdd(part, whole)) Add(_partsOf, whole, part);
    }

    private void Link(ulong physical, ulong analytical)
    {
        Add(_analyticalOf, physical, analytical);
        Add(_physicalOf, analytical, physical);
    }

    // The product should be the physical element; exporters write both directions. Neither or both analytical: not a link.
    private void LinkEitherWay(ulong product, ulong related)
    {
        var (productIs, relatedIs) = (IsAnalytical(product), IsAnalytical(related));
        if (productIs == relatedIs) return;

        if (relatedIs) Link(product, related);
        else Link(related, product);
    }

    private bool IsAnalytical(ulong id) =>
        _instances.File.TryFind(id, out var record) && record.Keyword is "IFCSTRUCTURALCURVEMEMBER" or "IFCSTRUCTURALCURVEMEMBERVARYING";

    private void AddProfileProperties(Part21Record relation)
    {
        if (!relation[5].TryReference(out var properties)) return;

        foreach (var related in Instances.IdsOf(relation[4]))
        {
            if (!_profilePropertiesOf.TryGetValue(related, out var list)) _profilePropertiesOf[related] = list = [];
            list.Add((properties, relation[7]));
        }
    }

    private void Each(string keyword, Action<Part21Record> read)
    {
        foreach (var relation in _instances.File.RecordsOf(keyword)) read(relation);
    }

    private static void Spread(Part21Value many, Part21Value one, Action<ulong, ulong> add)
    {
        if (!one.TryReference(out var target)) return;

        foreach (var id in Instances.IdsOf(many)) add(id, target);
    }

    private static void Pair(Part21Value first, Part21Value second, Action<ulong, ulong> add)
    {
        if (first.TryReference(out var a) && second.TryReference(out var b)) add(a, b);
    }

    private static void Add(Dictionary<ulong, List<ulong>> index, ulong key, ulong value)
    {
        if (!index.TryGetValue(key, out var list)) index[key] = list = [];
        if (!list.Contains(value)) list.Add(value);
    }
}
