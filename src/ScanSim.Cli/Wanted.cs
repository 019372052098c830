namespace ScanSim.Cli;

/// <summary>Which term of the radar equation is solved for.</summary>
internal enum Wanted
{
    None = 0,
    Range = 1,
    Power = 2,
    Rcs = 3,
    Gain = 4,
    Snr = 5,
}
