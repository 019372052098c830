using ScanSim.Display.Films;

namespace ScanSim.Display.Tests.Films;

public sealed class FilmPlanTests
{
    private static readonly FilmPlan Usual = new() { FromS = 0, ToS = 600 };

    [Fact]
    public void A_frame_shows_the_speed_over_the_frames_a_second_later_than_the_one_before()
    {
        var plan = Usual with { FromS = 30, SpeedRatio = 5, FramesPerSecond = 20 };
        Assert.Equal(30, plan.TimeS(0));
        Assert.Equal(30.25, plan.TimeS(1));
        Assert.Equal(55, plan.TimeS(100));
    }

    [Theory]
    // 600 s at 10 s a second is 60 s of 12 frames, and both ends are shown.
    [InlineData(600, 10, 12, 721)]
    [InlineData(0.1, 10, 12, 2)]
    [InlineData(10, 1, 1, 11)]
    [InlineData(10.5, 1, 1, 12)]
    // A third of a second is not exact in binary: no step of rounding is added.
    [InlineData(1, 1, 3, 4)]
    public void The_film_begins_and_ends_where_asked(double durationS, double speed, int framesPerSecond, int frames)
    {
        var plan = new FilmPlan { FromS = 7, ToS = 7 + durationS, SpeedRatio = speed, FramesPerSecond = framesPerSecond };
        Assert.Equal(frames, plan.FrameCount);
        Assert.Equal(7, plan.TimeS(0));
        Assert.Equal(7 + durationS, plan.TimeS(frames - 1));
        Assert.All(Enumerable.Range(1, frames - 1), i => Assert.InRange(plan.TimeS(i) - plan.TimeS(i - 1), 1e-9, plan.StepS + 1e-9));
    }

    [Theory]
    [InlineData(12, 1000)]
    [InlineData(12, 100)]
    [InlineData(60, 1000)]
    [InlineData(7, 100)]
    public void Lengths_of_frames_are_rounded_without_adding_up(int framesPerSecond, int unitsPerSecond)
    {
        var plan = Usual with { FramesPerSecond = framesPerSecond };
        Assert.All(Enumerable.Range(0, 2000), i => Assert.Equal(i * (double)unitsPerSecond / framesPerSecond, plan.ShownAt(i, unitsPerSecond), 0.5));
    }

    [Fact]
    public void A_film_of_too_many_frames_is_refused_with_the_speed_that_would_do()
    {
        var plan = new FilmPlan { FromS = 0, ToS = 24 * 3600, SpeedRatio = 1, FramesPerSecond = 25 };
        var fault = Assert.Throws<PictureException>(() => plan.Check(24 * 3600));
        Assert.Contains("2160001 frames", fault.Message, StringComparison.Ordinal);
        Assert.Contains("20000", fault.Message, StringComparison.Ordinal);
        Assert.Contains("at least 108.006", fault.Message, StringComparison.Ordinal);
        (plan with { SpeedRatio = 108.006 }).Check(24 * 3600);
    }

    [Theory]
    [InlineData(-1, 10)]
    [InlineData(10, 10)]
    [InlineData(20, 10)]
    [InlineData(0, 600.1)]
    [InlineData(double.NaN, 10)]
    [InlineData(0, double.NaN)]
    public void Times_that_do_not_go_are_refused(double fromS, double toS) =>
        Assert.Contains("0 s to 600 s", Assert.Throws<PictureException>(() => new FilmPlan { FromS = fromS, ToS = toS }.Check(600)).Message, StringComparison.Ordinal);

    [Fact]
    public void Values_that_do_not_go_are_refused_with_those_that_would()
    {
        Usual.Check(600);
        Refused("1 to 60", Usual with { FramesPerSecond = 0 });
        Refused("1 to 60", Usual with { FramesPerSecond = 61 });
        Refused("0.001 to 1000000", Usual with { SpeedRatio = 0 });
        Refused("0.001 to 1000000", Usual with { SpeedRatio = double.NaN });
        Refused("at most 4096", Usual with { Size = new PictureSize(4098, 3000) });
        Refused("at least 800 x 600", Usual with { Size = new PictureSize(320, 200) });
    }

    private static void Refused(string word, FilmPlan plan) =>
        Assert.Contains(word, Assert.Throws<PictureException>(() => plan.Check(600)).Message, StringComparison.Ordinal);
}
