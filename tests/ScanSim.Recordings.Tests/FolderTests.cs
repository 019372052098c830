namespace ScanSim.Recordings.Tests;

/// <summary>Which folders are written into, and what is left behind when a run does not end well.</summary>
public sealed class FolderTests
{
    [Fact]
    public void A_folder_that_exists_is_refused_without_force()
    {
        using var folder = new TemporaryFolder();
        Directory.CreateDirectory(folder.Recording);
        var refusal = Assert.Throws<RecordingException>(() => RecordingWriter.Create(folder.Recording, Samples.Head, force: false));
        Assert.Contains("exists already", refusal.Message, StringComparison.Ordinal);
        Assert.Empty(Directory.GetFileSystemEntries(folder.Recording));
    }

    [Fact]
    public void Force_takes_an_empty_folder()
    {
        using var folder = new TemporaryFolder();
        Directory.CreateDirectory(folder.Recording);
        Assert.True(RowSet.Of(Samples.Write(folder.Recording, Samples.Rows, TableFormat.Parquet)).HasSameBits(Samples.Rows));
    }

    [Fact]
    public void Force_replaces_a_recording_of_another_format_and_leaves_nothing_of_it()
    {
        using var folder = new TemporaryFolder();
        Samples.Write(folder.Recording, Samples.Rows, TableFormat.Csv);
        Samples.Write(folder.Recording, Samples.Rows, TableFormat.JsonLines);
        Assert.Equal(
            ["hits.jsonl", "looks.jsonl", "plots.jsonl", "recording.json", "scans.jsonl", "scenario.json", "truth.jsonl"],
            Names(folder.Recording),
            StringComparer.Ordinal
        );
    }

    [Fact]
    public void Force_replaces_an_unfinished_recording()
    {
        using var folder = new TemporaryFolder();
        using (var writer = RecordingWriter.Create(folder.Recording, Samples.Head, force: false))
        {
            Samples.Rows.AddTo(writer);
        }

        Assert.True(RowSet.Of(Samples.Write(folder.Recording, Samples.Rows, TableFormat.Parquet)).HasSameBits(Samples.Rows));
    }

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public void Force_refuses_a_recording_with_other_files_beside_it_names_them_and_deletes_nothing(bool finished)
    {
        using var folder = new TemporaryFolder();
        using (var writer = RecordingWriter.Create(folder.Recording, Samples.Head, force: false))
        {
            if (finished)
            {
                writer.Complete();
            }
        }

        File.WriteAllText(Path.Combine(folder.Recording, "thesis.txt"), "mine");
        Directory.CreateDirectory(Path.Combine(folder.Recording, "plots.csv"));
        var before = Names(folder.Recording);
        var refusal = Assert.Throws<RecordingException>(() => RecordingWriter.Create(folder.Recording, Samples.Head, force: true));
        Assert.Contains("plots.csv, thesis.txt", refusal.Message, StringComparison.Ordinal);
        Assert.Equal(before, Names(folder.Recording), StringComparer.Ordinal);
    }

    [Theory]
    [InlineData("scenario.json")]
    [InlineData("looks.csv")]
    [InlineData("notes.txt")]
    public void Force_never_touches_a_folder_that_no_recording_marks_as_ours(string file)
    {
        using var folder = new TemporaryFolder();
        Directory.CreateDirectory(folder.Recording);
        File.WriteAllText(Path.Combine(folder.Recording, file), "mine");
        Assert.Throws<RecordingException>(() => RecordingWriter.Create(folder.Recording, Samples.Head, force: true));
        Assert.Equal("mine", File.ReadAllText(Path.Combine(folder.Recording, file)), StringComparer.Ordinal);
        Assert.Equal([file], Names(folder.Recording), StringComparer.Ordinal);
    }

    [Fact]
    public void Force_refuses_a_foreign_file_named_recording_json()
    {
        using var folder = new TemporaryFolder();
        Directory.CreateDirectory(folder.Recording);
        File.WriteAllText(Path.Combine(folder.Recording, "recording.json"), "{ \"song\": 3 }");
        var refusal = Assert.Throws<RecordingException>(() => RecordingWriter.Create(folder.Recording, Samples.Head, force: true));
        Assert.Contains("no manifest", refusal.Message, StringComparison.Ordinal);
        Assert.Equal(["recording.json"], Names(folder.Recording), StringComparer.Ordinal);
    }

    [Fact]
    public void A_missing_parent_and_a_file_in_the_way_are_said_so()
    {
        using var folder = new TemporaryFolder();
        var refusal = Assert.Throws<RecordingException>(() => RecordingWriter.Create(folder.In("a/b"), Samples.Head, force: true));
        Assert.Contains("there is no folder " + folder.In("a"), refusal.Message, StringComparison.Ordinal);

        File.WriteAllText(folder.In("file"), "");
        refusal = Assert.Throws<RecordingException>(() => RecordingWriter.Create(folder.In("file"), Samples.Head, force: true));
        Assert.Contains("is a file", refusal.Message, StringComparison.Ordinal);
        Assert.Throws<RecordingException>(() => RecordingWriter.Create(folder.In("file/below"), Samples.Head, force: false));
    }

    [Fact]
    public void A_path_may_end_in_a_separator_and_must_be_one()
    {
        using var folder = new TemporaryFolder();
        Samples.Write(folder.Recording + "/", Samples.Rows, TableFormat.Csv).Verify();
        Assert.Throws<RecordingException>(() => RecordingWriter.Create("", Samples.Head, force: false));
        Assert.Throws<RecordingException>(() => RecordingWriter.Create("a\0b", Samples.Head, force: true));
        Assert.Throws<RecordingException>(() => Recording.Open("a\0b"));
        Assert.Throws<RecordingException>(() => Recording.Open(""));
    }

    [Fact]
    public void A_folder_that_cannot_be_written_is_said_so()
    {
        Assert.SkipUnless(Directory.Exists("/proc/self"), "needs a place that even root cannot write to");
        var refusal = Assert.Throws<RecordingException>(() => RecordingWriter.Create("/proc/recording", Samples.Head, force: false));
        Assert.Contains("/proc/recording cannot be written", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void While_a_run_goes_on_no_file_has_the_name_of_a_table_or_the_manifest()
    {
        using var folder = new TemporaryFolder();
        using var writer = RecordingWriter.Create(folder.Recording, Samples.Head, force: false);
        Samples.Rows.AddTo(writer);
        Assert.All(Names(folder.Recording).Where(name => name != "scenario.json"), name => Assert.EndsWith(".part", name, StringComparison.Ordinal));
        AssertUnfinished(folder.Recording);
    }

    [Theory]
    [MemberData(nameof(Samples.Formats), MemberType = typeof(Samples))]
    public void Disposing_before_completion_leaves_an_unfinished_recording_without_tables(TableFormat format)
    {
        using var folder = new TemporaryFolder();
        using (var writer = RecordingWriter.Create(folder.Recording, Samples.Head with { Format = format }, force: false))
        {
            Samples.Rows.AddTo(writer);
        }

        AssertUnfinished(folder.Recording);
        Assert.Equal(["recording.json.part", "scenario.json"], Names(folder.Recording), StringComparer.Ordinal);
    }

    [Fact]
    public void Without_looks_there_is_no_looks_table_and_the_manifest_says_so()
    {
        using var folder = new TemporaryFolder();
        using (var writer = RecordingWriter.Create(folder.Recording, Samples.Head with { Looks = LooksKept.None }, force: false))
        {
            Assert.Throws<InvalidOperationException>(() => writer.AddLooks(Samples.Rows.Looks));
            writer.AddLooks([]);
            writer.AddPlots(Samples.Rows.Plots);
            writer.Complete();
        }

        var recording = Recording.Open(folder.Recording);
        Assert.Equal(LooksKept.None, recording.Head.Looks);
        Assert.False(recording.Tables.ContainsKey("looks"));
        Assert.Empty(recording.Looks());
        Assert.Equal(Samples.Rows.Plots, recording.Plots());
        Assert.False(File.Exists(Path.Combine(folder.Recording, "looks.parquet")));
    }

    private static void AssertUnfinished(string path)
    {
        var refusal = Assert.Throws<RecordingException>(() => Recording.Open(path));
        Assert.Contains("is an unfinished recording: the run was interrupted", refusal.Message, StringComparison.Ordinal);
    }

    private static string[] Names(string path) => [.. Directory.GetFileSystemEntries(path).Select(entry => Path.GetFileName(entry)).Order(StringComparer.Ordinal)];
}
