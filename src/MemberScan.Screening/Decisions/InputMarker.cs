using System.Globalization;
using System.Security.Cryptography;
using System.Text;
using MemberScan.Inputs.SettingsFiles;
using MemberScan.Mechanics.Forces;
using MemberScan.Model;
using MemberScan.Model.Forces;
using MemberScan.Model.Limits;
using MemberScan.Model.Members;
using MemberScan.Screening.Marks;

namespace MemberScan.Screening.Decisions;

/// <summary>Marks the inputs of a candidate, so that a later run can tell whether they changed.</summary>
internal sealed class InputMarker
{
    // Magnitudes below are rounding of a turn of axes [N], [N·m].
    private const double Nothing = 1e-6;

    private static readonly string[] s_limits = ["basis.", "checks.", "stability.", "threads.", "materials.welds", "rules"];

    private readonly string _limit;

    /// <summary>A marker for one run.</summary>
    public InputMarker(Settings settings)
    {
        var standard = Settings.Default.Effective.Select(s => (s.Key, s.Value)).ToHashSet();
        var others = settings.Effective.Where(s => s_limits.Any(key => s.Key.StartsWith(key, StringComparison.Ordinal)) && !standard.Contains((s.Key, s.Value)));
        _limit = Mark($"{Words(settings.Basis.Service)}|{Words(settings.Basis.Design)}|{settings.LengthFactor.ToString("R", CultureInfo.InvariantCulture)}"
            + string.Concat(others.Select(s => $"|{s.Key}={s.Value}")));
    }

    /// <summary>The marks of a candidate under its forces.</summary>
    public InputMarks Of(Member member, IReadOnlyList<MemberForces> forces) => new(Mark(Section(member)), Mark(Material(member.Material)), Mark(Forces(forces)), _limit);

    private static string Section(Member member) => member.Section is Finding<SectionFinding>.Found found
        ? string.Join('|', found.Value.Shapes.Select(s => $"{s.Designation} {Number(s.ExtentY)} {Number(s.ExtentZ)}"))
        : "none";

    private static string Material(Material material) => string.Join(
        '|', material.Name, Value(material.Yield), Value(material.Modulus), Value(material.Poisson), material.IsSteel ? "steel" : "other");

    private static string Forces(IReadOnlyList<MemberForces> forces)
    {
        var text = new StringBuilder();
        foreach (var entry in forces.OrderBy(f => f.Situation.Name, StringComparer.Ordinal))
        {
            text.Append(entry.Situation.Name).Append('|').Append(entry.Situation.Kind).Append('|').Append(entry.Situation.ActsInFull).Append('|').Append(entry.Unusable?.Code).Append('\n');
            foreach (var station in entry.Stations)
            {
                SectionForces f = station.Forces;
                text.AppendJoin(' ', new[] { station.X, f.N, f.Vy, f.Vz, f.T, f.My, f.Mz }.Select(Number)).Append('\n');
            }
        }

        return text.ToString();
    }

    private static string Value(Finding<double> finding) => finding is Finding<double>.Found found ? Number(found.Value) : "none";

    private static string Words(StressLimit? limit) => limit is null ? "none" : $"{limit.Criterion} {limit.Factor.ToString("R", CultureInfo.InvariantCulture)}";

    private static string Number(double value) => (Math.Abs(value) < Nothing ? 0 : value).ToString("G9", CultureInfo.InvariantCulture);

    private static string Mark(string text) => Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(text)))[..16];
}
