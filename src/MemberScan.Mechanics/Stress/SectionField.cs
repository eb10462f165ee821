using System.Buffers;
using MemberScan.Mechanics.Edges;
using MemberScan.Mechanics.Fields;
using MemberScan.Mechanics.Forces;
using MemberScan.Mechanics.Outlines;
using MemberScan.Mechanics.Profiles;
using MemberScan.Mechanics.Properties;
using MemberScan.Mechanics.Resultants;
using MemberScan.Mechanics.Sections;
using MemberScan.Mechanics.Shear;
using MemberScan.Mechanics.Warping;

namespace MemberScan.Mechanics.Stress;

/// <summary>A stress field made of the bending formula for σ and a shear solution.</summary>
internal sealed class SectionField : StressField
{
    // A state whose best node is below this share of the best state's cannot overtake it: between nodes a target that is a polynomial
    // of degree 4 along each edge or circle rises by less than 4 %, between nodes twice as far apart by less than 16 %.
    private const double Worthwhile = 0.93;
    private const double WorthwhileWhenThin = 0.8;

    // Share of a target, a square of the stress or the stress, that a search in haste may miss: twice 0.1 % and a margin.
    private const double HasteMisses = 4e-3;

    private readonly ShearSolution _shear;
    private readonly Outline _outline;
    private readonly GoverningSearch _search;
    private readonly GoverningSearch? _fillets;
    private readonly Lazy<Closure> _closure;
    private readonly Lazy<ShearAreas> _shearAreas;
    private readonly Lazy<(BlockScan Thin, BlockScan Dense)> _scans;

    /// <summary>The field of a section with its shear solution.</summary>
    public SectionField(
        CrossSection section, ShearModel model, double poisson, SectionProperties properties, ShearSolution shear)
        : base(section, model, poisson, properties)
    {
        _shear = shear;
        _outline = OutlineOf(section, shear);
        _search = new GoverningSearch(this, shear, _outline);
        if (shear.HasPeaks && FilletsOf(section, _outline) is { Length: > 0 } arcs)
            _fillets = new GoverningSearch(this, shear, new FilletOutline(section, _outline, arcs));
        _scans = new Lazy<(BlockScan, BlockScan)>(() => (new BlockScan(properties, shear, _outline, true), new BlockScan(properties, shear, _outline, false)));
        _closure = new Lazy<Closure>(() => ClosureIntegral.Of(properties, shear, _outline));
        _shearAreas = new Lazy<ShearAreas>(() => ClosureIntegral.ShearAreas(shear, _outline));
    }

    /// <inheritdoc/>
    public override bool CarriesTorsion => _shear.CarriesTorsion;

    /// <inheritdoc/>
    public override FieldError? NumericalError => _shear.NumericalError;

    /// <summary>The tables for many states at a time.</summary>
    public (BlockScan Thin, BlockScan Dense) Scans => _scans.Value;

    /// <summary>Points with their share of the area, dense enough for products of two stresses.</summary>
    public IEnumerable<(double Y, double Z, double Area)> Quadrature() => _outline.Quadrature();

    /// <inheritdoc/>
    public override Closure Closure => _closure.Value;

    /// <inheritdoc/>
    public override ShearAreas ShearAreas => _shearAreas.Value;

    /// <inheritdoc/>
    public override StressState At(in SectionForces forces, double y, double z)
    {
        RefuseTorsion(forces);
        var shear = _shear.At(forces.Vy, forces.Vz, forces.T, y, z);
        return new StressState(BendingStress.At(Properties, forces, y, z), shear.XY, shear.XZ);
    }

    /// <inheritdoc/>
    public override bool Contains(double y, double z) => _outline.Contains(y, z, Outline.OnEdge * _outline.Extent);

    /// <inheritdoc/>
    public override bool Decides(double y, double z) => _outline.Decides(y, z);

    /// <inheritdoc/>
    public override GoverningPoint? FilletPeak(in SectionForces forces, StressMeasure measure)
    {
        if (!forces.IsFinite) throw new ArgumentException("section forces must be finite numbers", nameof(forces));

        return _fillets?.Find(forces, measure);
    }

    /// <inheritdoc/>
    public override GoverningPoint Govern(in SectionForces forces, StressMeasure measure)
    {
        if (!forces.IsFinite) throw new ArgumentException("section forces must be finite numbers", nameof(forces));

        RefuseTorsion(forces);
        return _search.Find(forces, measure);
    }

    /// <inheritdoc/>
    public override void GovernAll(ReadOnlySpan<SectionForces> states, Span<GoverningPoint> largest, Span<int> which)
    {
        if (states.IsEmpty) throw new ArgumentException("at least one state is needed", nameof(states));
        if (largest.Length < BlockScan.Measures || which.Length < BlockScan.Measures) throw new ArgumentException("six results need room", nameof(largest));
        foreach (ref readonly var forces in states)
            if (!forces.IsFinite) throw new ArgumentException("section forces must be finite numbers", nameof(states));

        var targetBuffer = ArrayPool<double>.Shared.Rent(states.Length * BlockScan.Measures);
        var keyBuffer = ArrayPool<double>.Shared.Rent(states.Length);
        var numberBuffer = ArrayPool<int>.Shared.Rent(2 * states.Length);
        var keptBuffer = ArrayPool<SectionForces>.Shared.Rent(states.Length);
        try
        {
            // Twice: over few nodes for all states, over all nodes for those that are left.
            var targets = targetBuffer.AsSpan(0, states.Length * BlockScan.Measures);
            Scans.Thin.Scan(states, targets);
            var numbers = numberBuffer.AsSpan(0, states.Length);
            var count = Promising(targets, numbers);
            for (var k = 0; k < count; k++) keptBuffer[k] = states[numbers[k]];
            var kept = keptBuffer.AsSpan(0, count);
            Scans.Dense.Scan(kept, targets[..(count * BlockScan.Measures)]);
            for (var measure = 0; measure < BlockScan.Measures; measure++)
            {
                (largest[measure], var at) = Largest(kept, targets, (StressMeasure)measure, keyBuffer, numberBuffer.AsSpan(states.Length, count));
                which[measure] = numbers[at];
            }
        }
        finally
        {
            ArrayPool<double>.Shared.Return(targetBuffer);
            ArrayPool<double>.Shared.Return(keyBuffer);
            ArrayPool<int>.Shared.Return(numberBuffer);
            ArrayPool<SectionForces>.Shared.Return(keptBuffer);
        }
    }

    /// <inheritdoc/>
    public override void GovernEach(ReadOnlySpan<SectionForces> states, StressMeasure measure, Span<double> values)
    {
        if (values.Length < states.Length) throw new ArgumentException("every state needs room for its value", nameof(values));
        foreach (ref readonly var forces in states)
        {
            if (!forces.IsFinite) throw new ArgumentException("section forces must be finite numbers", nameof(states));
            RefuseTorsion(forces);
        }

        for (var i = 0; i < states.Length; i++) values[i] = _search.Value(states[i], measure);
    }

    private void RefuseTorsion(in SectionForces forces)
    {
        if (forces.T != 0 && !CarriesTorsion) throw new ArgumentException($"the elementary model of this {Section.Kind} carries no torsion");
    }

    private static Outline OutlineOf(CrossSection section, ShearSolution shear)
    {
        if (section is not (OutlineSection or OpenProfile)) return Outline.Of(section, shear.HasPeaks);

        var shape = new OutlineShape(ProfileEdges.Of(section));
        var walls = section is OpenProfile profile ? shear as OpenProfileElementary ?? new OpenProfileElementary(profile, OutlineProperties.Of(section, 0)) : null;
        return new ProfileOutline(
            section, shape, SolvedSections.TryOf(section)!.Potential.Mesh, shear.HasPeaks,
            shear is OpenProfileElementary elementary ? elementary.Creases() : [],
            walls is null ? (y, z) => ProfileOutline.PlainName(shape, y, z) : (y, z) => walls.NameOf(y, z));
    }

    private static EdgeCurve[] FilletsOf(CrossSection section, Outline outline) => (section, outline) switch
    {
        (Box { InnerRadius: > 0 } box, _) when ReentrantZone.ReachOf(box) > 0 => FilletOutline.ArcsOf(box),
        (_, ProfileOutline profile) => [.. profile.Fillets],
        _ => [],
    };

    // Numbers of the states that may be largest in some measure.
    private static int Promising(ReadOnlySpan<double> targets, Span<int> numbers)
    {
        Span<double> floor = stackalloc double[BlockScan.Measures];
        floor.Clear();
        for (var i = 0; i < targets.Length; i += BlockScan.Measures)
            for (var measure = 0; measure < floor.Length; measure++) floor[measure] = Math.Max(floor[measure], targets[i + measure]);
        for (var measure = 0; measure < floor.Length; measure++) floor[measure] *= WorthwhileWhenThin;

        var count = 0;
        for (var s = 0; s < numbers.Length; s++)
        {
            var isKept = false;
            for (var measure = 0; measure < floor.Length; measure++) isKept |= targets[s * BlockScan.Measures + measure] >= floor[measure];
            if (isKept) numbers[count++] = s;
        }

        return count;
    }

    private (GoverningPoint Point, int State) Largest(
        ReadOnlySpan<SectionForces> states, ReadOnlySpan<double> targets, StressMeasure measure, Span<double> keys, Span<int> order)
    {
        const double Tie = 1e-9;

        var highest = 0.0;
        for (var s = 0; s < states.Length; s++) highest = Math.Max(highest, targets[s * BlockScan.Measures + (int)measure]);
        var count = 0;
        for (var s = 0; s < states.Length; s++)
        {
            var target = targets[s * BlockScan.Measures + (int)measure];
            if (target < Worthwhile * highest) continue;
            (keys[count], order[count]) = (-target, s);
            count++;
        }

        keys[..count].Sort(order[..count]);
        // Found in haste first; those within what haste may miss are then searched with care.
        var (left, leading) = (0, double.NegativeInfinity);
        for (; left < count && -keys[left] >= Worthwhile * leading; left++)
        {
            var target = _search.TargetInHaste(states[order[left]], measure);
            keys[left] = target;
            leading = Math.Max(leading, target);
        }

        var (best, bestState, bestTarget) = (default(GoverningPoint), -1, double.NegativeInfinity);
        for (var k = 0; k < left; k++)
        {
            if (keys[k] < leading * (1 - HasteMisses)) continue;

            var point = Govern(states[order[k]], measure);
            var target = Target.Of(measure, point.State);
            var isEqual = Math.Abs(target - bestTarget) <= Tie * Math.Abs(bestTarget);
            if (bestState < 0 || (isEqual ? order[k] < bestState : target > bestTarget)) (best, bestState) = (point, order[k]);
            bestTarget = Math.Max(bestTarget, target);
        }

        return (best, bestState);
    }
}
