using System.Collections.Immutable;
using MemberScan.Model.Members;

namespace MemberScan.Ifc.Members;

/// <summary>All candidates of a model, and what was passed over.</summary>
/// <param name="Members">Candidates in the order of the file, items in body order.</param>
/// <param name="PassedOver">Elements that are no candidates, per class and reason, by class.</param>
public sealed record MemberCatalog(ImmutableArray<Member> Members, ImmutableArray<ClassCount> PassedOver);
