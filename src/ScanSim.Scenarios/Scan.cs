namespace ScanSim.Scenarios;

/// <summary>How the beam moves in azimuth.</summary>
public abstract record Scan
{
    private Scan()
    {
    }

    /// <summary>Full turns, clockwise, north at time 0.</summary>
    public sealed record Rotation : Scan
    {
        public required double PeriodS { get; init; }
    }

    /// <summary>Sweeps to and fro between two azimuths: clockwise from From to To first; between sweeps the antenna turns round.</summary>
    public sealed record Sector : Scan
    {
        public required AzimuthSector Limits { get; init; }

        public required double RateRadPerS { get; init; }

        public required double TurnaroundS { get; init; }
    }
}
