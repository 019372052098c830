namespace ScanSim.Cli;

/// <summary>What the process returns.</summary>
internal static class ExitCode
{
    public const int Done = 0;

    /// <summary>Bad input, or a part of the system is missing.</summary>
    public const int BadInput = 2;

    /// <summary>128 + SIGINT.</summary>
    public const int Interrupted = 130;

    /// <summary>128 + SIGTERM.</summary>
    public const int Terminated = 143;
}
