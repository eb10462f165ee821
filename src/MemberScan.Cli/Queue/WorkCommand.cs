using System.CommandLine;
using System.Globalization;

namespace MemberScan.Cli.Queue;

/// <summary><c>memberscan work</c>: screens the models of a queue.</summary>
internal static class WorkCommand
{
    private const int DefaultAckWait = 60;

    /// <summary>Builds the command.</summary>
    public static Command Build()
    {
        var queue = new Option<string>("--queue") { Description = "Address of the queue: a NATS server with JetStream, such as nats://127.0.0.1:4222.", HelpName = "URL", Required = true };
        var root = new Option<string>("--root") { Description = "The folder that holds the models, as this machine sees it; default: the current one.", HelpName = "DIR", DefaultValueFactory = _ => "." };
        var results = new Option<string>("--results") { Description = "Folder for the outputs; the folders of the models are kept below it.", HelpName = "DIR", Required = true };
        var untilEmpty = new Option<bool>("--until-empty") { Description = "End when no job is waiting and none is with a worker." };
        var ackWait = new Option<int>("--ack-wait") { Description = "Seconds after which the job of a silent worker goes to another one; default 60.", HelpName = "SECONDS", DefaultValueFactory = _ => DefaultAckWait };
        var verbose = new Option<bool>("--verbose") { Description = "Log every finding, notes included." };
        var command = new Command("work", "Screen models out of a queue, one at a time, until interrupted.") { queue, root, results, untilEmpty, ackWait, verbose };
        command.SetAction((parsed, cancellation) => Task.Run(
            () => Execute(
                parsed.GetValue(queue)!, parsed.GetValue(root)!, parsed.GetValue(results)!, parsed.GetValue(ackWait), parsed.GetValue(untilEmpty), parsed.GetValue(verbose), cancellation),
            CancellationToken.None));
        return command;
    }

    private static async Task<int> Execute(string url, string root, string results, int ackWait, bool untilEmpty, bool verbose, CancellationToken cancellation)
    {
        if (ackWait is < JobQueue.LeastAckWait or > JobQueue.MostAckWait)
            throw new Failure(ExitCodes.Usage, string.Create(CultureInfo.InvariantCulture, $"--ack-wait {ackWait} is out of range; give {JobQueue.LeastAckWait} to {JobQueue.MostAckWait} seconds."));
        if (string.IsNullOrWhiteSpace(results)) throw new Failure(ExitCodes.Usage, "The path after --results is empty; give a folder.");

        var shared = new SharedRoot(root);
        await using var queue = await JobQueue.Open(url, cancellation);
        try
        {
            await new Worker(queue, shared, Path.GetFullPath(results), TimeSpan.FromSeconds(ackWait), verbose, Console.Out).Run(untilEmpty, cancellation);
        }
        catch (OperationCanceledException e)
        {
            throw new Failure(ExitCodes.Interrupted, "Interrupted; the job at hand went back to the queue, what is finished is whole.", e);
        }
        catch (NATS.Client.Core.NatsException e)
        {
            throw new Failure(ExitCodes.InputOutput, $"The queue failed: {e.Message} Jobs that were not acknowledged stay in it.", e);
        }

        return 0;
    }
}
