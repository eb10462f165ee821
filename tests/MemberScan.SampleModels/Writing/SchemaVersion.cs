namespace MemberScan.SampleModels.Writing;

/// <summary>The three schema releases that models are written in.</summary>
public enum SchemaVersion
{
    /// <summary>IFC2X3 TC1.</summary>
    Ifc2X3,

    /// <summary>IFC4 ADD2 TC1.</summary>
    Ifc4,

    /// <summary>IFC4X3 ADD2.</summary>
    Ifc4X3,
}
