using System.Collections.Immutable;
using ScanSim.Display.Painting;
using ScanSim.Display.Windowing;
using SkiaSharp;

namespace ScanSim.Display.Replay;

/// <summary>The replay of one recording, or of two side by side: state, what changes it, and the painting of it.</summary>
public sealed class ReplayScreen : IScreen, IDisposable
{
    private readonly ReplayPainter painter = new();
    private readonly ReplayReading reading;
    private readonly ReplaySettings settings;
    private ReplayWorld world;

    /// <summary>Starts a replay.</summary>
    /// <param name="recordings">One, or two to be shown in step.</param>
    /// <param name="settings">How it starts.</param>
    public ReplayScreen(ImmutableArray<ReplayRecording> recordings, ReplaySettings settings)
    {
        if (recordings.Length is < 1 or > 2)
        {
            throw new ArgumentException($"{recordings.Length} recordings cannot be shown: one or two", nameof(recordings));
        }

        this.settings = settings;
        world = new ReplayWorld
        {
            Recordings = recordings,
            Stretches = [.. recordings.Select(_ => ReplayStretch.Nothing)],
            Rows = ReplayRow.Of(recordings, RowOrder.Scenario),
            Overlays = settings.Overlays,
        };
        reading = new ReplayReading(recordings);
        State = (new ReplayState
        {
            TimelineToS = world.DurationS,
            IsPlaying = settings.IsPlaying,
            SpeedRatio = settings.SpeedRatio,
            Unit = settings.Unit,
            Theme = settings.Theme,
            AfterglowScans = settings.AfterglowScans,
        }).GoTo(world, settings.StartS).Select(world, settings.Selected);
        reading.Want(State, world);
    }

    /// <summary>What is shown now.</summary>
    public ReplayState State { get; private set; }

    public bool WantsToClose { get; private set; }

    public string Title => $"{string.Join(" | ", world.Recordings.Select(recording => recording.Scene.ScenarioName).Distinct(StringComparer.Ordinal))} – ScanSim";

    internal ReplayWorld World => world;

    internal ReplayPainter Painter => painter;

    /// <summary>Where each piece of text was set is added here, if given; then no layer is kept as pixels.</summary>
    internal ICollection<DrawnText>? Journal { get; set; }

    public bool Handle(in WindowEvent e)
    {
        var before = State;
        Change(ReplayInput.After(State, world, e));
        return !ReferenceEquals(before, State);
    }

    public bool Advance(double elapsedS)
    {
        var before = State;
        Change(ReplayClock.After(State, world, elapsedS));
        var isNew = Collect();
        return isNew || reading.IsBusy || !ReferenceEquals(before, State);
    }

    public void Paint(SKCanvas canvas, float width, float height, float scale)
    {
        Collect();
        if (width != State.Width || height != State.Height)
        {
            Change(State with { Width = width, Height = height });
        }

        Paint(canvas, scale, forSvg: false, isCached: true);
    }

    public void Dispose() => painter.Dispose();

    /// <summary>Waits until all that the present state shows has been read.</summary>
    internal void WaitForRows()
    {
        reading.Want(State, world);
        while (reading.IsBusy)
        {
            reading.Wait();
            Collect();
        }
    }

    private void Paint(SKCanvas canvas, float scale, bool forSvg, bool isCached)
    {
        var pixels = canvas.TotalMatrix;
        canvas.Save();
        canvas.Scale(scale);
        painter.Paint(new Frame(canvas, pixels, scale, forSvg, isCached && Journal is null) { Journal = Journal }, State, world, reading.Selected);
        canvas.Restore();
    }

    private void Change(ReplayState next)
    {
        if (ReferenceEquals(next, State))
        {
            return;
        }

        if (next.Order != State.Order)
        {
            world = world with { Rows = ReplayRow.Of(world.Recordings, next.Order) };
        }

        State = next with { Wish = ReplayWish.None };
        Fulfil(next.Wish);
        reading.Want(State, world);
    }

    private bool Collect()
    {
        if (reading.Collect(world) is not { } renewed)
        {
            return false;
        }

        world = renewed;
        if (reading.Fault is { } fault)
        {
            State = State with { Message = fault };
        }

        return true;
    }

    private void Fulfil(ReplayWish wish)
    {
        WantsToClose |= wish == ReplayWish.Close;
        var ending = wish switch { ReplayWish.SavePng => ".png", ReplayWish.SaveSvg => ".svg", ReplayWish.SavePdf => ".pdf", _ => null };
        if (ending is not null)
        {
            State = State with { Message = Save(ending) };
        }
    }

    private string Save(string ending)
    {
        try
        {
            WaitForRows();
            var scene = world.First.Scene;
            var path = SavedPicture.FreeName(settings.SaveFolder, scene, State.TimeS, ending);
            var size = new PictureSize((int)State.Width, (int)State.Height);
            Picture.Write(path, size, scene, (canvas, forSvg) => Paint(canvas, 1, forSvg, isCached: false));
            return $"Saved as {path}";
        }
        catch (PictureException fault)
        {
            return fault.Message;
        }
    }
}
