using System.Text;
using MemberScan.Foundation.Diagnostics;
using MemberScan.OpenModels;

namespace MemberScan.Part21.Tests;

/// <summary>Real files by others, against their inventory (written by a scanner that shares no code with this project).</summary>
public sealed class OpenModelTests
{
    [Theory]
    [InlineData("bad-foot-factor-ifc2x3.ifc", "IFC2X3", 20, 18, 28, "")]
    [InlineData("balcony-railings-ifc2x3.ifc", "IFC2X3", 37840, 59, 37849, "BUILDINGELEMENTPROXY 164, BEAM 37, ELEMENTASSEMBLY 9, PLATE 4, ARBITRARYCLOSEDPROFILEDEF 38, RECTANGLEPROFILEDEF 19, TRIMMEDCURVE 104, FACETEDBREP 83, EXTRUDEDAREASOLID 65, POLYLINE 27, PROPERTYSINGLEVALUE 7024, PROPERTYSET 428, COMPLEXPROPERTY 214")]
    [InlineData("bar-swept-disk-polygonal-ifc4.ifc", "IFC4", 39, 28, 221, "REINFORCINGBAR 1, REINFORCINGBARTYPE 1, INDEXEDPOLYCURVE 1, MAPPEDITEM 1, SWEPTDISKSOLIDPOLYGONAL 1")]
    [InlineData("beam-i-shape-tessellated-ifc4.ifc", "IFC4", 21, 16, 206, "BEAM 1, TRIANGULATEDFACESET 1")]
    [InlineData("beam-varying-profiles-ifc4x3.ifc", "IFC4X3_ADD2", 64, 32, 321, "BEAM 2, BEAMTYPE 2, CIRCLEHOLLOWPROFILEDEF 1, ISHAPEPROFILEDEF 1, EXTRUDEDAREASOLID 2")]
    [InlineData("beams-six-profiles-ifc4.ifc", "IFC4", 402, 53, 503, "BEAM 12, BEAMTYPE 6, EXTRUDEDAREASOLID 13, PROPERTYSINGLEVALUE 42")]
    [InlineData("carwash-steel-ifc2x3.ifc", "IFC2X3", 49044, 82, 49044, "BEAM 1949, ELEMENTASSEMBLY 1051, DISCRETEACCESSORY 409, MEMBER 228, COLUMN 26, SLAB 24, BEAMTYPE 78, RECTANGLEPROFILEDEF 69, EXTRUDEDAREASOLID 381, BOOLEANRESULT 295, FACETEDBREP 76, MATERIAL 13, PROPERTYSINGLEVALUE 2402, RELDEFINESBYPROPERTIES 2386, PROPERTYSET 1788")]
    [InlineData("column-room-foot-ifc4x3.ifc", "IFC4X3_ADD2", 5104, 75, 5105, "COLUMN 1, DOOR 1, WALL 1, FACETEDBREP 7, PROPERTYSET 17")]
    [InlineData("columns-on-grid-ifc4x3.ifc", "IFC4X3_ADD2", 525, 37, 2773, "COLUMN 25, BEAM 10, RECTANGLEPROFILEDEF 35, EXTRUDEDAREASOLID 35, POLYLINE 10")]
    [InlineData("comments-inside-instances-ifc2x3.ifc", "IFC2X3", 29, 14, 10000009, "")]
    [InlineData("concrete-frame-spanish-ifc2x3.ifc", "IFC2X3", 8646, 54, 14665, "BUILDINGELEMENTPROXY 645, ELEMENTASSEMBLY 236, BEAM 18, COLUMN 16, SLAB 14, MAPPEDITEM 645")]
    [InlineData("drainage-pipes-ifc4x3rc3.ifc", "IFC4X3_RC3", 525, 47, 525, "PIPESEGMENT 6, CIRCLEHOLLOWPROFILEDEF 9, EXTRUDEDAREASOLID 13, PROPERTYSET 42")]
    [InlineData("house-german-ifc4.ifc", "IFC4", 44249, 115, 79107, "MEMBER 42, WALLSTANDARDCASE 13, WINDOW 11, DOOR 5, BEAM 4, RAILING 2, POLYLINE 355, FACETEDBREP 140, BOUNDINGBOX 107, PROPERTYSINGLEVALUE 4451, QUANTITYLENGTH 2050")]
    [InlineData("members-mirrored-profiles-inch-ifc4.ifc", "IFC4", 178, 37, 178, "MEMBER 6, DERIVEDPROFILEDEF 2, MIRROREDPROFILEDEF 1, EXTRUDEDAREASOLID 8, MAPPEDITEM 6")]
    [InlineData("newlines-in-strings-inch-ifc2x3.ifc", "IFC2X3", 43, 27, 1032091, "MEMBER 1, DERIVEDPROFILEDEF 1, LSHAPEPROFILEDEF 1, EXTRUDEDAREASOLID 1")]
    [InlineData("rounded-rectangle-csg-ifc4.ifc", "IFC4", 48, 33, 227, "SANITARYTERMINALTYPE 1, ROUNDEDRECTANGLEPROFILEDEF 1, CSGSOLID 1")]
    [InlineData("stair-railings-ifc2x3.ifczip", "IFC2X3", 4694, 60, 8234, "RAILING 13, BUILDINGELEMENTPROXY 1, FACETEDBREP 5, PROPERTYSINGLEVALUE 376")]
    [InlineData("steel-frame-drawn-sections-ifc2x3.ifc", "IFC2X3", 6487, 80, 14312, "BEAM 43, COLUMN 42, WALLSTANDARDCASE 17, SLAB 9, POLYLINE 474, TRIMMEDCURVE 225, PROPERTYSET 647")]
    [InlineData("strings-solidus-escapes-ifc2x3.ifc", "IFC2X3", 29, 16, 2002, "")]
    [InlineData("structural-beams-linked-ifc4.ifc", "IFC4", 547, 55, 547, "BEAM 12, RELCONNECTSSTRUCTURALMEMBER 24, STRUCTURALPOINTCONNECTION 24, STRUCTURALCURVEMEMBER 12, STRUCTURALANALYSISMODEL 1")]
    [InlineData("structural-portal-frame-results-ifc4.ifc", "IFC4", 188, 48, 2791, "RELCONNECTSSTRUCTURALACTIVITY 10, STRUCTURALLOADSINGLEFORCE 8, STRUCTURALPOINTREACTION 6, STRUCTURALCURVEMEMBER 3, STRUCTURALCURVEREACTION 3, STRUCTURALRESULTGROUP 1")]
    [InlineData("structural-surface-member-ifc4x2.ifc", "IFC4X2", 96, 33, 98, "STRUCTURALSURFACEMEMBER 1, STRUCTURALANALYSISMODEL 1")]
    public void Counts_agree_with_the_inventory(string name, string schema, int instances, int keywords, int largestId, string counts)
    {
        var (file, told) = Read(name);

        Assert.Equal([schema], file.Header.Schemas);
        Assert.Equal(instances, file.Count);
        Assert.Equal(keywords, file.CountByKeyword.Count);
        Assert.Equal((ulong)largestId, file.HighestId);
        foreach (var entry in counts.Split(", ", StringSplitOptions.RemoveEmptyEntries))
        {
            var parts = entry.Split(' ');
            Assert.Equal(entry, $"{parts[0]} {file.CountByKeyword.GetValueOrDefault("IFC" + parts[0])}");
            Assert.Equal(file.CountByKeyword["IFC" + parts[0]], file.RecordsOf("IFC" + parts[0]).Count());
        }

        Assert.True(file.ReadToEnd);
        Assert.True(file.Bytes.Span[(int)file.InsertionOffset..].StartsWith("ENDSEC"u8));
        Assert.Equal(name.StartsWith("comments", StringComparison.Ordinal) ? ["P21-0027"] : [], told.Items.Select(d => d.Code));
    }

    [Fact]
    public void Several_files_in_one_are_not_read_to_the_end()
    {
        var (file, told) = Read("bad-24-files-in-one-ifc2x3.ifc");

        Assert.False(file.ReadToEnd);
        Assert.Equal("P21-0004", Assert.Single(told.Items).Code);
        Assert.Equal(6, file.Count);
    }

    [Fact]
    public void Two_commas_are_told_with_their_place()
    {
        var (file, told) = Read("bad-double-comma-ifc4.ifc");

        Assert.True(file.HasDamage);
        var found = Assert.Single(told.Items);
        Assert.Equal("P21-0022", found.Code);
        Assert.Equal((8L, 1UL), (found.Span!.Value.Line, found.Span!.Value.InstanceId));
        Assert.True(file.Bytes.Span[((int)found.Span!.Value.Offset - 1)..].StartsWith(",,$"u8));
        Assert.True(file.TryFind(1, out var person));
        Assert.Equal(8, person.ArgumentCount);
        Assert.Equal(Part21ValueKind.Absent, person[3].Kind);
        Assert.Equal(20, file.Count);
    }

    [Fact]
    public void Infinities_are_told_with_their_place_and_latin_1_is_read()
    {
        var (file, told) = Read("bad-numbers-and-latin1-ifc4.ifc");

        Assert.True(file.HasDamage);
        Assert.True(file.ReadToEnd);
        var found = Assert.Single(told.Items);
        Assert.Equal("P21-0023", found.Code);
        Assert.Equal(3, told.CountOf(found));
        Assert.Equal((21L, 2UL), (found.Span!.Value.Line, found.Span!.Value.InstanceId));
        Assert.True(file.Bytes.Span[(int)found.Span!.Value.Offset..].StartsWith("-1.#INF,"u8));
        Assert.True(file.TryFind(2, out var point));
        Assert.All(point[0].Items, i => Assert.Equal(Part21ValueKind.Malformed, i.Kind));
        Assert.True(file.TryFind(1, out var property));
        Assert.True(property[2].TryText(out var text));
        Assert.Contains(text, c => c is >= '\u00A0' and <= '\u00FF');
    }

    [Fact]
    public void The_special_apostrophe_case_of_the_standard_reads_as_written()
    {
        var (file, _) = Read("strings-solidus-escapes-ifc2x3.ifc");

        Assert.Equal(
            ["Don't", "'", "", "Ärger", "hôtel", "This string ends with as special case of solidus escape §"],
            file.RecordsOf("IFCGROUP").Select(r => r[2].TryText(out var text) ? text : "?"));
    }

    [Fact]
    public void Line_ends_within_strings_do_not_count()
    {
        var (file, _) = Read("newlines-in-strings-inch-ifc2x3.ifc");

        Assert.Equal(["((''ViewDefinition [CoordinationView_V2.0]''),''2;1'')"], file.Header.Description.Select(d => d.Replace("'", "''", StringComparison.Ordinal)));
        Assert.True(Assert.Single(file.RecordsOf("IFCMEMBER"))[2].TryText(out var name));
        Assert.Equal("L4x4x3/8B", name);
    }

    [Fact]
    public void A_plain_tokenizer_finds_the_same_instances_and_arguments()
    {
        OpenModel.SkipIfAbsent();
        foreach (var path in OpenModel.All)
        {
            // Damaged ones, and the one whose strings the plain tokenizer cannot end (\S\').
            var name = Path.GetFileName(path);
            if (name is "bad-24-files-in-one-ifc2x3.ifc" or "bad-numbers-and-latin1-ifc4.ifc" or "strings-solidus-escapes-ifc2x3.ifc") continue;

            var (file, _) = Read(name);
            var text = Encoding.Latin1.GetString(file.Bytes.Span);
            using var records = file.Records.GetEnumerator();
            foreach (var (id, keyword, arguments) in PlainTokenizer.Instances(text))
            {
                Assert.True(records.MoveNext());
                var record = records.Current;
                Assert.Equal(id, record.Id);
                Assert.Equal(keyword, record.Keyword);
                Assert.Equal(arguments, record.Arguments().Select(a => PlainTokenizer.WithoutComments(Encoding.Latin1.GetString(a.Text))));
            }

            Assert.False(records.MoveNext());
        }
    }

    private static (Part21File File, DiagnosticList Told) Read(string name)
    {
        var told = new DiagnosticList();
        return (Part21File.Read(ModelContainer.Read(OpenModel.Path(name)).Bytes, name, told), told);
    }
}
