using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Time;
using PassPlanner.Planning.Links;

namespace PassPlanner.Planning.Assessments;

/// <summary>
/// Reads the seconds of a pass in order, stretch by stretch, and keeps only what the assessment needs. The
/// definitions of usable second, window, yield and verdict are those of the API's documentation.
/// </summary>
public sealed class PassAssessor
{
    private readonly LinkChain chain;
    private readonly WaveformLadder ladder;
    private readonly int profileStepS;
    private readonly List<double> profileMarginDb = [];
    private readonly List<bool> profileUsable = [];
    private readonly List<TimeWindow> windows = [];

    private UtcInstant startUtc;
    private int seconds;
    private int? firstClosed;
    private int closedS;
    private int usableS;
    private int? windowStart;
    private int aboveMinimumS;
    private int aboveMinimumMissedS;
    private double bits;
    private double highestBitRateBps;
    private double highestMarginDb = double.NegativeInfinity;
    private double lowestMarginDb = double.PositiveInfinity;
    private Extreme best;
    private Extreme worst;
    private Extreme worstAboveMinimum;
    private double firstUsableElevationDeg;
    private double lastUsableElevationDeg;

    /// <summary>Starts on a pass.</summary>
    /// <param name="chain">The link.</param>
    /// <param name="profileStepS">Step of the margin profile, s; 0 for none.</param>
    public PassAssessor(LinkChain chain, int profileStepS)
    {
        this.chain = chain;
        this.profileStepS = profileStepS;
        ladder = chain.Ladder;
    }

    /// <summary>Reads the next stretch; its samples stand one second apart.</summary>
    public void Add(PassTrack track, LinkColumns columns)
    {
        if (seconds == 0)
        {
            startUtc = track.StartUtc;
        }

        for (int i = 0; i < columns.Count; i++)
        {
            AddSecond(track.Look[i].ElevationDeg, track.Look[i].SlantRangeKm, columns.Samples[i]);
        }
    }

    /// <summary>The assessment of the seconds read; nothing when there was none.</summary>
    public Assessment? Finish()
    {
        if (seconds == 0)
        {
            return null;
        }

        CloseWindow();
        // A pass that stays below the minimum elevation closes when every one of its seconds does.
        int missedS = aboveMinimumS > 0 ? aboveMinimumMissedS : seconds - closedS;
        Verdict verdict = usableS == 0 ? Verdict.DoesNotClose
            : missedS == 0 ? Verdict.Closes
            : Verdict.ClosesInPart;
        return new Assessment
        {
            Verdict = verdict,
            Cause = CauseOf(verdict),
            HighestMarginDb = highestMarginDb,
            LowestMarginDb = lowestMarginDb,
            BestUtc = startUtc.AddSeconds(best.Second),
            UsableWindows = windows,
            UsableS = usableS,
            YieldBytes = bits / 8,
            HighestBitRateBps = highestBitRateBps,
            UsableFromElevationDeg = usableS > 0 ? firstUsableElevationDeg : null,
            UsableToElevationDeg = usableS > 0 ? lastUsableElevationDeg : null,
            Profile = profileStepS == 0 ? null : new MarginProfile(startUtc, profileStepS, profileMarginDb, profileUsable),
        };
    }

    private void AddSecond(double elevationDeg, double slantRangeKm, in LinkSample sample)
    {
        int waveform = ladder.Best(sample.COverN0DbHz);
        double marginDb = ladder.MarginDb(waveform, sample.COverN0DbHz);
        highestMarginDb = Math.Max(highestMarginDb, marginDb);
        lowestMarginDb = Math.Min(lowestMarginDb, marginDb);

        bool closes = ladder.Closes(sample.COverN0DbHz);
        if (closes)
        {
            closedS++;
            firstClosed ??= seconds;
        }

        bool usable = closes && seconds - firstClosed >= chain.Link.Radio.AcquisitionS;
        if (usable)
        {
            firstUsableElevationDeg = usableS == 0 ? elevationDeg : firstUsableElevationDeg;
            lastUsableElevationDeg = elevationDeg;
            usableS++;
            bits += ladder.Waveforms[waveform].BitRateBps * ladder.Waveforms[waveform].FrameEfficiency;
            highestBitRateBps = Math.Max(highestBitRateBps, ladder.Waveforms[waveform].BitRateBps);
            windowStart ??= seconds;
        }
        else
        {
            CloseWindow();
        }

        var here = new Extreme(seconds, elevationDeg, slantRangeKm, sample);
        best = seconds == 0 || sample.COverN0DbHz > best.Sample.COverN0DbHz ? here : best;
        worst = seconds == 0 || sample.COverN0DbHz < worst.Sample.COverN0DbHz ? here : worst;
        if (elevationDeg >= chain.Link.Radio.MinimumElevationDeg)
        {
            worstAboveMinimum = aboveMinimumS == 0 || sample.COverN0DbHz < worstAboveMinimum.Sample.COverN0DbHz ? here : worstAboveMinimum;
            aboveMinimumS++;
            aboveMinimumMissedS += closes ? 0 : 1;
        }

        if (profileStepS > 0 && seconds % profileStepS == 0)
        {
            profileMarginDb.Add(ladder.MarginDb(ladder.MostRobust, sample.COverN0DbHz));
            profileUsable.Add(usable);
        }

        seconds++;
    }

    private void CloseWindow()
    {
        if (windowStart is { } start)
        {
            windows.Add(new TimeWindow(startUtc.AddSeconds(start), startUtc.AddSeconds(seconds)));
            windowStart = null;
        }
    }

    private LimitingCause CauseOf(Verdict verdict)
    {
        double acquisitionS = chain.Link.Radio.AcquisitionS;
        if (verdict == Verdict.Closes)
        {
            return LimitingCause.None;
        }

        if (verdict == Verdict.DoesNotClose)
        {
            double shortByDb = ladder.RequiredMarginDb - highestMarginDb;
            return shortByDb <= 0
                ? new LimitingCause(CauseKind.Acquisition, 0, null, 0, closedS, acquisitionS)
                : CauseOfShortfall(shortByDb);
        }

        Extreme low = aboveMinimumMissedS > 0 ? worstAboveMinimum : worst;
        (CauseKind kind, double changeDb) = Largest(
            (CauseKind.Range, best.Sample.FreeSpaceLossDb - low.Sample.FreeSpaceLossDb),
            (CauseKind.SpacecraftAntenna, low.Sample.SpacecraftGainDbi - best.Sample.SpacecraftGainDbi),
            (CauseKind.Pointing, low.Sample.GroundGainDbi - best.Sample.GroundGainDbi),
            (CauseKind.Atmosphere, best.Sample.AtmosphericLossDb - low.Sample.AtmosphericLossDb),
            (CauseKind.Noise, 10 * Math.Log10(best.Sample.SystemNoiseTemperatureK / low.Sample.SystemNoiseTemperatureK)));
        return new LimitingCause(
            kind, changeDb, Math.Max(firstUsableElevationDeg, lastUsableElevationDeg), 0, closedS, acquisitionS);
    }

    /// <summary>
    /// What costs the best second most, against the spacecraft overhead, both antennas on their peaks, no atmosphere
    /// and matched polarisation. Where all of it together would not make up what is missing, the cause is power.
    /// </summary>
    private LimitingCause CauseOfShortfall(double shortByDb)
    {
        double heightKm = HeightKm(best.SlantRangeKm, best.ElevationDeg);
        ReadOnlySpan<(CauseKind, double)> causes =
        [
            (CauseKind.Range, 20 * Math.Log10(heightKm / best.SlantRangeKm)),
            (CauseKind.SpacecraftAntenna, best.Sample.SpacecraftGainDbi - chain.SpacecraftPeakGainDbi),
            (CauseKind.Pointing, best.Sample.GroundGainDbi - chain.GroundPeakGainDbi),
            (CauseKind.Atmosphere, -best.Sample.AtmosphericLossDb),
            (CauseKind.Polarisation, -chain.PolarisationLossDb),
        ];
        double allDb = 0;
        foreach ((_, double changeDb) in causes)
        {
            allDb += changeDb;
        }

        (CauseKind kind, double largestDb) = -allDb < shortByDb ? (CauseKind.Power, -shortByDb) : Largest(causes);
        return new LimitingCause(kind, largestDb, null, shortByDb, closedS, chain.Link.Radio.AcquisitionS);
    }

    /// <summary>Height above a round Earth of what is seen at a range and an elevation, by the law of cosines.</summary>
    private static double HeightKm(double slantRangeKm, double elevationDeg)
    {
        double sineOfElevation = Math.Sin(double.DegreesToRadians(elevationDeg));
        const double radiusKm = Wgs84.EquatorialRadiusKm;
        return Math.Sqrt((radiusKm * radiusKm) + (slantRangeKm * slantRangeKm) + (2 * radiusKm * slantRangeKm * sineOfElevation)) - radiusKm;
    }

    private static (CauseKind Kind, double ChangeDb) Largest(params ReadOnlySpan<(CauseKind Kind, double ChangeDb)> causes)
    {
        (CauseKind Kind, double ChangeDb) largest = causes[0];
        foreach ((CauseKind Kind, double ChangeDb) cause in causes)
        {
            largest = cause.ChangeDb < largest.ChangeDb ? cause : largest;
        }

        return largest;
    }

    private readonly record struct Extreme(int Second, double ElevationDeg, double SlantRangeKm, LinkSample Sample);
}
