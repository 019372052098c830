using System.Collections.Immutable;

namespace ScanSim.Scenarios.Building;

/// <summary>The state of a target while its legs are laid one after the other, and the pieces laid so far.</summary>
internal sealed class TrackWriter(double startS, double eastM, double northM, double heightM)
{
    private readonly ImmutableArray<TrackPiece>.Builder pieces = ImmutableArray.CreateBuilder<TrackPiece>();

    public double TimeS { get; private set; } = startS;

    public double EastM { get; private set; } = eastM;

    public double NorthM { get; private set; } = northM;

    public double HeightM { get; private set; } = heightM;

    /// <summary>Null as long as nothing has said where the target heads.</summary>
    public double? HeadingRad { get; set; }

    /// <summary>Null as long as nothing has said how fast it is.</summary>
    public double? SpeedMps { get; set; }

    public void Straight(double durationS, double speedMps, double accelerationMps2 = 0, double climbMps = 0) =>
        Add(durationS, speedMps, accelerationMps2, 0, climbMps);

    /// <summary>Turns by a signed angle (positive to the right).</summary>
    public void Arc(double angleRad, double rateRadPerS, double speedMps, double climbMps = 0)
    {
        Add(Math.Abs(angleRad) / rateRadPerS, speedMps, 0, Math.CopySign(rateRadPerS, angleRad), climbMps);
        HeadingRad = Angles.Positive(HeadingRad!.Value + angleRad);
    }

    /// <summary>The pieces up to <paramref name="endS"/>, the last one cut there.</summary>
    /// <remarks>Null when there is none: legs so short that time stands still.</remarks>
    public Track? Finish(double endS)
    {
        var kept = pieces.Where(piece => piece.StartS < endS).ToList();
        if (kept.Count == 0)
        {
            return null;
        }

        if (kept[^1].EndS > endS)
        {
            kept[^1] = kept[^1] with { EndS = endS };
        }

        return new Track { Pieces = [.. kept], MaximumSpeedMps = kept.Max(Fastest) };
    }

    private void Add(double durationS, double speedMps, double accelerationMps2, double turnRateRadPerS, double climbMps)
    {
        var piece = new TrackPiece
        {
            StartS = TimeS,
            EndS = TimeS + durationS,
            EastM = EastM,
            NorthM = NorthM,
            HeightM = HeightM,
            HeadingRad = HeadingRad ?? 0,
            SpeedMps = speedMps,
            AccelerationMps2 = accelerationMps2,
            TurnRateRadPerS = turnRateRadPerS,
            ClimbMps = climbMps,
        };
        if (!(piece.EndS > piece.StartS))
        {
            return;
        }

        pieces.Add(piece);
        var end = piece.At(piece.EndS);
        (TimeS, EastM, NorthM, HeightM) = (piece.EndS, end.EastM, end.NorthM, end.HeightM);
    }

    private static double Fastest(TrackPiece piece)
    {
        var last = piece.SpeedMps + piece.AccelerationMps2 * (piece.EndS - piece.StartS);
        var horizontal = Math.Max(Math.Abs(piece.SpeedMps), Math.Abs(last));
        return Math.Sqrt(horizontal * horizontal + piece.ClimbMps * piece.ClimbMps);
    }
}
