using ScanSim.Physics;
using ScanSim.Physics.Detection;
using ScanSim.Physics.Draws;
using ScanSim.Scenarios;

namespace ScanSim.Engine;

/// <summary>A target as the run needs it: constants looked up once.</summary>
internal sealed class RunTarget(Target target)
{
    public string Id { get; } = target.Id;

    public double RcsM2 { get; } = target.RcsM2;

    public double RcsDb { get; } = Decibels.FromRatio(target.RcsM2);

    public FluctuationCase Fluctuation { get; } = (FluctuationCase)target.FluctuationCase;

    /// <summary>Its part of a draw's address: from the id, so that other targets do not change it.</summary>
    public uint Entity { get; } = DrawEntity.Of(target.Id);

    public Track Track { get; } = target.Track;

    public TimeSpanS Life { get; } = new(target.Track.StartS, target.Track.EndS);
}
