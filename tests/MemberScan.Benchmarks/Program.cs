using System.Globalization;
using BenchmarkDotNet.Running;
using MemberScan.Benchmarks.Frames;
using MemberScan.Benchmarks.Meshes;
using MemberScan.Benchmarks.Models;
using MemberScan.Benchmarks.Pages;
using MemberScan.Benchmarks.Question;
using MemberScan.Benchmarks.Tables;

// generate NAME FILE | question FILE [THREADS] | checked FILE | pass FILE THREADS | scan FILE | append FILE TARGET [disk] | meshes |
// forces-table generate FILE ROWS MEMBERS | forces-table read FILE ROUNDS | frame NX NY STOREYS SITUATIONS THREADS ROUNDS |
// frame-matrix NX NY STOREYS FILE | page FOLDER; anything else goes to BenchmarkDotNet. compare.sh measures some of them beside other programs.
return args switch
{
    ["generate", var name, var path] => Generate(name, path),
    ["question", var path] => Print(IndexedQuestion.Ask(path, 0)),
    ["question", var path, var threads] => Print(IndexedQuestion.Ask(path, int.Parse(threads, CultureInfo.InvariantCulture))),
    ["pass", var path, var threads] => IndexedQuestion.Pass(path, int.Parse(threads, CultureInfo.InvariantCulture)),
    ["append", var path, var target] => AppendedSets.Write(path, target, toDisk: false),
    ["append", var path, var target, "disk"] => AppendedSets.Write(path, target, toDisk: true),
    ["forces-table", "generate", var path, var rows, var members] => GenerateTable(path, rows, members),
    ["forces-table", "read", var path, var rounds] => ForcesTableRun.Read(path, int.Parse(rounds, CultureInfo.InvariantCulture)),
    ["scan", var path] => MaskScan.Run(path),
    ["meshes"] => MeshRecognition.Run(),
    ["frame", var nx, var ny, var storeys, var situations, var threads, var rounds] => FrameTimes.Print(Int(nx), Int(ny), Int(storeys), Int(situations), Int(threads), Int(rounds)),
    ["frame-matrix", var nx, var ny, var storeys, var path] => FrameTimes.Export(Int(nx), Int(ny), Int(storeys), path),
    ["page", var folder] => await PageTimes.Print(folder),
    ["checked", var path] => Print(CheckedQuestion.Ask(path)),
    _ => Benchmark(args),
};

static int Int(string text) => int.Parse(text, CultureInfo.InvariantCulture);

static int Generate(string name, string path)
{
    using var file = new FileStream(path, FileMode.Create, FileAccess.Write, FileShare.None, 1 << 20);
    LandingModel.Write(ModelRecipe.Named(name), file);
    return 0;
}

static int GenerateTable(string path, string rows, string members)
{
    ForcesTableModel.Write(path, int.Parse(rows, CultureInfo.InvariantCulture), int.Parse(members, CultureInfo.InvariantCulture));
    return 0;
}

static int Print(Answer answer)
{
    Console.WriteLine(answer);
    return 0;
}

static int Benchmark(string[] args)
{
    BenchmarkSwitcher.FromAssembly(typeof(Program).Assembly).Run(args);
    return 0;
}
