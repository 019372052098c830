using System.Collections.Immutable;

namespace ScanSim.Scenarios.Format;

/// <summary>The track block: where a target starts, and its legs.</summary>
internal static class TrackFormat
{
    private static readonly ImmutableArray<Property> Place =
    [
        Property.InGroup("east", Shapes.Coordinate, "East of the site, in the local plane.", "\"2.5 km\""),
        Property.InGroup("north", Shapes.Coordinate, "North of the site, in the local plane.", "\"-800 m\""),
        Property.InGroup("latitude", Shapes.Latitude, "Latitude (WGS-84), negative in the south.", "\"54.25 deg\""),
        Property.InGroup("longitude", Shapes.Longitude, "Longitude (WGS-84), negative in the west.", "\"-10.4 deg\""),
        Property.InGroup("bearing", Shapes.Direction, "Bearing from the site, from true north.", "\"285 deg\""),
        Property.InGroup("range", Shapes.Distance, "Surface distance from the site.", "\"6 nmi\""),
    ];

    private static readonly ImmutableArray<PropertyGroup> OnePlace =
    [
        PropertyGroup.ExactlyOne(
            PropertyVariant.Of("east", "north"),
            PropertyVariant.Of("latitude", "longitude"),
            PropertyVariant.Of("bearing", "range")),
    ];

    private static readonly Shape.OfBlock Start = new(
        "trackStart",
        "Where and when the track begins.",
        [
            Property.Optional("at", Shapes.RunTime, "Time of the scenario at which the target comes into being.", "\"90 s\"", "\"0 s\""),
            .. Place,
            Property.Needed("height", Shapes.Height, "Height above mean sea level.", "\"300 m\""),
            Property.Optional("heading", Shapes.Direction, "First heading, from true north. Needed when the first leg does not go to a point.", "\"90 deg\"", byDefaultWords: "towards the first point"),
            Property.Optional("speed", Shapes.AnySpeed, "First speed. A leg may give its own.", "\"12 kn\"", byDefaultWords: "the first leg's"),
        ])
    {
        Groups = OnePlace,
    };

    private static readonly Shape.OfBlock Point = new(
        "trackPoint",
        "A point to go to.",
        [
            .. Place,
            Property.Optional("height", Shapes.Height, "Height above mean sea level at the point; it changes evenly over the leg.", "\"600 m\"", byDefaultWords: "the present height"),
        ])
    {
        Groups = OnePlace,
    };

    private static readonly Shape.OfBlock Turn = new(
        "turn",
        "An arc at constant speed.",
        [
            Property.InGroup("by", new Shape.OfQuantity(Dimension.Angle) { AtLeast = "-36000 deg", AtMost = "36000 deg" }, "Angle to turn, positive to the right; more than a circle is a holding pattern.", "\"-90 deg\""),
            Property.InGroup("onto", Shapes.Direction, "Heading to turn onto, the shorter way (to the right when both are equal).", "\"270 deg\""),
            Property.InGroup("rate", Shapes.TurnRate, "Turn rate.", "\"3 deg/s\""),
            Property.InGroup("radius", new Shape.OfQuantity(Dimension.Length) { AtLeast = "0.1 m", AtMost = "1000 km" }, "Radius of the arc.", "\"400 m\""),
        ])
    {
        Groups =
        [
            PropertyGroup.ExactlyOne(PropertyVariant.Of("by"), PropertyVariant.Of("onto")),
            PropertyGroup.ExactlyOne(PropertyVariant.Of("rate"), PropertyVariant.Of("radius")),
        ],
    };

    private static readonly Shape.OfBlock SpeedChange = new(
        "speedChange",
        "A straight piece along the heading with constant acceleration.",
        [
            Property.Needed("speed", Shapes.AnySpeed, "Speed at its end.", "\"20 kn\""),
            Property.Needed("acceleration", new Shape.OfQuantity(Dimension.Acceleration) { AtLeast = "0.0001 m/s^2", AtMost = "1000 m/s^2" }, "Rate of the change, either way.", "\"0.5 m/s^2\""),
        ]);

    private static readonly Shape.OfBlock Climb = new(
        "climb",
        "A straight piece along the heading at the present speed, climbing or sinking at a constant rate.",
        [
            Property.Needed("height", Shapes.Height, "Height above mean sea level at its end.", "\"1000 ft\""),
            Property.Needed("rate", Shapes.MovingSpeed, "Rate of climb or descent.", "\"500 ft/min\""),
        ]);

    private static readonly Shape.OfBlock Leg = new(
        "leg",
        "One leg of a track.",
        [
            Property.InGroup("to", Point, "Go to a point: straight, or with 'turnRate' first on an arc until the point lies ahead."),
            Property.InGroup("straight", new Shape.OfEither([Shapes.PathLength, Shapes.Span]), "Go on along the heading, for a distance or for a time.", "\"4 km\""),
            Property.InGroup("turn", Turn, "Turn."),
            Property.InGroup("speedTo", SpeedChange, "Change speed."),
            Property.InGroup("climbTo", Climb, "Climb or sink."),
            Property.InGroup("wait", Shapes.Span, "Stay on the spot for a time; afterwards the old speed holds.", "\"2 min\""),
            Property.InGroup("speed", Shapes.AnySpeed, "Speed from this leg on, taken up at once (speedTo changes it gradually). 0 only with climbTo.", "\"12 kn\""),
            Property.InGroup("turnRate", Shapes.TurnRate, "Rate of the turn towards the point. Without it the corner is sharp.", "\"3 deg/s\""),
        ])
    {
        Groups =
        [
            PropertyGroup.ExactlyOne(
                PropertyVariant.Of("to").With("speed", "turnRate"),
                PropertyVariant.Of("straight").With("speed"),
                PropertyVariant.Of("turn").With("speed"),
                PropertyVariant.Of("speedTo"),
                PropertyVariant.Of("climbTo").With("speed"),
                PropertyVariant.Of("wait")),
        ],
    };

    public static readonly Shape.OfBlock Track = new(
        "track",
        "The motion of a target: it exists from start.at to the end of its last leg, or to 'end' if that is earlier. Legs run in the site's local plane, in which distances and bearings from the site are true.",
        [
            Property.Needed("start", Start, "Where and when it begins."),
            Property.Needed("legs", new Shape.OfList(Leg, 1, 10_000), "What it does, one leg after the other."),
            Property.Optional("end", Shapes.RunTime, "Time of the scenario at which the target ends, also in the middle of a leg.", "\"8 min\"", byDefaultWords: "the end of the last leg"),
        ]);
}
