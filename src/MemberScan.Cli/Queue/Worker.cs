using System.Globalization;
using System.Text;
using MemberScan.Cli.Files;
using MemberScan.Cli.Screening;
using MemberScan.Cli.Screening.Many;
using MemberScan.Reporting.Index;
using MemberScan.Reporting.Topics;
using NATS.Client.JetStream;

namespace MemberScan.Cli.Queue;

/// <summary>Takes jobs out of the queue, one at a time. A job is acknowledged only after its outputs are in place, so one whose worker dies comes to another.</summary>
internal sealed class Worker(JobQueue queue, SharedRoot root, string results, TimeSpan ackWait, bool verbose, TextWriter output)
{
    private const string LockEnding = ".lock", FailedEnding = ".failed.txt";

    /// <summary>Time until a job that failed for want of a file or a disk is tried again.</summary>
    private static readonly TimeSpan s_tryAgain = TimeSpan.FromSeconds(5);

    /// <summary>Works until cancelled, or until the queue is empty.</summary>
    public async Task Run(bool untilEmpty, CancellationToken cancellation)
    {
        await queue.Join(ackWait, cancellation);
        while (true)
        {
            cancellation.ThrowIfCancellationRequested();
            if (await queue.Next(cancellation) is { } message) await Handle(message, cancellation);
            else if (untilEmpty && await queue.IsEmpty(cancellation)) return;
        }
    }

    private async Task Handle(INatsJSMsg<byte[]> message, CancellationToken cancellation)
    {
        if (QueueJob.Read(message.Data) is not { } job)
        {
            output.WriteLine("a message that is no job of this program was taken out of the queue");
            await message.AckTerminateAsync(cancellationToken: cancellation);
            return;
        }

        output.WriteLine($"working on {job.Model}");
        using var stop = new CancellationTokenSource();
        var alive = TellAlive(message, stop.Token);
        try
        {
            var isDone = await Task.Run(() => Screen(job, IsLastTry(message), cancellation), CancellationToken.None);
            if (isDone) await message.AckAsync(new AckOpts { DoubleAck = true }, cancellation);
            else await message.NakAsync(delay: s_tryAgain, cancellationToken: cancellation);
        }
        catch (OperationCanceledException)
        {
            await message.NakAsync(cancellationToken: CancellationToken.None);      // another worker may have it at once
            throw;
        }
        finally
        {
            await stop.CancelAsync();
            await alive;
        }
    }

    private static bool IsLastTry(INatsJSMsg<byte[]> message) => message.Metadata?.NumDelivered >= JobQueue.MostDeliveries;

    /// <summary>Screens the model of a job; false when it should be tried again later.</summary>
    private bool Screen(QueueJob job, bool isLastTry, CancellationToken cancellation)
    {
        ModelJob model;
        try
        {
            model = JobOf(job);
            Directory.CreateDirectory(model.Options.Output!);
        }
        catch (Failure failure)
        {
            output.WriteLine($"{job.Model}: refused: {failure.Message}");
            return true;
        }

        var stem = model.Names.RunRecord[..^".run.json".Length];
        using var held = Hold(stem + LockEnding);
        if (held is null) return false;                                     // another worker is at it: its own delivery was late

        var (entry, wasFinished) = model.Run(results, resume: true, cancellation);
        if (entry.Failure.Length > 0 && entry.ExitCode is ExitCodes.InputOutput or ExitCodes.Internal && !isLastTry)
        {
            output.WriteLine($"{job.Model}: to be tried again: {entry.Failure}");
            return false;
        }

        Conclude(stem + FailedEnding, entry);
        output.WriteLine(entry.Failure.Length > 0 ? $"failed {job.Model}: {entry.Failure}" : $"finished {job.Model}{(wasFinished ? " (before)" : "")}");
        return true;
    }

    /// <summary>A failure is a result too: it is written down where the outputs would be.</summary>
    private static void Conclude(string path, ModelEntry entry)
    {
        if (entry.Failure.Length == 0)
        {
            File.Delete(path);
            return;
        }

        using var files = new OutputSet();
        files.Add(path, Encoding.UTF8.GetBytes(string.Create(CultureInfo.InvariantCulture, $"{entry.Path}: not screened (exit code {entry.ExitCode}): {entry.Failure}\n")));
        files.Commit();
    }

    private ModelJob JobOf(QueueJob job)
    {
        var model = root.PathOf(job.Model);
        var folder = Path.Combine(results, Path.GetDirectoryName(job.Model) ?? "");
        var names = OutputNames.For(model, folder);
        var stem = names.RunRecord[..^".run.json".Length];
        string? Also(string kind) => job.Also.Contains(kind) ? $"{stem}.{kind}" : null;
        var options = new ScreenRun.Options(model, [.. job.Forces.Select(root.PathOf)], job.Settings is { } s ? root.PathOf(s) : null, job.Kind, folder, job.Timestamp, verbose)
        {
            SetTemplate = job.SetTemplate,
            Further = new FurtherOutputs(Also("bcf"), BcfVersion.Bcf21, [], Also("xlsx"), Also("parquet")),
        };
        return new ModelJob(options, names);
    }

    // Held by the operating system as long as the process lives: a worker that dies lets it go.
    private static FileStream? Hold(string path)
    {
        try
        {
            return new FileStream(path, FileMode.OpenOrCreate, FileAccess.ReadWrite, FileShare.None, 1, FileOptions.DeleteOnClose);
        }
        catch (IOException)
        {
            return null;
        }
    }

    private async Task TellAlive(INatsJSMsg<byte[]> message, CancellationToken stop)
    {
        try
        {
            while (true)
            {
                await Task.Delay(ackWait / 3, stop);
                await message.AckProgressAsync(cancellationToken: stop);
            }
        }
        catch (OperationCanceledException)
        {
            // The job has ended.
        }
        catch (NATS.Client.Core.NatsException)
        {
            // The server is away: the job may go to another worker, which finds it held or finished.
        }
    }
}
