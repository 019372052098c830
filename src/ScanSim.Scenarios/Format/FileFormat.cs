namespace ScanSim.Scenarios.Format;

/// <summary>The whole scenario file, as one description.</summary>
internal static class FileFormat
{
    public const ulong Version = 1;

    private static readonly Shape.OfBlock Site = new(
        "site",
        "Where the antenna stands (WGS-84). Heights are above mean sea level and are used as heights above the ellipsoid: the geoid's separation is left out.",
        [
            Property.Needed("name", Shapes.Line, "Name of the site, shown on pictures.", "\"Quillhaven lookout\""),
            Property.Needed(
                "latitude",
                new Shape.OfQuantity(Dimension.Angle) { AtLeast = "-89.9 deg", AtMost = "89.9 deg" },
                "Latitude, negative in the south. The poles have no bearings and are left out.",
                "\"54.2 deg\""),
            Property.Needed("longitude", Shapes.Longitude, "Longitude, negative in the west.", "\"-10.5 deg\""),
            Property.Needed("groundHeight", new Shape.OfQuantity(Dimension.Length) { AtLeast = "-500 m", AtMost = "9000 m" }, "Height of the ground above mean sea level.", "\"12 m\""),
            Property.Needed("antennaHeight", new Shape.OfQuantity(Dimension.Length) { AtLeast = "0 m", AtMost = "1000 m" }, "Height of the antenna's phase centre above the ground.", "\"18 m\""),
        ]);

    private static readonly Shape.OfBlock Refraction = new(
        "refraction",
        "Bending of rays in the atmosphere.",
        [
            Property.Optional(
                "effectiveEarthFactor",
                new Shape.OfNumber(0.3, 100),
                "Effective over true earth radius, k: heights and the horizon are those of a sphere of this radius. 4/3 is common practice for a standard atmosphere.",
                "1.3333333333333333",
                "1.3333333333333333"),
        ]);

    private static readonly Shape.OfBlock Environment = new(
        "environment",
        "What lies between the radar and its targets.",
        [Property.Optional("refraction", Refraction, "Bending of rays.", byDefault: "{}")]);

    private static readonly Shape.OfBlock Target = new(
        "target",
        "One moving target.",
        [
            Property.Needed("id", Shapes.Id, "Name in tables and on pictures; no two targets have the same.", "\"ferry-1\""),
            Property.Needed("class", Shapes.Line, "What it is, in words.", "\"fishing boat\""),
            Property.Needed(
                "rcs",
                new Shape.OfQuantity(Dimension.Area) { AtLeast = "0.000001 m^2", AtMost = "1000000 m^2" },
                "Mean radar cross section.",
                "\"3 m^2\""),
            Property.Needed(
                "fluctuation",
                new Shape.OfWhole(0, 4),
                "Fluctuation case: 0 steady; 1 many equal scatterers, new value each scan; 2 the same, each pulse; 3 one strong scatterer among small ones, each scan; 4 the same, each pulse.",
                "1"),
            Property.Needed("track", TrackFormat.Track, "Its motion."),
        ]);

    private static readonly Shape.OfBlock Run = new(
        "run",
        "What to run.",
        [
            Property.Needed("start", new Shape.OfInstant(), "UTC of the scenario's time 0.", "\"2031-05-12T06:00:00Z\""),
            Property.Needed("duration", Shapes.Span, "How long.", "\"10 min\""),
            Property.Needed("seed", new Shape.OfWhole(0, ulong.MaxValue), "Seed of all random draws: the same scenario and seed give the same recording.", "1"),
        ]);

    public static readonly Shape.OfBlock Root = new(
        "scenario",
        "A scenario: one radar on one site, its targets, and what to run. Values with a dimension are a number with its unit in one text; comments and trailing commas are allowed; unknown properties are errors.",
        [
            Property.Optional("$schema", new Shape.OfIgnoredText(), "Address of the JSON Schema, for editors; not used by the program.", "\"scenario.schema.json\""),
            Property.Needed("format", new Shape.OfWhole(Version, Version), "Version of this file format.", "1"),
            Property.Needed("name", Shapes.Line, "Name of the scenario.", "\"Harbour mouth\""),
            Property.Optional("description", new Shape.OfText(4000, "^[^\\u0000-\\u0008\\u000B\\u000C\\u000E-\\u001F\\u007F]+$", "no control characters"), "What it is for.", "\"Small craft along the breakwater\"", byDefaultWords: "none"),
            Property.Needed("site", Site, "Where the antenna stands."),
            Property.Needed("radar", RadarFormat.Radar, "The radar as its data sheet gives it."),
            Property.Optional("environment", Environment, "What lies between the radar and its targets.", byDefault: "{}"),
            Property.Needed("targets", new Shape.OfList(Target, 0, 100_000), "The targets. An empty list gives a recording of false alarms only."),
            Property.Needed("run", Run, "What to run."),
        ]);
}
