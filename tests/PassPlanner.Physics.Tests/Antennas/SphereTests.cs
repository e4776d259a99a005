using CsCheck;
using PassPlanner.Physics.Antennas;
using PassPlanner.Physics.Links;
using Xunit.Abstractions;

namespace PassPlanner.Physics.Tests.Antennas;

public class SphereTests(ITestOutputHelper output)
{
    private const double FrequencyHz = 8.2e9;
    private const double HalfAPercent = 0.005;
    private const double FiveHundredthsDb = 0.05;

    private static readonly Gen<AntennaPattern> AnyPattern = Gen.OneOf(
        Gen.Double[-10, 0].Select(gainDbi => (AntennaPattern)new IsotropicPattern(gainDbi)),
        Gen.Double[0.1, 1].Select(efficiency => (AntennaPattern)new HalfWaveDipolePattern(ohmicEfficiency: efficiency)),
        Gen.Double[12, 150].Select(widthDeg => (AntennaPattern)new GaussianBeamPattern(halfPowerBeamwidthDeg: widthDeg, floorDbi: -90)),
        Gen.Select(Gen.Double[0.12, 0.3], Gen.Double[0, 20], Gen.Int[1, 2]).Select((diameterM, taperDb, n) =>
            new TaperedApertureModel(diameterM, taperDb, n).At(FrequencyHz)),
        Gen.Double[-15, 8].Array[6].Select(gains => (AntennaPattern)new MeasuredPattern([new MeasuredCut(0, [0, 20, 47, 90, 131, 180], gains)])),
        Gen.Double[-15, 8].Array[16].Select(gains => (AntennaPattern)new MeasuredPattern(
            [.. Enumerable.Range(0, 4).Select(i => new MeasuredCut(i * 80, [0, 40, 95, 180], gains[(4 * i)..(4 * i + 4)]))])));

    /// <summary>A second way to integrate: equal steps of the cosine and of phi, gains as the links use them.</summary>
    [Fact]
    public void The_integral_of_any_directivity_over_the_sphere_is_four_pi()
    {
        double worst = 0;
        AnyPattern.Sample(pattern =>
        {
            double toDirectivityDb = PatternMetrics.Of(pattern, FrequencyHz).DirectivityDbi - pattern.PeakGainDbi;
            int phis = pattern.IsRotationallySymmetric ? 1 : 90;
            int rings = pattern.IsRotationallySymmetric ? 20000 : 2000;
            double sum = 0;
            for (int ring = 0; ring < rings; ring++)
            {
                double angle = Math.Acos(1 - (2 * (ring + 0.5) / rings));
                for (int i = 0; i < phis; i++)
                {
                    sum += Decibel.ToRatio(pattern.GainDbi(angle, 2 * Math.PI * (i + 0.5) / phis) + toDirectivityDb);
                }
            }

            double mean = sum / (rings * phis);
            worst = Math.Max(worst, Math.Abs(mean - 1));
            Assert.InRange(mean, 1 - HalfAPercent, 1 + HalfAPercent);
        }, iter: 40, threads: 1);
        output.WriteLine($"Measured: integral over 4 pi, worst departure from 1 is {worst:E2}");
    }

    [Fact]
    public void Percentiles_of_an_isotropic_antenna_are_its_gain()
    {
        Assert.Equal(-2, SphereStatistics.GainAtPercentileDbi(new IsotropicPattern(-2), 1));
        Assert.Equal(-2, SphereStatistics.GainAtPercentileDbi(new IsotropicPattern(-2), 99));
    }

    /// <summary>Directions with less gain are nearer to the wire: those within an angle g fill 1 - cos g of the sphere, both ends together.</summary>
    [Fact]
    public void Percentiles_of_a_dipole_are_those_of_its_closed_form() =>
        Gen.Double[5, 95].Sample(percentile =>
        {
            double cosine = 1 - (percentile / 100);
            double field = Math.Cos(Math.PI / 2 * cosine);
            double expectedDbi = 10 * Math.Log10(HalfWaveDipolePattern.Directivity * field * field / (1 - (cosine * cosine)));
            double foundDbi = SphereStatistics.GainAtPercentileDbi(new HalfWaveDipolePattern(), percentile);
            Assert.InRange(foundDbi - expectedDbi, -FiveHundredthsDb, FiveHundredthsDb);
        }, iter: 20);

    /// <summary>Directions with more gain fill a cap of (1 - cos angle) / 2 of the sphere.</summary>
    [Fact]
    public void Percentiles_of_a_beam_are_those_of_its_cap() =>
        Gen.Double[20, 99].Sample(percentile =>
        {
            var beam = new GaussianBeamPattern(halfPowerBeamwidthDeg: 90, floorDbi: -90);
            double angle = Math.Acos(1 - (2 * (1 - (percentile / 100))));
            double foundDbi = SphereStatistics.GainAtPercentileDbi(beam, percentile);
            Assert.InRange(foundDbi - beam.GainDbi(angle, 0), -FiveHundredthsDb, FiveHundredthsDb);
        }, iter: 20);

    [Theory]
    [InlineData(0)]
    [InlineData(100)]
    [InlineData(double.NaN)]
    public void A_percentile_that_is_none_is_refused(double percentile) =>
        Assert.Equal("percentile", Assert.Throws<ArgumentOutOfRangeException>(
            () => SphereStatistics.GainAtPercentileDbi(new IsotropicPattern(), percentile)).ParamName);
}
