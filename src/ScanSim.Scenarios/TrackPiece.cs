namespace ScanSim.Scenarios;

/// <summary>
/// One piece of motion: along a straight line with constant acceleration, or along an arc at constant speed; height linear in time.
/// </summary>
/// <remarks>Heading clockwise from north; turn rate positive to the right. default(TrackPiece) is a still point of zero duration.</remarks>
public readonly record struct TrackPiece
{
    /// <summary>Of <see cref="HeadingRad"/>, kept because each look asks for a state.</summary>
    private readonly double headingSine;
    private readonly double headingCosine;

    public required double StartS { get; init; }

    public required double EndS { get; init; }

    public required double EastM { get; init; }

    public required double NorthM { get; init; }

    public required double HeightM { get; init; }

    public required double HeadingRad
    {
        get;
        init
        {
            field = value;
            (headingSine, headingCosine) = Math.SinCos(value);
        }
    }

    public required double SpeedMps { get; init; }

    /// <summary>Along the heading; zero on an arc.</summary>
    public required double AccelerationMps2 { get; init; }

    public required double TurnRateRadPerS { get; init; }

    public required double ClimbMps { get; init; }

    /// <summary>State at a time, extrapolated when the time lies outside the piece.</summary>
    public TrackState At(double timeS)
    {
        var t = timeS - StartS;
        var heightM = HeightM + ClimbMps * t;
        var (sin0, cos0) = (headingSine, headingCosine);
        if (TurnRateRadPerS == 0)
        {
            var pathM = (SpeedMps + 0.5 * AccelerationMps2 * t) * t;
            var speedMps = SpeedMps + AccelerationMps2 * t;
            return new TrackState(EastM + sin0 * pathM, NorthM + cos0 * pathM, heightM, sin0 * speedMps, cos0 * speedMps, ClimbMps);
        }

        var (sin1, cos1) = Math.SinCos(HeadingRad + TurnRateRadPerS * t);
        var radiusM = SpeedMps / TurnRateRadPerS;
        return new TrackState(
            EastM + radiusM * (cos0 - cos1),
            NorthM + radiusM * (sin1 - sin0),
            heightM,
            SpeedMps * sin1,
            SpeedMps * cos1,
            ClimbMps);
    }
}
