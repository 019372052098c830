namespace ScanSim.Recordings.Columns;

internal delegate TValue RowValue<TRow, TValue>(in TRow row);
