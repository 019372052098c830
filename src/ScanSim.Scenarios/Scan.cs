namespace ScanSim.Scenarios;

/// <summary>How the beam moves in azimuth.</summary>
public abstract record Scan
{
    private Scan()
    {
    }

    /// <summary>Angular speed of the beam while it scans, without sign.</summary>
    public abstract double BeamSpeedRadPerS { get; }

    /// <summary>From the start of one scan to the start of the next.</summary>
    public abstract double ScanS { get; }

    /// <summary>Full turns, clockwise, north at time 0.</summary>
    public sealed record Rotation : Scan
    {
        public required double PeriodS { get; init; }

        public override double BeamSpeedRadPerS => 2 * Math.PI / PeriodS;

        public override double ScanS => PeriodS;
    }

    /// <summary>Sweeps to and fro between two azimuths: clockwise from From to To first; between sweeps the antenna turns round.</summary>
    public sealed record Sector : Scan
    {
        public required AzimuthSector Limits { get; init; }

        public required double RateRadPerS { get; init; }

        public required double TurnaroundS { get; init; }

        public override double BeamSpeedRadPerS => RateRadPerS;

        public override double ScanS => Limits.WidthRad / RateRadPerS + TurnaroundS;
    }
}
