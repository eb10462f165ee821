namespace MemberScan.Model.Forces;

/// <summary>The forces of one load case with the factor that a combination gives it.</summary>
/// <param name="Factor">The factor [-].</param>
/// <param name="Forces">Forces of the case on one member.</param>
public readonly record struct FactoredForces(double Factor, MemberForces Forces)
{
    /// <summary>Such as <c>1.35 × 'G'</c>.</summary>
    public string Words => string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{Factor:0.######} × '{Forces.Situation.Name}'");
}
