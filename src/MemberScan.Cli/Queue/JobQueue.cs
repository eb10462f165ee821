using System.Globalization;
using NATS.Client.Core;
using NATS.Client.JetStream;
using NATS.Client.JetStream.Models;

namespace MemberScan.Cli.Queue;

/// <summary>The work queue of jobs in a NATS server with JetStream: each job stays until a worker acknowledges it.</summary>
internal sealed class JobQueue : IAsyncDisposable
{
    /// <summary>How often a job is delivered before its failure is written down and it leaves the queue.</summary>
    public const int MostDeliveries = 5;

    /// <summary>Least and most time until a job of a silent worker goes to another one [s].</summary>
    public const int LeastAckWait = 1, MostAckWait = 3600;

    private const string StreamName = "MEMBERSCAN", Subject = "memberscan.jobs", ConsumerName = "memberscan-workers";

    /// <summary>Within this time a job of the same inputs is not taken into the queue a second time.</summary>
    private static readonly TimeSpan s_sameJob = TimeSpan.FromDays(1);

    private static readonly TimeSpan s_poll = TimeSpan.FromSeconds(1);

    private readonly NatsConnection _connection;
    private readonly NatsJSContext _context;
    private INatsJSConsumer? _consumer;

    private JobQueue(NatsConnection connection) => (_connection, _context) = (connection, new NatsJSContext(connection));

    /// <summary>Connects, and creates the queue where it is not there yet.</summary>
    /// <exception cref="Failure">The server cannot be reached, or has no JetStream.</exception>
    public static async Task<JobQueue> Open(string url, CancellationToken cancellation)
    {
        if (!Uri.TryCreate(url, UriKind.Absolute, out var uri) || uri.Scheme is not ("nats" or "tls"))
            throw new Failure(ExitCodes.Usage, "What follows --queue is no address of a queue; write it as nats://127.0.0.1:4222.");

        var connection = new NatsConnection(new NatsOpts { Url = url, Name = "MemberScan", ConnectTimeout = TimeSpan.FromSeconds(5), MaxReconnectRetry = 10 });
        var queue = new JobQueue(connection);
        try
        {
            await connection.ConnectAsync();
            await queue._context.CreateOrUpdateStreamAsync(new StreamConfig(StreamName, [Subject]) { Retention = StreamConfigRetention.Workqueue, DuplicateWindow = s_sameJob }, cancellation);
            return queue;
        }
        catch (NatsException e)
        {
            await queue.DisposeAsync();

            // The address may carry a password, so only host and port are told.
            throw new Failure(ExitCodes.InputOutput, string.Create(CultureInfo.InvariantCulture, $"The queue at {uri.Host}:{uri.Port} cannot be used: {e.Message} Start the server with JetStream (nats-server -js) and check the address."), e);
        }
    }

    /// <summary>Puts a job into the queue.</summary>
    /// <param name="job">The job.</param>
    /// <param name="id">Tells jobs of the same inputs from others.</param>
    /// <param name="cancellation">Stops.</param>
    /// <returns>False when a job of that id was put in before, within a day.</returns>
    public async Task<bool> Put(QueueJob job, string id, CancellationToken cancellation)
    {
        var taken = await _context.PublishAsync(Subject, job.Write(), opts: new NatsJSPubOpts { MsgId = id }, cancellationToken: cancellation);
        if (taken.Error is { } error) throw new Failure(ExitCodes.InputOutput, $"The queue did not take '{job.Model}': {error.Description}");
        return !taken.Duplicate;
    }

    /// <summary>Becomes one of the workers.</summary>
    /// <param name="ackWait">Time until a job of a silent worker goes to another one.</param>
    /// <param name="cancellation">Stops.</param>
    public async Task Join(TimeSpan ackWait, CancellationToken cancellation) => _consumer = await _context.CreateOrUpdateConsumerAsync(
        StreamName,
        new ConsumerConfig(ConsumerName) { DurableName = ConsumerName, AckPolicy = ConsumerConfigAckPolicy.Explicit, AckWait = ackWait, MaxDeliver = -1, MaxAckPending = 10_000 },
        cancellation);

    /// <summary>The next job; null when there is none for a second.</summary>
    public async Task<INatsJSMsg<byte[]>?> Next(CancellationToken cancellation) =>
        await _consumer!.NextAsync<byte[]>(opts: new NatsJSNextOpts { Expires = s_poll }, cancellationToken: cancellation);

    /// <summary>Whether no job is waiting and none is with a worker.</summary>
    public async Task<bool> IsEmpty(CancellationToken cancellation)
    {
        await _consumer!.RefreshAsync(cancellation);
        return _consumer.Info is { NumPending: 0, NumAckPending: 0 };
    }

    /// <inheritdoc/>
    public ValueTask DisposeAsync() => _connection.DisposeAsync();
}
