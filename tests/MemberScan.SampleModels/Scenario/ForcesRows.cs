using System.Globalization;
using System.Text;

namespace MemberScan.SampleModels.Scenario;

/// <summary>Rows of a forces table.</summary>
internal static class ForcesRows
{
    /// <summary>The header line with its units.</summary>
    public static string Header(string length, string force, string moment) =>
        $"member,situation,kind,station[{length}],N[{force}],Vy[{force}],Vz[{force}],T[{moment}],My[{moment}],Mz[{moment}]";

    /// <summary>A member's rows, each with its line end; a name with a comma is quoted.</summary>
    public static string Of(SampleMember member, string key, double metres, double newtons, double newtonMetres)
    {
        var rows = new StringBuilder();
        foreach (var situation in member.Situations)
        {
            foreach (var (x, f) in situation.Stations)
            {
                string[] numbers = [Number(x / metres), Number(f.N / newtons), Number(f.Vy / newtons), Number(f.Vz / newtons),
                    Number(f.T / newtonMetres), Number(f.My / newtonMetres), Number(f.Mz / newtonMetres)];
                rows.Append(CultureInfo.InvariantCulture, $"{Quoted(key)},{Quoted(situation.Name)},{situation.Kind},").AppendJoin(',', numbers).Append('\n');
            }
        }

        return rows.ToString();
    }

    private static string Quoted(string text) => text.Contains(',', StringComparison.Ordinal) ? $"\"{text}\"" : text;

    private static string Number(double value)
    {
        var text = value.ToString("G10", CultureInfo.InvariantCulture);
        return text == "-0" ? "0" : text;
    }
}
