namespace ScanSim.Display.Replay;

/// <summary>All that the user can change about what the replay shows. Each event makes a new state of the old one.</summary>
public sealed record ReplayState
{
    public const double SlowestRatio = 0.25;
    public const double FastestRatio = 64;

    /// <summary>Size of the window in layout units.</summary>
    public float Width { get; init; } = PictureSize.LeastWidth;

    public float Height { get; init; } = PictureSize.LeastHeight;

    /// <summary>The time shown, in seconds since the start.</summary>
    public double TimeS { get; init; }

    public bool IsPlaying { get; init; }

    /// <summary>Seconds of the recording a second.</summary>
    public double SpeedRatio { get; init; } = 1;

    /// <summary>Play goes back to here from <see cref="LoopToS"/>; null: no loop.</summary>
    public double? LoopFromS { get; init; }

    /// <summary>Null while only the loop's start is marked.</summary>
    public double? LoopToS { get; init; }

    /// <summary>Id of the selected target.</summary>
    public string? Selected { get; init; }

    /// <summary>What lies in the middle of the plans, east of the site.</summary>
    public double CentreEastM { get; init; }

    public double CentreNorthM { get; init; }

    /// <summary>From a plan's middle to its nearer edges; null: the instrumented range.</summary>
    public double? RangeM { get; init; }

    /// <summary>The bearing that points up.</summary>
    public double UpRad { get; init; }

    public RangeUnit Unit { get; init; }

    public Theme Theme { get; init; }

    public bool ShowTruth { get; init; } = true;

    public bool ShowTrails { get; init; } = true;

    public bool ShowLabels { get; init; } = true;

    public bool ShowHits { get; init; } = true;

    public bool ShowFalsePlots { get; init; } = true;

    public bool ShowOverlays { get; init; } = true;

    /// <summary>Plots stay on the plan for this many scans, fading.</summary>
    public int AfterglowScans { get; init; } = 8;

    /// <summary>Start of what the timeline shows.</summary>
    public double TimelineFromS { get; init; }

    public required double TimelineToS { get; init; }

    /// <summary>Rows of the timeline scrolled away at the top.</summary>
    public int FirstRow { get; init; }

    public RowOrder Order { get; init; }

    public bool IsHelpShown { get; init; }

    /// <summary>Where the pointer is; null when it is outside the window.</summary>
    public float? PointerX { get; init; }

    public float? PointerY { get; init; }

    public DragKind Drag { get; init; }

    /// <summary>Where the button went down.</summary>
    public float PressX { get; init; }

    public float PressY { get; init; }

    /// <summary>Whether the pointer has moved away from there since.</summary>
    public bool HasDragged { get; init; }

    /// <summary>The last thing to tell, at the foot of the window.</summary>
    public string Message { get; init; } = "";

    public ReplayWish Wish { get; init; }
}
