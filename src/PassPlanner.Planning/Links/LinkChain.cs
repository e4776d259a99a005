using PassPlanner.Physics.Antennas;
using PassPlanner.Physics.Constants;
using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Links;
using PassPlanner.Physics.Noise;
using PassPlanner.Physics.Pointing;
using PassPlanner.Planning.Profiles;

namespace PassPlanner.Planning.Links;

/// <summary>
/// The link equation of one link, prepared once and evaluated at every second: lists, timelines and budgets all come
/// from here. Immutable; evaluation allocates nothing.
/// </summary>
public sealed class LinkChain
{
    private readonly GroundGain groundGain;
    private readonly AntennaPattern spacecraftPattern;
    private readonly ControlledAttitude? attitude;
    private readonly double uncontrolledGainDbi;
    private readonly double backgroundK;
    private readonly Vector3D? fixedDirection;

    /// <summary>Prepares a link.</summary>
    /// <param name="link">Radio, chain and antenna.</param>
    /// <param name="attitudeLaw">Attitude of the spacecraft.</param>
    /// <param name="tables">Gains worked out before, shared with other links.</param>
    public LinkChain(Link link, AttitudeLaw attitudeLaw, GainTables tables)
    {
        Link = link;
        Ladder = new WaveformLadder(link.Radio.Waveforms, link.Radio.RequiredMarginDb);
        double frequencyHz = link.Radio.FrequencyHz;
        groundGain = tables.Ground(link.Chain.Pattern, frequencyHz, link.Antenna.Pointing.JitterRmsDeg);
        spacecraftPattern = link.Radio.Pattern.At(frequencyHz);
        attitude = attitudeLaw as ControlledAttitude;
        Attitude = attitudeLaw;
        uncontrolledGainDbi = attitudeLaw is UncontrolledAttitude uncontrolled
            ? tables.AtPercentileDbi(link.Radio.Pattern, frequencyHz, uncontrolled.Percentile)
            : 0;
        backgroundK = SkyNoise.BackgroundK(frequencyHz);
        PolarisationLossDb = PolarisationMismatch.LossDb(link.Radio.Polarisation, link.Chain.Polarisation, link.Radio.PolarisationCase);
        if (link.Direction == LinkDirection.Downlink)
        {
            var transmitter = (Transmitter)link.Radio;
            (TransmitPowerW, TransmitLineLossDb) = (transmitter.PowerW, transmitter.LineLossDb);
            Noise = ((ReceiveChain)link.Chain).Noise;
        }
        else
        {
            var transmit = (TransmitChain)link.Chain;
            (TransmitPowerW, TransmitLineLossDb) = (transmit.PowerW, transmit.LineLossDb);
        }

        TransmitPowerDbw = Decibel.FromRatio(TransmitPowerW);
        fixedDirection = link.Antenna.FixedDirection is { } direction ? UnitVector(direction.AzimuthDeg, direction.ElevationDeg) : null;
    }

    /// <summary>The link.</summary>
    public Link Link { get; }

    /// <summary>Waveforms, slowest first.</summary>
    public WaveformLadder Ladder { get; }

    /// <summary>Attitude of the spacecraft.</summary>
    public AttitudeLaw Attitude { get; }

    /// <summary>Noise of the receive chain; nothing for an uplink.</summary>
    public SystemNoise? Noise { get; }

    /// <summary>Power of the transmitting amplifier, W.</summary>
    public double TransmitPowerW { get; }

    /// <summary>Power of the transmitting amplifier, dBW.</summary>
    public double TransmitPowerDbw { get; }

    /// <summary>Loss between the amplifier and its antenna, dB.</summary>
    public double TransmitLineLossDb { get; }

    /// <summary>Polarisation loss, dB.</summary>
    public double PolarisationLossDb { get; }

    /// <summary>Greatest gain of the ground antenna, dBi.</summary>
    public double GroundPeakGainDbi => groundGain.PeakGainDbi;

    /// <summary>Greatest gain of the spacecraft antenna, dBi.</summary>
    public double SpacecraftPeakGainDbi => spacecraftPattern.PeakGainDbi;

    /// <summary>Where the ground antenna's peak gain comes from, in words.</summary>
    public string GroundGainSource => SourceOf(Link.Chain.Pattern);

    /// <summary>Noise temperature of the sky behind a loss in the atmosphere, K (ITU-R P.618-14, section 3).</summary>
    public double SkyTemperatureK(double atmosphericLossDb) => SkyNoise.TemperatureK(atmosphericLossDb, backgroundK);

    /// <summary>Where the spacecraft antenna's gain comes from, in words.</summary>
    public string SpacecraftGainSource(in LinkSample sample) => Attitude switch
    {
        UncontrolledAttitude uncontrolled => FormattableString.Invariant(
            $"{SourceOf(Link.Radio.Pattern)}; attitude not controlled: {uncontrolled.Percentile:0.#} percent of all directions have less"),
        _ => FormattableString.Invariant($"{SourceOf(Link.Radio.Pattern)}, {sample.SpacecraftOffAxisDeg:0.00} degrees off its boresight"),
    };

    /// <summary>Evaluates the link at every sample of a track.</summary>
    public void Evaluate(PassTrack track, LinkColumns columns)
    {
        columns.Count = track.Count;
        Span<LinkSample> samples = columns.Buffer;
        for (int i = 0; i < track.Count; i++)
        {
            samples[i] = Evaluate(track.Look[i], track.SkyRateDegPerS[i], track.SpacecraftTeme[i], track.StationTemeKm[i]);
        }
    }

    private LinkSample Evaluate(in LookAngles look, double skyRateDegPerS, in TemeState spacecraft, in Vector3D stationTemeKm)
    {
        (double spacecraftOffAxisDeg, double spacecraftGainDbi) = SpacecraftGain(spacecraft, stationTemeKm);
        double pointingErrorDeg = PointingErrorDeg(look, skyRateDegPerS);
        double groundGainDbi = groundGain.Dbi(double.DegreesToRadians(pointingErrorDeg));
        double freeSpaceLossDb = FreeSpaceLoss.Db(look.SlantRangeKm, Link.Radio.FrequencyHz);
        double atmosphericLossDb = Link.Chain.ClearSkyZenithLossDb is { } zenithDb ? ClearSkyLoss.Db(zenithDb, look.ElevationDeg) : 0;

        double eirpDbw;
        double systemNoiseTemperatureK;
        double gOverTDbPerK;
        if (Noise is { } noise)
        {
            eirpDbw = TransmitPowerDbw - TransmitLineLossDb + spacecraftGainDbi;
            double skyK = noise.FollowsSky ? SkyTemperatureK(atmosphericLossDb) : 0;
            ReceivedNoise received = noise.At(groundGainDbi, GroundPeakGainDbi, skyK, Link.Chain.LineLossDb);
            (systemNoiseTemperatureK, gOverTDbPerK) = (received.SystemNoiseTemperatureK, received.GOverTDbPerK);
        }
        else
        {
            eirpDbw = TransmitPowerDbw - TransmitLineLossDb + groundGainDbi;
            double enteredDbPerK = ((Receiver)Link.Radio).GOverTDbPerK;
            systemNoiseTemperatureK = Decibel.ToRatio(SpacecraftPeakGainDbi - enteredDbPerK);
            gOverTDbPerK = enteredDbPerK + (spacecraftGainDbi - SpacecraftPeakGainDbi);
        }

        return new LinkSample
        {
            PointingErrorDeg = pointingErrorDeg,
            GroundGainDbi = groundGainDbi,
            SpacecraftOffAxisDeg = spacecraftOffAxisDeg,
            SpacecraftGainDbi = spacecraftGainDbi,
            FreeSpaceLossDb = freeSpaceLossDb,
            AtmosphericLossDb = atmosphericLossDb,
            EirpDbw = eirpDbw,
            SystemNoiseTemperatureK = systemNoiseTemperatureK,
            GOverTDbPerK = gOverTDbPerK,
            COverN0DbHz = eirpDbw - freeSpaceLossDb - atmosphericLossDb - PolarisationLossDb + gOverTDbPerK - PhysicalConstants.BoltzmannDbwPerKHz,
            PowerFluxDensityDbWPerM2 = PowerFluxDensity.DbWPerM2(eirpDbw, look.SlantRangeKm),
        };
    }

    private (double OffAxisDeg, double GainDbi) SpacecraftGain(in TemeState spacecraft, in Vector3D stationTemeKm)
    {
        if (attitude is null)
        {
            return (0, uncontrolledGainDbi);
        }

        AntennaDirection direction = Link.Radio.Mounting.DirectionTo(attitude, spacecraft, stationTemeKm);
        return (double.RadiansToDegrees(direction.OffAxisRad), spacecraftPattern.GainDbi(direction.OffAxisRad, direction.PhiRad));
    }

    private double PointingErrorDeg(in LookAngles look, double skyRateDegPerS)
    {
        PointingErrors errors = Link.Antenna.Pointing;
        double errorDeg = fixedDirection is { } boresight
            ? errors.BiasDeg + double.RadiansToDegrees(boresight.AngleToRad(UnitVector(look.AzimuthDeg, look.ElevationDeg)))
            : TrackingError.PointingErrorDeg(errors.BiasDeg, skyRateDegPerS, errors.UpdateIntervalS);
        return Math.Min(errorDeg, 180);
    }

    private static Vector3D UnitVector(double azimuthDeg, double elevationDeg)
    {
        (double sinAzimuth, double cosAzimuth) = Math.SinCos(double.DegreesToRadians(azimuthDeg));
        (double sinElevation, double cosElevation) = Math.SinCos(double.DegreesToRadians(elevationDeg));
        return new Vector3D(cosElevation * sinAzimuth, cosElevation * cosAzimuth, sinElevation);
    }

    private static string SourceOf(PatternModel pattern) => pattern switch
    {
        IsotropicModel => "isotropic, entered",
        HalfWaveDipoleModel => "half-wave dipole",
        GaussianBeamModel beam => FormattableString.Invariant($"Gaussian beam, entered, {beam.HalfPowerBeamwidthDeg:0.###} degrees at half power"),
        TaperedApertureModel dish => FormattableString.Invariant(
            $"aperture of {dish.DiameterM:0.###} m, edge taper {dish.EdgeTaperDb:0.#} dB, efficiency {dish.Efficiency:0.###}, surface {dish.SurfaceErrorRmsMm:0.##} mm rms (Ruze)"),
        MeasuredModel measured => $"measured, {measured.Cuts.Count} cut{(measured.Cuts.Count == 1 ? "" : "s")}",
        _ => "entered",
    };
}
