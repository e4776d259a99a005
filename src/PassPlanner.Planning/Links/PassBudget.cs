using PassPlanner.Physics.Constants;
using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Links;
using PassPlanner.Physics.Noise;
using PassPlanner.Physics.Waveforms;
using PassPlanner.Planning.Profiles;

namespace PassPlanner.Planning.Links;

/// <summary>
/// Writes the terms of a <see cref="LinkSample"/> as the lines of a budget. It computes nothing of its own: what the
/// timeline says at a second and what the budget adds up to are the same numbers.
/// </summary>
public static class PassBudget
{
    /// <summary>The budget of a link at one instant, for one of its waveforms.</summary>
    /// <param name="chain">The link.</param>
    /// <param name="sample">Its terms at the instant.</param>
    /// <param name="look">Where the station sees the spacecraft then.</param>
    /// <param name="waveform">Index of the waveform on the link's ladder.</param>
    public static LinkBudget Of(LinkChain chain, in LinkSample sample, in LookAngles look, int waveform)
    {
        var budget = new LinkBudgetBuilder();
        bool uplink = chain.Link.Direction == LinkDirection.Uplink;
        budget
            .Term("transmitPower", "Transmit power", chain.TransmitPowerDbw, "dBW", Text($"entered, {chain.TransmitPowerW:g6} W"))
            .Term("transmitLineLoss", "Transmit line loss", -chain.TransmitLineLossDb, "dB", "entered");
        if (uplink)
        {
            AddGroundAntenna(budget, "transmitAntennaGain", "Ground antenna gain", chain, sample);
        }
        else
        {
            budget.Term("transmitAntennaGain", "Spacecraft antenna gain", sample.SpacecraftGainDbi, "dBi", chain.SpacecraftGainSource(sample));
        }

        budget
            .Sum("eirp", "EIRP", "dBW")
            .Term("freeSpaceLoss", "Free-space loss", -sample.FreeSpaceLossDb, "dB", Text(
                $"20 log10(4 pi d f / c), d = {look.SlantRangeKm:0.000} km, f = {chain.Link.Radio.FrequencyHz / 1e6:0.######} MHz"))
            .Term("atmosphericLoss", "Atmosphere, clear sky", -sample.AtmosphericLossDb, "dB", AtmosphereSource(chain, look))
            .Term("polarisationLoss", "Polarisation", -chain.PolarisationLossDb, "dB", Text(
                $"mismatch of two ellipses (IEEE Std 145), {CaseOf(chain)} relative tilt"));
        if (uplink)
        {
            budget
                .Term("gOverT", "Spacecraft G/T", ((Receiver)chain.Link.Radio).GOverTDbPerK, "dB/K", "entered, where the antenna's gain is greatest")
                .Term("receiveAntennaRelativeGain", "Spacecraft antenna", sample.SpacecraftGainDbi - chain.SpacecraftPeakGainDbi, "dB", chain.SpacecraftGainSource(sample));
        }
        else if (chain.Noise is GOverTNoise gOverT)
        {
            budget
                .Term("gOverT", "Ground G/T", gOverT.GOverTDbPerK, "dB/K", "entered, on the boresight")
                .Term("groundPointingLoss", "Pointing", sample.GroundGainDbi - chain.GroundPeakGainDbi, "dB", PointingSource(chain, sample));
        }
        else
        {
            AddGroundAntenna(budget, "receiveAntennaGain", "Ground antenna gain", chain, sample);
            budget.Term("systemNoiseTemperature", "System noise", -Decibel.FromRatio(sample.SystemNoiseTemperatureK), "dBK", NoiseSource(chain, sample));
        }

        Waveform chosen = chain.Ladder.Waveforms[waveform];
        return budget
            .Term("boltzmann", "Boltzmann's constant", -PhysicalConstants.BoltzmannDbwPerKHz, "dB", "CODATA 2018, 1.380649e-23 J/K")
            .Sum("cOverN0", "C/N0", "dBHz")
            .Term("bitRate", "Bit rate", -Decibel.FromRatio(chosen.BitRateBps), "dBHz", Text($"{chosen.Name}, {chosen.BitRateBps:g9} bit/s of information"))
            .Sum("ebN0", "Eb/N0", "dB")
            .Term("requiredEbN0", "Required Eb/N0", -chosen.RequiredEbN0Db, "dB", Text($"{chosen.Name}, {chosen.Source}"))
            .Term("implementationLoss", "Implementation loss", -chosen.ImplementationLossDb, "dB", "entered")
            .Sum("margin", "Margin", "dB")
            .Build();
    }

    private static void AddGroundAntenna(LinkBudgetBuilder budget, string id, string name, LinkChain chain, in LinkSample sample) => budget
        .Term(id, name, chain.GroundPeakGainDbi, "dBi", chain.GroundGainSource)
        .Term("groundPointingLoss", "Pointing", sample.GroundGainDbi - chain.GroundPeakGainDbi, "dB", PointingSource(chain, sample));

    private static string PointingSource(LinkChain chain, in LinkSample sample)
    {
        PointingErrors pointing = chain.Link.Antenna.Pointing;
        return chain.Link.Antenna.FixedDirection is { } direction
            ? Text($"fixed mount at azimuth {direction.AzimuthDeg:0.##}, elevation {direction.ElevationDeg:0.##} degrees: {sample.PointingErrorDeg:0.000} degrees off")
            : Text($"{sample.PointingErrorDeg:0.0000} degrees off (bias {pointing.BiasDeg:0.###}, update every {pointing.UpdateIntervalS:0.###} s), mean over {pointing.JitterRmsDeg:0.###} degrees rms jitter; an ideal mount");
    }

    private static string AtmosphereSource(LinkChain chain, in LookAngles look) => chain.Link.Chain.ClearSkyZenithLossDb is { } zenithDb
        ? Text($"entered, {zenithDb:0.###} dB at the zenith / sin({Math.Max(look.ElevationDeg, ClearSkyLoss.LowestElevationDeg):0.00} degrees)")
        : "not entered, nothing taken off: enter clearSkyZenithLossDb for this chain";

    private static string NoiseSource(LinkChain chain, in LinkSample sample) => chain.Noise is ComponentNoise components
        ? Text($"{sample.SystemNoiseTemperatureK:0.0} K at the antenna's terminal: sky {chain.SkyTemperatureK(sample.AtmosphericLossDb):0.0} K (ITU-R P.618-14 section 3), spillover {components.SpilloverTemperatureK:0.#} K, line {chain.Link.Chain.LineLossDb:0.##} dB at {components.LineTemperatureK:0.#} K, receiver {components.ReceiverNoiseTemperatureK:0.#} K")
        : Text($"entered, {sample.SystemNoiseTemperatureK:0.###} K at the antenna's terminal");

    private static string CaseOf(LinkChain chain) => chain.Link.Radio.PolarisationCase switch
    {
        PolarisationCase.Mean => "mean",
        PolarisationCase.Best => "best",
        _ => "worst",
    };

    private static string Text(FormattableString text) => FormattableString.Invariant(text);
}
