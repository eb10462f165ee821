using System.Collections.Immutable;
using System.Globalization;
using MemberScan.Foundation.Geometry;
using MemberScan.Ifc.Analysis;
using MemberScan.Ifc.Analysis.Loads;
using MemberScan.Ifc.Frames.Loading;
using MemberScan.Model;
using MemberScan.Model.Forces;
using MemberScan.Model.Frames.Loads;
using MemberScan.Model.Loads;
using MemberScan.Model.Verdicts;
using FrameAxes = MemberScan.Model.Frames.Loads.LoadAxes;
using ModelAxes = MemberScan.Model.Loads.LoadAxes;

namespace MemberScan.Ifc.Frames;

/// <summary>Lays the loads of one situation on the members and nodes of a frame.</summary>
internal sealed class SituationBuilder(Situation situation, Vector3 selfWeight)
{
    /// <summary>Straight stretches by which a half sine or a parabola is replaced; each keeps the curve's own value at its ends.</summary>
    public const int Stretches = 64;

    private readonly ImmutableArray<NodeLoad>.Builder _nodes = ImmutableArray.CreateBuilder<NodeLoad>();
    private readonly ImmutableArray<MemberPointLoad>.Builder _points = ImmutableArray.CreateBuilder<MemberPointLoad>();
    private readonly ImmutableArray<MemberLineLoad>.Builder _lines = ImmutableArray.CreateBuilder<MemberLineLoad>();
    private readonly ImmutableArray<MemberTemperature>.Builder _temperatures = ImmutableArray.CreateBuilder<MemberTemperature>();
    private readonly ImmutableArray<SupportMovement>.Builder _movements = ImmutableArray.CreateBuilder<SupportMovement>();

    /// <summary>Why the loads are not all known; null when they are.</summary>
    public Reason? Unusable { get; private set; }

    /// <summary>What a reader must know of the loads.</summary>
    public List<string> Notes { get; } = [];

    /// <summary>Takes the first reason.</summary>
    public void Fail(Reason why) => Unusable ??= why;

    /// <summary>The situation; without loads where they are not all known.</summary>
    public FrameSituation Build()
    {
        var blank = new FrameSituation { Name = situation.Name, Kind = situation.Kind };
        return Unusable is not null ? blank : blank with
        {
            SelfWeight = selfWeight,
            NodeLoads = _nodes.ToImmutable(),
            PointLoads = _points.ToImmutable(),
            LineLoads = _lines.ToImmutable(),
            Temperatures = _temperatures.ToImmutable(),
            Movements = _movements.ToImmutable(),
        };
    }

    /// <summary>Adds an action on a node.</summary>
    public void Add(NodeAction action, double factor)
    {
        if (action.Unusable is { } why)
        {
            Fail(why);
            return;
        }

        if (action.Force != Vector3.Zero || action.Moment != Vector3.Zero) _nodes.Add(new NodeLoad(action.Node, factor * action.Force, factor * action.Moment));
        _movements.AddRange(action.Movements.Select(m => m with { Value = factor * m.Value }));
    }

    /// <summary>Adds a load on an analytical member to the frame members that it consists of.</summary>
    public void Add(MemberLoad load, double factor, AnalyticalMember line, FrameAssembly assembly)
    {
        var pieces = assembly.PiecesOf(load.Member);
        if (pieces.Count == 0) return;

        // Where the section has no preferred axes the member may have none of its own; then only its components along the project's axes have a meaning.
        if (line.Axes is not Finding<MemberAxes>.Found { Value: var axes })
        {
            if (load.Axes == ModelAxes.Member && load.Shape != LoadShape.Temperature)
            {
                Fail(new Reason(ReasonCode.AxesUnknown, $"the load {load.Source} follows the axes of a member that has none"));
                return;
            }

            axes = assembly.Pieces[pieces[0]].Axes;
        }

        switch (load.Shape)
        {
            case LoadShape.Temperature: AddTemperature(load, factor, axes, pieces, assembly); break;
            case LoadShape.Point: AddPoint(load, factor, axes, pieces, assembly); break;
            case LoadShape.Linear: AddStretch(load.From, load.To, factor, Global(load.Along(load.Start, axes), axes), Global(load.Along(load.End, axes), axes), pieces, assembly); break;
            default: AddCurved(load, factor, axes, pieces, assembly); break;
        }
    }

    /// <summary>Makes sure that every member's weight is known.</summary>
    public void Weigh(FrameAssembly assembly)
    {
        for (var i = 0; i < assembly.Pieces.Count; i++)
            if (assembly.Stiffness[i].Density is null)
                Fail(new Reason(ReasonCode.ForcesIncomplete, $"self-weight acts, and the density of {assembly.Pieces[i].Name} is not known"));
        Notes.Add(string.Create(CultureInfo.InvariantCulture, $"self-weight by the sections' areas, with g = {MemberWeight.Gravity} m/s²"));
    }

    private void AddPoint(MemberLoad load, double factor, MemberAxes axes, IReadOnlyList<int> pieces, FrameAssembly assembly)
    {
        var vector = Global(load.Along(load.Start, axes), axes);
        var at = Math.Max(0, load.From);
        var piece = pieces.LastOrDefault(p => assembly.Pieces[p].From <= at, pieces[0]);
        var place = Math.Clamp(at - assembly.Pieces[piece].From, 0, assembly.LengthOf(piece));
        vector = AboutAxis(vector, assembly.BesideOf(piece));
        _points.Add(new MemberPointLoad(piece, place, factor * vector.Force, factor * vector.Couple, FrameAxes.Global));
    }

    private void AddCurved(MemberLoad load, double factor, MemberAxes axes, IReadOnlyList<int> pieces, FrameAssembly assembly)
    {
        double Share(double t) => load.Shape == LoadShape.HalfSine ? Math.Sin(Math.PI * t) : 4 * t * (1 - t);
        var middle = Global(load.Along(load.Start, axes), axes);
        for (var i = 0; i < Stretches; i++)
        {
            var (a, b) = ((double)i / Stretches, (i + 1.0) / Stretches);
            AddStretch(load.From + a * (load.To - load.From), load.From + b * (load.To - load.From), factor, Share(a) * middle, Share(b) * middle, pieces, assembly);
        }

        Notes.Add($"the load {load.Source} is taken as {Stretches} straight stretches");
    }

    /// <summary>A load that changes linearly over a stretch of the analytical member, cut at the ends of its pieces.</summary>
    private void AddStretch(double from, double to, double factor, LoadVector start, LoadVector end, IReadOnlyList<int> pieces, FrameAssembly assembly)
    {
        foreach (var piece in pieces)
        {
            var (first, length) = (assembly.Pieces[piece].From, assembly.LengthOf(piece));
            var (a, b) = (Math.Max(from, first), Math.Min(to, first + length));
            if (b - a <= 0) continue;

            LoadVector At(double x) => start + (x - from) / (to - from) * (end + -1 * start);
            var (atA, atB) = (factor * AboutAxis(At(a), assembly.BesideOf(piece)), factor * AboutAxis(At(b), assembly.BesideOf(piece)));
            _lines.Add(new MemberLineLoad(piece, Math.Max(0, a - first), Math.Min(length, b - first), atA.Force, atB.Force, FrameAxes.Global) { MomentFrom = atA.Couple, MomentTo = atB.Couple });
        }
    }

    /// <summary>A change of temperature; the differences across the section are between its outer fibres, so a gradient is one over the extent.</summary>
    private void AddTemperature(MemberLoad load, double factor, MemberAxes axes, IReadOnlyList<int> pieces, FrameAssembly assembly)
    {
        foreach (var piece in pieces)
        {
            var (own, stiffness) = (assembly.Pieces[piece].Axes, assembly.Stiffness[piece]);
            if (stiffness.Expansion is null)
            {
                Fail(new Reason(ReasonCode.ForcesIncomplete, $"the temperature changes ({load.Source}), and the thermal expansion of {assembly.Pieces[piece].Name} is not known"));
                return;
            }

            var change = factor * load.Start.Force;
            var isAlike = axes.Z.Cross(own.Z).Length < 1e-6;
            if (!isAlike && (change.Y != 0 || change.Z != 0))
            {
                Fail(new Reason(ReasonCode.AxesUnknown, $"the load {load.Source} differs across the section of {assembly.Pieces[piece].Name}, whose axes are not those of the analytical member"));
                return;
            }

            var isUneven = change.Y != 0 || change.Z != 0;
            if (isUneven && (stiffness.Course is not null || !(stiffness.ExtentY > 0 && stiffness.ExtentZ > 0)))
            {
                Fail(new Reason(ReasonCode.ForcesIncomplete, $"the load {load.Source} differs across the section of {assembly.Pieces[piece].Name}, whose extents are not known all along it"));
                return;
            }

            var side = axes.Z.Dot(own.Z) < 0 ? -1 : 1;
            _temperatures.Add(new MemberTemperature(piece, change.X, isUneven ? side * change.Y / stiffness.ExtentY : 0, isUneven ? side * change.Z / stiffness.ExtentZ : 0));
        }

        if (load.Start.Force.Y != 0 || load.Start.Force.Z != 0) Notes.Add($"the load {load.Source}: differences of temperature are taken between the outer fibres");
    }

    /// <summary>A load on the line as it acts on the axis beside it: with the couple of its arm.</summary>
    private static LoadVector AboutAxis(in LoadVector load, Vector3 beside) => beside == Vector3.Zero ? load : load with { Couple = load.Couple - beside.Cross(load.Force) };

    private static LoadVector Global(in LoadVector local, MemberAxes axes)
    {
        Vector3 Turned(Vector3 v) => v.X * axes.X + v.Y * axes.Y + v.Z * axes.Z;
        return new LoadVector(Turned(local.Force), Turned(local.Couple));
    }
}
