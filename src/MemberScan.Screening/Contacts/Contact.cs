using System.Globalization;
using MemberScan.Foundation.Geometry;

namespace MemberScan.Screening.Contacts;

/// <summary>Two members that touch, found by the nearness of their axes.</summary>
/// <param name="First">Key of the first member; of an end at a side the one whose end it is.</param>
/// <param name="FirstAt">Place along the first, from its start [m].</param>
/// <param name="Second">Key of the second member.</param>
/// <param name="SecondAt">Place along the second, from its start [m].</param>
/// <param name="Kind">How they touch.</param>
/// <param name="Gap">Distance of their surfaces [m]; below zero where they overlap.</param>
/// <param name="AxisDistance">Distance of their axes [m].</param>
/// <param name="IsCertain">Whether the gap is within the tolerance; otherwise they nearly touch and it is in doubt whether they do.</param>
/// <param name="Point">The place on the axis of the first [m].</param>
public sealed record Contact(
    string First, double FirstAt, string Second, double SecondAt, ContactKind Kind, double Gap, double AxisDistance, bool IsCertain, Vector3 Point)
{
    /// <summary>Whether it is one of a member.</summary>
    public bool Of(string key) => First == key || Second == key;

    /// <summary>The other member.</summary>
    public string Other(string key) => First == key ? Second : First;

    /// <summary>Place along a member [m].</summary>
    public double At(string key) => First == key ? FirstAt : SecondAt;

    /// <summary>One sentence.</summary>
    public string Words => string.Create(CultureInfo.InvariantCulture,
        $"{First} at {FirstAt:0.###} m and {Second} at {SecondAt:0.###} m: {KindWords}, gap {Gap * 1e3:0.#} mm{(IsCertain ? "" : ", in doubt")}");

    private string KindWords => Kind switch
    {
        ContactKind.EndToEnd => "end at end",
        ContactKind.EndToSide => "end at side",
        ContactKind.Crossing => "crossing",
        _ => "alongside",
    };
}
