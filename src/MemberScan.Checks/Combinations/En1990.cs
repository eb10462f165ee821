using System.Collections.Immutable;
using MemberScan.Model.Rules.Combinations;

namespace MemberScan.Checks.Combinations;

/// <summary>
/// Combinations of EN 1990:2002 for persistent design situations, STR, set B: γG = 1.35 or 1.00, γQ = 1.5, ξ = 0.85, ψ0 of Table A1.1.
/// All values recommended ones and from memory; national annexes differ.
/// </summary>
internal static class En1990
{
    /// <summary>How the factors are named in every output.</summary>
    public const string Standard = "EN 1990:2002";

    /// <summary>What a reader must know of the factors.</summary>
    public const string Remark = "γG 1.35 or 1.00, γQ 1.5, ψ0: live 0.7, roof live 0, snow 0.7 (0.5 up to 1000 m), wind 0.6, temperature 0.6; ξ 0.85; recommended values, from memory";

    private const double GammaG = 1.35, GammaGInf = 1.00, GammaQ = 1.5, Xi = 0.85;

    private static readonly ImmutableArray<(ActionTag Tag, double Psi0)> s_variable =
        [(ActionTag.Live, 0.7), (ActionTag.RoofLive, 0), (ActionTag.Snow, 0.7), (ActionTag.Wind, 0.6), (ActionTag.Temperature, 0.6)];

    /// <summary>Equation 6.10.</summary>
    public static IEnumerable<CombinationRule> Eq610() => [Alone("6.10", GammaG), Alone("6.10", GammaGInf), .. Leading("6.10", GammaG), .. Leading("6.10", GammaGInf)];

    /// <summary>Equations 6.10a and 6.10b.</summary>
    public static IEnumerable<CombinationRule> Eq610ab() =>
    [
        Accompanying(GammaG), Accompanying(GammaGInf), Alone("6.10b", Xi * GammaG), .. Leading("6.10b", Xi * GammaG), .. Leading("6.10b", GammaGInf),
    ];

    private static CombinationRule Alone(string equation, double permanent) => new(equation, permanent);

    private static CombinationRule Accompanying(double permanent) => new("6.10a", permanent, Beside(ActionTag.None));

    private static IEnumerable<CombinationRule> Leading(string equation, double permanent) =>
        s_variable.Select(lead => new CombinationRule(equation, permanent, [CombinationRule.Must((lead.Tag, GammaQ)), .. Beside(lead.Tag)]));

    private static ImmutableArray<CombinationRule.Place> Beside(ActionTag lead) =>
        [.. s_variable.Where(v => v.Tag != lead && v.Psi0 > 0).Select(v => CombinationRule.May((v.Tag, GammaQ * v.Psi0)))];
}
