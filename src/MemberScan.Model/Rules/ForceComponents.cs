namespace MemberScan.Model.Rules;

/// <summary>Which axes the force components of results in the model follow.</summary>
public enum ForceComponents
{
    /// <summary>As each activity's own flag says.</summary>
    AsFlagged,

    /// <summary>The analytical member's axes, whatever the flag says.</summary>
    MemberAxes,

    /// <summary>The analysis model's global axes, whatever the flag says.</summary>
    GlobalAxes,
}
