using System.Runtime.InteropServices;
using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Films;

/// <summary>The 255 colours of a film and the transparent one: the theme's own exactly, the shades between them by splitting what occurs.</summary>
internal sealed class GifPalette
{
    public const byte Transparent = 255;

    /// <summary>Frames looked at to find the colours that occur, spread over the film.</summary>
    private const int Samples = 9;

    private readonly uint[] colours;

    // By red, green and blue: the index plus one; 0 where it is not known yet. Filled from several threads, always with the same values.
    private readonly byte[] known = new byte[1 << 24];

    public GifPalette(IReadOnlyCollection<uint> exact, IReadOnlyDictionary<uint, long> histogram)
    {
        var rest = histogram.Where(entry => !exact.Contains(entry.Key)).Select(entry => new ColourCount(entry.Key, entry.Value));
        colours = [.. exact, .. ColourBox.Split(rest, Transparent - exact.Count)];
        for (var i = 0; i < colours.Length; i++)
        {
            known[colours[i]] = (byte)(i + 1);
        }
    }

    /// <summary>256 colours of three bytes each, red first.</summary>
    public byte[] Table
    {
        get
        {
            var table = new byte[3 * 256];
            for (var i = 0; i < colours.Length; i++)
            {
                (table[3 * i], table[3 * i + 1], table[3 * i + 2]) = ((byte)colours[i], (byte)(colours[i] >> 8), (byte)(colours[i] >> 16));
            }

            return table;
        }
    }

    public static GifPalette Of(Scene scene, ViewOptions view, FilmPlan plan, CancellationToken cancellation)
    {
        var histogram = new Dictionary<uint, long>();
        using var frame = new FrameBuffer(plan.Size);
        var samples = Math.Min(Samples, plan.FrameCount);
        var painter = new Painter(scene);
        for (var sample = 0; sample < samples; sample++)
        {
            cancellation.ThrowIfCancellationRequested();
            frame.Paint(painter, view, plan.TimeS((int)((long)sample * (plan.FrameCount - 1) / Math.Max(1, samples - 1))));
            Count(frame, histogram);
        }

        return new GifPalette(ThemeColours(Colours.Of(view.Theme)), histogram);
    }

    /// <summary>The nearest colour of the palette; of equally near ones the first.</summary>
    public byte IndexOf(uint colour)
    {
        var rgb = colour & 0xFF_FFFF;
        var index = known[rgb];
        if (index == 0)
        {
            index = (byte)(Nearest(rgb) + 1);
            known[rgb] = index;
        }

        return (byte)(index - 1);
    }

    private int Nearest(uint rgb)
    {
        var (best, bestDistance) = (0, int.MaxValue);
        for (var i = 0; i < colours.Length; i++)
        {
            var red = (int)(rgb & 0xFF) - (int)(colours[i] & 0xFF);
            var green = (int)(rgb >> 8 & 0xFF) - (int)(colours[i] >> 8 & 0xFF);
            var blue = (int)(rgb >> 16 & 0xFF) - (int)(colours[i] >> 16 & 0xFF);
            var distance = red * red + green * green + blue * blue;
            if (distance < bestDistance)
            {
                (best, bestDistance) = (i, distance);
            }
        }

        return best;
    }

    private static void Count(FrameBuffer frame, Dictionary<uint, long> histogram)
    {
        for (var y = 0; y < frame.Size.HeightPx; y++)
        {
            var row = frame.Row(y);
            for (var x = 0; x < row.Length;)
            {
                var colour = row[x];
                var run = row[x..].IndexOfAnyExcept(colour);
                run = run < 0 ? row.Length - x : run;
                CollectionsMarshal.GetValueRefOrAddDefault(histogram, colour & 0xFF_FFFF, out _) += run;
                x += run;
            }
        }
    }

    private static uint[] ThemeColours(Colours theme) =>
        [.. new[]
        {
            theme.Ground, theme.Panel, theme.Rule, theme.Grid, theme.GridText, theme.Ink, theme.Quiet, theme.Truth, theme.Trail, theme.Plot, theme.FalsePlot,
        }.Concat(theme.Outcomes).Select(Rgb).Distinct()];

    private static uint Rgb(SKColor colour) => colour.Red | (uint)colour.Green << 8 | (uint)colour.Blue << 16;
}
