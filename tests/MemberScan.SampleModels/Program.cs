using MemberScan.SampleModels.Scenario;

if (args.Length != 1)
{
    Console.Error.WriteLine("Usage: dotnet run --project tests/MemberScan.SampleModels -- FOLDER (the folder to write the samples into)");
    return 64;
}

Directory.CreateDirectory(args[0]);
foreach (var (fileName, bytes) in SampleModel.All().SelectMany(sample => sample.Files()))
{
    File.WriteAllBytes(Path.Combine(args[0], fileName), [.. bytes]);
    Console.WriteLine(fileName);
}

return 0;
