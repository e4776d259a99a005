using CsCheck;
using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Time;

namespace PassPlanner.Physics.Tests.Frames;

public sealed class FrameTests
{
    private const double OneMicrometreKm = 1e-9;
    private const double OneTenthOfAMillimetreM = 1e-4;
    private const double MicrodegreeDeg = 1e-6;
    private const double NanodegreeDeg = 1e-9;

    private static readonly Gen<GeodeticPosition> Places =
        from latitude in Gen.Double[-89.999, 89.999]
        from longitude in Gen.Double[-179.99, 179.99]
        from height in Gen.Double[-500.0, 4.0e7]
        select new GeodeticPosition(latitude, longitude, height);

    [Fact]
    public void Mean_sidereal_time_matches_the_test_value_of_the_standards_library()
    {
        // ERFA 2.0, t_erfa_c.c, t_gmst82: 2006-01-01T00:00 UT1, to 1e-12 rad.
        double gmst = EarthRotation.Gmst82Rad(new JulianDateUt1(2453736.5, 0.0));
        Assert.Equal(1.754174981860675096, gmst, 1e-12);
    }

    [Fact]
    public void A_state_can_be_printed()
        => Assert.Equal(
            "EcefState { PositionKm = (1, 2.5, -3), VelocityKmPerS = (0, 0, 0) }",
            new EcefState(new Vector3D(1.0, 2.5, -3.0), default).ToString());

    [Fact]
    public void A_turn_to_Earth_fixed_axes_and_back_returns_the_state()
    {
        Gen.Select(Gen.Double[-40000.0, 40000.0].Array[6], Gen.Long[0, 40000]).Sample((values, days) =>
        {
            JulianDateUt1 ut1 = new UtcInstant(days * TimeSpan.TicksPerDay).AddSeconds(values[0]).ToUt1(0.1);
            var state = new TemeState(new(values[0], values[1], values[2]), new(values[3] / 4000, values[4] / 4000, values[5] / 4000));
            TemeState back = EarthRotation.ToTeme(EarthRotation.ToEcef(state, ut1), ut1);
            Assert.True((back.PositionKm - state.PositionKm).Norm < OneMicrometreKm);
            Assert.True((back.VelocityKmPerS - state.VelocityKmPerS).Norm < OneMicrometreKm);
        });
    }

    [Fact]
    public void A_point_that_stands_in_Earth_fixed_axes_moves_with_the_rotation_in_TEME()
    {
        TemeState state = EarthRotation.ToTeme(new EcefState(new(6378.137, 0, 0), default), new JulianDateUt1(2459000.5, 0.3));
        Assert.Equal(0.46510, state.VelocityKmPerS.Norm, 4);
        Assert.True(Math.Abs(state.PositionKm.Dot(state.VelocityKmPerS)) < OneMicrometreKm);
    }

    [Fact]
    public void Geodetic_positions_survive_the_way_to_Earth_fixed_axes_and_back()
        => Places.Sample(place =>
        {
            GeodeticPosition back = Wgs84.ToGeodetic(Wgs84.ToEcefKm(place));
            Assert.True(Math.Abs(back.LatitudeDeg - place.LatitudeDeg) < NanodegreeDeg, $"{back} {place}");
            Assert.True(Math.Abs(back.LongitudeDeg - place.LongitudeDeg) < NanodegreeDeg, $"{back} {place}");
            Assert.True(Math.Abs(back.HeightM - place.HeightM) < OneTenthOfAMillimetreM, $"{back} {place}");
        });

    [Fact]
    public void A_spacecraft_along_a_direction_is_seen_in_that_direction()
        => Gen.Select(Gen.Double[-90.0, 90.0], Gen.Double[-180.0, 360.0], Gen.Double[0.0, 359.999], Gen.Double[-89.0, 89.0], Gen.Double[100.0, 40000.0])
            .Sample((latitude, longitude, azimuth, elevation, range) =>
            {
                var frame = new TopocentricFrame(new GeodeticPosition(latitude, longitude, 250.0));
                Vector3D direction = frame.UnitVector(azimuth, elevation);
                LookAngles look = frame.Look(new EcefState(frame.PositionKm + (direction * range), direction * 3.0));
                Assert.True(Math.Abs(Math.IEEERemainder(look.AzimuthDeg - azimuth, 360.0)) < MicrodegreeDeg);
                Assert.True(look.AzimuthDeg is >= 0.0 and < 360.0);
                Assert.Equal(elevation, look.ElevationDeg, 1e-8);
                Assert.Equal(range, look.SlantRangeKm, 1e-8);
                Assert.Equal(3.0, look.RangeRateKmPerS, 1e-10);
                Assert.Equal(Math.Sin(look.ElevationDeg * Math.PI / 180), frame.SinElevation(frame.PositionKm + (direction * range)), 1e-10);
            });

    [Theory]
    [InlineData(90.1, 0.0, 0.0, "LatitudeDeg")]
    [InlineData(0.0, 361.0, 0.0, "LongitudeDeg")]
    [InlineData(0.0, 0.0, double.NaN, "HeightM")]
    public void A_station_outside_its_ranges_is_refused_by_name(double latitudeDeg, double longitudeDeg, double heightM, string name)
    {
        var error = Assert.Throws<ArgumentOutOfRangeException>(() => new TopocentricFrame(new(latitudeDeg, longitudeDeg, heightM)));
        Assert.Equal(name, error.ParamName);
    }
}
