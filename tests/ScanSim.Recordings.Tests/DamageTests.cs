using CsCheck;

namespace ScanSim.Recordings.Tests;

/// <summary>Whatever is wrong with the files, the user gets a <see cref="RecordingException"/> and never another one.</summary>
public sealed class DamageTests
{
    [Fact]
    public void What_is_no_recording_is_said_so()
    {
        using var folder = new TemporaryFolder();
        AssertRefused(() => Recording.Open(folder.In("nowhere")), "there is no such folder");
        AssertRefused(() => Recording.Open(folder.Path), "is no recording: there is no recording.json in it");
        File.WriteAllText(folder.In("file"), "");
        AssertRefused(() => Recording.Open(folder.In("file")), "is a file; a recording is a folder");
    }

    [Fact]
    public void A_newer_format_is_said_so()
    {
        using var folder = new TemporaryFolder();
        Samples.Write(folder.Recording, Samples.Rows, TableFormat.Parquet);
        Edit(folder, text => text.Replace("\"format\": 1", "\"format\": 2", StringComparison.Ordinal));
        AssertRefused(() => Recording.Open(folder.Recording), "has format 2, this program reads format 1");
    }

    [Theory]
    [InlineData("\"seed\": \"18446744073709551615\"", "\"seed\": \"-1\"", "seed is \"-1\"")]
    [InlineData("\"looks_kept\": \"all\"", "\"looks_kept\": \"some\"", "\"some\" is none of")]
    [InlineData("\"file\": \"looks.parquet\"", "\"file\": \"../looks.parquet\"", "names the file")]
    [InlineData("\"name\": \"pd\"", "\"name\": \"probability\"", "the columns of looks")]
    [InlineData("\"duration_s\": 600.5", "\"duration_s\": \"long\"", "no manifest")]
    [InlineData("\"duration_s\": 600.5,", "", "no manifest")]
    [InlineData("\"tables\": {", "\"tables\": [", "no manifest")]
    public void A_changed_manifest_is_refused_with_the_reason(string written, string changed, string reason)
    {
        using var folder = new TemporaryFolder();
        Samples.Write(folder.Recording, Samples.Rows, TableFormat.Parquet);
        Edit(folder, text => text.Replace(written, changed, StringComparison.Ordinal));
        AssertRefused(() => Recording.Open(folder.Recording), reason);
    }

    [Theory]
    [MemberData(nameof(Samples.Formats), MemberType = typeof(Samples))]
    public void A_missing_or_cut_table_is_found_on_opening(TableFormat format)
    {
        using var folder = new TemporaryFolder();
        Samples.Write(folder.Recording, Samples.Rows, format);
        var table = Directory.GetFiles(folder.Recording, "plots.*").Single();
        using (var stream = new FileStream(table, FileMode.Open))
        {
            stream.SetLength(stream.Length - 1);
        }

        AssertRefused(() => Recording.Open(folder.Recording), "the file was cut or changed");
        File.Delete(table);
        AssertRefused(() => Recording.Open(folder.Recording), "is missing, recording.json names it");
    }

    [Fact]
    public void A_missing_scenario_is_said_so()
    {
        using var folder = new TemporaryFolder();
        Samples.Write(folder.Recording, Samples.Rows, TableFormat.Parquet);
        File.Delete(Path.Combine(folder.Recording, "scenario.json"));
        AssertRefused(() => Recording.Open(folder.Recording), "scenario.json cannot be read");
    }

    [Theory]
    [MemberData(nameof(Samples.Formats), MemberType = typeof(Samples))]
    public void Another_number_of_rows_than_the_manifest_says_is_found_on_reading(TableFormat format)
    {
        foreach (var other in new[] { 199, 201 })
        {
            using var folder = new TemporaryFolder();
            Samples.Write(folder.Recording, Samples.Rows, format);

            // 200 plots and 200 positions.
            Edit(folder, text => text.Replace("\"rows\": 200,", $"\"rows\": {other},", StringComparison.Ordinal));
            AssertRefused(() => Recording.Open(folder.Recording).Plots().Count(), "plots.");
        }
    }

    [Theory]
    [MemberData(nameof(Samples.Formats), MemberType = typeof(Samples))]
    public void A_changed_byte_is_refused_or_fails_the_verification(TableFormat format)
    {
        using var folder = new TemporaryFolder();
        var rows = Samples.Rows with { Looks = Samples.Rows.Looks[..40] };
        Samples.Write(folder.Recording, rows, format, blockRows: 16);
        var path = Directory.GetFiles(folder.Recording, "looks.*").Single();
        var whole = File.ReadAllBytes(path);
        Gen.Select(Gen.Int[0, whole.Length - 1], Gen.Byte[1, 255]).Sample(
            (place, change) =>
            {
                var damaged = (byte[])whole.Clone();
                damaged[place] ^= change;
                File.WriteAllBytes(path, damaged);
                return IsFoundOrHarmless(folder.Recording, rows.Looks);
            },
            iter: 400,
            threads: 1,
            seed: "0000KOIPe303"
        );
    }

    [Theory]
    [InlineData("hits.csv", "noise", "nOise", "\"nOise\" is none of \"target\", \"noise\"")]
    [InlineData("hits.csv", "beam_azimuth_deg", "beam_azimuth_grd", "its columns are")]
    public void A_word_that_no_column_has_is_named(string file, string written, string changed, string reason)
    {
        using var folder = new TemporaryFolder();
        Samples.Write(folder.Recording, Samples.Rows, TableFormat.Csv);
        var path = Path.Combine(folder.Recording, file);
        File.WriteAllText(path, File.ReadAllText(path).Replace(written, changed, StringComparison.Ordinal));
        AssertRefused(() => Recording.Open(folder.Recording).Hits().Count(), reason);
    }

    [Fact]
    public void A_damaged_line_is_named()
    {
        using var folder = new TemporaryFolder();
        Samples.Write(folder.Recording, Samples.Rows, TableFormat.JsonLines);
        var path = Path.Combine(folder.Recording, "scans.jsonl");
        var lines = File.ReadAllLines(path);
        lines[6] = lines[6].Replace("\"start_s\"", "\"START_S\"", StringComparison.Ordinal);
        File.WriteAllText(path, string.Join('\n', lines) + "\n");
        AssertRefused(() => Recording.Open(folder.Recording).Scans().Count(), "line 7: start_s is missing in its place");
    }

    /// <summary>A changed byte may also be one that says nothing, as in the name of the writing library: then all rows are as before.</summary>
    private static bool IsFoundOrHarmless(string path, LookRow[] looks)
    {
        var recording = Recording.Open(path);
        try
        {
            var within = recording.Looks(0, 1).Count();
            recording.Verify();
            return recording.Looks().SequenceEqual(looks) && within == looks.Count(row => row.TimeS is >= 0 and <= 1);
        }
        catch (RecordingException)
        {
            return true;
        }
    }

    private static void Edit(TemporaryFolder folder, Func<string, string> change)
    {
        var path = Path.Combine(folder.Recording, "recording.json");
        var text = File.ReadAllText(path);
        var changed = change(text);
        Assert.NotEqual(text, changed, StringComparer.Ordinal);
        File.WriteAllText(path, changed);
    }

    private static void AssertRefused<T>(Func<T> read, string reason)
    {
        var refusal = Assert.Throws<RecordingException>(() => { read(); });
        Assert.Contains(reason, refusal.Message, StringComparison.Ordinal);
    }
}
