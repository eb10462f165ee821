namespace MemberScan.Mechanics.Sections;

/// <summary>Seeks the smallest size of a section that passes a test, one dimension being free and the others kept.</summary>
public static class SizeSearch
{
    private const double Step = 1e-5;
    private const double Largest = 10;

    /// <summary>The sizes of a round bar, a tube and a box; none for other kinds.</summary>
    /// <param name="section">The section.</param>
    /// <param name="passes">The test; must hold for every size above one that passes.</param>
    public static IReadOnlyList<FreeSize> Of(CrossSection section, Func<CrossSection, bool> passes)
    {
        ArgumentNullException.ThrowIfNull(section);
        ArgumentNullException.ThrowIfNull(passes);
        return section switch
        {
            Round => [Search("diameter", d => Round.Fault(d / 2) is null ? new Round(d / 2) : null, 0, Largest, passes)],
            Tube tube =>
            [
                Search("wall, outer diameter kept", t => Tube.Fault(tube.OuterRadius, t) is null ? new Tube(tube.OuterRadius, t) : null, 0, tube.OuterRadius, passes),
                Search("outer diameter, wall kept", d => Tube.Fault(d / 2, tube.Wall) is null ? new Tube(d / 2, tube.Wall) : null, 2 * tube.Wall, Largest, passes),
            ],
            // The corner radii keep their ratio to the wall.
            Box box => [Search("wall, width and depth kept", t => OfWall(box, t), 0, Math.Min(box.Width, box.Depth) / 2, passes)],
            _ => [],
        };
    }

    private static Box? OfWall(Box box, double wall)
    {
        var (outer, inner) = (box.OuterRadius * wall / box.Wall, box.InnerRadius * wall / box.Wall);
        return Box.Fault(box.Width, box.Depth, wall, outer, inner) is null ? new Box(box.Width, box.Depth, wall, outer, inner) : null;
    }

    // Halving between what fails and what passes; sizes that are no section fail where too small and end the search where too large.
    private static FreeSize Search(string dimension, Func<double, CrossSection?> make, double from, double to, Func<CrossSection, bool> passes)
    {
        bool Passes(long steps) => make(steps * Step) is { } section && passes(section);

        var (low, high) = ((long)Math.Floor(from / Step), (long)Math.Ceiling(to / Step));
        while (high > low + 1 && make(high * Step) is null) high--;
        if (high <= low || !Passes(high)) return new FreeSize(dimension, null, null);

        while (high - low > 1)
        {
            var middle = (low + high) / 2;
            if (Passes(middle)) high = middle;
            else low = middle;
        }

        return new FreeSize(dimension, high * Step, make(high * Step));
    }
}
