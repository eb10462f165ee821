using System.Globalization;
using System.Text;
using MemberScan.Model.Verdicts;
using MemberScan.OpenModels;
using MemberScan.Part21;

namespace MemberScan.Screening.Tests.Frames;

/// <summary>
/// structural-beams-linked-ifc4.ifc: twelve beams of six profiles with analytical members apart from each other, without supports and loads, and without a unit of stress. The test
/// holds their starts and puts 1 kN downwards on their ends.
/// </summary>
public sealed class OpenLinkedBeamsTests
{
    private const double Load = 1000;

    private static readonly int[] s_starts = [103, 135, 183, 231, 279, 311, 343, 391, 439, 471, 503, 535];
    private static readonly int[] s_ends = [109, 141, 189, 237, 285, 317, 349, 397, 445, 477, 509, 541];

    /// <summary>From (x, 1, 0) to (x, 3, 0) the lever is 2 m; from (x, 1, 0.5) to (x + 0.25, 3, 1) its level part is √(0.25² + 2²) = 2.01556 m.</summary>
    [Fact]
    public void Each_beam_is_solved_once_supports_and_a_load_are_added()
    {
        var record = Landing.Screen(Encoding.UTF8.GetBytes(Loaded()), settings: Settings);

        Assert.Equal(12, record.Members.Length);
        Assert.DoesNotContain(record.Findings, f => f.Code == "SCR-0031");
        foreach (var member in record.Members)
        {
            var forces = member.Situations.Single(s => s.Situation == "SLS").Stations[0].Forces;
            var lever = Math.Abs(member.Axes!.X.Z) > 0.1 ? double.Hypot(0.25, 2) : 2;
            // L, T and U have their centroid up to 105 mm beside the line, about which an axial force has that arm.
            var arm = member.Section[0] is 'L' or 'T' or 'U' ? 0.105 : 0;
            Assert.Equal(-Load * member.Axes.X.Z, forces.N, 1e-6 * Load);
            Assert.Equal(Load * lever, double.Hypot(forces.My, forces.Mz), 1e-6 * Load * lever + arm * Math.Abs(forces.N));
        }

        Assert.Contains(record.Members, m => m.Verdict == Verdict.WithinLimit);
    }

    /// <summary>
    /// The channel's line runs through the middle of its box, 55 mm from the back of its web. Its centroid lies 27.16 mm from there towards the web, its shear
    /// centre beyond the web, y_S from the centroid: a load on the line turns the section about the shear centre with the arm 27.16 mm − y_S.
    /// </summary>
    [Fact]
    public void A_load_on_a_line_beside_the_centroid_twists_the_section()
    {
        var record = Landing.Screen(Encoding.UTF8.GetBytes(Loaded()), settings: Settings);

        var channel = record.Members.Single(m => m.Section.StartsWith("U ", StringComparison.Ordinal) && Math.Abs(m.Axes!.X.Z) < 0.1);
        var shearCentre = record.Sections.Single(s => s.Designation == channel.Section).ShearCentreY;
        Assert.InRange(shearCentre, -0.060, -0.045);
        var forces = channel.Situations.Single(s => s.Situation == "SLS").Stations[0].Forces;
        Assert.Equal(-Load * (0.02716 - shearCentre), forces.T, 0.02);
        Assert.Contains(channel.Notes, n => n.Contains("lies at y -27.16 mm", StringComparison.Ordinal));
    }

    private const string Settings = "{\"units\": {\"PRESSUREUNIT\": \"Pa\"}}";

    private static string Loaded()
    {
        var text = Encoding.UTF8.GetString(ModelContainer.Read(OpenModel.Path("structural-beams-linked-ifc4.ifc")).Bytes);
        foreach (var start in s_starts)
        {
            var at = text.IndexOf($"#{start}=IFCSTRUCTURALPOINTCONNECTION(", StringComparison.Ordinal);
            var end = text.IndexOf(",$,$);", at, StringComparison.Ordinal);
            text = string.Concat(text.AsSpan(0, end), ",#9001,$);", text.AsSpan(end + ",$,$);".Length));
        }

        text = text.Replace(".LOADING_3D.,$,$,$,#40);", ".LOADING_3D.,$,(#9002,#9003),$,#40);", StringComparison.Ordinal);
        const string Fixed = "IFCBOOLEAN(.T.)";
        var added = new StringBuilder()
            .Append(CultureInfo.InvariantCulture, $"#9001=IFCBOUNDARYNODECONDITION('Fixed',{string.Join(',', Enumerable.Repeat(Fixed, 6))});\n")
            .Append("#9002=IFCSTRUCTURALLOADCASE('0000000000000000000901',#8,'Live',$,$,.LOAD_CASE.,.VARIABLE_Q.,.LIVE_LOAD_Q.,1.,$,$);\n")
            .Append("#9003=IFCSTRUCTURALLOADGROUP('0000000000000000000902',#8,'SLS',$,$,.LOAD_COMBINATION.,.NOTDEFINED.,.NOTDEFINED.,1.,'SLS');\n")
            .Append("#9004=IFCRELASSIGNSTOGROUPBYFACTOR('0000000000000000000903',#8,$,$,(#9002),$,#9003,1.);\n")
            .Append("#9005=IFCSTRUCTURALLOADSINGLEFORCE($,0.,0.,-1000.,0.,0.,0.);\n");
        for (var i = 0; i < s_ends.Length; i++)
        {
            added.Append(CultureInfo.InvariantCulture, $"#{9100 + i}=IFCSTRUCTURALPOINTACTION('00000000000000000010{i:00}',#8,$,$,$,#40,$,#9005,.GLOBAL_COORDS.,$);\n")
                .Append(CultureInfo.InvariantCulture, $"#{9200 + i}=IFCRELCONNECTSSTRUCTURALACTIVITY('00000000000000000020{i:00}',#8,$,$,#{s_ends[i]},#{9100 + i});\n");
        }

        added.Append(CultureInfo.InvariantCulture, $"#9006=IFCRELASSIGNSTOGROUP('0000000000000000000904',#8,$,$,({string.Join(',', s_ends.Select((_, i) => $"#{9100 + i}"))}),$,#9002);\n");
        return text.Insert(text.LastIndexOf("ENDSEC", StringComparison.Ordinal), added.ToString());
    }
}
