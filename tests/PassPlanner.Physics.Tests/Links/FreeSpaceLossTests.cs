using CsCheck;
using PassPlanner.Physics.Links;
using PassPlanner.Tests;
using Xunit.Abstractions;
using static PassPlanner.Physics.Tests.Links.WorstError;

namespace PassPlanner.Physics.Tests.Links;

public class FreeSpaceLossTests(ITestOutputHelper output)
{
    private const double PrintedToFourPlacesDb = 0.00005;
    private const double PrintedToTwoPlacesDb = 0.005;
    private const double Exactly = 1e-9;

    [Fact]
    public void Free_space_loss_agrees_with_every_published_row()
    {
        var error = new WorstError(output, "radio/free-space-loss.csv", "dB");
        foreach (var row in ReferenceData.Rows("radio/free-space-loss.csv"))
        {
            double lossDb = FreeSpaceLoss.Db(Number(row["distance_km"]), Number(row["frequency_ghz"]) * 1e9);
            error.Check(Number(row["loss_db"]), lossDb, PrintedToFourPlacesDb, row["frequency_ghz"]);
        }

        error.Report(6);
        Assert.Equal(142.3, FreeSpaceLoss.Db(2140, 145.8e6), 1);
        Assert.InRange(FreeSpaceLoss.Db(2000, 437e6), 151.28 - PrintedToTwoPlacesDb, 151.28 + PrintedToTwoPlacesDb);
    }

    [Fact]
    public void Doubling_the_slant_range_costs_six_decibels() =>
        Gen.Select(Gen.Double[100, 1e6], Gen.Double[100e6, 40e9]).Sample((rangeKm, frequencyHz) =>
            Assert.Equal(6.0206, FreeSpaceLoss.Db(2 * rangeKm, frequencyHz) - FreeSpaceLoss.Db(rangeKm, frequencyHz), 4));

    [Fact]
    public void Power_flux_density_agrees_with_every_published_row()
    {
        var error = new WorstError(output, "radio/pfd-computed.csv", "dB");
        foreach (var row in ReferenceData.Rows("radio/pfd-computed.csv"))
        {
            double total = PowerFluxDensity.DbWPerM2(Number(row["eirp_dbw"]), Number(row["distance_m"]) / 1000);
            error.Check(Number(row["total_pfd_dbw_per_m2"]), total, PrintedToFourPlacesDb, row["eirp_dbw"]);
            double inBand = PowerFluxDensity.InBandwidthDbWPerM2(
                total, Number(row["occupied_bandwidth_hz"]), Number(row["reference_bandwidth_hz"]));
            error.Check(Number(row["pfd_in_reference_bandwidth_dbw_per_m2"]), inBand, PrintedToFourPlacesDb, row["eirp_dbw"]);
        }

        error.Report(6);
    }

    [Fact]
    public void A_carrier_narrower_than_the_reference_bandwidth_has_no_more_than_its_whole_flux_density() =>
        Assert.Equal(-120, PowerFluxDensity.InBandwidthDbWPerM2(-120, 1000, 4000));

    [Fact]
    public void Flux_density_and_isotropic_area_give_what_free_space_loss_gives() =>
        Gen.Select(Gen.Double[-10, 60], Gen.Double[100, 50000], Gen.Double[100e6, 40e9]).Sample((eirpDbw, rangeKm, frequencyHz) =>
        {
            double byFlux = PowerFluxDensity.DbWPerM2(eirpDbw, rangeKm) + PowerFluxDensity.IsotropicAreaDbM2(frequencyHz);
            Assert.InRange(byFlux - (eirpDbw - FreeSpaceLoss.Db(rangeKm, frequencyHz)), -Exactly, Exactly);
        });

    [Fact]
    public void A_doubled_power_is_three_decibels_and_fifteen_decibels_are_a_ratio_of_31_6()
    {
        Assert.Equal(3.01, Decibel.FromRatio(2), 2);
        Assert.Equal(31.6, Decibel.ToRatio(15), 1);
        Gen.Double[-200, 200].Sample(valueDb => Assert.InRange(Decibel.FromRatio(Decibel.ToRatio(valueDb)) - valueDb, -Exactly, Exactly));
    }

    [Theory]
    [InlineData(90, 0.5)]
    [InlineData(30, 1.0)]
    [InlineData(1, 28.6493)]
    [InlineData(0, 28.6493)]
    [InlineData(-3, 28.6493)]
    public void Zenith_loss_spreads_as_one_over_the_sine_down_to_one_degree(double elevationDeg, double lossDb) =>
        Assert.Equal(lossDb, ClearSkyLoss.Db(0.5, elevationDeg), 4);

    [Fact]
    public void A_receding_spacecraft_is_heard_low()
    {
        Assert.Equal(-191465.79, Doppler.ShiftHz(8.2e9, 7), 2);
        Assert.Equal(8.2e9 * (1 - (7 / 299792.458)) - 8.2e9, Doppler.ShiftHz(8.2e9, 7), 4);
        Assert.Equal(-2735.23, Doppler.RateHzPerS(8.2e9, 0.1), 2);
    }
}
