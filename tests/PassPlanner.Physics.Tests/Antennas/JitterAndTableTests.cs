using CsCheck;
using PassPlanner.Physics.Antennas;
using PassPlanner.Physics.Links;
using Xunit.Abstractions;

namespace PassPlanner.Physics.Tests.Antennas;

public class JitterAndTableTests(ITestOutputHelper output)
{
    private const double OneMillionthDb = 1e-6;
    private const double OneThousandthDb = 0.001;
    private const double RoundingOfTwelveDb = 0.0035; // the pattern falls by 12 dB, the half power by 40 log10 2 = 12.041 dB
    private const double TableDb = 0.005;

    [Fact]
    public void The_closed_form_of_a_jittering_beam_is_the_one_of_the_definition() =>
        Gen.Select(Gen.Double[0.1, 5], Gen.Double[0, 1], Gen.Double[0, 0.6]).Sample((widthDeg, offsetWidths, jitterWidths) =>
        {
            var beam = new GaussianBeamPattern(40, widthDeg, -100);
            double k = 4 * Math.Log(2);
            double spread = 1 + (k * jitterWidths * jitterWidths);
            double expectedDb = 10 * Math.Log10(Math.Exp(-k * offsetWidths * offsetWidths / spread) / spread);
            double scale = double.DegreesToRadians(widthDeg);
            double foundDb = beam.MeanGainDbi(offsetWidths * scale, jitterWidths * scale) - 40;
            Assert.InRange(Math.Abs(foundDb - expectedDb), 0, (RoundingOfTwelveDb * Math.Abs(expectedDb)) + OneMillionthDb);
        });

    [Fact]
    public void Quadrature_over_jitter_agrees_with_the_closed_form()
    {
        double worst = 0;
        Gen.Select(Gen.Double[0.1, 10], Gen.Double[0, 1], Gen.Double[0.001, 1]).Sample((widthDeg, offsetWidths, jitterWidths) =>
        {
            var beam = new GaussianBeamPattern(40, widthDeg, -100);
            double scale = double.DegreesToRadians(widthDeg);
            double exact = beam.MeanGainDbi(offsetWidths * scale, jitterWidths * scale);
            double found = new JitterAveragedPattern(new Disguised(beam), Math.Min(0.2, jitterWidths * scale)).GainDbi(offsetWidths * scale, 0.3);
            worst = Math.Max(worst, Math.Abs(found - exact));
            Assert.InRange(found - exact, -OneMillionthDb, OneMillionthDb);
        }, threads: 1);
        output.WriteLine($"Measured: quadrature against closed form, worst {worst:E2} dB");
    }

    [Fact]
    public void Jitter_fills_the_first_null_and_lowers_the_peak_of_a_dish()
    {
        AntennaPattern dish = new TaperedApertureModel(3.7, 11).At(8.2e9);
        var shaken = new JitterAveragedPattern(dish, double.DegreesToRadians(0.1));
        var still = new JitterAveragedPattern(dish, 0);
        double nullRad = Math.Asin(165.0 / 180 * Math.PI / 2 * dish.AngularScaleRad);
        Assert.Equal(dish.GainDbi(0.004, 0), still.GainDbi(0.004, 0));
        Assert.True(shaken.GainDbi(0, 0) < dish.PeakGainDbi);
        Assert.True(shaken.GainDbi(nullRad, 0) > dish.GainDbi(nullRad, 0) + 10);
        Assert.Equal(shaken.PeakGainDbi, shaken.GainDbi(0, 0));
    }

    [Fact]
    public void A_pattern_that_depends_on_phi_is_averaged_over_both_angles()
    {
        var dipole = new JitterAveragedPattern(new HalfWaveDipolePattern(), 0.1);
        Assert.True(dipole.GainDbi(Math.PI / 2, 0) > -30);
        Assert.InRange(dipole.GainDbi(1, Math.PI / 2), 2.10, 2.151);
        Assert.Equal(dipole.GainDbi(0.5, 0.4), dipole.GainDbi(0.5, -0.4), 9);
    }

    [Fact]
    public void A_table_keeps_the_error_that_it_states()
    {
        AntennaPattern[] patterns =
        [
            new TaperedApertureModel(3.7, 11, efficiency: 0.62, surfaceErrorRmsMm: 0.5).At(8.2e9),
            new TaperedApertureModel(7.3, 16, 2, blockageDiameterM: 0.8).At(26.25e9),
            new GaussianBeamPattern(34, 2.8),
            new MeasuredPattern([new MeasuredCut(0, [0, 30, 60, 75], [4, 5, 6, 1])]),
            new IsotropicPattern(),
        ];
        foreach (AntennaPattern pattern in patterns)
        {
            var table = new PatternTable(pattern);
            output.WriteLine($"Measured: {pattern.GetType().Name}: main-beam error {table.MainBeamErrorDb:E2} dB");
            Assert.InRange(table.MainBeamErrorDb, 0, TableDb);
            for (double angle = 0; angle < pattern.AngularScaleRad; angle += pattern.AngularScaleRad / 777)
            {
                if (pattern.GainDbi(angle, 0) > pattern.GainDbi(0, 0) - 20)
                {
                    Assert.InRange(table.GainDbi(angle) - pattern.GainDbi(angle, 0), -table.MainBeamErrorDb - OneThousandthDb, table.MainBeamErrorDb + OneThousandthDb);
                }
            }

            Assert.Equal(pattern.GainDbi(Math.PI, 0), table.GainDbi(Math.PI), 9);
            Assert.Equal(pattern.PeakGainDbi, table.PeakGainDbi);
        }
    }

    [Fact]
    public void A_table_over_jitter_agrees_with_the_mean_that_it_tabulates()
    {
        double jitterRad = double.DegreesToRadians(0.05);
        AntennaPattern dish = new TaperedApertureModel(3.7, 11).At(8.2e9);
        var mean = new JitterAveragedPattern(dish, jitterRad);
        var table = new PatternTable(dish, jitterRad);
        for (double angleDeg = 0; angleDeg < 0.5; angleDeg += 0.0173)
        {
            double angle = double.DegreesToRadians(angleDeg);
            Assert.InRange(table.GainDbi(angle) - mean.GainDbi(angle, 0), -TableDb, TableDb);
        }

        var beam = new GaussianBeamPattern(34, 2.8);
        Assert.Equal(beam.MeanGainDbi(0.01, jitterRad), new PatternTable(beam, jitterRad).GainDbi(0.01), 3);
    }

    [Fact]
    public void The_table_of_a_pattern_that_depends_on_phi_holds_its_worst_phi()
    {
        var dipole = new HalfWaveDipolePattern();
        var table = new PatternTable(dipole);
        Assert.Equal(dipole.GainDbi(0.7, 0), table.GainDbi(0.7), 3);
    }

    [Fact]
    public void Looking_up_a_table_allocates_nothing()
    {
        var table = new PatternTable(new TaperedApertureModel(3.7, 11).At(8.2e9), 0.0005);
        double sum = table.GainDbi(0.001) + table.GainDbi(2); // each part of the table is there from its first look-up on
        long before = GC.GetAllocatedBytesForCurrentThread();
        for (int i = 0; i < 1000; i++)
        {
            sum += table.GainDbi(i * 0.003);
        }

        Assert.Equal(before, GC.GetAllocatedBytesForCurrentThread());
        Assert.True(double.IsFinite(sum));
    }

    [Fact]
    public void Jitter_that_is_no_small_angle_is_refused() =>
        Assert.Equal("jitterRmsRad", Assert.Throws<ArgumentOutOfRangeException>(() => new PatternTable(new IsotropicPattern(), 1)).ParamName);

    /// <summary>A beam that does not show that it is Gaussian, so that its mean is taken by quadrature.</summary>
    private sealed class Disguised(GaussianBeamPattern beam) : AntennaPattern
    {
        public override double PeakGainDbi => beam.PeakGainDbi;

        public override bool IsRotationallySymmetric => true;

        public override double OhmicEfficiency => beam.OhmicEfficiency;

        public override double AngularScaleRad => beam.AngularScaleRad;

        protected override double EvaluateDbi(double offAxisRad, double phiRad) => beam.GainDbi(offAxisRad, phiRad);
    }
}
