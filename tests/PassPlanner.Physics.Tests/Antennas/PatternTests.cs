using CsCheck;
using PassPlanner.Physics.Antennas;
using PassPlanner.Physics.Links;
using PassPlanner.Tests;
using Xunit.Abstractions;

namespace PassPlanner.Physics.Tests.Antennas;

public class PatternTests(ITestOutputHelper output)
{
    private const double PrintedToThreePlacesDb = 0.0005;
    private const double ExactlyDb = 1e-9;
    private const double OneHundredthDb = 0.01;
    private const double FrequencyHz = 437e6;

    [Fact]
    public void A_half_wave_dipole_has_the_published_directivity()
    {
        double publishedDbi = WorstErrorRow("half-wave dipole");
        var dipole = new HalfWaveDipolePattern();
        PatternMetrics metrics = PatternMetrics.Of(dipole, FrequencyHz);
        output.WriteLine($"Measured: dipole integrated {metrics.DirectivityDbi:F6} dBi, closed form {dipole.PeakGainDbi:F6}, published {publishedDbi}");
        Assert.InRange(metrics.DirectivityDbi - publishedDbi, -PrintedToThreePlacesDb, PrintedToThreePlacesDb);
        Assert.InRange(dipole.PeakGainDbi - metrics.DirectivityDbi, -1e-6, 1e-6);
        Assert.InRange(Decibel.FromRatio(1.643) - metrics.DirectivityDbi, 0, OneHundredthDb);
        Assert.Equal(78.08, Assert.IsType<Found<double>>(metrics.HalfPowerBeamwidthDeg).Value, 2); // Balanis: 78 degrees
        Assert.IsType<Missing<double>>(PatternMetrics.Of(dipole, FrequencyHz, Math.PI / 2).HalfPowerBeamwidthDeg);
    }

    [Fact]
    public void A_dipole_shines_on_its_boresight_and_all_round_its_wire_but_not_along_it()
    {
        var dipole = new HalfWaveDipolePattern();
        Assert.Equal(dipole.PeakGainDbi, dipole.GainDbi(0, 0.7), 9);
        Assert.Equal(dipole.PeakGainDbi, dipole.GainDbi(1.2, Math.PI / 2), 9);
        Assert.Equal(dipole.PeakGainDbi, dipole.GainDbi(Math.PI, 0), 9);
        Assert.Equal(AntennaPattern.MinimumGainDbi, dipole.GainDbi(Math.PI / 2, 0));
        Assert.Equal(AntennaPattern.MinimumGainDbi, dipole.GainDbi(Math.PI / 2, Math.PI));
        double cosine = Math.Cos(Math.PI / 2 * Math.Cos(Math.PI / 3));
        double at60Deg = 10 * Math.Log10(cosine * cosine / 0.75);
        Assert.Equal(dipole.PeakGainDbi + at60Deg, dipole.GainDbi(Math.PI / 6, 0), 9);
    }

    [Fact]
    public void Gain_is_directivity_less_ohmic_loss()
    {
        Assert.Equal(2.1509 - 1, new HalfWaveDipolePattern(ohmicEfficiency: Math.Pow(10, -0.1)).PeakGainDbi, 4);
        Assert.Equal(0.5, new HalfWaveDipolePattern(gainDbi: new HalfWaveDipolePattern(ohmicEfficiency: 0.5).PeakGainDbi).OhmicEfficiency, 9);
        Gen.Select(Gen.Double[1, 120], Gen.Double[0.2, 1]).Sample((widthDeg, efficiency) =>
        {
            var beam = new GaussianBeamPattern(halfPowerBeamwidthDeg: widthDeg, ohmicEfficiency: efficiency);
            PatternMetrics metrics = PatternMetrics.Of(beam, FrequencyHz);
            Assert.InRange(metrics.DirectivityDbi + Decibel.FromRatio(efficiency) - beam.PeakGainDbi, -ExactlyDb, ExactlyDb);
            Assert.InRange(metrics.Efficiency - efficiency, -ExactlyDb, ExactlyDb);
        }, iter: 50);
    }

    [Fact]
    public void An_effective_area_gives_the_gain_back() =>
        Gen.Select(Gen.Double[-10, 60], Gen.Double[100e6, 40e9]).Sample((gainDbi, frequencyHz) =>
        {
            double areaM2 = PatternMetrics.Of(new IsotropicPattern(gainDbi), frequencyHz).EffectiveAreaM2;
            double wavelengthM = 299792458 / frequencyHz;
            Assert.InRange((10 * Math.Log10(4 * Math.PI * areaM2 / (wavelengthM * wavelengthM))) - gainDbi, -ExactlyDb, ExactlyDb);
        }, iter: 20);

    [Fact]
    public void A_gaussian_beam_is_twelve_decibels_down_at_its_width_and_thirty_at_its_floor()
    {
        var beam = new GaussianBeamPattern(34, 2.8);
        Assert.Equal(34 - 12, beam.GainDbi(double.DegreesToRadians(2.8), 0), 9);
        Assert.Equal(34 - 3, beam.GainDbi(double.DegreesToRadians(1.4), 2), 9);
        Assert.Equal(4, beam.GainDbi(1, 0));
        Assert.Equal(-7, new GaussianBeamPattern(34, 2.8, -7).GainDbi(1, 0));
    }

    [Fact]
    public void Gain_and_width_of_a_gaussian_beam_follow_from_each_other() =>
        Gen.Double[0.2, 120].Sample(widthDeg =>
        {
            double gainDbi = new GaussianBeamPattern(halfPowerBeamwidthDeg: widthDeg).PeakGainDbi;
            Assert.InRange(new GaussianBeamPattern(gainDbi).HalfPowerBeamwidthDeg / widthDeg, 1 - 1e-6, 1 + 1e-6);
            Assert.InRange(new GaussianBeamPattern(gainDbi).OhmicEfficiency, 1 - 1e-6, 1 + 1e-6);
        }, iter: 30);

    [Fact]
    public void A_narrow_gaussian_beam_has_the_directivity_of_its_closed_form()
    {
        double k = 1.2 * Math.Log(10) / Math.Pow(double.DegreesToRadians(1), 2);
        Assert.Equal(10 * Math.Log10(4 * k), new GaussianBeamPattern(halfPowerBeamwidthDeg: 1).PeakGainDbi, 3);
    }

    [Fact]
    public void An_isotropic_antenna_has_neither_beam_nor_sidelobe()
    {
        PatternMetrics metrics = PatternMetrics.Of(new IsotropicPattern(-3), FrequencyHz);
        Assert.Equal(0, metrics.DirectivityDbi, 9);
        Assert.Equal(-3, metrics.PeakGainDbi);
        Assert.Equal(0.5012, metrics.Efficiency, 4);
        Assert.IsType<Missing<double>>(metrics.HalfPowerBeamwidthDeg);
        Assert.IsType<Missing<Sidelobe>>(metrics.FirstSidelobe);
        Assert.IsType<Missing<Sidelobe>>(PatternMetrics.Of(new GaussianBeamPattern(10, 60), FrequencyHz).FirstSidelobe);
    }

    [Fact]
    public void Impossible_patterns_are_refused_by_name()
    {
        Refused(() => new IsotropicModel(double.NaN), "gainDbi");
        Refused(() => new HalfWaveDipoleModel(3), "gainDbi");
        Refused(() => new HalfWaveDipoleModel(1, 0.5), "ohmicEfficiency");
        Refused(() => new HalfWaveDipoleModel(ohmicEfficiency: 0), "ohmicEfficiency");
        Refused(() => new GaussianBeamModel(), "gainDbi");
        Refused(() => new GaussianBeamModel(-20), "gainDbi");
        Refused(() => new GaussianBeamModel(10, 0), "halfPowerBeamwidthDeg");
        Refused(() => new GaussianBeamModel(10, 60, 11), "floorDbi");
        Refused(() => new GaussianBeamModel(10, 60, 0, 0.5), "ohmicEfficiency");
        Refused(() => new IsotropicModel().At(0), "frequencyHz");

        static void Refused(Func<object> make, string member) =>
            Assert.Equal(member, Assert.ThrowsAny<ArgumentException>(make).ParamName);
    }

    [Fact]
    public void Models_give_the_same_pattern_at_every_frequency_that_does_not_matter()
    {
        PatternModel[] models = [new IsotropicModel(1), new HalfWaveDipoleModel(1.5), new GaussianBeamModel(12, 40)];
        foreach (PatternModel model in models)
        {
            Assert.Equal(model.At(437e6).GainDbi(0.4, 1), model.At(8.2e9).GainDbi(0.4, 1));
        }
    }

    private static double WorstErrorRow(string antenna) =>
        PassPlanner.Physics.Tests.Links.WorstError.Number(
            ReferenceData.Rows("radio/simple-antennas.csv").Single(x => x["antenna"] == antenna)["value"]);
}
