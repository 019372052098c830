namespace ScanSim.Recordings.Tests;

public sealed class WriterTests
{
    [Theory]
    [MemberData(nameof(Samples.Formats), MemberType = typeof(Samples))]
    public void Equal_rows_give_byte_identical_files_in_whatever_portions_they_come(TableFormat format)
    {
        using var folder = new TemporaryFolder();
        Samples.Write(folder.In("whole"), Samples.Rows, format, blockRows: 300);
        using (var writer = RecordingWriter.Create(folder.In("portions"), Samples.Head with { Format = format }, force: false, new() { BlockRows = 300 }))
        {
            AddInPortions(writer);
            writer.Complete();
        }

        foreach (var file in Directory.GetFiles(folder.In("whole")))
        {
            Assert.Equal(File.ReadAllBytes(file), File.ReadAllBytes(Path.Combine(folder.In("portions"), Path.GetFileName(file))));
        }
    }

    [Fact]
    public void The_head_reads_back_from_the_manifest_with_all_digits()
    {
        using var folder = new TemporaryFolder();
        var head = Samples.Write(folder.Recording, Samples.Rows, TableFormat.Csv).Head;
        Assert.Equal(Samples.Head with { Format = TableFormat.Csv }, head);
        Assert.Equal(TimeSpan.Zero, head.StartUtc.Offset);
        Assert.Equal(Samples.Head.ScenarioText, File.ReadAllText(Path.Combine(folder.Recording, "scenario.json")), StringComparer.Ordinal);
    }

    [Fact]
    public void Not_a_number_is_refused_with_its_column_and_row()
    {
        using var folder = new TemporaryFolder();
        using var writer = RecordingWriter.Create(folder.Recording, Samples.Head, force: false);
        writer.AddHits(Samples.Rows.Hits);
        writer.AddHits([Samples.Rows.Hits[0] with { SnrDb = double.NaN }]);
        var refusal = Assert.Throws<InvalidOperationException>(writer.Complete);
        Assert.Contains($"hits.snr_db, row {Samples.Rows.Hits.Length}", refusal.Message, StringComparison.Ordinal);
        Assert.Throws<InvalidOperationException>(writer.Complete);
    }

    [Theory]
    [MemberData(nameof(Samples.Formats), MemberType = typeof(Samples))]
    public void A_full_device_ends_in_a_message_that_names_file_and_reason(TableFormat format)
    {
        using var folder = new TemporaryFolder();
        var settings = new Tables.WriterSettings { BlockRows = 300, OpenFile = path => new FullAfter(path, bytes: 20_000) };
        using (var writer = RecordingWriter.Create(folder.Recording, Samples.Head with { Format = format }, force: false, settings))
        {
            var fault = Assert.Throws<RecordingException>(() => WriteMuch(writer));
            Assert.Contains("looks." , fault.Message, StringComparison.Ordinal);
            Assert.Contains("No space left on device", fault.Message, StringComparison.Ordinal);
            Assert.Throws<InvalidOperationException>(writer.Complete);
        }

        Assert.Throws<RecordingException>(() => Recording.Open(folder.Recording));
        Assert.Equal(2, Directory.GetFiles(folder.Recording).Length);
    }

    [Fact]
    public void A_full_disk_ends_in_a_message_that_names_file_and_reason()
    {
        using var folder = new TemporaryFolder();
        using var disk = SmallDisk.TryMount(folder.In("disk"), "64k");
        Assert.SkipWhen(disk is null, "mounting a small file system needs root");
        using (var writer = RecordingWriter.Create(Path.Combine(disk.Path, "recording"), Samples.Head, force: false, new() { BlockRows = 300 }))
        {
            var fault = Assert.Throws<RecordingException>(() => WriteMuch(writer));
            Assert.Contains("looks.parquet.part cannot be written: No space left on device", fault.Message, StringComparison.Ordinal);
        }

        var refusal = Assert.Throws<RecordingException>(() => Recording.Open(Path.Combine(disk.Path, "recording")));
        Assert.Contains("unfinished", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void The_heap_does_not_grow_with_the_number_of_rows()
    {
        using var folder = new TemporaryFolder();
        using var writer = RecordingWriter.Create(folder.Recording, Samples.Head, force: false, new() { BlockRows = 4096 });
        var early = HeapAfter(writer, looks: 40_000);
        var late = HeapAfter(writer, looks: 400_000);

        // A row takes 184 bytes of columns: kept rows would be 74 MB. The list of row groups grows by 12 KB for each of them.
        Assert.InRange(late - early, long.MinValue, 4_000_000);
    }

    [Fact(Explicit = true)]
    [Trait("Category", "Long")]
    public void Three_million_looks_leave_the_heap_bounded()
    {
        using var folder = new TemporaryFolder();
        using var writer = RecordingWriter.Create(folder.Recording, Samples.Head, force: false);
        var early = HeapAfter(writer, looks: 300_000);
        var late = HeapAfter(writer, looks: 2_700_000);
        Assert.InRange(late - early, long.MinValue, 16_000_000);
    }

    private static long HeapAfter(RecordingWriter writer, int looks)
    {
        for (var i = 0; i < looks; i += Samples.Rows.Looks.Length)
        {
            writer.AddLooks(Samples.Rows.Looks);
        }

        return GC.GetTotalMemory(forceFullCollection: true);
    }

    private static void WriteMuch(RecordingWriter writer)
    {
        for (var i = 0; i < 100; i++)
        {
            writer.AddLooks(Samples.Rows.Looks);
        }
    }

    private static void AddInPortions(RecordingWriter writer)
    {
        foreach (var scan in Samples.Rows.Scans)
        {
            writer.AddScan(scan);
        }

        for (int start = 0, length = 1; start < Samples.Rows.Looks.Length; start += length, length = 1 + length % 37)
        {
            writer.AddLooks(Samples.Rows.Looks.AsSpan(start, Math.Min(length, Samples.Rows.Looks.Length - start)));
        }

        writer.AddHits(Samples.Rows.Hits.AsSpan(0, 299));
        writer.AddHits([]);
        writer.AddHits(Samples.Rows.Hits.AsSpan(299));
        writer.AddPlots(Samples.Rows.Plots);
        writer.AddTruth(Samples.Rows.Truth);
    }
}
