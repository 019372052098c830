namespace ScanSim.Recordings.Files;

/// <summary>Times from <paramref name="FromS"/> to <paramref name="ToS"/>, both included.</summary>
internal readonly record struct TimeSpanS(double FromS, double ToS)
{
    public static TimeSpanS Everything => new(double.NegativeInfinity, double.PositiveInfinity);

    public bool IsEverything => this == Everything;

    public bool Contains(double timeS) => timeS >= FromS && timeS <= ToS;

    public bool Overlaps(double firstS, double lastS) => lastS >= FromS && firstS <= ToS;
}
