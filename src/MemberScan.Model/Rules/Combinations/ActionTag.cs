namespace MemberScan.Model.Rules.Combinations;

/// <summary>What kind of action a load case holds, as standards tell them apart.</summary>
public enum ActionTag
{
    /// <summary>In no generated combination, on purpose.</summary>
    None,

    /// <summary>Permanent: self-weight and other dead load.</summary>
    Permanent,

    /// <summary>Imposed on floors, guards and walkways.</summary>
    Live,

    /// <summary>Imposed on roofs.</summary>
    RoofLive,

    /// <summary>Snow.</summary>
    Snow,

    /// <summary>Rain.</summary>
    Rain,

    /// <summary>Wind.</summary>
    Wind,

    /// <summary>Temperature.</summary>
    Temperature,

    /// <summary>Earthquake, its vertical part included.</summary>
    Seismic,
}
