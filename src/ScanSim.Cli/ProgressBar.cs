using Spectre.Console;

namespace ScanSim.Cli;

/// <summary>A bar on stderr while something long runs; nothing when stderr is not a terminal.</summary>
internal static class ProgressBar
{
    /// <summary>Runs <paramref name="work"/>, which reports how much of how much is done.</summary>
    public static void Around(string what, Action<Action<int, int>?> work)
    {
        if (Console.IsErrorRedirected)
        {
            work(null);
            return;
        }

        var terminal = AnsiConsole.Create(new AnsiConsoleSettings { Out = new AnsiConsoleOutput(Console.Error) });
        terminal.Progress()
            .AutoClear(true)
            .Columns(new TaskDescriptionColumn(), new ProgressBarColumn(), new PercentageColumn(), new RemainingTimeColumn())
            .Start(context =>
            {
                var task = context.AddTask(what);
                work((done, all) =>
                {
                    task.MaxValue = all;
                    task.Value = done;
                });
            });
    }
}
