namespace MemberScan.Ifc.Schema;

/// <summary>The schema whose attribute positions a model is read by.</summary>
public enum SchemaVersion
{
    /// <summary>IFC2X3 TC1.</summary>
    Ifc2x3,

    /// <summary>IFC4 ADD2 TC1.</summary>
    Ifc4,

    /// <summary>IFC4X3 ADD2.</summary>
    Ifc4x3,
}
