using ScanSim.Display.Films;

namespace ScanSim.Display.Tests.Films;

public sealed class FilmTests : IDisposable
{
    private static readonly FilmPlan Short = FilmMaking.Plan with { ToS = FilmMaking.Plan.FromS + 5 };
    private readonly TemporaryFolder folder = new();

    public void Dispose() => folder.Dispose();

    [Theory]
    [InlineData("webp")]
    [InlineData("gif")]
    public void The_same_film_has_the_same_bytes_twice(string ending)
    {
        Film.Save(FilmMaking.Scene, FilmMaking.View, FilmMaking.Plan, folder.In("a." + ending));
        Film.Save(FilmMaking.Scene, FilmMaking.View, FilmMaking.Plan, folder.In("b." + ending));
        Assert.Equal(File.ReadAllBytes(folder.In("a." + ending)), File.ReadAllBytes(folder.In("b." + ending)));
    }

    [Fact]
    public void A_film_replaces_the_one_that_stood_there_and_leaves_nothing_else()
    {
        File.WriteAllText(folder.In("a.WEBP"), "old");
        Film.Save(FilmMaking.Scene, FilmMaking.View, Short, folder.In("a.WEBP"));
        Assert.Equal(["a.WEBP"], folder.Files());
        Assert.Equal((byte)'R', File.ReadAllBytes(folder.In("a.WEBP"))[0]);
    }

    [Fact]
    public void Progress_counts_each_frame_once_and_in_order()
    {
        var told = new List<(int, int)>();
        Film.Save(FilmMaking.Scene, FilmMaking.View, Short, folder.In("a.gif"), (done, all) => told.Add((done, all)));
        Assert.Equal(Enumerable.Range(1, 7).Select(i => (i, 7)), told);
    }

    [Theory]
    [InlineData("webp")]
    [InlineData("gif")]
    [InlineData("mp4")]
    public void An_interrupted_film_leaves_no_file_and_the_old_one_untouched(string ending)
    {
        Assert.SkipWhen(ending == "mp4" && Ffmpeg.Find() is null, "ffmpeg is not installed");
        File.WriteAllText(folder.In("a." + ending), "old");
        using var source = new CancellationTokenSource();
        Assert.ThrowsAny<OperationCanceledException>(() => Film.Save(FilmMaking.Scene, FilmMaking.View, FilmMaking.Plan, folder.In("a." + ending), (done, _) => CancelAt(3, done), source.Token));
        Assert.Equal(["a." + ending], folder.Files());
        Assert.Equal("old", File.ReadAllText(folder.In("a." + ending)));

        void CancelAt(int frame, int done)
        {
            if (done == frame)
            {
                source.Cancel();
            }
        }
    }

    [Theory]
    [InlineData("a.avi", "the ending '.avi'")]
    [InlineData("a", "no ending")]
    [InlineData("a.png", "the ending '.png'")]
    public void Another_ending_is_refused_with_those_that_go(string name, string found)
    {
        var fault = Assert.Throws<PictureException>(() => Film.Save(FilmMaking.Scene, FilmMaking.View, Short, folder.In(name)));
        Assert.Contains(found, fault.Message, StringComparison.Ordinal);
        Assert.Contains(".webp, .gif or .mp4", fault.Message, StringComparison.Ordinal);
        Assert.Empty(folder.Files());
    }

    [Fact]
    public void A_view_or_plan_that_does_not_go_is_refused_before_anything_is_written()
    {
        Assert.Throws<PictureException>(() => Film.Save(FilmMaking.Scene, new ViewOptions { RangeM = 0 }, Short, folder.In("a.webp")));
        Assert.Throws<PictureException>(() => Film.Save(FilmMaking.Scene, FilmMaking.View, Short with { ToS = 121 }, folder.In("a.webp")));
        Assert.Empty(folder.Files());
    }

    [Fact]
    public void A_place_that_cannot_be_written_is_named()
    {
        var missing = folder.In(Path.Combine("missing", "a.webp"));
        Assert.Contains(missing, Assert.Throws<PictureException>(() => Film.Save(FilmMaking.Scene, FilmMaking.View, Short, missing)).Message, StringComparison.Ordinal);
        Directory.CreateDirectory(folder.In("b.webp"));
        Assert.Contains("it is a folder", Assert.Throws<PictureException>(() => Film.Save(FilmMaking.Scene, FilmMaking.View, Short, folder.In("b.webp"))).Message, StringComparison.Ordinal);
        Assert.Empty(folder.Files());
    }
}
