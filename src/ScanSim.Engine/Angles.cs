namespace ScanSim.Engine;

/// <summary>Wrapping of angles.</summary>
internal static class Angles
{
    public const double TurnRad = 2 * Math.PI;

    public const double DegPerRad = 180 / Math.PI;

    /// <summary>Into [0, 2π), for an angle within one turn of that.</summary>
    public static double ToTurn(double angleRad)
    {
        var wrapped = angleRad < 0 ? angleRad + TurnRad : angleRad;
        return wrapped >= TurnRad ? wrapped - TurnRad : wrapped;
    }

    /// <summary>Into [−π, π], for an angle within one turn of that.</summary>
    public static double ToHalfTurns(double angleRad)
    {
        if (angleRad > Math.PI)
        {
            return angleRad - TurnRad;
        }

        return angleRad < -Math.PI ? angleRad + TurnRad : angleRad;
    }
}
