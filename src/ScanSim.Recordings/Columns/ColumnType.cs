namespace ScanSim.Recordings.Columns;

/// <summary>A type that columns may have, by its name in manifests and the values class that stores it.</summary>
internal sealed record ColumnType<TValue>(string Name, Func<Column, ColumnValues<TValue>> Create);
