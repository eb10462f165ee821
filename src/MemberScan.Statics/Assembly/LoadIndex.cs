using MemberScan.Foundation.Geometry;
using MemberScan.Model.Frames.Loads;
using MemberScan.Statics.Members;

namespace MemberScan.Statics.Assembly;

/// <summary>The member loads of one situation, found by member.</summary>
internal sealed class LoadIndex(FrameSituation situation)
{
    private readonly ILookup<int, MemberPointLoad> _points = situation.PointLoads.ToLookup(load => load.Member);
    private readonly ILookup<int, MemberLineLoad> _lines = situation.LineLoads.ToLookup(load => load.Member);
    private readonly ILookup<int, MemberTemperature> _temperatures = situation.Temperatures.ToLookup(load => load.Member);

    /// <summary>The situation.</summary>
    public FrameSituation Situation => situation;

    /// <summary>Whether a member carries any load.</summary>
    public bool Loads(int number) =>
        situation.SelfWeight != default || _points.Contains(number) || _lines.Contains(number) || _temperatures.Contains(number);

    /// <summary>Adds the loads of a member, multiplied, in its axes.</summary>
    public void AddTo(MemberLoading loading, MemberBody body, int number, double factor)
    {
        foreach (var load in _points[number])
        {
            var at = Math.Clamp(load.At, 0, body.Length);
            loading.Points.Add(new PointPiece(at, factor * Local(body, load.Force, load.Axes, false), factor * Local(body, load.Moment, load.Axes, false)));
        }

        foreach (var load in _lines[number])
        {
            var (from, to) = (Math.Clamp(load.From ?? 0, 0, body.Length), Math.Clamp(load.To ?? body.Length, 0, body.Length));
            if (to <= from) continue;
            var (q1, q2) = (Local(body, load.ForceFrom, load.Axes, true), Local(body, load.ForceTo, load.Axes, true));
            var (m1, m2) = (Local(body, load.MomentFrom, load.Axes, true), Local(body, load.MomentTo, load.Axes, true));
            loading.Lines.Add(new LinePiece(from, to, factor * q1, factor / (to - from) * (q2 - q1), factor * m1, factor / (to - from) * (m2 - m1)));
        }

        foreach (var t in _temperatures[number])
            loading.Free += Strains.OfTemperature(factor * body.Member.Material.Expansion, t);
        AddWeight(loading, body, factor);
    }

    private void AddWeight(MemberLoading loading, MemberBody body, double factor)
    {
        if (situation.SelfWeight == default || body.Member.Material.UnitWeight == 0) return;

        var direction = factor * body.Member.Material.UnitWeight * body.Axes.Components(situation.SelfWeight);
        IReadOnlyList<double> places = body.IsTapered ? body.TaperPlaces : [0, body.Length];
        for (var k = 0; k + 1 < places.Count; k++)
        {
            var (from, to) = (places[k], places[k + 1]);
            var (first, last) = (body.AreaAt(from), body.AreaAt(to));
            loading.Lines.Add(new LinePiece(from, to, first * direction, (last - first) / (to - from) * direction, default, default));
        }
    }

    // Projected: a component acts per length of the projection on the plane square to it, which is sin of the angle between.
    private static Vector3 Local(MemberBody body, Vector3 load, LoadAxes axes, bool isSpread)
    {
        if (axes == LoadAxes.Local) return load;
        if (axes == LoadAxes.Projected && isSpread)
        {
            var x = body.Axes.X;
            load = new Vector3(double.Hypot(x.Y, x.Z) * load.X, double.Hypot(x.Z, x.X) * load.Y, double.Hypot(x.X, x.Y) * load.Z);
        }

        return body.Axes.Components(load);
    }
}
