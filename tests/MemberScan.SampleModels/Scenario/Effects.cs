using System.Collections.Immutable;
using MemberScan.Mechanics.Forces;

namespace MemberScan.SampleModels.Scenario;

/// <summary>Section forces of statically determinate members, in equilibrium by their formulas: dMy/dx = Vz, dMz/dx = −Vy.</summary>
public static class Effects
{
    /// <summary>A member held at its start, with forces at its free end along its axes [N] and a couple about x [N·m]; two stations.</summary>
    public static ImmutableArray<ForceStation> Cantilever(double length, double n = 0, double py = 0, double pz = 0, double t = 0) =>
    [
        new(0, new SectionForces(n, py, pz, t, -pz * length, py * length)),
        new(length, new SectionForces(n, py, pz, t, 0, 0)),
    ];

    /// <summary>A member held at both ends against shear alone, under uniform loads along y and z [N/m] and an axial force [N].</summary>
    public static ImmutableArray<ForceStation> SimpleSpan(double length, int stations, double qy = 0, double qz = 0, double n = 0, double t = 0) =>
    [
        .. Enumerable.Range(0, stations).Select(i =>
        {
            var x = length * i / (stations - 1);
            var shear = length / 2 - x;
            var moment = x * (length - x) / 2;
            return new ForceStation(x, new SectionForces(n, qy * shear, qz * shear, t, qz * moment, -qy * moment));
        }),
    ];

    /// <summary>Simple spans one behind the other, hinged over each support: the shear jumps there.</summary>
    public static ImmutableArray<ForceStation> SimpleSpans(double span, int spans, int stations, double qy = 0, double qz = 0) =>
        [.. Enumerable.Range(0, spans).SelectMany(i => SimpleSpan(span, stations, qy, qz).Select(s => s with { X = span * i + s.X }))];

    /// <summary>The two effects with factors, station by station.</summary>
    public static ImmutableArray<ForceStation> Combine(
        double factorG, ImmutableArray<ForceStation> g, double factorQ, ImmutableArray<ForceStation> q) =>
        [.. g.Zip(q, (a, b) => new ForceStation(a.X, factorG * a.Forces + factorQ * b.Forces))];

    /// <summary>The same forces in axes turned by a quarter: new y = −z, new z = y.</summary>
    public static SectionForces QuarterTurned(in SectionForces f) => f with { Vy = -f.Vz, Vz = f.Vy, My = -f.Mz, Mz = f.My };
}
