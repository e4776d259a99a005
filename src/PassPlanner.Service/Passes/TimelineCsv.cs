using System.Globalization;
using System.Text;
using PassPlanner.Physics.Time;

namespace PassPlanner.Service.Passes;

/// <summary>Writes a timeline as CSV: the same columns as the JSON, utc first.</summary>
public static class TimelineCsv
{
    /// <summary>The text, with a header line and LF line ends.</summary>
    public static string Write(TimelineResponse timeline)
    {
        _ = UtcInstant.TryParse(timeline.StartUtc, out UtcInstant start);
        (string Name, Func<int, double> Value)[] columns =
        [
            ("azimuthDeg", i => timeline.AzimuthDeg[i]),
            ("elevationDeg", i => timeline.ElevationDeg[i]),
            ("apparentElevationDeg", i => timeline.ApparentElevationDeg[i]),
            ("slantRangeKm", i => timeline.SlantRangeKm[i]),
            ("rangeRateKmPerS", i => timeline.RangeRateKmPerS[i]),
            ("dopplerHz", i => timeline.DopplerHz[i]),
            ("dopplerRateHzPerS", i => timeline.DopplerRateHzPerS[i]),
            ("pointingErrorDeg", i => timeline.PointingErrorDeg[i]),
            ("groundGainDbi", i => timeline.GroundGainDbi[i]),
            ("spacecraftOffAxisDeg", i => timeline.SpacecraftOffAxisDeg[i]),
            ("spacecraftGainDbi", i => timeline.SpacecraftGainDbi[i]),
            ("freeSpaceLossDb", i => timeline.FreeSpaceLossDb[i]),
            ("atmosphericLossDb", i => timeline.AtmosphericLossDb[i]),
            ("polarisationLossDb", i => timeline.PolarisationLossDb[i]),
            ("systemNoiseTemperatureK", i => timeline.SystemNoiseTemperatureK[i]),
            ("gOverTDbPerK", i => timeline.GOverTDbPerK[i]),
            ("cOverN0DbHz", i => timeline.COverN0DbHz[i]),
            ("powerFluxDensityDbWPerM2", i => timeline.PowerFluxDensityDbWPerM2[i]),
            ("waveform", i => timeline.Waveform[i]),
            ("marginDb", i => timeline.MarginDb[i]),
            ("usable", i => timeline.Usable[i]),
            ("bitRateBps", i => timeline.BitRateBps[i]),
            .. timeline.Waveforms.Select((w, index) => ($"marginDb{index}", (Func<int, double>)(i => w.MarginDb[i]))),
        ];
        var text = new StringBuilder("utc");
        foreach ((string name, _) in columns)
        {
            text.Append(',').Append(name);
        }

        text.Append('\n');
        for (int i = 0; i < timeline.AzimuthDeg.Length; i++)
        {
            text.Append(start.AddSeconds((double)i * timeline.StepS));
            foreach ((_, Func<int, double> value) in columns)
            {
                text.Append(',').Append(value(i).ToString(CultureInfo.InvariantCulture));
            }

            text.Append('\n');
        }

        return text.ToString();
    }
}
