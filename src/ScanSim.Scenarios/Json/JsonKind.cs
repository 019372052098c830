namespace ScanSim.Scenarios.Json;

internal enum JsonKind
{
    Null,
    False,
    True,
    Number,
    Text,
    List,
    Block,
}
