using MemberScan.Part21;

namespace MemberScan.Ifc.Frames.Topology;

/// <summary>The structural items of one analysis model, in the order of the file.</summary>
/// <param name="Members">Curve members; of an aggregate its parts.</param>
/// <param name="Connections">Point connections.</param>
/// <param name="Others">Items that a frame does not hold: surface members, curve and surface connections.</param>
internal sealed record StructuralItems(IReadOnlyList<Part21Record> Members, IReadOnlyList<Part21Record> Connections, IReadOnlyList<Part21Record> Others)
{
    /// <summary>Gathers the items of a model; connections that only a member's relation names are among them.</summary>
    public static StructuralItems Of(Part21Record model, Instances instances, Relations relations, JointReader joints)
    {
        var ids = new HashSet<ulong>();
        foreach (var relation in instances.File.RecordsOf("IFCRELASSIGNSTOGROUP"))
            if (relation[6].TryReference(out var group) && group == model.Id)
                ids.UnionWith(Instances.IdsOf(relation[4]));

        // Parts of an aggregate stand for it; relations may be the only ones that name a connection.
        foreach (var whole in ids.Where(id => relations.PartsOf(id).Count > 0).ToList()) ids.UnionWith(relations.PartsOf(whole));
        foreach (var member in ids.ToList()) ids.UnionWith(joints.ConnectionsOf(member));

        var (members, connections, others) = (new List<Part21Record>(), new List<Part21Record>(), new List<Part21Record>());
        foreach (var id in ids.Order())
        {
            if (!instances.File.TryFind(id, out var item)) continue;

            switch (item.Keyword)
            {
                case "IFCSTRUCTURALCURVEMEMBER" or "IFCSTRUCTURALCURVEMEMBERVARYING" when relations.PartsOf(id).Count == 0: members.Add(item); break;
                case "IFCSTRUCTURALPOINTCONNECTION": connections.Add(item); break;
                case "IFCSTRUCTURALSURFACEMEMBER" or "IFCSTRUCTURALSURFACEMEMBERVARYING" or "IFCSTRUCTURALCURVECONNECTION" or "IFCSTRUCTURALSURFACECONNECTION": others.Add(item); break;
            }
        }

        return new StructuralItems(members, connections, others);
    }
}
