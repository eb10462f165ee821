using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Mechanics.Forces;
using MemberScan.Model.Frames;
using MemberScan.Statics.Members;
using MemberScan.Statics.Solving;

namespace MemberScan.Statics.Results;

/// <summary>One member of a solved frame: its start forces by stiffness, everything along it by equilibrium.</summary>
internal sealed class SolvedMember : MemberResult
{
    private readonly FrameStations _wanted;
    private readonly MemberBody _body;
    private readonly MemberLoading _loading;
    private readonly SectionForces _start;
    private readonly double[] _breaks;
    private readonly EndDisplacement[] _atBreaks;

    public SolvedMember(FrameSolution solution, int situation, int number)
    {
        var stiffness = solution.Matrix.Frame.Members[number];
        _body = stiffness.Body;
        _wanted = _body.Member.Stations ?? solution.Matrix.Frame.Frame.Stations;
        _loading = solution.Loads[situation].LoadingOf(number);

        var at = solution.Cases[situation];
        Span<double> maps = stackalloc double[72], nodes = stackalloc double[12], forces = stackalloc double[12], unresisted = stackalloc double[12];
        solution.Matrix.Maps(number, maps);
        Displace(maps, at.High, nodes);
        Span<double> strain = stackalloc double[6], held = stackalloc double[12];
        solution.Residual.Strain(number, at, strain);
        ElementResidual.Answer(stiffness, strain, forces);
        stiffness.HeldForces(_loading, held, unresisted);
        for (var i = 0; i < 12; i++) forces[i] += held[i];
        _start = new SectionForces(-forces[0], -forces[1], -forces[2], -forces[3], -forces[4], -forces[5]);

        _breaks = [.. _loading.Breaks(Length, _body.TaperPlaces)];
        _atBreaks = new EndDisplacement[_breaks.Length];
        _atBreaks[0] = stiffness.StartSide(nodes, _loading);
        for (var k = 1; k < _breaks.Length; k++) _atBreaks[k] = _body.Follow(_start, _loading, _breaks[k - 1], _atBreaks[k - 1], _breaks[k]);
    }

    /// <inheritdoc/>
    public override MemberAxes Axes => _body.Axes;

    /// <inheritdoc/>
    public override double Length => _body.Length;

    /// <inheritdoc/>
    public override ImmutableArray<MemberStation> Stations
    {
        get
        {
            var rows = ImmutableArray.CreateBuilder<MemberStation>();
            foreach (var asked in _wanted.Along(Length))
            {
                var x = Snapped(asked);
                var (before, moved) = (ForcesAt(x, afterJump: false), DisplacementAt(x));
                rows.Add(new MemberStation(asked, before, moved));
                if (Jumps(x)) rows.Add(new MemberStation(asked, ForcesAt(x, afterJump: true), moved));
            }

            return rows.ToImmutable();
        }
    }

    /// <inheritdoc/>
    public override ImmutableArray<MemberExtreme> Extremes => MemberExtremes.Of(this, _breaks);

    /// <inheritdoc/>
    public override ImmutableArray<double> Places => MemberExtremes.Places(this, _breaks);

    /// <inheritdoc/>
    public override SectionForces ForcesAt(double x, bool afterJump)
    {
        Refuse(x);
        var forces = _loading.At(_start, x, afterJump);
        return forces with { T = _body.FlexibilityAt(x).AboutShearCentre(forces) };
    }

    /// <inheritdoc/>
    public override Vector3 DisplacementAt(double x)
    {
        Refuse(x);
        var k = Array.BinarySearch(_breaks, x);
        if (k < 0) k = Math.Max(0, ~k - 1);
        var moved = _breaks[k] == x ? _atBreaks[k] : _body.Follow(_start, _loading, _breaks[k], _atBreaks[k], x);
        return new Vector3(moved.X, moved.Y, moved.Z);
    }

    /// <inheritdoc/>
    public override Vector3 ChordDeflectionAt(double x)
    {
        var (first, last) = (DisplacementAt(0), DisplacementAt(Length));
        return DisplacementAt(x) - first - x / Length * (last - first);
    }

    // Displacements of the nodes' sides of both ends, member axes.
    private void Displace(ReadOnlySpan<double> maps, double[] displacements, Span<double> nodes)
    {
        for (var end = 0; end < 2; end++)
        {
            var u = displacements.AsSpan(6 * (end == 0 ? _body.Member.Start : _body.Member.End), 6);
            for (var i = 0; i < 6; i++)
            {
                var sum = 0.0;
                for (var j = 0; j < 6; j++) sum += maps[36 * end + 6 * i + j] * u[j];
                nodes[6 * end + i] = sum;
            }
        }
    }

    // A station within rounding of a load stands at the load.
    private double Snapped(double x)
    {
        const double Rounding = 1e-9;
        if (x < -Rounding * Length || x > (1 + Rounding) * Length)
            throw new ArgumentException(FormattableString.Invariant($"station {x} m lies beyond member {_body.Member.Name}, whose flexible length is {Length} m"));

        var clamped = Math.Clamp(x, 0, Length);
        foreach (var place in _breaks)
            if (Math.Abs(place - clamped) <= Rounding * Length) return place;
        return clamped;
    }

    private bool Jumps(double x) => _loading.Points.Exists(p => p.At == x && (p.Force != default || p.Moment != default));

    private void Refuse(double x)
    {
        if (!(x >= 0 && x <= Length)) throw new ArgumentOutOfRangeException(nameof(x), x, "the place lies beyond the member");
    }
}
