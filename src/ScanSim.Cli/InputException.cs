namespace ScanSim.Cli;

/// <summary>An option's value that does not go with the scenario or recording at hand; the message is for the user.</summary>
internal sealed class InputException(string message) : Exception(message);
