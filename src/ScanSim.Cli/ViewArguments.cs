using System.CommandLine;
using System.CommandLine.Parsing;
using System.Globalization;
using ScanSim.Display;
using ScanSim.Display.Overlays;
using ScanSim.Scenarios;

namespace ScanSim.Cli;

/// <summary>The options that say what part of a recording is drawn, and how: the same for pictures and films.</summary>
internal sealed class ViewArguments
{
    /// <summary>What messages call the scenario in a recording.</summary>
    public const string ScenarioName = "scenario.json of the recording";

    private readonly Option<RangeUnit> unit = ChoiceOption.Create("--unit", "Unit of ranges.", ("km", RangeUnit.Kilometre), ("nmi", RangeUnit.NauticalMile));
    private readonly Option<double?> range = QuantityOption.Create("--range", Dimension.Length, "LENGTH", "Range from the site to the plan's edge [default: the instrumented range].", 10);
    private readonly Option<double?> east = QuantityOption.Create("--east", Dimension.Length, "LENGTH", "Middle of the plan, east of the site [default: 0 m].");
    private readonly Option<double?> north = QuantityOption.Create("--north", Dimension.Length, "LENGTH", "Middle of the plan, north of the site [default: 0 m].");
    private readonly Option<bool> paper = new("--paper") { Description = "Dark on white, for printing." };
    private readonly Option<int> afterglow = AfterglowOption();
    // No default of the option's own: the help would print all of the record's members.
    private readonly Option<PictureSize?> size;
    private readonly PictureSize defaultSize;
    private readonly Option<double> scale = new("--scale") { Description = "Draws everything so many times as large.", HelpName = "FACTOR", DefaultValueFactory = _ => 1 };
    private readonly Option<string[]> overlays = OverlayOption();
    private readonly Option<bool> noTruth = new("--no-truth") { Description = "Leave out where the targets really are." };

    private ViewArguments(PictureSize defaultSize)
    {
        this.defaultSize = defaultSize;
        size = new Option<PictureSize?>("--size") { Description = $"Pixels [default: {defaultSize.WidthPx}x{defaultSize.HeightPx}].", HelpName = "WxH", CustomParser = ParseSize };
    }

    public static ViewArguments AddTo(Command command, PictureSize defaultSize)
    {
        var arguments = new ViewArguments(defaultSize);
        foreach (var option in (Option[])[arguments.unit, arguments.range, arguments.east, arguments.north, arguments.paper, arguments.afterglow, arguments.size, arguments.scale, arguments.overlays, arguments.noTruth])
        {
            command.Add(option);
        }

        return arguments;
    }

    public static Option<int> AfterglowOption() =>
        new("--afterglow") { Description = "Scans for which plots stay, fading, from 1 to 1000.", HelpName = "SCANS", DefaultValueFactory = _ => new ViewOptions().AfterglowScans };

    public static Option<string[]> OverlayOption() =>
        new("--overlay") { Description = "Lines and places to draw under the plan, as GeoJSON; may be given again.", HelpName = "FILE.geojson", DefaultValueFactory = _ => [] };

    /// <summary>What the options ask for; overlays are read here.</summary>
    /// <param name="parsed">The command line.</param>
    /// <param name="site">The recording's, to which overlays are laid.</param>
    public ViewOptions View(ParseResult parsed, Site site) => new()
    {
        Unit = parsed.GetValue(unit),
        Theme = parsed.GetValue(paper) ? Theme.Paper : Theme.Dark,
        RangeM = parsed.GetValue(range),
        CentreEastM = parsed.GetValue(east) ?? 0,
        CentreNorthM = parsed.GetValue(north) ?? 0,
        AfterglowScans = parsed.GetValue(afterglow),
        ShowTruth = !parsed.GetValue(noTruth),
        Overlays = [.. parsed.GetValue(overlays)!.Select(file => Overlay.Load(file, site))],
    };

    public PictureSize Size(ParseResult parsed) => (parsed.GetValue(size) ?? defaultSize) with { Scale = parsed.GetValue(scale) };

    private static PictureSize? ParseSize(ArgumentResult result)
    {
        var text = result.Tokens.Count > 0 ? result.Tokens[0].Value : "";
        var parts = text.Split('x');
        if (parts.Length == 2
            && int.TryParse(parts[0], NumberStyles.None, CultureInfo.InvariantCulture, out var width)
            && int.TryParse(parts[1], NumberStyles.None, CultureInfo.InvariantCulture, out var height))
        {
            return new PictureSize(width, height);
        }

        result.AddError($"--size: read \"{text}\", expected width and height in pixels, such as 1920x1080");
        return null;
    }
}
