using System.Diagnostics;
using System.Text;

namespace MemberScan.Cli.Tests.Readers;

/// <summary>Programs by others that read our files.</summary>
internal static class OtherProgram
{
    /// <summary>Runs a script of <c>tests/web-ifc</c>; skips, saying so, where Node or its packages are absent.</summary>
    public static async Task<Memberscan.Ran> Node(string package, string script, params string[] arguments)
    {
        var folder = Path.Combine(Memberscan.Root, "tests", "web-ifc");
        Assert.SkipUnless(Directory.Exists(Path.Combine(folder, "node_modules", package)), $"{package} is not installed: run npm ci in tests/web-ifc");
        return await Run("node", [Path.Combine(folder, script), .. arguments]) ?? Skipped("node is not installed");
    }

    /// <summary>Runs the program of <c>tests/ifcplusplus</c>; skips, saying so, where it is not built.</summary>
    public static async Task<Memberscan.Ran> IfcPlusPlus(string path)
    {
        var program = Path.Combine(Memberscan.Root, ".artifacts", "ifcplusplus", "read-sets");
        Assert.SkipUnless(File.Exists(program), "the reader with Debian's libifcplusplus is not built: run tests/ifcplusplus/build.sh .artifacts/ifcplusplus");
        return await Run(program, path) ?? Skipped("the reader with libifcplusplus cannot be started");
    }

    private static Memberscan.Ran Skipped(string why)
    {
        Assert.Skip(why);
        return null!;
    }

    private static async Task<Memberscan.Ran?> Run(string program, params string[] arguments)
    {
        var start = new ProcessStartInfo(program) { RedirectStandardOutput = true, RedirectStandardError = true, StandardOutputEncoding = Encoding.UTF8 };
        foreach (var argument in arguments) start.ArgumentList.Add(argument);
        try
        {
            return await Memberscan.Run(start);
        }
        catch (System.ComponentModel.Win32Exception)
        {
            return null;
        }
    }
}
