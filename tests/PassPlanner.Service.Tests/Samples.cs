using System.Text.Json.Nodes;

namespace PassPlanner.Service.Tests;

/// <summary>Documents that pass every check, for tests to send or to spoil.</summary>
internal static class Samples
{
    public const string Station = """
        {
          "name": "Wirra Flat",
          "position": { "latitudeDeg": -33.9, "longitudeDeg": 138.2, "heightM": 120 },
          "horizonMask": [{ "azimuthDeg": 0, "elevationDeg": 0 }],
          "antennas": [{
            "id": "dish", "name": "3.7 m dish", "setUpS": 120, "tearDownS": 60,
            "mount": { "kind": "azimuthElevation",
              "azimuth": { "minimumDeg": -270, "maximumDeg": 270, "maximumRateDegPerS": 6, "maximumAccelerationDegPerS2": 3 },
              "elevation": { "minimumDeg": 0, "maximumDeg": 90, "maximumRateDegPerS": 3, "maximumAccelerationDegPerS2": 2 } },
            "pointing": { "biasDeg": 0.05, "jitterRmsDeg": 0.03, "updateIntervalS": 1 },
            "receive": [{
              "id": "x-rx", "fromHz": 8.025e9, "toHz": 8.4e9,
              "pattern": { "kind": "taperedAperture", "diameterM": 3.7, "edgeTaperDb": 11, "efficiency": 0.62, "surfaceErrorRmsMm": 0.5 },
              "polarisation": { "kind": "rightCircular", "axialRatioDb": 1.0 },
              "lineLossDb": 0.3,
              "noise": { "kind": "components", "receiverNoiseTemperatureK": 60, "lineTemperatureK": 290, "spilloverTemperatureK": 12 },
              "clearSkyZenithLossDb": 0.1 }],
            "transmit": [{
              "id": "s-tx", "fromHz": 2.025e9, "toHz": 2.11e9, "powerW": 20, "lineLossDb": 1,
              "pattern": { "kind": "gaussianBeam", "gainDbi": 34, "halfPowerBeamwidthDeg": 2.8 },
              "polarisation": { "kind": "rightCircular", "axialRatioDb": 1.0 } }] }]
        }
        """;

    public const string Spacecraft = """
        {
          "name": "Lark 1", "catalogNumber": 46313, "priority": 2,
          "attitude": { "kind": "nadir" },
          "transmitters": [{
            "id": "x-tx", "frequencyHz": 8.2e9, "powerW": 2, "lineLossDb": 0.8, "requiredMarginDb": 3, "minimumElevationDeg": 10, "acquisitionS": 10,
            "pattern": { "kind": "measured", "cuts": [{ "phiDeg": 0, "angleDeg": [0, 30, 60, 75], "gainDbi": [4, 5, 6, 1] }] },
            "boresight": [0, 0, 1], "polarisation": { "kind": "rightCircular", "axialRatioDb": 2 },
            "waveforms": [
              { "name": "QPSK 1/2", "bitRateBps": 25e6, "requiredEbN0Db": 1.05, "implementationLossDb": 1.5 },
              { "name": "8PSK 2/3", "bitRateBps": 50e6, "requiredEbN0Db": 3.65, "implementationLossDb": 1.8, "frameEfficiency": 0.9 }] }],
          "receivers": [{
            "id": "s-rx", "frequencyHz": 2.05e9, "gOverTDbPerK": -28, "pattern": { "kind": "isotropic" },
            "polarisation": { "kind": "rightCircular" },
            "waveforms": [{ "name": "uncoded BPSK", "bitRateBps": 4000, "requiredEbN0Db": 9.6, "implementationLossDb": 2 }] }],
          "recorder": { "capacityBytes": 64e9, "generatedBytesPerS": 150e3, "storedBytes": 0 },
          "needs": [{ "kind": "contactsPerDay", "count": 2 }, { "kind": "longestGap", "hours": 14 }]
        }
        """;

    /// <summary>Two-line elements of 46313. Source: tests/reference/orbit/spacecraft.tle.</summary>
    public static string TwoLines => string.Join('\n', File.ReadLines(PassPlanner.Tests.ReferenceData.PathOf("orbit/spacecraft.tle"))
        .Where(line => line.StartsWith("1 46313", StringComparison.Ordinal) || line.StartsWith("2 46313", StringComparison.Ordinal)));

    /// <summary>A document with one member replaced, by JSON pointer; nothing removes it.</summary>
    public static string With(string document, string pointer, string? json)
    {
        JsonNode root = JsonNode.Parse(document)!;
        string[] path = pointer.Split('/')[1..];
        JsonNode owner = path[..^1].Aggregate(root, (node, name) => node is JsonArray array ? array[int.Parse(name, System.Globalization.CultureInfo.InvariantCulture)]! : node[name]!);
        if (json is null)
        {
            owner.AsObject().Remove(path[^1]);
        }
        else if (owner is JsonArray list)
        {
            list[int.Parse(path[^1], System.Globalization.CultureInfo.InvariantCulture)] = JsonNode.Parse(json);
        }
        else
        {
            owner[path[^1]] = JsonNode.Parse(json);
        }

        return root.ToJsonString();
    }

    /// <summary>A document in which one text is replaced, for JSON that no node can hold, such as NaN.</summary>
    public static string Spoiled(string document, string what, string by)
    {
        Assert.Contains(what, document, StringComparison.Ordinal);
        return document.Replace(what, by, StringComparison.Ordinal);
    }
}
