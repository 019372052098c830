using ScanSim.Recordings;

namespace ScanSim.Engine;

/// <summary>What one scan gave. Owned by one worker at a time, emptied and used again.</summary>
internal sealed class ScanResult
{
    public int Scan { get; private set; }

    public int LookCount { get; set; }

    public int FalseHitCount { get; set; }

    public List<LookRow> Looks { get; } = [];

    public List<Hit> Hits { get; } = [];

    public List<TruthRow> Truth { get; } = [];

    public void Begin(int scan)
    {
        Scan = scan;
        LookCount = 0;
        FalseHitCount = 0;
        Looks.Clear();
        Hits.Clear();
        Truth.Clear();
    }
}
