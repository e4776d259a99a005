using PassPlanner.Physics.Constants;

namespace PassPlanner.Physics.Links;

/// <summary>The budget of a link with fixed geometry.</summary>
/// <param name="Budget">The lines; sums are running totals.</param>
/// <param name="EirpDbw">Radiated power towards the receiver, dBW.</param>
/// <param name="PowerFluxDensityDbWPerM2">Power flux density at the receiver in free space, dBW/m^2.</param>
/// <param name="ReceivedPowerDbw">Power at the receiver after all losses, dBW.</param>
/// <param name="COverN0DbHz">Carrier power over noise density, dBHz.</param>
/// <param name="COverNDb">Carrier over noise power in the noise bandwidth, dB.</param>
/// <param name="EbN0Db">Energy per information bit over noise density, dB.</param>
/// <param name="MarginDb">What is left over the requirement and the implementation loss, dB.</param>
public sealed record FixedLinkBudget(
    LinkBudget Budget,
    Finding<double> EirpDbw,
    double PowerFluxDensityDbWPerM2,
    Finding<double> ReceivedPowerDbw,
    Finding<double> COverN0DbHz,
    Finding<double> COverNDb,
    Finding<double> EbN0Db,
    Finding<double> MarginDb)
{
    /// <summary>Works a budget out: EIRP - losses + G/T + 228.599 dB, and what follows from it.</summary>
    /// <param name="inputs">The link.</param>
    /// <exception cref="ArgumentException">A value is out of range, or alternatives are missing or given together; the message names the members.</exception>
    public static FixedLinkBudget Of(FixedLinkInputs inputs)
    {
        FixedLinkCheck.Refuse(inputs);
        return new Worksheet(inputs).Write();
    }

    private sealed class Worksheet(FixedLinkInputs inputs)
    {
        private const string Entered = "entered";
        private readonly LinkBudgetBuilder lines = new();
        private Finding<double> eirpDbw = new Missing<double>("The radiated power was not given; the budget begins at the power flux density.");
        private Finding<double> receivedPowerDbw = new Missing<double>("A received power needs receiveGainDbi, which was not given.");
        private Finding<double> cOverN0DbHz = new Missing<double>("C/N0 needs gOverTDbPerK or systemNoiseTemperatureK.");
        private Finding<double> cOverNDb = new Missing<double>("C/N needs noiseBandwidthHz.");
        private Finding<double> ebN0Db = new Missing<double>("Eb/N0 needs bitRateBps.");
        private Finding<double> marginDb = new Missing<double>("A margin needs a requirement.");
        private double powerFluxDensityDbWPerM2;

        public FixedLinkBudget Write()
        {
            Transmit();
            Path();
            for (int i = 0; i < inputs.Losses.Count; i++)
            {
                lines.Term($"loss{i + 1}", inputs.Losses[i].Name, -inputs.Losses[i].ValueDb, "dB", Entered);
            }

            Receive();
            if (inputs.RequiredReceivedPowerDbw is not null)
            {
                PowerMargin();
            }
            else
            {
                NoiseDensityRatio();
                Requirement();
            }

            return new FixedLinkBudget(
                lines.Build(), eirpDbw, powerFluxDensityDbWPerM2, receivedPowerDbw, cOverN0DbHz, cOverNDb, ebN0Db, marginDb);
        }

        private void Transmit()
        {
            if (inputs.PowerW is { } powerW)
            {
                lines.Term("power", "Transmitter power", Decibel.FromRatio(powerW), "dBW", Entered)
                    .Term("lineLoss", "Line loss, transmitter", -inputs.LineLossDb, "dB", Entered)
                    .Term("transmitGain", "Gain, transmitting antenna", inputs.GainDbi, "dBi", Entered)
                    .Term("transmitPointing", "Pointing loss, transmitting antenna", -inputs.PointingLossDb, "dB", Entered)
                    .Sum("eirp", "EIRP", "dBW");
            }
            else if (inputs.EirpDbw is { } entered)
            {
                lines.Term("eirp", "EIRP", entered, "dBW", Entered);
            }
            else
            {
                return;
            }

            eirpDbw = new Found<double>(lines.TotalDb);
        }

        private void Path()
        {
            double isotropicAreaDbM2 = PowerFluxDensity.IsotropicAreaDbM2(inputs.FrequencyHz);
            if (inputs.PowerFluxDensityDbWPerM2 is { } arriving)
            {
                powerFluxDensityDbWPerM2 = arriving;
                if (eirpDbw is Found<double>)
                {
                    lines.Term("spreading", "Spreading and losses on the way", arriving - lines.TotalDb, "dB/m2", "entered power flux density less EIRP")
                        .Sum("powerFluxDensity", "Power flux density", "dBW/m2");
                }
                else
                {
                    lines.Term("powerFluxDensity", "Power flux density", arriving, "dBW/m2", Entered);
                }

                lines.Term("isotropicArea", "Area of an isotropic antenna", isotropicAreaDbM2, "dBm2", "lambda^2 / 4 pi");
            }
            else
            {
                double lossDb = inputs.FreeSpaceLossDb ?? FreeSpaceLoss.Db(inputs.SlantRangeKm!.Value, inputs.FrequencyHz); // FixedLinkCheck: one of the two is given
                powerFluxDensityDbWPerM2 = lines.TotalDb - lossDb - isotropicAreaDbM2;
                lines.Term("freeSpaceLoss", "Free-space loss", -lossDb, "dB", inputs.FreeSpaceLossDb is null ? "ITU-R P.525" : Entered);
            }

            lines.Sum("isotropicPower", "Power in an isotropic antenna, free space", "dBW");
        }

        private void Receive()
        {
            if (inputs.ReceiveGainDbi is { } gainDbi)
            {
                lines.Term("receiveGain", "Gain, receiving antenna", gainDbi, "dBi", Entered)
                    .Term("receivePointing", "Pointing loss, receiving antenna", -inputs.ReceivePointingLossDb, "dB", Entered)
                    .Sum("receivedPower", "Received power", "dBW");
                receivedPowerDbw = new Found<double>(lines.TotalDb);
                if (inputs.SystemNoiseTemperatureK is { } temperatureK)
                {
                    cOverN0DbHz = new Found<double>(lines.TotalDb - Decibel.FromRatio(temperatureK) - PhysicalConstants.BoltzmannDbwPerKHz);
                }
            }
        }

        private void PowerMargin()
        {
            double required = inputs.RequiredReceivedPowerDbw!.Value; // asked only when it is given
            lines.Term("requiredReceivedPower", "Received power required", -required, "dBW", Entered);
            Margin();
        }

        private void NoiseDensityRatio()
        {
            if (inputs.GOverTDbPerK is { } gOverT)
            {
                lines.Term("gOverT", "G/T", gOverT, "dB/K", Entered)
                    .Term("receivePointing", "Pointing loss, receiving antenna", -inputs.ReceivePointingLossDb, "dB", Entered);
            }
            else if (inputs.SystemNoiseTemperatureK is { } temperatureK)
            {
                lines.Term("systemNoiseTemperature", "System noise temperature", -Decibel.FromRatio(temperatureK), "dBK", Entered);
            }

            lines.Term("boltzmann", "Boltzmann's constant", -PhysicalConstants.BoltzmannDbwPerKHz, "dBW/K/Hz", "CODATA 2018")
                .Sum("cOverN0", "C/N0", "dBHz");
            cOverN0DbHz = new Found<double>(lines.TotalDb);
        }

        private void Requirement()
        {
            if (inputs.BitRateBps is { } bitRateBps)
            {
                lines.Term("bitRate", "Information bit rate", -Decibel.FromRatio(bitRateBps), "dBHz", Entered).Sum("ebN0", "Eb/N0", "dB");
                ebN0Db = new Found<double>(lines.TotalDb);
            }
            else if (inputs.NoiseBandwidthHz is { } bandwidthHz)
            {
                lines.Term("noiseBandwidth", "Noise bandwidth", -Decibel.FromRatio(bandwidthHz), "dBHz", Entered).Sum("cOverN", "C/N", "dB");
                cOverNDb = new Found<double>(lines.TotalDb);
            }

            if (inputs.RequiredEbN0Db is { } requiredEbN0Db)
            {
                lines.Term("requiredEbN0", "Eb/N0 required", -requiredEbN0Db, "dB", Entered);
                Margin();
            }
            else if (inputs.RequiredCOverNDb is { } requiredCOverNDb)
            {
                lines.Term("requiredCOverN", "C/N required", -requiredCOverNDb, "dB", Entered);
                Margin();
            }
        }

        private void Margin()
        {
            lines.Term("implementationLoss", "Implementation loss", -inputs.ImplementationLossDb, "dB", Entered)
                .Sum("margin", "Margin", "dB");
            marginDb = new Found<double>(lines.TotalDb);
        }
    }
}
