namespace ScanSim.Display.Windowing;

/// <summary>Keeps a screen in a window going: events in, time on, frames out, 60 a second while time runs and none while nothing changes.</summary>
/// <param name="window">Open, on this thread.</param>
/// <param name="screen">What it shows.</param>
/// <param name="nowS">A clock that never goes back, with any zero.</param>
public sealed class WindowLoop(SdlWindow window, IScreen screen, Func<double> nowS)
{
    public const double FramesPerS = 60;

    /// <summary>Asleep, the loop still looks for cancellation this often.</summary>
    private const double IdleS = 0.25;

    private readonly List<WindowEvent> events = [];

    /// <summary>Until the screen wants to close, the measurement is complete, or <paramref name="cancellation"/> comes.</summary>
    public void Run(FrameMeasurement? measurement = null, CancellationToken cancellation = default)
    {
        var lastS = nowS();
        var frameS = lastS;
        events.Add(window.Resized());
        var goesOn = true;
        while (!screen.WantsToClose && !cancellation.IsCancellationRequested && measurement?.IsComplete != true)
        {
            frameS = Gather(frameS, goesOn);
            var startS = nowS();
            var changed = screen.Advance(Math.Max(0, startS - lastS));
            lastS = startS;
            goesOn = changed | HandleAll();
            changed = goesOn || window.NeedsPaint;
            var painted = changed && window.IsVisible && !screen.WantsToClose;
            if (painted)
            {
                window.Paint(screen.Paint);
                window.Title = screen.Title;
            }

            measurement?.Add(nowS(), painted ? nowS() - startS : null);
        }
    }

    /// <summary>Collects events until the next frame is due and tells when the one after that is. At rest the next frame is due with the first event.</summary>
    private double Gather(double frameS, bool goesOn)
    {
        var now = nowS();
        var dueS = Math.Max(frameS, now);
        var untilS = goesOn ? dueS : now + IdleS;
        while (untilS - now > 0.0005)
        {
            if (window.Wait((int)Math.Ceiling((untilS - now) * 1000), out var e))
            {
                Add(e);
                untilS = Math.Min(untilS, dueS);
            }
            else if (window.NeedsPaint && window.IsVisible)
            {
                untilS = Math.Min(untilS, dueS);
            }

            now = nowS();
        }

        while (window.Next(out var e))
        {
            Add(e);
        }

        // Frames keep their beat; after a late one there is no rush to catch up.
        return dueS < now - 1 / FramesPerS ? now + 1 / FramesPerS : dueS + 1 / FramesPerS;
    }

    /// <summary>Of moves and sizes in a row only the last matters.</summary>
    private void Add(in WindowEvent e)
    {
        if (events.Count > 0 && events[^1].Kind == e.Kind && e.Kind is WindowEventKind.PointerMoved or WindowEventKind.Resized)
        {
            events[^1] = e;
        }
        else
        {
            events.Add(e);
        }
    }

    private bool HandleAll()
    {
        var changed = false;
        foreach (var e in events)
        {
            changed |= screen.Handle(e);
        }

        events.Clear();
        return changed;
    }
}
