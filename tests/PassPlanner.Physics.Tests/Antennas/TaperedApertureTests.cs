using CsCheck;
using PassPlanner.Physics.Antennas;
using PassPlanner.Physics.Links;
using PassPlanner.Physics.Tests.Links;
using PassPlanner.Tests;
using Xunit.Abstractions;
using static PassPlanner.Physics.Tests.Links.WorstError;

namespace PassPlanner.Physics.Tests.Antennas;

public class TaperedApertureTests(ITestOutputHelper output)
{
    private const double PrintedToFourPlaces = 0.00005;
    private const double PrintedToTwoPlaces = 0.005;

    // The column was read off a grid of about 0.0015 in u: its uniform row has 139.73 where the first zero of J1
    // (3.8317) gives 139.76. The nulls of that row are held to the exact zero below.
    private const double GridOfTheNullColumn = 0.055;
    private const double FirstZeroOfJ1 = 3.8317059702075123;
    private const double PrintedToThreePlacesDb = 0.0005;
    private const double ExactlyDb = 1e-9;

    // At 2,000 wavelengths the sine of the first lobes' angles is the angle itself to 1e-6.
    private const double FrequencyHz = 30e9;
    private const double DiameterM = 2000 * 299792458.0 / FrequencyHz;
    private const double DegreesToFactor = 2000;

    [Fact]
    public void Tapers_agree_with_every_published_row()
    {
        var efficiency = new WorstError(output, "radio/circular-aperture-tapers.csv, efficiency", "");
        var width = new WorstError(output, "radio/circular-aperture-tapers.csv, half-power width", "deg D/lambda");
        var sidelobe = new WorstError(output, "radio/circular-aperture-tapers.csv, first sidelobe", "dB");
        var nulls = new WorstError(output, "radio/circular-aperture-tapers.csv, width between nulls", "deg D/lambda");
        foreach (var row in ReferenceData.Rows("radio/circular-aperture-tapers.csv"))
        {
            string name = row["taper"] + " " + row["edge_taper_db"];
            var model = new TaperedApertureModel(DiameterM, -Number(row["edge_taper_db"]), Math.Max(1, (int)Number(row["n"])));
            AntennaPattern pattern = model.At(FrequencyHz);
            PatternMetrics metrics = PatternMetrics.Of(pattern, FrequencyHz);
            efficiency.Check(Number(row["taper_efficiency"]), model.Efficiency, PrintedToFourPlaces, name);
            double widthDeg = Assert.IsType<Found<double>>(metrics.HalfPowerBeamwidthDeg).Value;
            width.Check(Number(row["hpbw_factor_deg_times_D_over_lambda"]), widthDeg * DegreesToFactor, PrintedToTwoPlaces, name);
            Sidelobe first = Assert.IsType<Found<Sidelobe>>(metrics.FirstSidelobe).Value;
            sidelobe.Check(-Number(row["first_sidelobe_db"]), first.BelowPeakDb, PrintedToTwoPlaces, name);
            double nullDeg = 2 * NullDeg(pattern, widthDeg / 2, first.AngleDeg);
            nulls.Check(Number(row["first_null_full_width_factor_deg"]), nullDeg * DegreesToFactor, GridOfTheNullColumn, name);
            if (model.EdgeTaperDb == 0)
            {
                Assert.Equal(double.RadiansToDegrees(2 * FirstZeroOfJ1 / Math.PI), nullDeg * DegreesToFactor, 3);
            }
        }

        efficiency.Report(9);
        width.Report(9);
        sidelobe.Report(9);
        nulls.Report(9);
    }

    [Fact]
    public void Dishes_of_a_known_efficiency_have_the_published_gain()
    {
        var error = new WorstError(output, "radio/simple-antennas.csv, paraboloids", "dB");
        (string Antenna, double DiameterM, double FrequencyHz, double Efficiency)[] dishes =
        [
            ("paraboloid 3.7 m at 8.20 GHz efficiency 0.60", 3.7, 8.2e9, 0.60),
            ("paraboloid 7.3 m at 26.25 GHz efficiency 0.58", 7.3, 26.25e9, 0.58),
        ];
        foreach ((string antenna, double diameterM, double frequencyHz, double efficiency) in dishes)
        {
            var row = ReferenceData.Rows("radio/simple-antennas.csv").Single(x => x["antenna"] == antenna);
            double gainDbi = new TaperedApertureModel(diameterM, efficiency: efficiency).At(frequencyHz).PeakGainDbi;
            error.Check(Number(row["value"]), gainDbi, PrintedToThreePlacesDb, antenna);
        }

        error.Report(2);
    }

    [Fact]
    public void Surface_error_costs_what_ruze_says_in_every_row_and_is_on_top_of_an_entered_efficiency()
    {
        var error = new WorstError(output, "radio/ruze-loss.csv", "dB");
        foreach (var row in ReferenceData.Rows("radio/ruze-loss.csv"))
        {
            double surfaceMm = Number(row["rms_surface_error_mm"]);
            double frequencyHz = Number(row["frequency_ghz"]) * 1e9;
            double lossDb = RuzeLoss.Db(surfaceMm, frequencyHz);
            error.Check(Number(row["gain_loss_db"]), lossDb, PrintedToFourPlaces, row["frequency_ghz"]);
            AntennaPattern smooth = new TaperedApertureModel(3.7, efficiency: 0.62).At(frequencyHz);
            AntennaPattern rough = new TaperedApertureModel(3.7, efficiency: 0.62, surfaceErrorRmsMm: surfaceMm).At(frequencyHz);
            Assert.InRange(smooth.PeakGainDbi - rough.PeakGainDbi - lossDb, -ExactlyDb, ExactlyDb);
            Assert.InRange(smooth.GainDbi(0.003, 0) - rough.GainDbi(0.003, 0) - lossDb, -ExactlyDb, ExactlyDb);
        }

        error.Report(4);
    }

    [Fact]
    public void The_closed_form_is_the_integral_of_the_taper_over_the_aperture() =>
        Gen.Select(Gen.Double[0, 30], Gen.Int[1, 2], Gen.Double[0, 0.4], Gen.Double[0, 40]).Sample((taperDb, n, blocked, u) =>
        {
            const int Steps = 4000;
            double edge = Math.Pow(10, -taperDb / 20);
            double sum = 0;
            for (int i = 0; i < Steps; i++)
            {
                double r = blocked + ((1 - blocked) * (i + 0.5) / Steps);
                double field = edge + ((1 - edge) * Math.Pow(1 - (r * r), n));
                sum += field * MathNet.Numerics.SpecialFunctions.BesselJ(0, u * r) * r * (1 - blocked) / Steps;
            }

            // The relative field is the ratio to the axis; the axis is checked at u = 0 by the same sum.
            double onAxis = 0;
            for (int i = 0; i < Steps; i++)
            {
                double r = blocked + ((1 - blocked) * (i + 0.5) / Steps);
                onAxis += (edge + ((1 - edge) * Math.Pow(1 - (r * r), n))) * r * (1 - blocked) / Steps;
            }

            var model = new TaperedApertureModel(DiameterM, taperDb, n, blockageDiameterM: blocked * DiameterM);
            AntennaPattern pattern = model.At(FrequencyHz);
            double offAxisRad = Math.Asin(u / (Math.PI * 2000));
            double field2 = Decibel.ToRatio(pattern.GainDbi(offAxisRad, 0) - pattern.PeakGainDbi);
            Assert.InRange(Math.Sqrt(field2) - Math.Abs(sum / onAxis), -2e-5, 2e-5);
        }, iter: 60);

    [Fact]
    public void A_blocked_middle_costs_the_square_of_the_field_that_is_left_and_raises_the_first_sidelobe()
    {
        var open = new TaperedApertureModel(3.7, 0);
        var blocked = new TaperedApertureModel(3.7, 0, blockageDiameterM: 0.74);
        Assert.Equal(0.96 * 0.96, blocked.Efficiency / open.Efficiency, 9);
        double lobeOpen = Lobe(open);
        double lobeBlocked = Lobe(blocked);
        Assert.InRange(lobeOpen - lobeBlocked, 1, 3);

        static double Lobe(TaperedApertureModel model) =>
            Assert.IsType<Found<Sidelobe>>(PatternMetrics.Of(model.At(8.2e9), 8.2e9).FirstSidelobe).Value.BelowPeakDb;
    }

    [Fact]
    public void A_taper_fitted_to_an_efficiency_or_a_width_gives_it_back() =>
        Gen.Select(Gen.Double[0.5, 25], Gen.Int[1, 2], Gen.Double[1, 12], Gen.Double[4e9, 30e9]).Sample((taperDb, n, diameterM, frequencyHz) =>
        {
            var model = new TaperedApertureModel(diameterM, taperDb, n);
            Assert.InRange(TaperFit.FromEfficiency(n, model.Efficiency) - taperDb, -1e-6, 1e-6);
            double widthDeg = Assert.IsType<Found<double>>(PatternMetrics.Of(model.At(frequencyHz), frequencyHz).HalfPowerBeamwidthDeg).Value;
            Assert.InRange(TaperFit.FromHalfPowerBeamwidth(n, diameterM, frequencyHz, widthDeg) - taperDb, -1e-4, 1e-4);
            var fitted = new TaperedApertureModel(
                diameterM, pedestalExponent: n, halfPowerBeamwidthDeg: widthDeg, halfPowerBeamwidthFrequencyHz: frequencyHz);
            Assert.InRange(fitted.EdgeTaperDb - taperDb, -1e-4, 1e-4);
        }, iter: 20);

    [Fact]
    public void Doubling_the_frequency_of_a_dish_adds_six_decibels_and_halves_the_beam()
    {
        var dish = new TaperedApertureModel(3.7, efficiency: 0.6);
        PatternMetrics low = PatternMetrics.Of(dish.At(8e9), 8e9);
        PatternMetrics high = PatternMetrics.Of(dish.At(16e9), 16e9);
        Assert.Equal(6.0206, high.PeakGainDbi - low.PeakGainDbi, 4);
        double ratio = Assert.IsType<Found<double>>(low.HalfPowerBeamwidthDeg).Value / Assert.IsType<Found<double>>(high.HalfPowerBeamwidthDeg).Value;
        Assert.Equal(2, ratio, 3);
    }

    [Fact]
    public void Directivity_by_integration_is_the_taper_efficiency_of_the_aperture()
    {
        const double ScalarTheoryDb = 0.05;
        foreach ((double diameterM, double frequencyHz) in new[] { (3.7, 8.2e9), (7.3, 26.25e9), (1.8, 2.25e9) })
        {
            var model = new TaperedApertureModel(diameterM, 11, efficiency: 0.6);
            double taperOnly = new TaperedApertureModel(diameterM, 11).At(frequencyHz).PeakGainDbi;
            PatternMetrics metrics = PatternMetrics.Of(model.At(frequencyHz), frequencyHz);
            output.WriteLine($"Measured: {diameterM} m at {frequencyHz / 1e9} GHz: integrated {metrics.DirectivityDbi:F4} dBi, aperture theory {taperOnly:F4} dBi");
            Assert.InRange(metrics.DirectivityDbi - taperOnly, -ScalarTheoryDb, ScalarTheoryDb);
            Assert.InRange(10 * Math.Log10(metrics.Efficiency / model.OhmicEfficiency), -ScalarTheoryDb, ScalarTheoryDb);
        }
    }

    [Fact]
    public void Behind_the_dish_the_gain_is_the_documented_one()
    {
        AntennaPattern dish = new TaperedApertureModel(3.7).At(8.2e9);
        Assert.Equal(-20, dish.GainDbi(Math.PI / 2, 0));
        Assert.Equal(-20, dish.GainDbi(Math.PI, 1));
    }

    [Fact]
    public void Impossible_apertures_are_refused_by_name()
    {
        Refused(() => new TaperedApertureModel(0), "diameterM");
        Refused(() => new TaperedApertureModel(double.NaN), "diameterM");
        Refused(() => new TaperedApertureModel(3.7, -1), "edgeTaperDb");
        Refused(() => new TaperedApertureModel(3.7, 11, 3), "pedestalExponent");
        Refused(() => new TaperedApertureModel(3.7, 11, efficiency: 0.95), "efficiency");
        Refused(() => new TaperedApertureModel(3.7, 11, efficiency: 0.6, ohmicEfficiency: 0.9), "ohmicEfficiency");
        Refused(() => new TaperedApertureModel(3.7, 11, blockageDiameterM: 3), "blockageDiameterM");
        Refused(() => new TaperedApertureModel(3.7, 11, surfaceErrorRmsMm: -1), "surfaceErrorRmsMm");
        Refused(() => new TaperedApertureModel(3.7, halfPowerBeamwidthDeg: 1), "halfPowerBeamwidthDeg");
        Refused(() => new TaperedApertureModel(3.7, 11).At(0), "frequencyHz");
        Refused(() => new TaperedApertureModel(0.3, 11).At(437e6), "diameterM");
        Refused(() => TaperFit.FromEfficiency(1, 0.5), "taperEfficiency");
        Refused(() => TaperFit.FromHalfPowerBeamwidth(1, 3.7, 8.2e9, 3), "halfPowerBeamwidthDeg");
        string message = Assert.Throws<ArgumentOutOfRangeException>(() => new TaperedApertureModel(0)).Message;
        Assert.StartsWith("diameterM is 0; it must be above 0 and at most 100 m", message, StringComparison.Ordinal);

        static void Refused(Func<object> make, string member) =>
            Assert.Equal(member, Assert.ThrowsAny<ArgumentException>(make).ParamName);
    }

    private static double NullDeg(AntennaPattern pattern, double fromDeg, double toDeg)
    {
        for (int i = 0; i < 100; i++)
        {
            double third = (toDeg - fromDeg) / 3;
            (fromDeg, toDeg) = At(fromDeg + third) < At(toDeg - third) ? (fromDeg, toDeg - third) : (fromDeg + third, toDeg);
        }

        return (fromDeg + toDeg) / 2;

        double At(double angleDeg) => pattern.GainDbi(double.DegreesToRadians(angleDeg), 0);
    }
}
