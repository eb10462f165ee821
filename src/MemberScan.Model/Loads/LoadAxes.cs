namespace MemberScan.Model.Loads;

/// <summary>Which axes the components of a load follow.</summary>
public enum LoadAxes
{
    /// <summary>The project's.</summary>
    Project,

    /// <summary>The analytical member's own.</summary>
    Member,
}
