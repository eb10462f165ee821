namespace MemberScan.SampleModels.Scenario;

/// <summary>How the body of a sample member is written.</summary>
public enum SampleBody
{
    /// <summary>An extrusion in the member's own placement.</summary>
    Extrusion,

    /// <summary>A mapped item of an extrusion that several members share.</summary>
    Mapped,

    /// <summary>A disk swept along a straight polyline.</summary>
    SweptDisk,

    /// <summary>An extrusion, and a material profile set usage that says the section.</summary>
    ProfileSet,

    /// <summary>A faceted boundary: no parametric section.</summary>
    Brep,

    /// <summary>One of several swept disks of one railing.</summary>
    RailingItem,

    /// <summary>No body: an analytical curve member alone, with a material profile set usage.</summary>
    AnalyticalOnly,
}
