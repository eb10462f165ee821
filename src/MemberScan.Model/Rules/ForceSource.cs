namespace MemberScan.Model.Rules;

/// <summary>Where section forces may come from.</summary>
public enum ForceSource
{
    /// <summary>Forces tables beside the model.</summary>
    Table,

    /// <summary>Result groups in the model.</summary>
    Results,

    /// <summary>Property sets of elements.</summary>
    PropertySets,

    /// <summary>Our own frame analysis of analysis models that have loads.</summary>
    Statics,

    /// <summary>Load presets that are switched on.</summary>
    Presets,
}
