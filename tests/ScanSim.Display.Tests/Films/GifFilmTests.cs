using ScanSim.Display.Films;
using ScanSim.Display.Painting;
using SkiaSharp;

namespace ScanSim.Display.Tests.Films;

public sealed class GifFilmTests : IDisposable
{
    private readonly TemporaryFolder folder = new();

    public void Dispose() => folder.Dispose();

    [Theory]
    [InlineData(Theme.Dark)]
    [InlineData(Theme.Paper)]
    public void Every_frame_of_a_gif_is_the_painters_but_for_slight_shades(Theme theme)
    {
        var view = new ViewOptions { Theme = theme };
        Film.Save(FilmMaking.Scene, view, FilmMaking.Plan, folder.In("a.gif"));
        var film = DecodedFilm.Read(folder.In("a.gif"));
        Assert.Equal((800, 600), film.Size);
        Assert.Equal(19, film.Frames.Count);
        var own = Colours.Of(theme);
        SKColor[] exact = [own.Ground, own.Panel, own.Rule, own.Ink, own.Plot, .. own.Outcomes];
        for (var i = 0; i < film.Frames.Count; i++)
        {
            var painted = FilmMaking.Painted(FilmMaking.Plan, view, i);
            var (sum, greatest) = (0L, 0);
            for (var at = 0; at < painted.Length; at++)
            {
                if (painted[at] == film.Frames[i][at])
                {
                    continue;
                }

                var difference = FilmMaking.Difference(painted[at], film.Frames[i][at]);
                (sum, greatest) = (sum + difference, Math.Max(greatest, difference));
                Assert.False(exact.Contains(painted[at]), $"{painted[at]} of the theme became {film.Frames[i][at]} in frame {i}");
            }

            // 255 colours for some two thousand shades: under a fifth of the range, and hardly anything on the whole.
            Assert.InRange(greatest, 0, 50);
            Assert.InRange((double)sum / painted.Length, 0, 0.5);
        }
    }

    [Fact]
    public void A_gif_lasts_as_long_as_its_frames_and_repeats()
    {
        var plan = FilmMaking.Plan with { ToS = FilmMaking.Plan.FromS + 4 };
        Film.Save(FilmMaking.Scene, FilmMaking.View, plan, folder.In("a.gif"));
        var film = DecodedFilm.Read(folder.In("a.gif"));
        Assert.Equal([80, 90, 80, 80, 90, 80], film.Durations);
        Assert.Equal(-1, film.RepetitionCount);
    }

    [Fact]
    public void More_frames_a_second_than_viewers_show_are_refused()
    {
        var plan = FilmMaking.Plan with { FramesPerSecond = 51 };
        Assert.Contains("at most 50", Assert.Throws<PictureException>(() => Film.Save(FilmMaking.Scene, FilmMaking.View, plan, folder.In("a.gif"))).Message, StringComparison.Ordinal);
        Assert.Empty(folder.Files());
    }

    [Fact]
    public void Few_colours_are_kept_exactly()
    {
        uint[] theme = [0x102030, 0xFFFFFF];
        var occurring = Enumerable.Range(0, 253).ToDictionary(i => (uint)(i * 7919), i => (long)i + 1);
        var palette = new GifPalette(theme, occurring);
        var table = palette.Table;
        Assert.All(theme.Concat(occurring.Keys), colour => Assert.Equal(colour, Colour(table, palette.IndexOf(colour))));
    }

    [Fact]
    public void Each_of_many_colours_goes_to_the_nearest_of_the_palette_and_never_to_the_transparent_one()
    {
        var draws = new Random(13);
        var palette = new GifPalette([0], Enumerable.Range(0, 5000).Select(_ => (uint)draws.Next(1 << 24)).Distinct().ToDictionary(c => c, _ => (long)draws.Next(1, 1000)));
        var table = palette.Table;
        for (var n = 0; n < 2000; n++)
        {
            var colour = (uint)draws.Next(1 << 24);
            var index = palette.IndexOf(colour);
            Assert.NotEqual(GifPalette.Transparent, index);
            Assert.Equal(Enumerable.Range(0, 255).Min(i => Squared(colour, Colour(table, i))), Squared(colour, Colour(table, index)));
        }
    }

    [Theory]
    [InlineData(1)]
    [InlineData(300)]
    [InlineData(40_000)]
    public void Codes_are_read_back_by_a_second_reading_of_the_standard(int length)
    {
        var draws = new Random(14);
        foreach (var kinds in (int[])[1, 2, 17, 256])
        {
            var bytes = Enumerable.Range(0, length).Select(_ => (byte)draws.Next(kinds)).ToArray();
            using var compressed = new MemoryStream();
            LzwCompression.Write(bytes, compressed);
            Assert.Equal(bytes, Decompressed(compressed.ToArray()));
        }
    }

    private static uint Colour(byte[] table, int index) => table[3 * index] | (uint)table[3 * index + 1] << 8 | (uint)table[3 * index + 2] << 16;

    private static int Squared(uint a, uint b) =>
        Enumerable.Range(0, 3).Sum(axis => (int)Math.Pow((int)(a >> 8 * axis & 0xFF) - (int)(b >> 8 * axis & 0xFF), 2));

    /// <summary>The plainest decoder: a table of strings, one bit at a time.</summary>
    private static List<byte> Decompressed(byte[] stream)
    {
        Assert.Equal(8, stream[0]);
        var bits = new List<bool>();
        var at = 1;
        for (; stream[at] != 0; at += stream[at] + 1)
        {
            bits.AddRange(stream.AsSpan(at + 1, stream[at]).ToArray().SelectMany(b => Enumerable.Range(0, 8).Select(i => (b >> i & 1) == 1)));
        }

        Assert.Equal(stream.Length - 1, at);
        var (result, table, width, previous, read) = (new List<byte>(), new List<byte[]>(), 9, (byte[]?)null, 0);
        while (true)
        {
            var code = Enumerable.Range(0, width).Sum(i => bits[read + i] ? 1 << i : 0);
            read += width;
            if (code == 257)
            {
                Assert.InRange(bits.Count - read, 0, 7);
                return result;
            }

            if (code == 256)
            {
                table = [.. Enumerable.Range(0, 256).Select(b => new[] { (byte)b }), [], []];
                (width, previous) = (9, null);
                continue;
            }

            byte[] entry = code < table.Count ? table[code] : [.. previous!, previous![0]];
            result.AddRange(entry);
            if (previous is not null && table.Count < 4096)
            {
                table.Add([.. previous, entry[0]]);
            }

            width = table.Count >= 2048 ? 12 : table.Count >= 1024 ? 11 : table.Count >= 512 ? 10 : 9;
            previous = entry;
        }
    }
}
