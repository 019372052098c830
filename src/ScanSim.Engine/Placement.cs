using ScanSim.Scenarios;

namespace ScanSim.Engine;

/// <summary>Moves a target's state to another range for a what-if.</summary>
internal static class Placement
{
    private const int Steps = 200;

    /// <summary>The state on the same bearing and at the same height at a slant range; straight above the antenna if the range is shorter than the height.</summary>
    public static TrackState AtRange(LookModel model, in TrackState state, double rangeM)
    {
        var groundM = Math.Sqrt(state.EastM * state.EastM + state.NorthM * state.NorthM);
        var (east, north) = groundM > 0 ? (state.EastM / groundM, state.NorthM / groundM) : (0.0, 1.0);
        double low = 0;
        var high = 1.1 * rangeM + 1;

        // Slant range grows with distance over ground; halve until the double is exhausted.
        for (var i = 0; i < Steps && high - low > 0; i++)
        {
            var middle = 0.5 * (low + high);
            if (middle <= low || middle >= high)
            {
                break;
            }

            var sight = model.SightOf(state with { EastM = middle * east, NorthM = middle * north });
            if (sight.RangeM < rangeM)
            {
                low = middle;
            }
            else
            {
                high = middle;
            }
        }

        return state with { EastM = high * east, NorthM = high * north };
    }
}
