using System.Collections.Immutable;

namespace ScanSim.Scenarios.Format;

/// <summary>The antenna block.</summary>
internal static class AntennaFormat
{
    /// <summary>Shapes that a beamwidth alone describes.</summary>
    private static readonly ImmutableArray<string> ByBeamwidth = ["gaussian", "uniform", "cosine", "cosineSquared"];

    private const string ShapesInWords =
        "gaussian; uniform, cosine or cosineSquared: the pattern of an aperture with that illumination; table: rows from a data sheet or a measurement";

    private static readonly Shape Beamwidth = new Shape.OfQuantity(Dimension.Angle) { AtLeast = "0.01 deg", AtMost = "120 deg" };

    private static readonly Shape.OfBlock Row = new(
        "patternRow",
        "One row of a pattern table.",
        [
            Property.Needed("offset", new Shape.OfQuantity(Dimension.Angle) { AtLeast = "-180 deg", AtMost = "180 deg" }, "Angle from the beam's peak.", "\"-0.6 deg\""),
            Property.Needed("level", new Shape.OfQuantity(Dimension.Ratio) { AtLeast = "-200 dB", AtMost = "0 dB" }, "One-way level below the peak.", "\"-3 dB\""),
        ]);

    private static readonly Property Width = Property.InGroup(
        "beamwidth", Beamwidth, "Width between the one-way half-power points. Of a table it follows from the rows.", "\"1.2 deg\"");

    private static readonly Property Rows = Property.InGroup(
        "table",
        new Shape.OfList(Row, 3, 10_000),
        "Rows in rising order of offset, the highest at 0 dB, falling to half power (-3.01 dB) on both sides; between rows the level is linear in dB, outside the end rows hold.");

    private static readonly Shape.OfBlock Azimuth = new(
        "azimuthPattern",
        "The horizontal cut of the pattern.",
        [
            Property.Needed("shape", new Shape.OfChoice([.. ByBeamwidth, "table"]), ShapesInWords + ".", "\"cosine\""),
            Width,
            Rows,
        ])
    {
        Groups = [PropertyGroup.ByValueOf("shape", PropertyVariant.When(ByBeamwidth, "beamwidth"), PropertyVariant.When(["table"], "table"))],
    };

    private static readonly Shape.OfBlock Elevation = new(
        "elevationPattern",
        "The vertical cut of the pattern.",
        [
            Property.Needed(
                "shape",
                new Shape.OfChoice([.. ByBeamwidth, "cosecantSquared", "table"]),
                ShapesInWords + "; cosecantSquared: a beam below, equal echo at equal height above.",
                "\"cosecantSquared\""),
            Width,
            Property.InGroup(
                "upTo",
                new Shape.OfQuantity(Dimension.Angle) { Above = "0 deg", AtMost = "90 deg" },
                "Elevation above the horizontal where the cosecant-squared part ends. It begins half a beamwidth above the tilt, which must be above the horizontal.",
                "\"30 deg\""),
            Rows,
        ])
    {
        Groups =
        [
            PropertyGroup.ByValueOf(
                "shape",
                PropertyVariant.When(ByBeamwidth, "beamwidth"),
                PropertyVariant.When(["cosecantSquared"], "beamwidth", "upTo"),
                PropertyVariant.When(["table"], "table")),
        ],
    };

    public static readonly Shape.OfBlock Antenna = new(
        "antenna",
        "One antenna for sending and receiving. Its pattern is the azimuth cut times the elevation cut, and never below the side-lobe floor.",
        [
            Property.Needed("gain", new Shape.OfQuantity(Dimension.Gain) { AtLeast = "0 dBi", AtMost = "70 dBi" }, "Gain at the peak.", "\"31 dBi\""),
            Property.Needed("azimuth", Azimuth, "The horizontal cut."),
            Property.Needed("elevation", Elevation, "The vertical cut."),
            Property.Optional("tilt", new Shape.OfQuantity(Dimension.Angle) { AtLeast = "-30 deg", AtMost = "60 deg" }, "Elevation of the beam's peak, positive up.", "\"2 deg\"", "\"0 deg\""),
            Property.Optional(
                "sideLobeFloor",
                new Shape.OfQuantity(Dimension.Ratio) { AtLeast = "-100 dB", AtMost = "0 dB" },
                "One-way level below the peak under which the whole pattern never falls. The default is common practice: ITU-R M.1313-1 gives -30 to -40 dB for marine antennas away from the beam.",
                "\"-30 dB\"",
                "\"-35 dB\""),
        ]);
}
