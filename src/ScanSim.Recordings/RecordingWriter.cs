using ScanSim.Recordings.Files;
using ScanSim.Recordings.Tables;

namespace ScanSim.Recordings;

/// <summary>Writes a recording while the run goes on, in memory that does not grow with its length.</summary>
/// <remarks>
/// Until <see cref="Complete"/> the folder has no recording.json and its tables are under names ending in .part. Disposing before that
/// deletes the tables; what is left is recognised as an unfinished recording. One thread at a time.
/// </remarks>
public sealed class RecordingWriter : IRecordingSink, IDisposable
{
    private readonly RecordingFolder folder;
    private readonly RecordingHead head;
    private readonly List<(Table Table, Func<string, TableInfo> Finish, IDisposable Writer)> writers = [];
    private TableWriter<ScanRow>? scans;
    private TableWriter<LookRow>? looks;
    private TableWriter<HitRow>? hits;
    private TableWriter<PlotRow>? plots;
    private TableWriter<TruthRow>? truth;
    private State state = State.Writing;

    private RecordingWriter(string folder, RecordingHead head)
    {
        this.folder = new RecordingFolder(folder);
        this.head = head;
    }

    private enum State
    {
        Writing,
        Faulty,
        Complete,
        Disposed,
    }

    /// <summary>Makes the folder and starts its tables.</summary>
    /// <param name="folder">Must not exist; its parent must.</param>
    /// <param name="head">What is known before the run.</param>
    /// <param name="force">Allows a folder that is empty or holds a recording, finished or not, and nothing else: it is cleared.</param>
    public static RecordingWriter Create(string folder, RecordingHead head, bool force) => Create(folder, head, force, new WriterSettings());

    public void AddScan(in ScanRow row) => Add(scans, new ReadOnlySpan<ScanRow>(in row));

    public void AddLooks(ReadOnlySpan<LookRow> rows)
    {
        if (rows.Length > 0)
        {
            Add(looks ?? throw new InvalidOperationException("The recording was started without a looks table."), rows);
        }
    }

    public void AddHits(ReadOnlySpan<HitRow> rows) => Add(hits, rows);

    public void AddPlots(ReadOnlySpan<PlotRow> rows) => Add(plots, rows);

    public void AddTruth(ReadOnlySpan<TruthRow> rows) => Add(truth, rows);

    /// <summary>Closes the tables, gives them their names, and writes the manifest: from here on the folder is a recording.</summary>
    public void Complete()
    {
        Expect(State.Writing);
        state = State.Faulty;
        var tables = new Dictionary<string, TableInfo>(StringComparer.Ordinal);
        foreach (var (table, finish, _) in writers)
        {
            tables[table.Name] = finish(RecordingFolder.TableName(table, head.Format));
        }

        foreach (var path in tables.Values.Select(table => folder.In(table.File)))
        {
            FileFault.Writing(path, () => File.Move(RecordingFolder.PartOf(path), path));
        }

        Manifest.Write(folder, head, tables);
        state = State.Complete;
    }

    public void Dispose()
    {
        if (state == State.Disposed)
        {
            return;
        }

        foreach (var (_, _, writer) in writers)
        {
            writer.Dispose();
        }

        if (state != State.Complete)
        {
            Abandon();
        }

        state = State.Disposed;
    }

    internal static RecordingWriter Create(string folder, RecordingHead head, bool force, WriterSettings settings)
    {
        var writer = new RecordingWriter(folder, head);
        writer.folder.Prepare(force);
        try
        {
            writer.Start(settings);
        }
        catch
        {
            writer.Dispose();
            throw;
        }

        return writer;
    }

    private void Start(WriterSettings settings)
    {
        FileFault.Writing(folder.Scenario, () => File.WriteAllText(folder.Scenario, head.ScenarioText));
        scans = Open(RecordingTables.Scans, settings);
        looks = head.Looks == LooksKept.None ? null : Open(RecordingTables.Looks, settings);
        hits = Open(RecordingTables.Hits, settings);
        plots = Open(RecordingTables.Plots, settings);
        truth = Open(RecordingTables.Truth, settings);
    }

    private TableWriter<TRow> Open<TRow>(Table<TRow> table, WriterSettings settings)
    {
        var path = folder.In(RecordingFolder.PartOf(RecordingFolder.TableName(table, head.Format)));
        TableWriter<TRow>? writer = null;
        FileFault.Writing(path, () => writer = new TableWriter<TRow>(table, path, head.Format, settings));
        writers.Add((table, writer!.Finish, writer));
        return writer;
    }

    private void Add<TRow>(TableWriter<TRow>? table, ReadOnlySpan<TRow> rows)
    {
        Expect(State.Writing);
        state = State.Faulty;
        table!.Add(rows);
        state = State.Writing;
    }

    private void Expect(State needed)
    {
        if (state != needed)
        {
            throw new InvalidOperationException($"The writer of {folder.Path} is {state}, not {needed}.");
        }
    }

    private void Abandon()
    {
        try
        {
            folder.DropParts();
        }
        catch (Exception fault) when (FileFault.IsOne(fault))
        {
            // What cannot be deleted stays under its .part name: no reader takes it for a table.
        }
    }
}
