namespace ScanSim.Recordings;

/// <summary>Of a look what a timeline needs: read in a fraction of the time that whole rows take. default(LookSummary) is no look.</summary>
public readonly record struct LookSummary(double TimeS, int Scan, string Target, double SnrDb, bool Detected, LossReason LostTo)
{
    public static LookSummary Of(in LookRow row) => new(row.TimeS, row.Scan, row.Target, row.SnrDb, row.Detected, row.LostTo);
}
