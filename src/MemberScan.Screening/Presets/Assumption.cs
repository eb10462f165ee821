using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Forces;
using MemberScan.Model.Presets;
using MemberScan.Model.Verdicts;

namespace MemberScan.Screening.Presets;

/// <summary>The forces of one member under one preset, each situation with the assumptions behind it.</summary>
/// <param name="Key">Key of the member.</param>
/// <param name="Use">The preset.</param>
/// <param name="Model">Supports and ends as assumed, one sentence.</param>
internal sealed record Assumption(string Key, PresetUse Use, string Model)
{
    private string Source => $"assumed: load preset '{Use.Preset.Name}', {Use.Preset.Source}";

    /// <summary>Forces of one situation.</summary>
    public MemberForces Forces(string situation, ImmutableArray<ForceStation> stations) => new()
    {
        MemberKey = Key,
        Situation = new Situation($"{Use.Preset.Name}: {situation}", Use.Preset.SituationKind, "load preset", ActsInFull: true, Source),
        Stations = stations,
        Source = Source,
        Conversion = $"assumed: {Model}; self-weight and other loads are left out{(Use.Preset.Note.Length > 0 ? "; " + Use.Preset.Note : "")}",
    };

    /// <summary>No forces, with the reason.</summary>
    public MemberForces Doubt(string why) => Forces("not applied", []) with { Unusable = new Reason(ReasonCode.NoForces, $"load preset '{Use.Preset.Name}' is not applied: {why}") };

    /// <summary>A force in words.</summary>
    public static string Kn(double newtons) => string.Create(CultureInfo.InvariantCulture, $"{newtons / 1e3:0.###} kN");

    /// <summary>A direction in project axes, in words.</summary>
    public static string Towards(Vector3 direction) => string.Create(CultureInfo.InvariantCulture, $"towards ({Rounded(direction.X):0.###}, {Rounded(direction.Y):0.###}, {Rounded(direction.Z):0.###})");

    /// <summary>A place in words.</summary>
    public static string At(double place) => string.Create(CultureInfo.InvariantCulture, $"{place:0.###} m");

    // Minus zero would read as another direction.
    private static double Rounded(double value) => Math.Round(value, 3) + 0.0;
}
