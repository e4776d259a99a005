using CsCheck;
using PassPlanner.Physics.Tests.Links;
using PassPlanner.Physics.Waveforms;
using PassPlanner.Tests;
using Xunit.Abstractions;
using static PassPlanner.Physics.Tests.Links.WorstError;

namespace PassPlanner.Physics.Tests.Waveforms;

public class WaveformTests(ITestOutputHelper output)
{
    private const double PrintedToThreePlacesDb = 0.0005;
    private const double PrintedToTwoPlacesDb = 0.005;
    private const double PrintedToSixPlaces = 0.0000005;
    private const double SixFiguresRelative = 5e-6;

    private static readonly Dictionary<string, Modulation> Names = new()
    {
        ["BPSK/QPSK/OQPSK/MSK coherent"] = Modulation.CoherentPsk,
        ["DBPSK differentially coherent"] = Modulation.DifferentialBpsk,
        ["BFSK noncoherent orthogonal"] = Modulation.NoncoherentFsk,
        ["BFSK coherent orthogonal"] = Modulation.CoherentFsk,
        ["8PSK Gray, nearest-neighbour bound"] = Modulation.EightPsk,
        ["16QAM Gray, nearest-neighbour bound"] = Modulation.SixteenQam,
        ["DE-BPSK (differentially encoded, coherent)"] = Modulation.DifferentiallyEncodedBpsk,
    };

    [Fact]
    public void Bit_error_rates_agree_with_every_row_of_theory()
    {
        var rate = new WorstError(output, "radio/ber-theory.csv, rate relative to the printed one", "");
        var required = new WorstError(output, "radio/ber-theory.csv, required Eb/N0", "dB");
        foreach (var row in ReferenceData.Rows("radio/ber-theory.csv"))
        {
            Modulation modulation = Names[row["modulation"]];
            double ebN0Db = Number(row["ebn0_db"]);
            double bitErrorRate = Number(row["ber"]);
            if (row["row_kind"] == "ber_at_ebn0")
            {
                rate.Check(1, BitErrorRate.Of(modulation, ebN0Db) / bitErrorRate, SixFiguresRelative, row["modulation"]);
            }
            else
            {
                required.Check(ebN0Db, BitErrorRate.RequiredEbN0Db(modulation, bitErrorRate), PrintedToThreePlacesDb, row["modulation"]);
            }
        }

        rate.Report(25);
        required.Report(14);
    }

    [Fact]
    public void Required_eb_n0_is_the_inverse_of_the_bit_error_rate() =>
        Gen.Select(Gen.Int[0, 6].Select(i => (Modulation)i), Gen.Double[-12, -1.5]).Sample((modulation, exponent) =>
        {
            double wanted = Math.Pow(10, exponent);
            double found = BitErrorRate.Of(modulation, BitErrorRate.RequiredEbN0Db(modulation, wanted));
            Assert.InRange(found / wanted, 1 - 1e-6, 1 + 1e-6);
        });

    [Fact]
    public void Dvb_s2_modcods_agree_with_every_published_row()
    {
        var efficiency = new WorstError(output, "radio/dvbs2-modcods.csv, efficiency", "bit/symbol");
        var threshold = new WorstError(output, "radio/dvbs2-modcods.csv, Eb/N0", "dB");
        var rows = ReferenceData.Rows("radio/dvbs2-modcods.csv");
        foreach (var row in rows)
        {
            string name = row["modulation"] + " " + row["code_rate"];
            DvbS2Modcod modcod = PublishedWaveforms.DvbS2.Single(x => x.Modulation == row["modulation"] && x.CodeRate == row["code_rate"]);
            Assert.Equal(Number(row["kbch_bits"]), modcod.KbchBits);
            Assert.Equal(Number(row["bits_per_symbol"]), modcod.BitsPerSymbol);
            Assert.Equal(Number(row["esn0_ideal_db"]), modcod.EsN0Db);
            efficiency.Check(Number(row["spectral_efficiency_no_pilots_bit_per_symbol"]), modcod.SpectralEfficiencyBitPerSymbol, PrintedToSixPlaces, name);
            threshold.Check(Number(row["ebn0_equivalent_db"]), modcod.EbN0Db, PrintedToTwoPlacesDb, name);
            PublishedWaveform entry = PublishedWaveforms.All.Single(x => x.Name == "DVB-S2 " + name);
            Assert.Equal(modcod.EbN0Db, entry.RequiredEbN0Db);
        }

        Assert.Equal(rows.Count, PublishedWaveforms.DvbS2.Count);
        efficiency.Report(14);
        threshold.Report(14);
    }

    [Theory]
    [InlineData("RS(255,223) alone, bit error rate", "1e-06", "BPSK, RS(255,223)")]
    [InlineData("RS(255,239) alone, bit error rate", "1e-05", "BPSK, RS(255,239)")]
    [InlineData("convolutional (7,1/2) G1=171 G2=133, soft Viterbi, unquantised", "1e-06", "BPSK, convolutional (7,1/2)")]
    [InlineData("concatenated (7,1/2)+RS(255,223) I=5", "1e-06", "BPSK, convolutional (7,1/2) + RS(255,223), depth 5")]
    [InlineData("turbo k=8920 r=1/2", "0.0001", "BPSK, turbo 1/2, 8920 bits")]
    [InlineData("turbo k=8920 r=1/6", "0.0001", "BPSK, turbo 1/6, 8920 bits")]
    [InlineData("LDPC AR4JA k=1024 r=1/2", "0.0001", "BPSK, LDPC 1/2, 1024 bits")]
    [InlineData("LDPC C2 (8160,7136)", "1e-06", "BPSK, LDPC (8160,7136)")]
    public void Library_thresholds_are_the_ones_of_the_table_and_say_when_they_are_from_memory(string code, string errorRate, string name)
    {
        var row = ReferenceData.Rows("radio/coding-thresholds.csv").Single(x => x["code"] == code && x["error_rate"] == errorRate);
        PublishedWaveform entry = PublishedWaveforms.All.Single(x => x.Name == name);
        Assert.Equal(Number(row["required_ebn0_db"]), entry.RequiredEbN0Db);
        Assert.Equal(row["kind"].StartsWith("memory", StringComparison.Ordinal), entry.IsFromMemory);
        Assert.Equal(entry.IsFromMemory, entry.Source.StartsWith("from memory", StringComparison.Ordinal));
        string[] rate = row["rate"].Split('/');
        Assert.Equal(Number(rate[0]) / Number(rate[1]), entry.SpectralEfficiencyBitPerSymbol!.Value, 12); // these entries all fix BPSK
        Assert.Contains(Number(errorRate) == 1e-4 ? "1e-4" : Number(errorRate) == 1e-5 ? "1e-5" : "1e-6", entry.ErrorCriterion, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(1e-4, 8.40)]
    [InlineData(1e-6, 10.53)]
    public void Uncoded_bpsk_needs_what_the_threshold_table_says(double bitErrorRate, double requiredEbN0Db) =>
        Assert.InRange(
            BitErrorRate.RequiredEbN0Db(Modulation.CoherentPsk, bitErrorRate), requiredEbN0Db - PrintedToTwoPlacesDb, requiredEbN0Db + PrintedToTwoPlacesDb);

    [Fact]
    public void Every_library_entry_makes_a_waveform_and_has_a_name_of_its_own()
    {
        Assert.All(PublishedWaveforms.All, entry => Assert.Equal(1e6, entry.At(1e6, 1.5).BitRateBps));
        Assert.Equal(PublishedWaveforms.All.Count, PublishedWaveforms.All.Select(entry => entry.Name).Distinct().Count());
    }

    [Fact]
    public void Margin_is_what_is_left_over_requirement_and_loss_and_a_doubled_rate_costs_three_decibels()
    {
        var slow = new Waveform("QPSK 1/2", 25e6, 1.05, 1.5);
        Assert.Equal(80 - (10 * Math.Log10(25e6)) - 1.05 - 1.5, slow.MarginDb(80), 9);
        var fast = new Waveform("QPSK 1/2", 50e6, 1.05, 1.5);
        Assert.Equal(3.0103, slow.MarginDb(80) - fast.MarginDb(80), 4);
    }

    [Fact]
    public void Impossible_waveforms_are_refused_by_name()
    {
        Refused(() => new Waveform("x", 0, 4), "bitRateBps");
        Refused(() => new Waveform("x", 1e6, double.NaN), "requiredEbN0Db");
        Refused(() => new Waveform("x", 1e6, 4, -1), "implementationLossDb");
        Refused(() => new Waveform("x", 1e6, 4, 1, 1.1), "frameEfficiency");
        Refused(() => new Waveform("x", 1e6, 4, 1, 1, 0), "occupiedBandwidthHz");
        Refused(() => new Waveform(" ", 1e6, 4), "name");
        Refused(() => BitErrorRate.RequiredEbN0Db(Modulation.CoherentPsk, 0), "bitErrorRate");

        static void Refused(Func<object> make, string member) =>
            Assert.Equal(member, Assert.ThrowsAny<ArgumentException>(make).ParamName);
    }
}
