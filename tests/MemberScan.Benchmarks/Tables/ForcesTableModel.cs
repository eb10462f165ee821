using System.Globalization;
using System.Text;

namespace MemberScan.Benchmarks.Tables;

/// <summary>Writes a forces table of any size: gangway members by GlobalId-like keys, design and service situations, stations along each; seeded, always the same bytes.</summary>
internal static class ForcesTableModel
{
    private const int Stations = 10;

    /// <summary>Writes the table.</summary>
    /// <param name="path">File to write.</param>
    /// <param name="rows">Number of rows.</param>
    /// <param name="members">Number of members; each has its rows together, and its situations one after the other.</param>
    public static void Write(string path, int rows, int members)
    {
        using var file = new StreamWriter(new FileStream(path, FileMode.Create, FileAccess.Write, FileShare.None, 1 << 20), new UTF8Encoding(false), 1 << 16);
        file.Write("# convention: positive-face\nmember,situation,kind,station[m],N[kN],Vy[kN],Vz[kN],T[kNm],My[kNm],Mz[kNm]\n");
        var random = new Random(5);
        var each = (rows + members - 1) / members;
        for (var i = 0; i < rows; i++)
        {
            var (member, within) = (i / each, i % each);
            var situation = within / Stations;
            file.Write(string.Create(CultureInfo.InvariantCulture,
                $"2O2Fr$t4X7Zf8NOew{member:D5},{(situation % 2 == 0 ? "ULS" : "SLS")} {situation},{(situation % 2 == 0 ? "design" : "service")},{within % Stations * 0.25:0.00},"));
            for (var k = 0; k < 6; k++) file.Write(string.Create(CultureInfo.InvariantCulture, $"{200 * random.NextDouble() - 100:0.0000}{(k < 5 ? "," : "\n")}"));
        }
    }
}
