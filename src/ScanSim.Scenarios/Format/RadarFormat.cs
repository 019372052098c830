namespace ScanSim.Scenarios.Format;

/// <summary>The radar block but for its antenna.</summary>
internal static class RadarFormat
{
    private static readonly Shape Prf = new Shape.OfQuantity(Dimension.Frequency) { AtLeast = "10 Hz", AtMost = "1 MHz" };

    private static readonly Shape PulseLength = new Shape.OfQuantity(Dimension.Time) { AtLeast = "1 ns", AtMost = "10 ms" };

    private static readonly Shape.OfBlock Sector = new(
        "sector",
        "Scan to and fro between two azimuths: clockwise from 'from' to 'to' first, then back.",
        [
            Property.Needed("from", Shapes.Direction, "Left edge, from true north.", "\"300 deg\""),
            Property.Needed("to", Shapes.Direction, "Right edge, from true north.", "\"60 deg\""),
            Property.Needed("rate", new Shape.OfQuantity(Dimension.AngularRate) { Above = "0 deg/s", AtMost = "3600 deg/s" }, "Speed of the sweep.", "\"60 deg/s\""),
            Property.Needed("turnaround", new Shape.OfQuantity(Dimension.Time) { AtLeast = "0 s", AtMost = "1 min" }, "Time to turn round between two sweeps, in which nothing is seen.", "\"0.5 s\""),
        ]);

    private static readonly Shape.OfBlock Blanked = new(
        "blankedSector",
        "A sector in which the transmitter is off.",
        [
            Property.Needed("from", Shapes.Direction, "Left edge, from true north; the sector runs clockwise.", "\"170 deg\""),
            Property.Needed("to", Shapes.Direction, "Right edge, from true north.", "\"200 deg\""),
        ]);

    private static readonly Shape.OfBlock Waveform = new(
        "waveform",
        "The pulse and its repetition.",
        [
            Property.Needed("pulseWidth", PulseLength, "Length of the transmitted pulse.", "\"0.25 us\""),
            Property.Optional("compressedWidth", PulseLength, "Length after pulse compression. Noise bandwidth and range cell follow from it.", "\"0.1 us\"", byDefaultWords: "pulseWidth (no compression)"),
            Property.Needed("prf", new Shape.OfEither([Prf, new Shape.OfList(Prf, 1, 64)]), "Pulse repetition frequency; of a list, each dwell uses the next one.", "\"1800 Hz\""),
        ]);

    private static readonly Shape.OfBlock Receiver = new(
        "receiver",
        "System noise temperature at the antenna terminals: given, or Ts = Ta + Tline (L - 1) + L 290 K (F - 1) of antenna temperature, line temperature, line loss L and noise figure F. Left at their defaults of 290 K, Ts = 290 K F L.",
        [
            Property.InGroup("systemTemperature", new Shape.OfQuantity(Dimension.Temperature) { AtLeast = "1 K", AtMost = "1000000 K" }, "System noise temperature at the antenna terminals, line loss included.", "\"1200 K\""),
            Property.InGroup("noiseFigure", Shapes.LossDb, "Noise figure of the receiver.", "\"4 dB\""),
            Property.InGroup("lineLoss", Shapes.LossDb, "Loss between antenna and receiver.", "\"1.5 dB\""),
            Property.InGroup("antennaTemperature", Shapes.Kelvin, "Noise temperature of the antenna. 290 K is common practice for a beam along the ground.", "\"150 K\"", "\"290 K\""),
            Property.InGroup("lineTemperature", Shapes.Kelvin, "Physical temperature of the line. 290 K is the standard temperature of noise figures.", "\"20 degC\"", "\"290 K\""),
        ])
    {
        Groups =
        [
            PropertyGroup.ExactlyOne(
                PropertyVariant.Of("systemTemperature"),
                PropertyVariant.Of("noiseFigure", "lineLoss").With("antennaTemperature", "lineTemperature")),
        ],
    };

    private static readonly Shape.OfBlock Losses = new(
        "losses",
        "What lowers the signal and stands nowhere else. The receiving line's loss belongs to the receiver.",
        [
            Property.Optional("transmit", Shapes.LossDb, "Between the transmitter and the antenna.", "\"1.5 dB\"", "\"0 dB\""),
            Property.Optional("processing", Shapes.LossDb, "Filter mismatch, range straddling, thresholding, ageing: what the data sheet counts as processing or field loss.", "\"3 dB\"", "\"0 dB\""),
        ]);

    private static readonly Shape.OfBlock Processing = new(
        "processing",
        "What is done with the pulses of a dwell.",
        [
            Property.Needed("kind", new Shape.OfChoice(["noncoherent"]), "noncoherent: square-law detection, sum over the dwell, fixed threshold.", "\"noncoherent\""),
            Property.Needed(
                "pulsesPerDwell",
                new Shape.OfEither([new Shape.OfWhole(1, MostPulsesPerDwell), new Shape.OfChoice(["beamwidth"])]),
                "Pulses summed in a dwell; \"beamwidth\": those within the one-way half-power beamwidth, so that a faster scan has fewer.",
                "\"beamwidth\""),
            Property.Needed("falseAlarmProbability", new Shape.OfNumber(1e-15, 0.1), "Per range cell and dwell.", "1e-6"),
        ]);

    private static readonly Shape.OfBlock Plots = new(
        "plots",
        "How neighbouring hits of one scan become one plot.",
        [
            Property.Optional("rangeGap", new Shape.OfWhole(0, 100), "Hits join when their range cells differ by at most this many.", "1", "1"),
            Property.Optional("azimuthGap", new Shape.OfWhole(0, 100), "Dwells without a hit that a plot may bridge.", "1", "1"),
            Property.Optional("minimumHits", new Shape.OfWhole(1, 100), "Fewer hits make no plot.", "2", "1"),
            Property.Optional("maximumWidth", new Shape.OfQuantity(Dimension.Angle) { Above = "0 deg", AtMost = "360 deg" }, "A plot wider than this in azimuth is closed and a new one begun.", "\"6 deg\"", byDefaultWords: "4 azimuth beamwidths"),
        ]);

    private static readonly Shape.OfBlock Accuracy = new(
        "accuracy",
        "Random errors of the instrument itself (encoder, timing, quantisation), one standard deviation, added to those that noise makes.",
        [
            Property.Optional("range", new Shape.OfQuantity(Dimension.Length) { AtLeast = "0 m", AtMost = "10 km" }, "In range.", "\"5 m\"", "\"0 m\""),
            Property.Optional("azimuth", new Shape.OfQuantity(Dimension.Angle) { AtLeast = "0 deg", AtMost = "10 deg" }, "In azimuth.", "\"0.05 deg\"", "\"0 deg\""),
        ]);

    public const ulong MostPulsesPerDwell = 10_000;

    public static readonly Shape.OfBlock Radar = new(
        "radar",
        "The radar as its data sheet gives it.",
        [
            Property.Needed("carrier", new Shape.OfQuantity(Dimension.Frequency) { AtLeast = "30 MHz", AtMost = "300 GHz" }, "Carrier frequency.", "\"9.41 GHz\""),
            Property.Needed("peakPower", new Shape.OfQuantity(Dimension.Power) { AtLeast = "1 mW", AtMost = "1000 MW" }, "Peak power at the transmitter's flange.", "\"25 kW\""),
            Property.Needed("antenna", AntennaFormat.Antenna, "The antenna."),
            Property.InGroup("rotation", new Shape.OfQuantity(Dimension.AngularRate) { AtLeast = "0.01 rpm", AtMost = "600 rpm" }, "Full turns, clockwise, through north at time 0.", "\"24 rpm\""),
            Property.InGroup("sector", Sector, "Scan to and fro in a sector."),
            Property.Optional("blanked", new Shape.OfList(Blanked, 0, 36), "Sectors in which the transmitter is off.", byDefault: "[]"),
            Property.Needed("waveform", Waveform, "The pulse and its repetition."),
            Property.Needed("receiver", Receiver, "The receiving chain."),
            Property.Optional("losses", Losses, "What lowers the signal.", byDefault: "{}"),
            Property.Needed("processing", Processing, "What is done with the pulses of a dwell."),
            Property.Needed("instrumentedRange", new Shape.OfQuantity(Dimension.Length) { AtLeast = "10 m", AtMost = "1000 km" }, "Slant range up to which the receiver looks for targets; not beyond the unambiguous range of any PRF.", "\"12 nmi\""),
            Property.Optional("plots", Plots, "How hits become plots.", byDefault: "{}"),
            Property.Optional("accuracy", Accuracy, "Errors of the instrument itself.", byDefault: "{}"),
        ])
    {
        Groups = [PropertyGroup.ExactlyOne(PropertyVariant.Of("rotation"), PropertyVariant.Of("sector"))],
    };
}
