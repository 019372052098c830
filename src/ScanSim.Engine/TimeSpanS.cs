namespace ScanSim.Engine;

/// <summary>A span of scenario time in seconds; empty when the end lies before the start.</summary>
internal readonly record struct TimeSpanS(double FromS, double ToS)
{
    public double MiddleS => 0.5 * (FromS + ToS);

    public double HalfS => 0.5 * (ToS - FromS);

    public TimeSpanS Within(TimeSpanS other) => new(Math.Max(FromS, other.FromS), Math.Min(ToS, other.ToS));
}
