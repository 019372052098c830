using System.Collections.Concurrent;

namespace ScanSim.Testing;

/// <summary>Collects the claims that held in this test process; <see cref="ValidationPage"/> writes them to docs/validation.md.</summary>
public static class ValidationLog
{
    private static readonly ConcurrentDictionary<string, ValidationEntry> Entries = new(StringComparer.Ordinal);

    /// <summary>Records a claim that held. Call it after the assertion, never before.</summary>
    public static void Record(ValidationEntry entry) => Entries[entry.Claim] = entry;

    /// <summary>The entries so far, ordered by claim, so that the page does not depend on the order of the tests.</summary>
    public static IReadOnlyList<ValidationEntry> Snapshot() => [.. Entries.Values.OrderBy(e => e.Claim, StringComparer.Ordinal)];
}
