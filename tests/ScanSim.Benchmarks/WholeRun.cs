using System.Diagnostics;
using System.Globalization;
using ScanSim.Engine;
using ScanSim.Recordings;

namespace ScanSim.Benchmarks;

/// <summary>Whole runs, timed as a user would: time, looks per second, peak memory.</summary>
internal static class WholeRun
{
    private const double BytesPerMegabyte = 1024 * 1024;

    /// <summary>whole [targets] [hours] [threads] [looks: none|best|all] [repeats]: rows go nowhere.</summary>
    public static int Time(string[] args)
    {
        var targets = Number(args, 0, 200);
        var hours = Number(args, 1, 1);
        var options = new RunOptions { Threads = (int)Number(args, 2, 0), Looks = Looks(args, 3) };
        var scenario = BusyScenario.Of((int)targets, hours);
        for (var i = 0; i < Number(args, 4, 3); i++)
        {
            var sink = new NullSink();
            var clock = Stopwatch.StartNew();
            Run.Execute(scenario, options, sink, progress: null, CancellationToken.None);
            var seconds = clock.Elapsed.TotalSeconds;
            Console.WriteLine(string.Create(
                CultureInfo.InvariantCulture,
                $"{targets} targets, {hours} h, looks {options.Looks}: {seconds:0.000} s, {sink.Looks} looks, {sink.Looks / seconds / 1e6:0.00} million looks a second"));
        }

        return 0;
    }

    /// <summary>memory [targets] [hours] [looks]: one run into a recording in a temporary folder; peak working set of this process.</summary>
    public static int Memory(string[] args)
    {
        var scenario = BusyScenario.Of((int)Number(args, 0, 200), Number(args, 1, 1));
        var looks = Looks(args, 2);
        var folder = Path.Combine(Path.GetTempPath(), "scansim-benchmark-" + Environment.ProcessId.ToString(CultureInfo.InvariantCulture));
        var head = new RecordingHead
        {
            ScenarioName = scenario.Name,
            ScenarioDigest = "",
            ScenarioText = scenario.SourceText,
            ProgramVersion = "benchmark",
            Seed = scenario.Run.Seed,
            StartUtc = scenario.Run.Start,
            DurationS = scenario.Run.DurationS,
            Looks = looks,
            Format = TableFormat.Parquet,
        };
        var clock = Stopwatch.StartNew();
        using (var writer = RecordingWriter.Create(folder, head, force: true))
        {
            Run.Execute(scenario, new RunOptions { Looks = looks }, writer, progress: null, CancellationToken.None);
            writer.Complete();
        }

        var bytes = new DirectoryInfo(folder).GetFiles().Sum(f => f.Length);
        Directory.Delete(folder, recursive: true);
        Console.WriteLine(string.Create(
            CultureInfo.InvariantCulture,
            $"{scenario.Targets.Length} targets, {scenario.Run.DurationS / 3600} h, looks {looks}: {clock.Elapsed.TotalSeconds:0.00} s, recording {bytes / BytesPerMegabyte:0.0} MB, peak working set {Process.GetCurrentProcess().PeakWorkingSet64 / BytesPerMegabyte:0} MB"));
        return 0;
    }

    private static double Number(string[] args, int index, double otherwise) =>
        args.Length > index ? double.Parse(args[index], CultureInfo.InvariantCulture) : otherwise;

    private static LooksKept Looks(string[] args, int index) =>
        args.Length > index ? Enum.Parse<LooksKept>(args[index], ignoreCase: true) : LooksKept.Best;
}
