using System.Collections.Immutable;
using ScanSim.Recordings;

namespace ScanSim.Display.Replay;

/// <summary>Reads what is shown in the background: plots and hits around the time, and the selected target's looks.</summary>
/// <remarks>
/// One task at a time for each kind. Results are picked up by <see cref="Collect"/> on the caller's thread. A damaged table leaves its part
/// empty and says so in <see cref="Fault"/>.
/// </remarks>
internal sealed class ReplayReading(ImmutableArray<ReplayRecording> recordings)
{
    /// <summary>Read ahead of the time shown, at the least: half a minute at the highest speed would be more than some recordings hold in an hour.</summary>
    private const double AheadS = 300;

    private readonly Task<ReplayStretch>?[] stretches = new Task<ReplayStretch>?[recordings.Length];
    private readonly ReplayStretch[] known = [.. recordings.Select(_ => ReplayStretch.Nothing)];
    private Task<SelectedLooks>? looks;
    private string wantedId = "";
    private double wantedTimeS;

    public bool IsBusy => looks is not null || Array.Exists(stretches, task => task is not null);

    public SelectedLooks Selected { get; private set; } = SelectedLooks.Nothing;

    /// <summary>Starts reading what a state shows and what it will show soon.</summary>
    public void Want(ReplayState state, ReplayWorld world)
    {
        for (var i = 0; i < recordings.Length; i++)
        {
            WantStretch(i, state);
        }

        (wantedId, wantedTimeS) = (state.Selected ?? "", state.TimeS);
        WantLooks(world.Recordings);
    }

    /// <summary>The world with what has been read since; null if nothing new has come.</summary>
    public ReplayWorld? Collect(ReplayWorld world)
    {
        var isNew = false;
        for (var i = 0; i < stretches.Length; i++)
        {
            if (stretches[i] is { IsCompleted: true } task)
            {
                stretches[i] = null;
                // What cannot be read now cannot be read later: nothing instead, once and for all.
                known[i] = Result(task, new ReplayStretch(double.NegativeInfinity, double.PositiveInfinity, [], []));
                isNew = true;
            }
        }

        if (looks is { IsCompleted: true } read)
        {
            looks = null;
            var found = Result(read, SelectedLooks.Nothing with { Id = wantedId });
            Selected = string.Equals(found.Id, wantedId, StringComparison.Ordinal) ? found : Selected;
            isNew = true;
            WantLooks(world.Recordings);
        }

        return isNew ? world with { Stretches = [.. known] } : null;
    }

    /// <summary>What a damaged table said, for the user; null while all is well.</summary>
    public string? Fault { get; private set; }

    /// <summary>Waits for what is being read now; more may follow once it is collected.</summary>
    public void Wait() =>
        // Faults come out where results are collected.
        Task.WhenAll([.. stretches.OfType<Task>(), .. looks is null ? (Task[])[] : [looks]]).ContinueWith(_ => { }, TaskScheduler.Default).Wait();

    private T Result<T>(Task<T> task, T instead)
    {
        try
        {
            return task.GetAwaiter().GetResult();
        }
        catch (RecordingException fault)
        {
            Fault = fault.Message;
            return instead;
        }
    }

    private void WantStretch(int index, ReplayState state)
    {
        var scene = recordings[index].Scene;
        var fromS = Math.Max(0, state.TimeS - state.AfterglowScans * scene.Beam.PeriodS);
        var toS = Math.Min(scene.DurationS, state.TimeS + AheadS / 2);
        if (stretches[index] is null && !known[index].Covers(Math.Min(fromS, toS), toS))
        {
            var recording = recordings[index];
            // Plots of echoes through the north mark and plots that the extractor dated a little later are in by the margin.
            var (readFromS, readToS) = (Math.Max(0, fromS - AheadS / 4), Math.Min(scene.DurationS, state.TimeS + AheadS) + scene.Beam.PeriodS);
            stretches[index] = Task.Run(() => recording.Read(readFromS, readToS));
        }
    }

    private void WantLooks(ImmutableArray<ReplayRecording> from)
    {
        var id = wantedId;
        if (id.Length == 0)
        {
            Selected = SelectedLooks.Nothing;
        }
        else if (looks is null && !string.Equals(Selected.Id, id, StringComparison.Ordinal))
        {
            // The looks around the time shown first: the budget does not wait for the charts.
            var (fromS, toS) = (wantedTimeS - 60, wantedTimeS + 60);
            looks = Task.Run(() => new SelectedLooks(id, [.. from.Select(recording => recording.ReadLooks(id, fromS, toS))], false));
        }
        else if (looks is null && !Selected.IsWhole)
        {
            looks = Task.Run(() => new SelectedLooks(id, [.. from.Select(recording => recording.ReadLooks(id, double.NegativeInfinity, double.PositiveInfinity))], true));
        }
    }
}
