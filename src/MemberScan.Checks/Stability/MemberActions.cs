using MemberScan.Mechanics.Forces;

namespace MemberScan.Checks.Stability;

/// <summary>The largest actions along a member in one situation, as its stability is checked with.</summary>
/// <param name="Compression">Largest compression [N], ≥ 0.</param>
/// <param name="My">Largest |My| [N·m].</param>
/// <param name="Mz">Largest |Mz| [N·m].</param>
/// <param name="M">Largest resultant moment [N·m].</param>
/// <remarks>The largest values of one situation, even where they stand at different stations.</remarks>
public sealed record MemberActions(double Compression, double My, double Mz, double M)
{
    /// <summary>The largest values over the stations of one situation.</summary>
    /// <exception cref="ArgumentException">A force is not finite.</exception>
    public static MemberActions Of(IEnumerable<SectionForces> stations)
    {
        ArgumentNullException.ThrowIfNull(stations);
        var actions = new MemberActions(0, 0, 0, 0);
        foreach (var f in stations)
        {
            if (!f.IsFinite) throw new ArgumentException("the section forces must be finite numbers", nameof(stations));
            actions = new MemberActions(
                Math.Max(actions.Compression, -f.N), Math.Max(actions.My, Math.Abs(f.My)), Math.Max(actions.Mz, Math.Abs(f.Mz)),
                Math.Max(actions.M, double.Hypot(f.My, f.Mz)));
        }

        return actions;
    }

    /// <summary>A multiple of the actions, ≥ 0.</summary>
    public MemberActions Times(double multiple) => new(multiple * Compression, multiple * My, multiple * Mz, multiple * M);
}
