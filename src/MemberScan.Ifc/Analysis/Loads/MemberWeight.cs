using System.Globalization;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Sections;
using MemberScan.Model;
using MemberScan.Model.Members;
using MemberScan.Model.Verdicts;

namespace MemberScan.Ifc.Analysis.Loads;

/// <summary>Weight of candidates per length, for results in which self-weight acts.</summary>
internal sealed class MemberWeight
{
    /// <summary>Acceleration of gravity by which a mass becomes a weight [m/s²]; the models name none.</summary>
    public const double Gravity = 9.80665;

    /// <summary>Density of steel where a model gives none [kg/m³].</summary>
    public const double SteelDensity = 7850;

    private readonly Dictionary<CrossSection, double> _areas = [];

    /// <summary>Weight per length [N/m] with what it is made of, or why it is not known.</summary>
    public Finding<double> PerLength(Member member)
    {
        if (!member.Section.TryGet(out var section, out var noSection)) return Missing($"no section of it is known ({noSection.Message})");
        if (member.EndSection is not null) return Missing("it tapers");

        var (density, source) = member.Material.Density switch
        {
            Finding<double>.Found found => (found.Value, found.Source),
            null when member.Material.IsSteel => (SteelDensity, "EN 1991-1-1, Table A.4, from memory; the model gives none"),
            Finding<double>.Missing missing => (double.NaN, missing.Why.Message),
            _ => (double.NaN, "its density is not known"),
        };
        if (!double.IsFinite(density)) return Missing(source);

        var shape = section.Value.Shape;
        if (!_areas.TryGetValue(shape, out var area)) _areas[shape] = area = SectionProperties.Of(shape).Area;
        var words = string.Create(CultureInfo.InvariantCulture, $"self-weight ({area * 1e6:0.##} mm² × {density:0.##} kg/m³ × {Gravity} m/s²; density: {source})");
        return new Finding<double>.Found(density * Gravity * area, words);
    }

    private static Finding<double> Missing(string why) => new Finding<double>.Missing(new Reason(ReasonCode.ForcesIncomplete, $"self-weight acts, and the member's weight is not known: {why}"));
}
