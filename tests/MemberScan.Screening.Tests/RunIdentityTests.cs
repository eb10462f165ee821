using MemberScan.Foundation.Diagnostics;

namespace MemberScan.Screening.Tests;

public sealed class RunIdentityTests
{
    private static readonly byte[] s_model = Landing.OnePost();
    private static readonly string s_table = Landing.Constant(new(1000, 0, 0, 0, 0, 0));

    [Fact]
    public void The_same_inputs_give_the_same_run()
    {
        Assert.Equal(RunId(), RunId());
        Assert.Matches("^[0-9a-f]{16}$", RunId());
    }

    [Fact]
    public void Model_table_settings_and_version_each_give_another_run()
    {
        string[] runs =
        [
            RunId(), RunId(model: Landing.OnePost(length: 1.5)), RunId(table: s_table.Replace("S1", "S2", StringComparison.Ordinal)), RunId(table: null),
            RunId(settings: """{"stability": {"lengthFactor": 1}}"""), RunId(version: "1.2.4"),
        ];

        Assert.Equal(runs.Length, runs.Distinct(StringComparer.Ordinal).Count());
    }

    [Fact]
    public void Settings_that_say_the_default_in_other_words_give_the_same_run()
    {
        var run = RunId(settings: """
            {
              // all of it is the default
              "stability": { "lengthFactor": 2.0 },
            }
            """);

        Assert.Equal(RunId(), run);
    }

    [Fact]
    public void A_block_of_ours_in_the_model_changes_nothing()
    {
        var outcome = Landing.Run(s_model, new DiagnosticList(), tables: [s_table])!;
        var written = new System.Buffers.ArrayBufferWriter<byte>();
        outcome.WriteModel(written);

        var again = Landing.Run(written.WrittenSpan.ToArray(), new DiagnosticList(), tables: [s_table])!;

        Assert.True(written.WrittenCount > s_model.Length);
        Assert.Equal(outcome.Record.RunId, again.Record.RunId);
        Assert.Equal(outcome.Record.Model.Sha256, again.Record.Model.Sha256);
    }

    [Theory]
    [InlineData("", "", 0)]
    [InlineData("", "2026-01-15T08:00:00", 1768464000)]
    [InlineData("2026-01-15T09:00:00+01:00", "1999-01-01T00:00:00", 1768464000)]
    [InlineData("", "yesterday", 0)]
    public void The_creation_date_is_the_given_time_else_that_of_the_header_else_none(string given, string header, long seconds) =>
        Assert.Equal(seconds, RunIdentity.CreationDate(given, header));

    private static string RunId(byte[]? model = null, string? table = "", string? settings = null, string version = "1.2.3") =>
        Landing.Run(model ?? s_model, new DiagnosticList(), settings, version, table is null ? [] : [table.Length == 0 ? s_table : table])!.Record.RunId;
}
