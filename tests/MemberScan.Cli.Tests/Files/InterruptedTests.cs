using System.Diagnostics;
using MemberScan.Cli.Tests.Screening;

namespace MemberScan.Cli.Tests.Files;

/// <summary>What stays when the program or the disk fails in the middle.</summary>
public sealed class InterruptedTests
{
    private const int Kills = 100, Lanes = 4;

    private static readonly string[] s_outputs = [".checked.ifc", ".members.csv", ".report.html", ".run.json"];

    [Fact]
    public async Task Killed_at_any_moment_each_file_is_the_old_one_or_the_new_one_and_the_next_run_leaves_no_strays()
    {
        var killed = await Task.WhenAll(Enumerable.Range(0, Lanes).Select(lane => KillAgainAndAgain(new Random(20260304 + lane), Kills / Lanes)));

        Assert.True(killed.Sum() > Kills / 4, $"only {killed.Sum()} of {Kills} runs were killed before their end");
    }

    // Runs in a folder of its own and gives how many of the runs were killed before their end.
    private static async Task<int> KillAgainAndAgain(Random random, int times)
    {
        using var folder = new TemporaryFolder();
        var (model, table) = Posts.Under(Posts.Fine, Posts.Over);
        string[] arguments = ["screen", folder.Write("a.ifc", model), "--forces", folder.Write("t.csv", table), "--out", folder["out"], "--timestamp"];
        string[] stamps = ["2026-03-04T05:06:07Z", "2027-03-04T05:06:07Z"];
        var whole = new List<Dictionary<string, byte[]>>();
        var watch = new Stopwatch();
        foreach (var time in stamps)
        {
            watch.Restart();
            Assert.Equal(1, (await Memberscan.Run([.. arguments, time])).ExitCode);
            watch.Stop();
            whole.Add(Contents(folder["out"]));
        }

        // Runs get shorter or longer with what else the machine does: the moments follow.
        var (killed, scale) = (0, 1.0);
        for (var i = 0; i < times; i++)
        {
            using var process = Process.Start(Memberscan.Start([.. arguments, stamps[i % 2]]))!;
            _ = process.StandardOutput.ReadToEndAsync(TestContext.Current.CancellationToken);
            _ = process.StandardError.ReadToEndAsync(TestContext.Current.CancellationToken);

            // The last third of a run, where files are written, gets most of the kills.
            var share = i % 4 == 0 ? random.NextDouble() : 0.65 + 0.4 * random.NextDouble();
            await Task.Delay(TimeSpan.FromMilliseconds(share * scale * watch.ElapsedMilliseconds), TestContext.Current.CancellationToken);
            var isRunning = !process.HasExited;
            scale = isRunning ? Math.Min(1.2, 1.05 * scale) : Math.Max(0.1, 0.8 * scale);
            if (isRunning) killed++;
            process.Kill();
            await process.WaitForExitAsync(TestContext.Current.CancellationToken);

            var now = Contents(folder["out"]);
            Assert.All(s_outputs, ending => Assert.Contains(whole, w => w["a" + ending].AsSpan().SequenceEqual(now["a" + ending])));
        }

        Assert.Equal(1, (await Memberscan.Run([.. arguments, stamps[0]])).ExitCode);
        Assert.Equal(s_outputs.Select(e => "a" + e), Contents(folder["out"]).Keys.Order(StringComparer.Ordinal));
        return killed;
    }

    [Fact]
    public async Task A_full_disk_leaves_the_old_files_and_nothing_else()
    {
        using var disk = await SmallDisk.Mount("size=24k");
        using var folder = new TemporaryFolder();
        File.WriteAllText(Path.Combine(disk.Path, "deck-hangers.members.csv"), "old");

        var ran = await Memberscan.Run(ScreenedSample.Arguments("deck-hangers", disk.Path));

        Assert.True(ran.ExitCode == 74, ran.All);
        Assert.Equal("old", File.ReadAllText(Path.Combine(disk.Path, "deck-hangers.members.csv")));
        Assert.Equal(["deck-hangers.members.csv"], Directory.EnumerateFileSystemEntries(disk.Path).Select(p => Path.GetFileName(p)));
    }

    [Fact]
    public async Task A_read_only_disk_ends_in_74()
    {
        using var disk = await SmallDisk.Mount("size=1m,ro");

        var ran = await Memberscan.Run(ScreenedSample.Arguments("deck-hangers", disk.Path));

        Assert.True(ran.ExitCode == 74, ran.All);
        Assert.Contains("give another folder with --out DIR", ran.Error, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_target_that_is_open_elsewhere_is_replaced_whole()
    {
        using var folder = new TemporaryFolder();
        var target = folder.Write("deck-hangers.members.csv", "old");
        using var open = new FileStream(target, FileMode.Open, FileAccess.Read, FileShare.ReadWrite | FileShare.Delete);

        var ran = await Memberscan.Run(ScreenedSample.Arguments("deck-hangers", folder.Path));

        Assert.True(ran.ExitCode == 1, ran.All);
        using var reader = new StreamReader(open);
        Assert.Equal("old", await reader.ReadToEndAsync(TestContext.Current.CancellationToken));
        Assert.Equal((await ScreenedSample.Of("deck-hangers")).Csv, await File.ReadAllBytesAsync(target, TestContext.Current.CancellationToken));
        Assert.Equal(s_outputs.Select(e => "deck-hangers" + e), folder.Names);
    }

    private static Dictionary<string, byte[]> Contents(string folder) => Directory.EnumerateFiles(folder).ToDictionary(f => Path.GetFileName(f), File.ReadAllBytes);

    /// <summary>A disk of a few kilobytes; needs the right to mount.</summary>
    private sealed class SmallDisk : IDisposable
    {
        private readonly TemporaryFolder _folder = new();

        private SmallDisk()
        {
        }

        public string Path => _folder.Path;

        /// <summary>Mounts it; skips the running test, saying so, where that is not allowed.</summary>
        public static async Task<SmallDisk> Mount(string options)
        {
            var disk = new SmallDisk();
            if (await Succeeds("mount", "-t", "tmpfs", "-o", options, "tmpfs", disk.Path)) return disk;

            disk._folder.Dispose();
            Assert.Skip("a small disk cannot be mounted here (needs the right to mount)");
            return disk;
        }

        public void Dispose()
        {
            Succeeds("umount", Path).GetAwaiter().GetResult();
            _folder.Dispose();
        }

        private static async Task<bool> Succeeds(string program, params string[] arguments)
        {
            try
            {
                var start = new ProcessStartInfo(program) { RedirectStandardError = true, RedirectStandardOutput = true };
                foreach (var argument in arguments) start.ArgumentList.Add(argument);
                return (await Memberscan.Run(start)).ExitCode == 0;
            }
            catch (System.ComponentModel.Win32Exception)
            {
                return false;
            }
        }
    }
}
