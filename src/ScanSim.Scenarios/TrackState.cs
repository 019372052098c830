namespace ScanSim.Scenarios;

/// <summary>Position and velocity in the site's local plane: east, north in metres (see <see cref="Track"/>), height above mean sea level.</summary>
/// <remarks>default(TrackState) is a still point at the site's foot on sea level.</remarks>
public readonly record struct TrackState(double EastM, double NorthM, double HeightM, double EastMps, double NorthMps, double UpMps);
