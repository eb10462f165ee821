using MemberScan.Part21;

namespace MemberScan.Ifc.Members;

/// <summary>Where an element belongs: its containers, its assembly, its layer, by their names.</summary>
internal readonly struct PlaceReader(Instances instances, Relations relations)
{
    /// <summary>Most containers of a path.</summary>
    private const int MostContainers = 32;

    /// <summary>Name of the container; empty if none.</summary>
    public string Storey(ulong element) => NameOf(relations.ContainerOf(element));

    /// <summary>Names of the containers from the outermost to the innermost; those without a name by their class and number.</summary>
    public string StoreyPath(ulong element)
    {
        var names = new List<string>();
        for (var at = relations.ContainerOf(element); at != 0 && names.Count < MostContainers; at = relations.WholeOf(at))
        {
            if (!instances.File.TryFind(at, out var record) || record.Keyword == "IFCPROJECT") break;

            names.Insert(0, Called(at));
        }

        return string.Join(" / ", names);
    }

    /// <summary>The whole that an element is part of, where that is no space or storey.</summary>
    public string Assembly(ulong element) =>
        relations.WholeOf(element) is var whole and not 0 && instances.File.TryFind(whole, out var record) && !IsSpatial(record.Keyword) ? Called(whole) : "";

    /// <summary>The layer that the element's representations or their items are assigned to; empty if none.</summary>
    public string Layer(Part21Value representation)
    {
        if (!relations.HasLayers || !instances.TryFollow(representation, out var shape)) return "";

        foreach (var part in instances.FollowAll(shape[2]))
        {
            if (relations.LayerOf(part.Id) is { Length: > 0 } whole) return whole;

            foreach (var item in Instances.IdsOf(part[3]))
                if (relations.LayerOf(item) is { Length: > 0 } own) return own;
        }

        return "";
    }

    private static bool IsSpatial(string keyword) =>
        keyword is "IFCSITE" or "IFCBUILDING" or "IFCBUILDINGSTOREY" or "IFCSPACE" or "IFCSPATIALZONE" or "IFCFACILITY" or "IFCFACILITYPART" or "IFCBRIDGE" or "IFCBRIDGEPART" or "IFCPROJECT";

    private string NameOf(ulong id) => id != 0 && instances.File.TryFind(id, out var record) ? Instances.Text(record[2]) : "";

    private string Called(ulong id)
    {
        if (NameOf(id) is { Length: > 0 } name) return name;

        _ = instances.File.TryFind(id, out var record);
        return Instances.Text(record[0]) is { Length: > 0 } globalId ? globalId : $"#{id.ToString(System.Globalization.CultureInfo.InvariantCulture)}";
    }
}
