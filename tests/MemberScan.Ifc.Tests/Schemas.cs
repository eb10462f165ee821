namespace MemberScan.Ifc.Tests;

/// <summary>The schema releases that one body of tests runs over.</summary>
internal static class Schemas
{
    /// <summary>All three.</summary>
    public static TheoryData<Release> All => [Release.Ifc2X3, Release.Ifc4, Release.Ifc4X3];

    /// <summary>Those with curve reactions, material profile sets and indexed curves.</summary>
    public static TheoryData<Release> Later => [Release.Ifc4, Release.Ifc4X3];

    /// <summary>The identifier in the header of a file.</summary>
    public static string Header(Release release) => release switch { Release.Ifc2X3 => "IFC2X3", Release.Ifc4 => "IFC4", _ => "IFC4X3_ADD2" };
}
