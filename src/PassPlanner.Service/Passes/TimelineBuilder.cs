using PassPlanner.Physics.Atmosphere;
using PassPlanner.Physics.Links;
using PassPlanner.Physics.Time;
using PassPlanner.Planning.Assessments;
using PassPlanner.Planning.Links;
using PassPlanner.Planning.Predictions;

namespace PassPlanner.Service.Passes;

/// <summary>Builds the columns of a pass from the same chain that the list used.</summary>
public static class TimelineBuilder
{
    /// <summary>Greatest number of samples in one answer.</summary>
    public const int GreatestSamples = 100_000;

    private const double RateHalfStepS = 0.5;

    /// <summary>The timeline of a pass.</summary>
    /// <param name="model">Profiles.</param>
    /// <param name="predicted">The pass.</param>
    /// <param name="stepS">Time between samples, s.</param>
    public static TimelineResponse Build(PlanningModel model, PredictedPass predicted, int stepS)
    {
        UtcInstant first = predicted.Pass.Window.StartUtc.CeilingToSecond();
        int count = SampleCount(predicted, stepS);
        var track = new PassTrack(count);
        var columns = new LinkColumns(count);
        Fill(model, predicted, track, first, stepS, count);
        predicted.Chain.Evaluate(track, columns);
        return Write(predicted, track, columns, stepS, DopplerRates(model, predicted, track));
    }

    /// <summary>Number of samples of a pass at a step.</summary>
    public static int SampleCount(PredictedPass predicted, int stepS)
    {
        double seconds = predicted.Pass.Window.EndUtc.SecondsSince(predicted.Pass.Window.StartUtc.CeilingToSecond());
        return Math.Max(0, (int)Math.Ceiling(seconds / stepS));
    }

    private static void Fill(PlanningModel model, PredictedPass predicted, PassTrack track, UtcInstant first, double stepS, int count) =>
        track.Fill(model.FindSpacecraft(predicted.Spacecraft.Id)!.Trajectory!, model.FrameOf(predicted.Station), first, stepS, count);

    /// <summary>Rate of the Doppler shift, Hz/s, from the range rate half a second before and after each sample.</summary>
    private static double[] DopplerRates(PlanningModel model, PredictedPass predicted, PassTrack track)
    {
        var before = new PassTrack(track.Count);
        var after = new PassTrack(track.Count);
        Fill(model, predicted, before, track.StartUtc.AddSeconds(-RateHalfStepS), track.StepS, track.Count);
        Fill(model, predicted, after, track.StartUtc.AddSeconds(RateHalfStepS), track.StepS, track.Count);
        double[] rates = new double[track.Count];
        for (int i = 0; i < rates.Length; i++)
        {
            // Where the propagation fails right after the last sample, its rate is that of the sample before.
            rates[i] = i < before.Count && i < after.Count
                ? Doppler.RateHzPerS(
                    predicted.Chain.Link.Radio.FrequencyHz,
                    (after.Look[i].RangeRateKmPerS - before.Look[i].RangeRateKmPerS) / (2 * RateHalfStepS))
                : rates[Math.Max(0, i - 1)];
        }

        return rates;
    }

    private static TimelineResponse Write(PredictedPass predicted, PassTrack track, LinkColumns columns, int stepS, double[] dopplerRates)
    {
        LinkChain chain = predicted.Chain;
        WaveformLadder ladder = chain.Ladder;
        double stationHeightM = predicted.Station.Position.HeightM;
        int[] waveform = Column(columns.Samples, s => ladder.Best(s.COverN0DbHz));
        int[] usable = UsableSamples(track, stepS, predicted);
        return new TimelineResponse
        {
            StartUtc = track.StartUtc.ToString(),
            StepS = stepS,
            AzimuthDeg = Column(track.Look, l => Math.Round(l.AzimuthDeg, 6)),
            ElevationDeg = Column(track.Look, l => Math.Round(l.ElevationDeg, 6)),
            ApparentElevationDeg = Column(track.Look, l => Math.Round(ItuRP834.ApparentElevationDeg(l.ElevationDeg, stationHeightM), 6)),
            SlantRangeKm = Column(track.Look, l => Math.Round(l.SlantRangeKm, 6)),
            RangeRateKmPerS = Column(track.Look, l => Math.Round(l.RangeRateKmPerS, 9)),
            DopplerHz = Column(track.Look, l => Math.Round(Doppler.ShiftHz(chain.Link.Radio.FrequencyHz, l.RangeRateKmPerS), 4)),
            DopplerRateHzPerS = Column<double, double>(dopplerRates, r => Math.Round(r, 4)),
            PointingErrorDeg = Column(columns.Samples, s => Math.Round(s.PointingErrorDeg, 6)),
            GroundGainDbi = Column(columns.Samples, s => PassWriter.Decibels(s.GroundGainDbi)),
            SpacecraftOffAxisDeg = Column(columns.Samples, s => Math.Round(s.SpacecraftOffAxisDeg, 6)),
            SpacecraftGainDbi = Column(columns.Samples, s => PassWriter.Decibels(s.SpacecraftGainDbi)),
            FreeSpaceLossDb = Column(columns.Samples, s => PassWriter.Decibels(s.FreeSpaceLossDb)),
            AtmosphericLossDb = Column(columns.Samples, s => PassWriter.Decibels(s.AtmosphericLossDb)),
            PolarisationLossDb = Column(columns.Samples, _ => PassWriter.Decibels(chain.PolarisationLossDb)),
            SystemNoiseTemperatureK = Column(columns.Samples, s => Math.Round(s.SystemNoiseTemperatureK, 6)),
            GOverTDbPerK = Column(columns.Samples, s => PassWriter.Decibels(s.GOverTDbPerK)),
            COverN0DbHz = Column(columns.Samples, s => PassWriter.Decibels(s.COverN0DbHz)),
            PowerFluxDensityDbWPerM2 = Column(columns.Samples, s => PassWriter.Decibels(s.PowerFluxDensityDbWPerM2)),
            Waveform = waveform,
            MarginDb = Column(columns.Samples, s => PassWriter.Decibels(ladder.MarginDb(ladder.Best(s.COverN0DbHz), s.COverN0DbHz))),
            Usable = usable,
            BitRateBps = [.. waveform.Zip(usable, (w, u) => u * ladder.Waveforms[w].BitRateBps)],
            Waveforms = [.. ladder.Waveforms.Select((w, index) => new TimelineWaveform
            {
                Name = w.Name,
                BitRateBps = w.BitRateBps,
                RequiredMarginDb = ladder.RequiredMarginDb,
                MarginDb = Column(columns.Samples, s => PassWriter.Decibels(ladder.MarginDb(index, s.COverN0DbHz))),
            })],
        };
    }

    /// <summary>Which samples lie in a usable window of the assessment, so that a coarse timeline agrees with the list.</summary>
    private static int[] UsableSamples(PassTrack track, int stepS, PredictedPass predicted)
    {
        int[] usable = new int[track.Count];
        foreach (TimeWindow window in predicted.Assessment.UsableWindows)
        {
            int from = (int)Math.Ceiling(window.StartUtc.SecondsSince(track.StartUtc) / stepS);
            int to = (int)Math.Ceiling(window.EndUtc.SecondsSince(track.StartUtc) / stepS);
            Array.Fill(usable, 1, from, Math.Min(to, usable.Length) - from);
        }

        return usable;
    }

    private static TOut[] Column<TIn, TOut>(ReadOnlySpan<TIn> samples, Func<TIn, TOut> value)
    {
        var column = new TOut[samples.Length];
        for (int i = 0; i < column.Length; i++)
        {
            column[i] = value(samples[i]);
        }

        return column;
    }
}
