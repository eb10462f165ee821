using MemberScan.Model.Members;

namespace MemberScan.Screening.Record;

/// <summary>What names a candidate and says where it belongs. Texts are empty where there is none.</summary>
public sealed record MemberIdentity
{
    /// <summary>GlobalId, for an item <c>GlobalId/2</c>.</summary>
    public required string Key { get; init; }

    /// <summary>GlobalId of the element.</summary>
    public required string GlobalId { get; init; }

    /// <summary>Number of the item, from 1; 0 when the element is the candidate.</summary>
    public required int ItemNumber { get; init; }

    /// <summary>Number of items of the element.</summary>
    public required int ItemCount { get; init; }

    /// <summary>Number after '#' of the element.</summary>
    public required ulong StepId { get; init; }

    /// <summary>Tag.</summary>
    public required string Tag { get; init; }

    /// <summary>Name.</summary>
    public required string Name { get; init; }

    /// <summary>Class, such as <c>IfcMember</c>.</summary>
    public required string Class { get; init; }

    /// <summary>Predefined type of the element or its type.</summary>
    public required string PredefinedType { get; init; }

    /// <summary>Name of its type object.</summary>
    public required string TypeName { get; init; }

    /// <summary>Guess of the role.</summary>
    public required string Role { get; init; }

    /// <summary>Storey or other container.</summary>
    public required string Storey { get; init; }

    /// <summary>Names of what contains it, from the outermost to its storey.</summary>
    public required string StoreyPath { get; init; }

    /// <summary>The assembly that it is part of.</summary>
    public required string Assembly { get; init; }

    /// <summary>Presentation layer of its body.</summary>
    public required string Layer { get; init; }

    /// <summary>The identity of a candidate.</summary>
    public static MemberIdentity Of(Member member)
    {
        ArgumentNullException.ThrowIfNull(member);
        var element = member.Element;
        return new MemberIdentity
        {
            Key = member.Key,
            GlobalId = element.GlobalId,
            ItemNumber = member.ItemNumber,
            ItemCount = member.ItemCount,
            StepId = element.StepId,
            Tag = element.Tag,
            Name = element.Name,
            Class = element.Class,
            PredefinedType = element.PredefinedType,
            TypeName = element.TypeName,
            Role = member.Role,
            Storey = element.Storey,
            StoreyPath = element.StoreyPath,
            Assembly = element.Assembly,
            Layer = element.Layer,
        };
    }
}
