namespace ScanSim.Engine;

/// <summary>Dwells from <paramref name="First"/> up to but not including <paramref name="End"/>.</summary>
internal readonly record struct DwellRange(long First, long End);
