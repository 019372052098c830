namespace ScanSim.Recordings;

/// <summary>How the tables of a recording are stored.</summary>
public enum TableFormat
{
    Parquet = 0,
    Csv = 1,
    JsonLines = 2,
}
