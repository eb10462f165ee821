namespace MemberScan.Model.Rules;

/// <summary>Yield strength up to a thickness.</summary>
/// <param name="UpTo">Largest thickness [m]; infinity for no bound.</param>
/// <param name="Yield">Yield strength [Pa].</param>
public readonly record struct YieldRange(double UpTo, double Yield);
