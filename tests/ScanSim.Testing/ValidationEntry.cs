namespace ScanSim.Testing;

/// <summary>One line of docs/validation.md: a claim, what it was held against, how many values, what was allowed, the worst case.</summary>
public sealed record ValidationEntry(string Claim, string Source, int Count, string Allowed, string Worst, string WorstRow);
