using System.Diagnostics;
using ScanSim.Display.Replay;
using ScanSim.Display.Tests.Replay;
using ScanSim.Display.Windowing;
using SkiaSharp;

namespace ScanSim.Display.Tests.Windowing;

/// <summary>The replay itself in the real window: keys, clicks, drag, wheel and size from the X server; state and pixels out.</summary>
[Collection(WindowCollection.Name)]
public sealed class ReplayInWindowTests(VirtualDisplay display)
{
    private static readonly TimeSpan Patience = TimeSpan.FromSeconds(20);

    [Fact]
    public void A_user_plays_seeks_zooms_pans_selects_resizes_and_closes()
    {
        display.Require();
        using var folder = new TemporaryFolder();
        var recording = ReplayMaking.Recording(folder.In("out"), SceneMaking.Scenario(8, 120));
        using var screen = new ReplayScreen([recording], new ReplaySettings { IsPlaying = false, StartS = 30 });
        using var cancellation = new CancellationTokenSource();
        Exception? fault = null;
        var thread = new Thread(() =>
        {
            try
            {
                using var window = SdlWindow.Open("replay", 1280, 800, 1);
                new WindowLoop(window, screen, () => Stopwatch.GetTimestamp() / (double)Stopwatch.Frequency).Run(null, cancellation.Token);
            }
            catch (Exception e)
            {
                fault = e;
            }
        });
        thread.Start();
        try
        {
            var id = "";
            Until(() => (id = display.FindWindow()).Length > 0);
            display.Do("windowmove", id, "0", "0");
            display.Do("windowfocus", id);
            Until(() => screen.State.Width == 1280);

            display.Do("key", "space");
            Until(() => screen.State.IsPlaying && screen.State.TimeS > 30.2);
            display.Do("key", "space");
            Until(() => !screen.State.IsPlaying);
            using var before = Settled();
            display.Do("key", "End");
            Until(() => screen.State.TimeS == 120);
            using var after = Settled();
            Assert.True(Differences(before, after) > 200, "the picture follows the time");

            display.Do("mousemove", "420", "240", "click", "4", "click", "4");
            Until(() => screen.State.RangeM is { } rangeM && rangeM < recording.Scene.InstrumentedRangeM);
            var east = screen.State.CentreEastM;
            display.Do("mousemove", "420", "240", "mousedown", "1", "mousemove", "460", "240", "mousemove", "500", "240", "mouseup", "1");
            Until(() => screen.State.CentreEastM < east);

            display.Do("key", "Tab");
            Until(() => screen.State.Selected is not null);
            display.Do("key", "question");
            Until(() => screen.State.IsHelpShown);
            display.Do("key", "Escape");
            Until(() => !screen.State.IsHelpShown);

            display.Do("windowsize", id, "1500", "900");
            Until(() => screen.State is { Width: 1500, Height: 900 });
            display.Do("key", "q");
            Until(() => !thread.IsAlive);
        }
        finally
        {
            cancellation.Cancel();
            thread.Join();
        }

        Assert.Null(fault);

        void Until(Func<bool> holds)
        {
            var waited = Stopwatch.StartNew();
            while (!holds())
            {
                Assert.True(fault is null, $"the window failed: {fault}");
                Assert.True(waited.Elapsed < Patience, $"waited in vain; the state is {screen.State}");
                Thread.Sleep(10);
            }
        }
    }

    /// <summary>What the screen shows once two photographs agree.</summary>
    private SKBitmap Settled()
    {
        var last = display.Photograph();
        for (var i = 0; i < 40; i++)
        {
            var next = display.Photograph();
            var same = Differences(last, next) == 0;
            last.Dispose();
            last = next;
            if (same)
            {
                break;
            }
        }

        return last;
    }

    private static int Differences(SKBitmap a, SKBitmap b) => a.Pixels.Zip(b.Pixels).Count(pair => pair.First != pair.Second);
}
