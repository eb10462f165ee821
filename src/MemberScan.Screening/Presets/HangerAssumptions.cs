using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Model.Forces;
using MemberScan.Model.Members;
using MemberScan.Model.Presets;
using MemberScan.Screening.Contacts;

namespace MemberScan.Screening.Presets;

/// <summary>Hanger rods and trapeze struts under the weight of a pipe.</summary>
internal sealed class HangerAssumptions(PresetMembers members, PresetUse use)
{
    /// <summary>Acceleration of gravity [m/s²].</summary>
    public const double Gravity = 9.80665;

    /// <summary>Share of the length by which a rod rises at least: 10° off the plumb line.</summary>
    private const double Plumb = 0.985;

    private static readonly string[] s_roles = ["hanger", "rod", "strut"];

    /// <summary>Load of one hanger point [N].</summary>
    public double Load => use.Preset.WeightFactor * Weight + use.Preset.Added;

    private double Weight => use.Spacing * use.Pipe!.WeightPerLength(use.ContentsDensity, Gravity);

    /// <summary>Forces of a member; empty when the preset is not for it.</summary>
    public IEnumerable<MemberForces> Of(Member member)
    {
        if (!PresetMembers.IsFor(use, member, s_roles)) return [];

        var blank = new Assumption(member.Key, use, "");
        if (members.Line(member.Key) is not { } line) return [blank.Doubt("the member is bent, or its section, length or axes are not known")];
        if (members.Doubt(line.Key, IsHanger) is { } doubt) return [blank.Doubt($"a contact is in doubt ({doubt.Words})")];
        if (members.IsLevel(member.Key)) return Strut(blank, line);

        return IsRod(member.Key) ? Rod(blank, line) : [blank.Doubt("the rod is not plumb")];
    }

    // Neighbours count by their role too: a pattern may name the rods alone.
    private bool IsHanger(string key) => PresetMembers.IsFor(use, members[key], s_roles) || s_roles.Contains(members[key].Role);

    private bool IsRod(string key) => IsHanger(key) && members.Line(key) is { } line && Math.Abs(line.Axes.X.Z) >= Plumb;

    private IEnumerable<MemberForces> Rod(Assumption blank, BarLine line)
    {
        var struts = members.Contacts.Of(line.Key).Where(c => c.IsCertain && IsHanger(c.Other(line.Key)) && members.IsLevel(c.Other(line.Key))).Select(c => c.Other(line.Key)).ToList();
        var model = struts.Count > 0
            ? $"a rod of a trapeze ({string.Join(", ", struts)}), hung from above, the pipe right beside it"
            : "a rod that carries the pipe alone, hung from above";
        yield return (blank with { Model = $"{model}; {Words}" }).Forces($"{Assumption.Kn(Load)} hung", [new(0, new(Load, 0, 0, 0, 0, 0)), new(line.Length, new(Load, 0, 0, 0, 0, 0))]);
    }

    private IEnumerable<MemberForces> Strut(Assumption blank, BarLine line)
    {
        var rods = members.Places(line.Key, IsRod);
        if (rods.Count < 2) return [blank.Doubt($"it touches {(rods.Count == 0 ? "no rod" : "one rod only")} within {members.Contacts.Tolerance * 1e3:0.#} mm")];

        var assumption = blank with { Model = $"simple spans between rods at {string.Join(", ", rods.Select(Assumption.At))}, the pipe at the worst place between them; {Words}" };
        return new BeamAssumptions(members, assumption, line, rods).Concentrated(Load, [line.Axes.Components(-Vector3.UnitZ)], betweenSupports: true);
    }

    private string Words
    {
        get
        {
            var pipe = use.Pipe!;
            var weight = string.Create(CultureInfo.InvariantCulture,
                $"pipe {pipe.Name} schedule {pipe.Schedule} ({pipe.Source}) with {use.Contents}, {Weight / use.Spacing:0.#} N/m over {use.Spacing:0.###} m");
            return use.Preset.Kind == PresetKind.SprinklerHanger
                ? string.Create(CultureInfo.InvariantCulture, $"{use.Preset.WeightFactor:0.##} × {weight} and {use.Preset.Added:0} N")
                : weight;
        }
    }
}
