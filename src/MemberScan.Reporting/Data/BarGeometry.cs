using System.Collections.Immutable;
using MemberScan.Foundation.Geometry;
using MemberScan.Screening.Record;

namespace MemberScan.Reporting.Data;

/// <summary>Where each bar lies, for drawing: start, direction of x and of y, about the middle of the model.</summary>
internal static class BarGeometry
{
    /// <summary>Adds nine columns; a member whose axes or length are not known has NaN in each.</summary>
    /// <returns>The place in project coordinates [m] that the starts are counted from: in single precision far coordinates would lose millimetres.</returns>
    public static (double X, double Y, double Z) Add(ColumnSet columns, ImmutableArray<MemberResult> members)
    {
        var middle = Pictures.Box.Around(members)?.Centre ?? Vector3.Zero;
        ImmutableArray<MemberAxes?> axes = [.. members.Select(m => m is { Axes: { } known, Length: { } length } && known.Origin.IsFinite && double.IsFinite(length) ? known : null)];
        Add("x0", a => a.Origin.X - middle.X);
        Add("y0", a => a.Origin.Y - middle.Y);
        Add("z0", a => a.Origin.Z - middle.Z);
        Add("xx", a => a.X.X);
        Add("xy", a => a.X.Y);
        Add("xz", a => a.X.Z);
        Add("yx", a => a.Y.X);
        Add("yy", a => a.Y.Y);
        Add("yz", a => a.Y.Z);
        return (middle.X, middle.Y, middle.Z);

        void Add(string name, Func<MemberAxes, double> of) => columns.Add(name, axes.Select(a => a is { } known ? (float)of(known) : float.NaN));
    }
}
