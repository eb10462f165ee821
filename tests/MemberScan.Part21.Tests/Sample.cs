using System.Text;
using MemberScan.Foundation.Diagnostics;

namespace MemberScan.Part21.Tests;

/// <summary>Small exchange structures of the cable-ferry landing, and reading them.</summary>
internal static class Sample
{
    public const string Header = "ISO-10303-21;\nHEADER;\nFILE_DESCRIPTION(('landing'),'2;1');\nFILE_NAME('landing.ifc','2031-05-04T08:00:00',(''),(''),'p','o','');\nFILE_SCHEMA(('IFC4'));\nENDSEC;\nDATA;\n";
    public const string Footer = "ENDSEC;\nEND-ISO-10303-21;\n";

    /// <summary>A whole file around data lines; the lines are taken as Latin-1.</summary>
    public static string Model(string data) => Header + data + "\n" + Footer;

    public static (Part21File File, DiagnosticList Told) Read(string text) => Read(Encoding.Latin1.GetBytes(text));

    public static (Part21File File, DiagnosticList Told) Read(byte[] bytes)
    {
        var told = new DiagnosticList();
        return (Part21File.Read(bytes, "landing.ifc", told), told);
    }

    /// <summary>The only argument of the only instance <c>#1=HANGER(…)</c>.</summary>
    public static Part21Value Value(string spelling)
    {
        var (file, _) = Read(Model($"#1=HANGER({spelling});"));
        Assert.True(file.TryFind(1, out var record));
        return record[0];
    }
}
