using PassPlanner.Physics.Antennas;
using PassPlanner.Physics.Constants;
using PassPlanner.Physics.Links;
using PassPlanner.Physics.Noise;
using PassPlanner.Physics.Pointing;
using PassPlanner.Planning.Links;
using PassPlanner.Planning.Profiles;

namespace PassPlanner.Planning.Tests.Links;

public class LinkChainTests
{
    private const double SumDb = 1e-9;
    private static readonly PassTrack Track = LinkScene.Track();

    [Fact]
    public void The_terms_of_every_second_add_up_to_its_carrier_to_noise_density()
    {
        foreach (LinkChain chain in new[] { LinkScene.Downlink(), LinkScene.Uplink() })
        {
            Assert.All(LinkScene.Samples(chain, Track), s => Assert.Equal(
                s.EirpDbw - s.FreeSpaceLossDb - s.AtmosphericLossDb - chain.PolarisationLossDb + s.GOverTDbPerK - PhysicalConstants.BoltzmannDbwPerKHz,
                s.COverN0DbHz,
                SumDb));
        }
    }

    public static TheoryData<int> Noises => new() { 0, 1, 2 };

    [Theory]
    [MemberData(nameof(Noises))]
    public void The_lines_of_a_budget_add_up_to_the_margin_of_the_second(int noise)
    {
        SystemNoise[] kinds = [new ComponentNoise(60, 290, 12), new SystemTemperatureNoise(130), new GOverTNoise(26)];
        foreach (LinkChain chain in new[] { LinkScene.Downlink(chain: LinkScene.Receive with { Noise = kinds[noise] }), LinkScene.Uplink() })
        {
            LinkSample[] samples = LinkScene.Samples(chain, Track);
            for (int i = 0; i < samples.Length; i += 41)
            {
                for (int waveform = 0; waveform < chain.Ladder.Waveforms.Count; waveform++)
                {
                    LinkBudget budget = PassBudget.Of(chain, samples[i], Track.Look[i], waveform);
                    budget.CheckAddsUp();
                    Assert.Equal(chain.Ladder.MarginDb(waveform, samples[i].COverN0DbHz), budget.ValueDb("margin"), SumDb);
                    Assert.All(budget.Lines, line => Assert.False(string.IsNullOrWhiteSpace(line.Source)));
                }
            }
        }
    }

    [Fact]
    public void G_over_T_entered_and_the_temperature_that_it_implies_give_the_same_link()
    {
        double peakDbi = LinkScene.Downlink().GroundPeakGainDbi;
        LinkSample[] entered = LinkScene.Samples(LinkScene.Downlink(chain: LinkScene.Receive with { Noise = new GOverTNoise(26) }), Track);
        LinkSample[] implied = LinkScene.Samples(LinkScene.Downlink(chain: LinkScene.Receive with { Noise = new SystemTemperatureNoise(Decibel.ToRatio(peakDbi - 26)) }), Track);
        Assert.All(entered.Zip(implied), pair => Assert.Equal(pair.First.COverN0DbHz, pair.Second.COverN0DbHz, SumDb));
    }

    [Fact]
    public void Twice_the_power_is_three_decibels_at_every_second()
    {
        LinkSample[] one = LinkScene.Samples(LinkScene.Downlink(), Track);
        LinkSample[] two = LinkScene.Samples(LinkScene.Downlink(LinkScene.Transmitter with { PowerW = 4 }), Track);
        Assert.All(one.Zip(two), pair => Assert.Equal(10 * Math.Log10(2), pair.Second.COverN0DbHz - pair.First.COverN0DbHz, SumDb));
    }

    [Fact]
    public void Twice_the_range_costs_six_decibels()
    {
        LinkSample[] samples = LinkScene.Samples(LinkScene.Downlink(), Track);
        for (int i = 1; i < samples.Length; i++)
        {
            double expectedDb = 20 * Math.Log10(Track.Look[i].SlantRangeKm / Track.Look[0].SlantRangeKm);
            Assert.Equal(expectedDb, samples[i].FreeSpaceLossDb - samples[0].FreeSpaceLossDb, SumDb);
        }
    }

    [Fact]
    public void Bias_and_jitter_cost_what_the_closed_form_says()
    {
        const double gainDbi = 34;
        const double widthDeg = 2.8;
        const double biasDeg = 0.4;
        const double jitterDeg = 0.3;

        // exp(-k b^2 / (1 + k j^2)) / (1 + k j^2), k such that the beam falls by 12 dB (theta / width)^2.
        double k = 12 * Math.Log(10) / 10 / (widthDeg * widthDeg);
        double spread = 1 + (k * jitterDeg * jitterDeg);
        double expectedDb = 10 * Math.Log10(Math.Exp(-k * biasDeg * biasDeg / spread) / spread);
        LinkChain chain = LinkScene.Downlink(
            chain: LinkScene.Receive with { Pattern = new GaussianBeamModel(gainDbi, widthDeg) },
            antenna: LinkScene.Antenna with { Pointing = new PointingErrors(biasDeg, jitterDeg, 0) });
        Assert.All(LinkScene.Samples(chain, Track), s => Assert.Equal(gainDbi + expectedDb, s.GroundGainDbi, SumDb));
    }

    [Fact]
    public void An_antenna_that_is_updated_seldom_is_off_by_half_of_what_the_sky_moves()
    {
        LinkSample[] samples = LinkScene.Samples(LinkScene.Downlink(), Track);
        for (int i = 0; i < samples.Length; i++)
        {
            Assert.Equal(0.05 + (Track.SkyRateDegPerS[i] / 2), samples[i].PointingErrorDeg, 1e-12);
        }
    }

    [Fact]
    public void A_fixed_antenna_is_off_by_the_angle_to_the_spacecraft()
    {
        LinkSample[] samples = LinkScene.Samples(
            LinkScene.Downlink(antenna: LinkScene.Antenna with { FixedDirection = new FixedDirection(0, 90), Pointing = default }), Track);
        for (int i = 0; i < samples.Length; i++)
        {
            Assert.Equal(90 - Track.Look[i].ElevationDeg, samples[i].PointingErrorDeg, 1e-9);
        }
    }

    [Fact]
    public void A_spacecraft_that_tracks_the_station_points_its_peak_at_it()
    {
        LinkSample[] samples = LinkScene.Samples(LinkScene.Downlink(attitude: new StationTrackingAttitude()), Track);
        Assert.All(samples, s => Assert.Equal(0, s.SpacecraftOffAxisDeg, 1e-6));
        Assert.All(samples, s => Assert.Equal(6, s.SpacecraftGainDbi, 1e-9));
    }

    [Fact]
    public void A_spacecraft_that_points_down_sees_the_station_at_the_nadir_angle_of_the_triangle()
    {
        LinkSample[] samples = LinkScene.Samples(LinkScene.Downlink(), Track);
        for (int i = 0; i < samples.Length; i += 20)
        {
            // Law of sines in the triangle of the Earth's centre, the station and the spacecraft, by geocentric zenith distance.
            double centreKm = Track.SpacecraftTeme[i].PositionKm.Norm;
            double stationKm = Track.StationTemeKm[i].Norm;
            double rangeKm = Track.Look[i].SlantRangeKm;
            double cosine = ((rangeKm * rangeKm) + (centreKm * centreKm) - (stationKm * stationKm)) / (2 * rangeKm * centreKm);
            Assert.Equal(double.RadiansToDegrees(Math.Acos(cosine)), samples[i].SpacecraftOffAxisDeg, 1e-6);
        }
    }

    [Fact]
    public void An_uncontrolled_spacecraft_has_the_gain_of_its_percentile_throughout()
    {
        var pattern = new HalfWaveDipoleModel();
        double expectedDbi = SphereStatistics.GainAtPercentileDbi(pattern.At(8.2e9), 20);
        LinkSample[] samples = LinkScene.Samples(LinkScene.Downlink(LinkScene.Transmitter with { Pattern = pattern }, attitude: new UncontrolledAttitude(20)), Track);
        Assert.All(samples, s => Assert.Equal(expectedDbi, s.SpacecraftGainDbi));
    }

    [Fact]
    public void What_was_not_entered_for_the_atmosphere_is_said_in_the_budget()
    {
        LinkChain chain = LinkScene.Downlink(chain: LinkScene.Receive with { ClearSkyZenithLossDb = null });
        LinkSample sample = LinkScene.Samples(chain, Track)[0];
        BudgetLine line = PassBudget.Of(chain, sample, Track.Look[0], 0).Lines.Single(l => l.Id == "atmosphericLoss");
        Assert.Equal(0, line.ValueDb);
        Assert.Contains("not entered", line.Source, StringComparison.Ordinal);
    }

    [Fact]
    public void Evaluating_a_pass_allocates_nothing()
    {
        LinkChain chain = LinkScene.Downlink();
        var columns = new LinkColumns(Track.Count);
        chain.Evaluate(Track, columns);
        long before = GC.GetAllocatedBytesForCurrentThread();
        chain.Evaluate(Track, columns);
        Assert.Equal(before, GC.GetAllocatedBytesForCurrentThread());
    }

    [Fact]
    public void Links_are_paired_by_frequency_downlinks_first()
    {
        var spacecraft = new Spacecraft
        {
            Id = "a",
            Name = "A",
            Revision = 1,
            CatalogNumber = 0,
            Attitude = new NadirAttitude(),
            Transmitters = [LinkScene.Transmitter, LinkScene.Transmitter with { Id = "other", FrequencyHz = 8.5e9 }],
            Receivers = [LinkScene.Receiver],
        };
        var station = new Station
        {
            Id = "s",
            Name = "S",
            Revision = 1,
            Position = LinkScene.Place,
            Mask = PassPlanner.Planning.Passes.HorizonMask.Default,
            Antennas = [LinkScene.Antenna],
        };
        Assert.Equal(
            [(LinkDirection.Downlink, "x-tx", "x-rx"), (LinkDirection.Uplink, "s-rx", "s-tx")],
            Link.Between(spacecraft, station).Select(l => (l.Direction, l.Radio.Id, l.Chain.Id)));
    }
}
