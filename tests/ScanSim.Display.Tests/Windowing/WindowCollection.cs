namespace ScanSim.Display.Tests.Windowing;

/// <summary>Tests with a window run one after the other: SDL, DISPLAY and the focus are one in a process.</summary>
[CollectionDefinition(Name)]
public sealed class WindowCollection : ICollectionFixture<VirtualDisplay>
{
    public const string Name = "window";
}
