namespace ScanSim.Scenarios.Tests;

/// <summary>A short valid scenario whose lines the tests know.</summary>
internal static class SmallScenario
{
    public const string Text = """
        {
          "format": 1,
          "name": "Small",
          "site": { "name": "Here", "latitude": "10 deg", "longitude": "20 deg", "groundHeight": "5 m", "antennaHeight": "10 m" },
          "radar": {
            "carrier": "3 GHz",
            "peakPower": "10 kW",
            "antenna": {
              "gain": "30 dBi",
              "azimuth": { "shape": "gaussian", "beamwidth": "2 deg" },
              "elevation": { "shape": "uniform", "beamwidth": "20 deg" }
            },
            "rotation": "15 rpm",
            "waveform": { "pulseWidth": "1 us", "prf": "1000 Hz" },
            "receiver": { "noiseFigure": "3 dB", "lineLoss": "1 dB" },
            "processing": { "kind": "noncoherent", "pulsesPerDwell": 10, "falseAlarmProbability": 1e-6 },
            "instrumentedRange": "50 km"
          },
          "targets": [
            {
              "id": "one",
              "class": "boat",
              "rcs": "3 m^2",
              "fluctuation": 1,
              "track": {
                "start": { "east": "1 km", "north": "2 km", "height": "3 m", "speed": "10 m/s" },
                "legs": [
                  { "to": { "east": "4 km", "north": "6 km" } }
                ]
              }
            }
          ],
          "run": { "start": "2031-01-02T03:04:05Z", "duration": "10 min", "seed": 7 }
        }
        """;

    public const string File = "small.json";

    /// <summary>The text with one place changed; the place must be there exactly once.</summary>
    public static string With(string right, string wrong)
    {
        Assert.Equal(2, Text.Split(right).Length);
        return Text.Replace(right, wrong, StringComparison.Ordinal);
    }

    /// <summary>The scenario with other start and legs of its target (and an end, when it is not empty).</summary>
    public static string WithTrack(string start, string legs, string end = "") =>
        With("""{ "east": "1 km", "north": "2 km", "height": "3 m", "speed": "10 m/s" }""", start)
            .Replace("""{ "to": { "east": "4 km", "north": "6 km" } }""", legs, StringComparison.Ordinal)
            .Replace("]\n      }\n    }\n  ],", end.Length == 0 ? "]\n      }\n    }\n  ]," : $"], \"end\": \"{end}\"\n      }}\n    }}\n  ],", StringComparison.Ordinal);

    public static Track Track(string start, string legs, string end = "") =>
        ScenarioFile.Parse(WithTrack(start, legs, end), File).Targets[0].Track;

    /// <summary>The one fault of a text.</summary>
    public static ScenarioFault Fault(string text) => Assert.Single(ScenarioFile.Check(text, File));
}
