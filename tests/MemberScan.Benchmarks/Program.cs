using System.Globalization;
using BenchmarkDotNet.Running;
using MemberScan.Benchmarks.Frames;
using MemberScan.Benchmarks.Models;
using MemberScan.Benchmarks.Question;

// generate NAME FILE | question FILE [THREADS] | checked FILE | pass FILE THREADS | scan FILE | append FILE TARGET [disk] |
// frame NX NY STOREYS SITUATIONS THREADS ROUNDS | frame-matrix NX NY STOREYS FILE; anything else goes to BenchmarkDotNet. compare.sh measures them beside other programs.
return args switch
{
    ["generate", var name, var path] => Generate(name, path),
    ["question", var path] => Print(IndexedQuestion.Ask(path, 0)),
    ["question", var path, var threads] => Print(IndexedQuestion.Ask(path, int.Parse(threads, CultureInfo.InvariantCulture))),
    ["pass", var path, var threads] => IndexedQuestion.Pass(path, int.Parse(threads, CultureInfo.InvariantCulture)),
    ["append", var path, var target] => AppendedSets.Write(path, target, toDisk: false),
    ["append", var path, var target, "disk"] => AppendedSets.Write(path, target, toDisk: true),
    ["scan", var path] => MaskScan.Run(path),
    ["frame", var nx, var ny, var storeys, var situations, var threads, var rounds] => FrameTimes.Print(Int(nx), Int(ny), Int(storeys), Int(situations), Int(threads), Int(rounds)),
    ["frame-matrix", var nx, var ny, var storeys, var path] => FrameTimes.Export(Int(nx), Int(ny), Int(storeys), path),
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
