using System.Collections.Immutable;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Forces;
using MemberScan.Model.Rules.Combinations;
using MemberScan.Model.Rules.PropertySets;

namespace MemberScan.Inputs.SettingsFiles.Forces;

/// <summary>Keys, words and ranges of combinations and property-set mappings in the <c>forces</c> part of a settings file.</summary>
internal static class ForceKeys
{
    public static readonly ImmutableArray<string> Tag = ["pattern", "tag"];
    public static readonly ImmutableArray<string> Combination = ["name", "kind", "factors"];
    public static readonly ImmutableArray<string> PropertySet =
        ["set", "situation", "kind", "situations", "results", "convention", "components", "stations", "station", "stationWords"];
    public static readonly ImmutableArray<string> Component = ["property", "unit"];
    public static readonly ImmutableArray<string> Station = ["property", "unit"];

    public static readonly (double Least, double Most) CaseFactor = (-100, 100);
    public static readonly (double Least, double Most) StationWord = (0, 100);

    public static readonly WordTable<TorsionAxis> TorsionAxes =
        new(("not-stated", TorsionAxis.NotStated), ("centroid", TorsionAxis.Centroid), ("shear-centre", TorsionAxis.ShearCentre));
    public static readonly WordTable<bool> MissingCoefficients = new(("refuse", false), ("one", true));
    public static readonly WordTable<CaseCoefficients> CaseCoefficientWords =
        new(("refuse", CaseCoefficients.Refuse), ("in-results", CaseCoefficients.InResults), ("not-in-results", CaseCoefficients.NotInResults));
    public static readonly WordTable<ActionTag> Tags = new(
        ("permanent", ActionTag.Permanent), ("live", ActionTag.Live), ("roof-live", ActionTag.RoofLive), ("snow", ActionTag.Snow), ("rain", ActionTag.Rain),
        ("wind", ActionTag.Wind), ("temperature", ActionTag.Temperature), ("seismic", ActionTag.Seismic), ("none", ActionTag.None));
    public static readonly WordTable<CombinationSet> Sets = new(
        ("en1990-6.10", CombinationSet.En1990Eq610), ("en1990-6.10ab", CombinationSet.En1990Eq610ab),
        ("asce7-22-2.3", CombinationSet.Asce7Strength), ("asce7-22-2.4", CombinationSet.Asce7Allowable));
    public static readonly WordTable<bool> SituationWords = new(("combinations", false), ("load-cases", true));
    public static readonly WordTable<bool> ResultWords = new(("not-stated", false), ("linear", true));
    public static readonly WordTable<StationSource> StationSources = new(
        ("constant", StationSource.Constant), ("list", StationSource.List), ("table", StationSource.Table), ("name", StationSource.Name));
    public static readonly WordTable<ForceComponent> Components = new(
        ("N", ForceComponent.N), ("Vy", ForceComponent.Vy), ("Vz", ForceComponent.Vz), ("T", ForceComponent.T), ("My", ForceComponent.My), ("Mz", ForceComponent.Mz));
}
