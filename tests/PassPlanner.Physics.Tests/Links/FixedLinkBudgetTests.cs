using CsCheck;
using PassPlanner.Physics.Antennas;
using PassPlanner.Physics.Constants;
using PassPlanner.Physics.Links;
using PassPlanner.Physics.Noise;
using PassPlanner.Tests;
using Xunit.Abstractions;
using static PassPlanner.Physics.Tests.Links.WorstError;

namespace PassPlanner.Physics.Tests.Links;

/// <summary>Published budgets, each from the document that tests/reference/radio/link-budgets.csv names.</summary>
public class FixedLinkBudgetTests(ITestOutputHelper output)
{
    private const double PrintedPrecisionDb = 0.1;
    private const double PrintedToTwoPlacesDb = 0.005;

    [Fact]
    public void Budget_B01_of_an_s_band_downlink_comes_out_as_published()
    {
        var sheet = new Sheet(output, "B01");
        FixedLinkBudget budget = FixedLinkBudget.Of(new FixedLinkInputs
        {
            FrequencyHz = sheet["frequency"] * 1e6,
            EirpDbw = sheet["satellite EIRP"] - 30,
            FreeSpaceLossDb = sheet["free space loss"],
            Losses = [new NamedLoss("depointing", sheet["depointing loss"])],
            ReceiveGainDbi = sheet["earth station antenna gain (5 m, 50 percent)"],
            SystemNoiseTemperatureK = sheet["system noise temperature"],
            BitRateBps = sheet["data rate"] * 1e6,
            RequiredEbN0Db = sheet["required Eb/N0"],
            ImplementationLossDb = sheet["demodulation losses"],
        });
        sheet.Check("C/N0", Value(budget.COverN0DbHz));
        sheet.Check("Eb/N0", Value(budget.EbN0Db));
        sheet.Check("margin", Value(budget.MarginDb));
        var dish = new TaperedAperturePattern(new TaperedApertureModel(5, efficiency: 0.5), sheet["frequency"] * 1e6);
        sheet.Check("earth station antenna gain (5 m, 50 percent)", dish.PeakGainDbi);
        sheet.Done(4, budget);
    }

    [Fact]
    public void Budget_B02_of_a_uhf_downlink_comes_out_as_published()
    {
        var sheet = new Sheet(output, "B02");
        FixedLinkBudget budget = FixedLinkBudget.Of(new FixedLinkInputs
        {
            FrequencyHz = sheet["frequency"] * 1e6,
            PowerW = Decibel.ToRatio(sheet["transmit power"] - 30),
            LineLossDb = sheet["transmit cable loss"],
            GainDbi = sheet["transmit antenna gain"],
            PointingLossDb = sheet["transmit pointing loss"],
            FreeSpaceLossDb = sheet["free space loss"],
            Losses =
            [
                new NamedLoss("atmosphere", sheet["atmospheric loss"]),
                new NamedLoss("polarisation", sheet["polarisation loss"]),
                new NamedLoss("receive cable", sheet["receive cable loss"]),
            ],
            ReceiveGainDbi = sheet["receive antenna gain"],
            ReceivePointingLossDb = sheet["receive pointing loss"],
            SystemNoiseTemperatureK = sheet["system noise temperature"],
            BitRateBps = sheet["data rate"],
            RequiredEbN0Db = sheet["required Eb/N0 with coding"],
        });
        sheet.Check("EIRP", Value(budget.EirpDbw) + 30);
        sheet.Check("received power", Value(budget.ReceivedPowerDbw) + 30, PrintedToTwoPlacesDb);
        sheet.Check("noise density", Value(budget.ReceivedPowerDbw) - Value(budget.COverN0DbHz));
        sheet.Check("Eb/N0", Value(budget.EbN0Db));
        sheet.Check("margin", Value(budget.MarginDb));
        sheet.Done(5, budget);
    }

    [Fact]
    public void Budget_B04_of_uhf_telemetry_comes_out_as_published()
    {
        var sheet = new Sheet(output, "B04");
        var receiver = new ComponentNoise(NoiseFigure.ToTemperatureK(sheet["receiver noise figure"]));
        FixedLinkBudget budget = FixedLinkBudget.Of(new FixedLinkInputs
        {
            FrequencyHz = sheet["frequency"] * 1e6,
            PowerW = Decibel.ToRatio(sheet["transmit power"]),
            GainDbi = sheet["transmit antenna gain"],
            SlantRangeKm = sheet["distance"],
            Losses = [new NamedLoss("polarisation", sheet["polarisation loss"])],
            ReceiveGainDbi = sheet["receive antenna gain"],
            SystemNoiseTemperatureK = receiver.AtTerminalK(sheet["antenna noise temperature (inferred)"], 0),
            BitRateBps = sheet["data rate"],
            RequiredEbN0Db = sheet["required Eb/N0 uncoded"] - sheet["coding gain"],
            ImplementationLossDb = sheet["implementation loss"],
        });
        sheet.Check("path loss", -budget.Budget.ValueDb("freeSpaceLoss"));
        sheet.Check("margin", Value(budget.MarginDb));
        sheet.Done(2, budget);
    }

    [Theory]
    [InlineData("B06", "antenna gain edge of coverage", "noise bandwidth (inferred)")]
    [InlineData("B07", "antenna gain", "noise bandwidth (inferred, 1 MHz)")]
    public void Budgets_B06_and_B07_of_geostationary_telemetry_come_out_as_published(string name, string gain, string bandwidth)
    {
        var sheet = new Sheet(output, name);
        FixedLinkBudget budget = FixedLinkBudget.Of(new FixedLinkInputs
        {
            FrequencyHz = sheet["frequency"] * 1e6,
            PowerW = Decibel.ToRatio(sheet["transmit power"]),
            LineLossDb = sheet["line losses"],
            GainDbi = sheet[gain],
            FreeSpaceLossDb = sheet["free space loss"],
            GOverTDbPerK = sheet["earth station G/T"],
            NoiseBandwidthHz = Decibel.ToRatio(sheet[bandwidth]),
            RequiredCOverNDb = sheet["required C/N"],
        });
        sheet.Check("EIRP", Value(budget.EirpDbw));
        sheet.Check("C/N", Value(budget.COverNDb));
        sheet.Check("margin", Value(budget.MarginDb));
        sheet.Done(3, budget);
    }

    [Fact]
    public void Budget_B11_of_a_command_uplink_by_flux_density_comes_out_as_published()
    {
        var sheet = new Sheet(output, "B11");
        FixedLinkBudget budget = FixedLinkBudget.Of(new FixedLinkInputs
        {
            FrequencyHz = sheet["frequency"] * 1e6,
            PowerW = Decibel.ToRatio(sheet["power to antenna"]),
            GainDbi = sheet["transmit antenna gain"],
            PowerFluxDensityDbWPerM2 = sheet["incident flux density"],
            Losses = [new NamedLoss("receive losses", sheet["receive losses"])],
            ReceiveGainDbi = sheet["satellite antenna gain"],
            SystemNoiseTemperatureK = Decibel.ToRatio(sheet["noise temperature"]),
            RequiredReceivedPowerDbw = sheet["threshold"],
        });
        double isotropicDbw = budget.Budget.ValueDb("isotropicPower");
        sheet.Check("EIRP", Value(budget.EirpDbw));
        sheet.Check("aperture factor lambda^2/4pi", budget.Budget.ValueDb("isotropicArea"));
        sheet.Check("isotropic power", isotropicDbw);
        sheet.Check("G/T (losses included)", Value(budget.COverN0DbHz) - isotropicDbw + PhysicalConstants.BoltzmannDbwPerKHz);
        sheet.Check("receiver input power", Value(budget.ReceivedPowerDbw));
        sheet.Check("margin", Value(budget.MarginDb));
        sheet.Done(6, budget);
    }

    [Fact]
    public void Range_and_free_space_loss_are_two_ways_to_say_the_same()
    {
        var byRange = new FixedLinkInputs { FrequencyHz = 8.2e9, SlantRangeKm = 1500, EirpDbw = 13, GOverTDbPerK = 25 };
        FixedLinkBudget first = FixedLinkBudget.Of(byRange);
        FixedLinkBudget second = FixedLinkBudget.Of(byRange with { SlantRangeKm = null, FreeSpaceLossDb = FreeSpaceLoss.Db(1500, 8.2e9) });
        Assert.Equal(Value(first.COverN0DbHz), Value(second.COverN0DbHz), 9);
        Assert.Equal(-121.5139, first.PowerFluxDensityDbWPerM2, 4); // radio/pfd-computed.csv, second row
        Assert.Equal(-121.5139, second.PowerFluxDensityDbWPerM2, 4);
        Assert.IsType<Missing<double>>(first.EbN0Db);
        Assert.IsType<Missing<double>>(first.MarginDb);
        Assert.IsType<Missing<double>>(first.ReceivedPowerDbw);
    }

    [Fact]
    public void Every_budget_adds_up_and_each_decibel_of_loss_takes_one_from_the_margin() =>
        Gen.Select(Gen.Double[-20, 40], Gen.Double[300, 4000], Gen.Double[0, 20], Gen.Double[-30, 40]).Sample((eirpDbw, rangeKm, lossDb, gOverT) =>
        {
            var clear = new FixedLinkInputs
            {
                FrequencyHz = 2.2e9, SlantRangeKm = rangeKm, EirpDbw = eirpDbw, GOverTDbPerK = gOverT, BitRateBps = 1e6, RequiredEbN0Db = 4,
            };
            FixedLinkBudget before = FixedLinkBudget.Of(clear);
            FixedLinkBudget after = FixedLinkBudget.Of(clear with { Losses = [new NamedLoss("rain", lossDb)] });
            before.Budget.CheckAddsUp();
            after.Budget.CheckAddsUp();
            Assert.InRange(Value(before.MarginDb) - Value(after.MarginDb) - lossDb, -1e-9, 1e-9);
            double byHand = eirpDbw - FreeSpaceLoss.Db(rangeKm, 2.2e9) + gOverT + 228.599 - 60 - 4;
            Assert.InRange(Value(before.MarginDb) - byHand, -0.001, 0.001);
        });

    [Fact]
    public void A_budget_that_does_not_add_up_is_found_out()
    {
        LinkBudget right = new LinkBudgetBuilder().Term("a", "A", 3, "dB", "test").Term("b", "B", -1, "dB", "test").Sum("c", "C", "dB").Build();
        right.CheckAddsUp();
        var wrong = new LinkBudget(right.Lines.Select(line => line.Id == "b" ? line with { ValueDb = -1.001 } : line));
        Assert.Contains("c is 2 dB", Assert.Throws<InvalidOperationException>(wrong.CheckAddsUp).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Missing_doubled_and_impossible_members_are_refused_by_name()
    {
        var whole = new FixedLinkInputs { FrequencyHz = 8.2e9, SlantRangeKm = 1500, EirpDbw = 13, GOverTDbPerK = 25 };
        Refused(whole with { FrequencyHz = 0 }, "frequencyHz");
        Refused(whole with { SlantRangeKm = 0 }, "slantRangeKm");
        Refused(whole with { SlantRangeKm = null }, "slantRangeKm");
        Refused(whole with { FreeSpaceLossDb = 170 }, "slantRangeKm");
        Refused(whole with { EirpDbw = null }, "eirpDbw");
        Refused(whole with { PowerW = 2 }, "eirpDbw");
        Refused(whole with { GainDbi = 6 }, "powerW");
        Refused(whole with { GOverTDbPerK = null }, "gOverTDbPerK");
        Refused(whole with { GOverTDbPerK = null, ReceiveGainDbi = 30 }, "gOverTDbPerK");
        Refused(whole with { SystemNoiseTemperatureK = 100 }, "gOverTDbPerK");
        Refused(whole with { RequiredEbN0Db = 4 }, "bitRateBps");
        Refused(whole with { RequiredReceivedPowerDbw = -140 }, "receiveGainDbi");
        Refused(whole with { Losses = [new NamedLoss("rain", double.NaN)] }, "losses.valueDb");

        static void Refused(FixedLinkInputs inputs, string member) =>
            Assert.Equal(member, Assert.ThrowsAny<ArgumentException>(() => FixedLinkBudget.Of(inputs)).ParamName);
    }

    private static double Value(Finding<double> finding) => Assert.IsType<Found<double>>(finding).Value;

    private sealed class Sheet
    {
        private readonly Dictionary<string, double> values;
        private readonly WorstError error;

        public Sheet(ITestOutputHelper output, string name)
        {
            values = ReferenceData.Rows("radio/link-budgets.csv")
                .Where(row => row["budget"] == name)
                .ToDictionary(row => row["item"], row => Number(row["value"]));
            error = new WorstError(output, "radio/link-budgets.csv, " + name, "dB");
        }

        public double this[string item] => values[item];

        public void Check(string item, double actual, double tolerance = PrintedPrecisionDb) =>
            error.Check(values[item], actual, tolerance, item);

        public void Done(int results, FixedLinkBudget budget)
        {
            budget.Budget.CheckAddsUp();
            error.Report(results);
        }
    }
}
