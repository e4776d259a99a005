namespace PassPlanner.Physics.Links;

/// <summary>Refuses a fixed link that says too little, too much or something out of range.</summary>
internal static class FixedLinkCheck
{
    public static void Refuse(FixedLinkInputs inputs)
    {
        Ranges(inputs);
        Alternatives(inputs);
        Requirements(inputs);
    }

    private static void Ranges(FixedLinkInputs inputs)
    {
        Wavelength.CheckFrequency(inputs.FrequencyHz);
        RangeCheck.AboveZeroIfGiven(inputs.SlantRangeKm, 1e9, "slantRangeKm", "km");
        RangeCheck.WithinIfGiven(inputs.FreeSpaceLossDb, 0, 400, "freeSpaceLossDb", "dB");
        RangeCheck.WithinIfGiven(inputs.PowerFluxDensityDbWPerM2, -400, 100, "powerFluxDensityDbWPerM2", "dBW/m2");
        RangeCheck.WithinIfGiven(inputs.EirpDbw, -200, 200, "eirpDbw", "dBW");
        RangeCheck.AboveZeroIfGiven(inputs.PowerW, 1e9, "powerW", "W");
        RangeCheck.Within(inputs.LineLossDb, 0, 100, "lineLossDb", "dB");
        RangeCheck.Within(inputs.GainDbi, -100, 100, "gainDbi", "dBi");
        RangeCheck.Within(inputs.PointingLossDb, 0, 100, "pointingLossDb", "dB");
        foreach (NamedLoss loss in inputs.Losses)
        {
            RangeCheck.Within(loss.ValueDb, -100, 400, "losses.valueDb", "dB");
        }

        RangeCheck.WithinIfGiven(inputs.GOverTDbPerK, -100, 100, "gOverTDbPerK", "dB/K");
        RangeCheck.WithinIfGiven(inputs.ReceiveGainDbi, -100, 100, "receiveGainDbi", "dBi");
        RangeCheck.Within(inputs.ReceivePointingLossDb, 0, 100, "receivePointingLossDb", "dB");
        RangeCheck.AboveZeroIfGiven(inputs.SystemNoiseTemperatureK, 1e6, "systemNoiseTemperatureK", "K");
        RangeCheck.AboveZeroIfGiven(inputs.BitRateBps, 1e12, "bitRateBps", "bit/s");
        RangeCheck.AboveZeroIfGiven(inputs.NoiseBandwidthHz, 1e12, "noiseBandwidthHz", "Hz");
        RangeCheck.WithinIfGiven(inputs.RequiredEbN0Db, -30, 100, "requiredEbN0Db", "dB");
        RangeCheck.WithinIfGiven(inputs.RequiredCOverNDb, -100, 100, "requiredCOverNDb", "dB");
        RangeCheck.WithinIfGiven(inputs.RequiredReceivedPowerDbw, -400, 100, "requiredReceivedPowerDbw", "dBW");
        RangeCheck.Within(inputs.ImplementationLossDb, 0, 100, "implementationLossDb", "dB");
    }

    private static void Alternatives(FixedLinkInputs inputs)
    {
        ExactlyOne(("slantRangeKm", inputs.SlantRangeKm), ("freeSpaceLossDb", inputs.FreeSpaceLossDb), ("powerFluxDensityDbWPerM2", inputs.PowerFluxDensityDbWPerM2));
        AtMostOne(("eirpDbw", inputs.EirpDbw), ("powerW", inputs.PowerW));
        Together(
            inputs.PowerFluxDensityDbWPerM2 is not null || inputs.EirpDbw is not null || inputs.PowerW is not null,
            "eirpDbw",
            "eirpDbw or powerW must be given");
        Together(
            inputs.PowerW is not null || (inputs.LineLossDb, inputs.GainDbi, inputs.PointingLossDb) == (0, 0, 0),
            "powerW",
            "lineLossDb, gainDbi and pointingLossDb go with powerW: an entered eirpDbw has them inside");
        AtMostOne(("gOverTDbPerK", inputs.GOverTDbPerK), ("receiveGainDbi", inputs.ReceiveGainDbi));
        AtMostOne(("gOverTDbPerK", inputs.GOverTDbPerK), ("systemNoiseTemperatureK", inputs.SystemNoiseTemperatureK));
        bool hasNoise = inputs.GOverTDbPerK is not null || (inputs.ReceiveGainDbi is not null && inputs.SystemNoiseTemperatureK is not null);
        Together(
            hasNoise || (inputs.RequiredReceivedPowerDbw is not null && inputs.ReceiveGainDbi is not null),
            "gOverTDbPerK",
            "gOverTDbPerK, or receiveGainDbi and systemNoiseTemperatureK, must be given");
    }

    private static void Requirements(FixedLinkInputs inputs)
    {
        AtMostOne(("bitRateBps", inputs.BitRateBps), ("noiseBandwidthHz", inputs.NoiseBandwidthHz), ("requiredReceivedPowerDbw", inputs.RequiredReceivedPowerDbw));
        Together(inputs.RequiredEbN0Db is null || inputs.BitRateBps is not null, "bitRateBps", "requiredEbN0Db goes with bitRateBps");
        Together(inputs.RequiredCOverNDb is null || inputs.NoiseBandwidthHz is not null, "noiseBandwidthHz", "requiredCOverNDb goes with noiseBandwidthHz");
        Together(
            inputs.RequiredReceivedPowerDbw is null || inputs.ReceiveGainDbi is not null,
            "receiveGainDbi",
            "requiredReceivedPowerDbw goes with receiveGainDbi");
    }

    private static void ExactlyOne(params ReadOnlySpan<(string Member, double? Value)> members)
    {
        AtMostOne(members);
        if (Given(members) == 0)
        {
            throw new ArgumentException($"one of {Names(members)} must be given", members[0].Member);
        }
    }

    private static void AtMostOne(params ReadOnlySpan<(string Member, double? Value)> members)
    {
        if (Given(members) > 1)
        {
            throw new ArgumentException($"only one of {Names(members)} may be given", members[0].Member);
        }
    }

    private static int Given(ReadOnlySpan<(string Member, double? Value)> members)
    {
        int given = 0;
        foreach ((_, double? value) in members)
        {
            given += value is null ? 0 : 1;
        }

        return given;
    }

    private static string Names(ReadOnlySpan<(string Member, double? Value)> members)
    {
        var names = new List<string>();
        foreach ((string member, _) in members)
        {
            names.Add(member);
        }

        return string.Join(", ", names);
    }

    private static void Together(bool holds, string member, string message)
    {
        if (!holds)
        {
            throw new ArgumentException(message, member);
        }
    }
}
