using ScanSim.Scenarios.Format;

namespace ScanSim.Scenarios.Building;

/// <summary>Compiles the legs of one sound track block into pieces of motion; what cannot be flown or sailed is a fault with the leg's path.</summary>
internal sealed class TrackCompiler(LocalPlane plane, FaultList faults)
{
    /// <summary>Nearer than this to a point is "there": below every radar's resolution, above rounding at 2,000 km.</summary>
    private const double ThereM = 1e-3;

    /// <summary>Thirty days, the longest run: beyond it a leg's time is a slip of speed or distance.</summary>
    private const double LongestS = 720 * 3600;

    /// <summary>The limit that positions have, with a millimetre for rounding.</summary>
    private const double FarthestM = 2_000_000.001;

    /// <summary>Null when there is a fault.</summary>
    public Track? Compile(CheckedBlock track)
    {
        var start = track.Block("start");
        var before = faults.Count;
        if (plane.Position(start, faults) is not { } place)
        {
            return null;
        }

        var writer = new TrackWriter(start.Si("at"), place.EastM, place.NorthM, start.Si("height"))
        {
            HeadingRad = start.Has("heading") ? Angles.Positive(start.Si("heading")) : null,
            SpeedMps = start.Has("speed") ? start.Si("speed") : null,
        };
        foreach (var leg in track.Blocks("legs"))
        {
            Leg(writer, leg);
            if (faults.Count > before)
            {
                // The legs behind a faulty one start from nowhere: their faults would be noise.
                return null;
            }
        }

        return Finish(writer, track, start);
    }

    private Track? Finish(TrackWriter writer, CheckedBlock track, CheckedBlock start)
    {
        var startS = start.Si("at");
        if (track.Has("end") && track.Si("end") <= startS)
        {
            faults.Add(track.Values["end"], $"{track.Values["end"].Json.Shown()}, not after the start", $"a time after {QuantityText.Plain(startS, 9)} s (start.at)");
            return null;
        }

        var compiled = writer.Finish(track.Has("end") ? Math.Min(writer.TimeS, track.Si("end")) : writer.TimeS);
        if (compiled is null)
        {
            faults.Add(track.Values["legs"], "legs that take no time", "legs long enough to be seen");
        }

        return compiled;
    }

    private void Leg(TrackWriter writer, CheckedBlock leg)
    {
        if (leg.Has("speed"))
        {
            writer.SpeedMps = leg.Si("speed");
        }

        if (leg.Has("to"))
        {
            To(writer, leg);
        }
        else if (leg.Has("straight"))
        {
            Straight(writer, leg);
        }
        else if (leg.Has("turn"))
        {
            Turn(writer, leg);
        }
        else if (leg.Has("speedTo"))
        {
            SpeedTo(writer, leg);
        }
        else if (leg.Has("climbTo"))
        {
            ClimbTo(writer, leg);
        }
        else
        {
            writer.Straight(leg.Si("wait"), 0);
        }

        if (!(Math.Abs(writer.EastM) <= FarthestM && Math.Abs(writer.NorthM) <= FarthestM) && writer.TimeS <= LongestS)
        {
            faults.Add(leg, "a leg that leads more than 2000 km east, west, north or south of the site", "legs that stay within 2000 km");
        }

        if (!(writer.TimeS <= LongestS))
        {
            faults.Add(leg, $"a leg that ends {QuantityText.Plain(writer.TimeS / 3600, 6)} h after time 0", "legs that end within 720 h");
        }
    }

    private void To(TrackWriter writer, CheckedBlock leg)
    {
        var point = leg.Block("to");
        if (Speed(writer, leg) is not { } speedMps || plane.Position(point, faults) is not { } place)
        {
            return;
        }

        var (eastM, northM) = (place.EastM - writer.EastM, place.NorthM - writer.NorthM);
        if (Math.Sqrt(eastM * eastM + northM * northM) < ThereM)
        {
            faults.Add(point, "the point where the target already is", "a point away from it (climbTo changes the height alone, wait stays)");
            return;
        }

        var (angleRad, rateRadPerS) = (0.0, leg.Has("turnRate") ? leg.Si("turnRate") : 0);
        if (leg.Has("turnRate") && writer.HeadingRad is { } headingRad)
        {
            var radiusM = speedMps / rateRadPerS;
            if (TurnToPoint.AngleRad(headingRad, eastM, northM, radiusM) is not { } found)
            {
                faults.Add(
                    point,
                    $"a point inside the turning circle (radius {QuantityText.Plain(radiusM, 4)} m at {QuantityText.Plain(speedMps, 4)} m/s)",
                    "a point outside it: slower, a greater turnRate, or farther away");
                return;
            }

            angleRad = found;
        }

        Go(writer, place, point.Has("height") ? point.Si("height") : writer.HeightM, speedMps, angleRad, rateRadPerS);
    }

    /// <summary>The arc, if there is one, then straight to the place; the height changes evenly over both.</summary>
    private static void Go(TrackWriter writer, (double EastM, double NorthM) place, double heightM, double speedMps, double angleRad, double rateRadPerS)
    {
        // Where the arc ends has to be known before the climb rate is: lay it in a draft first.
        var draft = new TrackWriter(0, writer.EastM, writer.NorthM, writer.HeightM) { HeadingRad = writer.HeadingRad };
        if (angleRad != 0)
        {
            draft.Arc(angleRad, rateRadPerS, speedMps);
        }

        var (eastM, northM) = (place.EastM - draft.EastM, place.NorthM - draft.NorthM);
        var straightM = Math.Sqrt(eastM * eastM + northM * northM);
        var climbMps = (heightM - writer.HeightM) / (draft.TimeS + straightM / speedMps);
        if (angleRad != 0)
        {
            writer.Arc(angleRad, rateRadPerS, speedMps, climbMps);
        }

        if (straightM >= ThereM || angleRad == 0)
        {
            writer.HeadingRad = Angles.Positive(Math.Atan2(eastM, northM));
            writer.Straight(straightM / speedMps, speedMps, 0, climbMps);
        }
    }

    private void Straight(TrackWriter writer, CheckedBlock leg)
    {
        if (Speed(writer, leg) is { } speedMps && Heading(writer, leg) is not null)
        {
            var amount = (CheckedValue.OfQuantity)leg.Values["straight"];
            writer.Straight(amount.Dimension == Dimension.Time ? amount.Quantity.Si : amount.Quantity.Si / speedMps, speedMps);
        }
    }

    private void Turn(TrackWriter writer, CheckedBlock leg)
    {
        var turn = leg.Block("turn");
        if (Speed(writer, leg) is not { } speedMps || Heading(writer, leg) is not { } headingRad)
        {
            return;
        }

        var angleRad = turn.Has("by") ? turn.Si("by") : Angles.Signed(turn.Si("onto") - headingRad);
        if (angleRad == 0)
        {
            faults.Add(turn, "a turn by nothing", "an angle other than 0, or a heading other than the present one");
            return;
        }

        var rateRadPerS = turn.Has("rate") ? turn.Si("rate") : speedMps / turn.Si("radius");
        writer.Arc(angleRad, rateRadPerS, speedMps);
    }

    private void SpeedTo(TrackWriter writer, CheckedBlock leg)
    {
        var change = leg.Block("speedTo");
        if (Heading(writer, leg) is null || AnySpeed(writer, leg) is not { } speedMps)
        {
            return;
        }

        var difference = change.Si("speed") - speedMps;
        if (difference == 0)
        {
            faults.Add(change, "the speed that the target already has", "another speed");
            return;
        }

        var accelerationMps2 = Math.CopySign(change.Si("acceleration"), difference);
        writer.Straight(difference / accelerationMps2, speedMps, accelerationMps2);
        writer.SpeedMps = change.Si("speed");
    }

    private void ClimbTo(TrackWriter writer, CheckedBlock leg)
    {
        var climb = leg.Block("climbTo");
        if (AnySpeed(writer, leg) is not { } speedMps || (speedMps > 0 && Heading(writer, leg) is null))
        {
            return;
        }

        var differenceM = climb.Si("height") - writer.HeightM;
        if (Math.Abs(differenceM) < ThereM)
        {
            faults.Add(climb, "the height that the target already has", "another height");
            return;
        }

        var climbMps = Math.CopySign(climb.Si("rate"), differenceM);
        writer.Straight(differenceM / climbMps, speedMps, 0, climbMps);
    }

    private double? Speed(TrackWriter writer, CheckedBlock leg)
    {
        if (AnySpeed(writer, leg) is not { } speedMps)
        {
            return null;
        }

        if (speedMps > 0)
        {
            return speedMps;
        }

        faults.Add(leg, "a leg with speed 0", "a speed above 0: 'speed' in the leg, in an earlier one, or in start; or 'wait'");
        return null;
    }

    private double? AnySpeed(TrackWriter writer, CheckedBlock leg)
    {
        if (writer.SpeedMps is null)
        {
            faults.Add(leg, "a leg without a speed", "'speed' in the leg, in an earlier one, or in start");
        }

        return writer.SpeedMps;
    }

    private double? Heading(TrackWriter writer, CheckedBlock leg)
    {
        if (writer.HeadingRad is null)
        {
            faults.Add(leg, "a leg without a heading", "'heading' in start, or a leg 'to' a point before it");
        }

        return writer.HeadingRad;
    }
}
