using System.CommandLine;

namespace MemberScan.Cli.Frames;

/// <summary><c>memberscan frame FILE</c>: a small space frame from a JSON file, without a model.</summary>
internal static class FrameCommand
{
    /// <summary>Builds the command.</summary>
    public static Command Build()
    {
        var file = new Argument<string>("FILE") { Description = "Frame file: JSON of nodes, materials, sections, members, supports and situations; see the README and config/frame.schema.json." };
        var json = new Option<bool>("--json") { Description = "Print JSON, in the units of the file." };
        var command = new Command("frame", "Displacements, reactions and section forces of a space frame, linear elastic, first order.") { file, json };
        command.SetAction((parsed, _) => Task.FromResult(FrameRun.Execute(parsed.GetValue(file)!, parsed.GetValue(json))));
        return command;
    }
}
