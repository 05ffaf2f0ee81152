using BenchmarkDotNet.Columns;
using BenchmarkDotNet.Configs;
using BenchmarkDotNet.Environments;
using BenchmarkDotNet.Jobs;
using BenchmarkDotNet.Loggers;
using BenchmarkDotNet.Running;
using BenchmarkDotNet.Toolchains.InProcess.Emit;
using JointPlanner.Benchmarks;
using JointPlanner.Benchmarks.Sites;

// Speed and memory, printed: medians, and ratios against the reference that each table names. No limit here fails a build.
//   dotnet run -c Release --project tests/JointPlanner.Benchmarks            everything
//   dotnet run -c Release --project tests/JointPlanner.Benchmarks -- site    the running site in a browser alone
//   dotnet run -c Release --project tests/JointPlanner.Benchmarks -- engine  from text to results alone
var asked = args.FirstOrDefault() ?? "all";
if (asked is not ("all" or "engine" or "site"))
{
    Console.Error.WriteLine($"There is nothing called “{asked}” to measure. Allowed: engine, site, all. Name one of them, or none for all.");
    return 2;
}

if (asked is "all" or "engine")
{
    // In this process: the program's own builds stay as they are, and nothing is restored or compiled on the way.
    var job = Job.Default.WithRuntime(CoreRuntime.Core10_0).WithToolchain(InProcessEmitToolchain.Instance).WithWarmupCount(4).WithIterationCount(12);
    var config = ManualConfig.CreateEmpty().AddJob(job)
        .AddColumnProvider(DefaultColumnProviders.Params)
        .AddColumn(TargetMethodColumn.Method, StatisticColumn.Median, BaselineRatioColumn.RatioMean)
        .AddColumnProvider(DefaultColumnProviders.Metrics)
        .AddDiagnoser(BenchmarkDotNet.Diagnosers.MemoryDiagnoser.Default)
        .AddLogger(ConsoleLogger.Default)
        .WithArtifactsPath(Path.Combine(Path.GetTempPath(), "joint-planner-benchmarks"));
    BenchmarkRunner.Run(typeof(PlanFiles).Assembly, config);
}

if (asked is "all" or "site") await SiteMeasurement.Print(Console.Out);
return 0;
