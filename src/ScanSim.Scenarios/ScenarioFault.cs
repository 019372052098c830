namespace ScanSim.Scenarios;

/// <summary>One error of a scenario file: where it is, what was read there, what would be right.</summary>
/// <param name="File">The file's name as the user gave it.</param>
/// <param name="Line">From 1; 0 when the file as a whole is meant.</param>
/// <param name="Column">From 1, in characters; 0 when the file as a whole is meant.</param>
/// <param name="JsonPath">"$.radar.peakPower"; "$" is the whole.</param>
/// <param name="Read">What stands there.</param>
/// <param name="Expected">What would be right.</param>
public sealed record ScenarioFault(string File, int Line, int Column, string JsonPath, string Read, string Expected)
{
    public override string ToString() =>
        Line == 0 ? $"{File}: read {Read}, expected {Expected}" : $"{File}:{Line}:{Column}: {JsonPath}: read {Read}, expected {Expected}";
}
