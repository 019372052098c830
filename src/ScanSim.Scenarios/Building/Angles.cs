namespace ScanSim.Scenarios.Building;

internal static class Angles
{
    public const double TurnRad = 2 * Math.PI;

    /// <summary>The same direction in [0, 2π).</summary>
    public static double Positive(double angleRad)
    {
        var rest = Math.IEEERemainder(angleRad, TurnRad);
        var positive = rest < 0 ? rest + TurnRad : rest;
        return positive >= TurnRad ? 0 : positive;
    }

    /// <summary>The same direction in (−π, π].</summary>
    public static double Signed(double angleRad)
    {
        var rest = Math.IEEERemainder(angleRad, TurnRad);
        return rest <= -Math.PI ? Math.PI : rest;
    }
}
