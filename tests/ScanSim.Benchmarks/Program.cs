using BenchmarkDotNet.Running;
using ScanSim.Benchmarks;

// "whole" and "memory" time one run as a process of its own; everything else goes to BenchmarkDotNet (try: --filter '*').
return args switch
{
    ["whole", ..] => WholeRun.Time(args[1..]),
    ["memory", ..] => WholeRun.Memory(args[1..]),
    _ => RunBenchmarkDotNet(args),
};

static int RunBenchmarkDotNet(string[] args)
{
    BenchmarkSwitcher.FromAssembly(typeof(WholeRun).Assembly).Run(args);
    return 0;
}
