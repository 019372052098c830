using ScanSim.Display.Films;

namespace ScanSim.Display.Tests.Films;

public sealed class WebpFilmTests : IDisposable
{
    private readonly TemporaryFolder folder = new();

    public void Dispose() => folder.Dispose();

    [Fact]
    public void Every_frame_of_a_webp_is_the_painters_pixel_for_pixel()
    {
        var plan = FilmMaking.Plan;
        Film.Save(FilmMaking.Scene, FilmMaking.View, plan, folder.In("a.webp"));
        var film = DecodedFilm.Read(folder.In("a.webp"));
        Assert.Equal((800, 600), film.Size);
        Assert.Equal(19, film.Frames.Count);
        for (var i = 0; i < film.Frames.Count; i++)
        {
            Assert.Equal(FilmMaking.Painted(plan, i), film.Frames[i]);
        }
    }

    [Fact]
    public void A_webp_lasts_as_long_as_its_frames_and_repeats()
    {
        var plan = FilmMaking.Plan with { ToS = FilmMaking.Plan.FromS + 4 };
        Film.Save(FilmMaking.Scene, FilmMaking.View, plan, folder.In("a.webp"));
        var film = DecodedFilm.Read(folder.In("a.webp"));
        Assert.Equal([83, 84, 83, 83, 84, 83], film.Durations);
        Assert.Equal(-1, film.RepetitionCount);
    }

    [Fact]
    public void Frames_of_a_view_moved_and_scaled_are_the_painters_too()
    {
        var plan = FilmMaking.Plan with { ToS = FilmMaking.Plan.FromS + 2, Size = new PictureSize(1283, 907, 1.5) };
        var view = new ViewOptions { Theme = Theme.Paper, RangeM = 9_000, CentreEastM = 4_000, Unit = RangeUnit.NauticalMile };
        Film.Save(FilmMaking.Scene, view, plan, folder.In("a.webp"));
        var film = DecodedFilm.Read(folder.In("a.webp"));
        Assert.Equal(FilmMaking.Painted(plan, view, 0), film.Frames[0]);
        Assert.Equal(FilmMaking.Painted(plan, view, 3), film.Frames[3]);
    }

    [Theory]
    [InlineData("webp", 200)]
    [InlineData("gif", 60)]
    public void A_frame_in_which_nothing_changes_is_kept_and_takes_next_to_nothing(string ending, int mostBytes)
    {
        using var frame = new FrameBuffer(FilmMaking.Plan.Size);
        frame.Paint(new Painter(FilmMaking.Scene), FilmMaking.View, 50);
        using (var file = File.Create(folder.In("a." + ending)))
        {
            IFilmEncoder encoder = ending == "gif"
                ? new GifEncoder(file, FilmMaking.Plan, GifPalette.Of(FilmMaking.Scene, FilmMaking.View, FilmMaking.Plan, CancellationToken.None))
                : new WebpEncoder(file, FilmMaking.Plan);
            encoder.Write(encoder.Encode(0, frame, null));
            var still = encoder.Encode(1, frame, frame);
            Assert.InRange(still.Length, 1, mostBytes);
            encoder.Write(still);
            encoder.Finish();
        }

        var film = DecodedFilm.Read(folder.In("a." + ending));
        Assert.Equal(2, film.Frames.Count);
        Assert.Equal(film.Frames[0], film.Frames[1]);
    }
}
