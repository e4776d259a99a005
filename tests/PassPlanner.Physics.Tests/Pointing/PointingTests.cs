using CsCheck;
using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Pointing;

namespace PassPlanner.Physics.Tests.Pointing;

public class PointingTests
{
    private const double Exactly = 1e-9;

    // On the x axis at 7,000 km, flying along +y; the station on the surface below, a little ahead and to the side.
    private static readonly TemeState Spacecraft = new(new Vector3D(7000, 0, 0), new Vector3D(0.1, 7.5, 0));
    private static readonly Vector3D Below = new(6378, 0, 0);
    private static readonly AntennaMounting Nadir = new(new Vector3D(0, 0, 1));

    private static readonly Gen<Vector3D> AnyVector =
        Gen.Select(Gen.Double[-1, 1], Gen.Double[-1, 1], Gen.Double[-1, 1]).Select((x, y, z) => new Vector3D(x, y, z)).Where(v => v.Norm > 0.1);

    [Fact]
    public void A_nadir_antenna_sees_the_point_below_it_on_its_boresight()
    {
        AntennaDirection seen = Nadir.DirectionTo(new NadirAttitude(), Spacecraft, Below);
        Assert.Equal(0, seen.OffAxisRad, 9);
    }

    [Fact]
    public void A_station_ahead_lies_at_phi_zero_and_one_to_the_right_at_plus_ninety()
    {
        AntennaDirection ahead = Nadir.DirectionTo(new NadirAttitude(), Spacecraft, Below + new Vector3D(0, 622, 0));
        Assert.Equal(45, double.RadiansToDegrees(ahead.OffAxisRad), 9);
        Assert.Equal(0, double.RadiansToDegrees(ahead.PhiRad), 9);

        // Body +Y is +Z x +X = (-x) x (+y) = -z: to the right of the track, seen from above with the head up.
        AntennaDirection right = Nadir.DirectionTo(new NadirAttitude(), Spacecraft, Below + new Vector3D(0, 0, -622));
        Assert.Equal(45, double.RadiansToDegrees(right.OffAxisRad), 9);
        Assert.Equal(90, double.RadiansToDegrees(right.PhiRad), 9);
    }

    [Fact]
    public void A_nadir_spacecraft_has_x_along_the_velocity_made_level()
    {
        BodyAxes axes = new NadirAttitude().Axes(Spacecraft, Below);
        Near(new Vector3D(0, 1, 0), axes.X);
        Near(new Vector3D(0, 0, -1), axes.Y);
        Near(new Vector3D(-1, 0, 0), axes.Z);
    }

    [Fact]
    public void Body_axes_are_right_handed_and_of_length_one() =>
        Gen.Select(AnyVector, AnyVector).Where((z, nearX) => z.Cross(nearX).Norm > 1e-3).Sample((z, nearX) =>
        {
            BodyAxes axes = BodyAxes.Along(z, nearX);
            Near(axes.Z, axes.X.Cross(axes.Y));
            Assert.InRange(axes.X.Dot(axes.Z), -Exactly, Exactly);
            Assert.InRange(axes.X.Norm - 1, -Exactly, Exactly);
            Assert.InRange(axes.Z.AngleToRad(z), 0, 1e-7);
            Assert.True(axes.X.Dot(nearX) > -Exactly);
        });

    [Fact]
    public void Axes_exist_even_when_the_velocity_is_straight_up()
    {
        foreach (double aside in new[] { 0, 1e-12, 1e-9, 1e-5 })
        {
            BodyAxes axes = BodyAxes.Along(new Vector3D(-7000, 0, 0), new Vector3D(3, aside, 0));
            Near(axes.Z, axes.X.Cross(axes.Y));
            Near(new Vector3D(-1, 0, 0), axes.Z);
            Assert.InRange(axes.X.Dot(axes.Z), -Exactly, Exactly);
        }
    }

    [Fact]
    public void A_spacecraft_that_tracks_the_station_keeps_it_on_body_z() =>
        AnyVector.Sample(direction =>
        {
            Vector3D station = Spacecraft.PositionKm + (direction * 1000);
            Assert.InRange(Nadir.DirectionTo(new StationTrackingAttitude(), Spacecraft, station).OffAxisRad, 0, 1e-7);
            var sideways = new AntennaMounting(new Vector3D(1, 0, 0));
            Assert.InRange(sideways.DirectionTo(new StationTrackingAttitude(), Spacecraft, station).OffAxisRad - (Math.PI / 2), -1e-7, 1e-7);
        });

    [Fact]
    public void An_inertial_quaternion_turns_the_axes_as_documented()
    {
        // 90 degrees about inertial z: body +X comes to inertial +y.
        double half = Math.Sqrt(0.5);
        BodyAxes axes = new InertialAttitude(new Quaternion(0, 0, half, half)).Axes(Spacecraft, Below);
        Near(new Vector3D(0, 1, 0), axes.X);
        Near(new Vector3D(-1, 0, 0), axes.Y);
        Near(new Vector3D(0, 0, 1), axes.Z);
        Near(new Vector3D(0, -1, 0), axes.ToBody(new Vector3D(1, 0, 0)));
        var identity = new InertialAttitude(new Quaternion(0, 0, 0, 1));
        Near(new Vector3D(0, 0, 1), identity.Axes(Spacecraft, Below).Z);
    }

    [Fact]
    public void A_quaternion_turns_by_its_angle_about_its_axis() =>
        Gen.Select(AnyVector, Gen.Double[-3, 3]).Sample((axis, angle) =>
        {
            Vector3D n = axis.Unit * Math.Sin(angle / 2);
            BodyAxes axes = new InertialAttitude(new Quaternion(n.X, n.Y, n.Z, Math.Cos(angle / 2))).Axes(Spacecraft, Below);
            Near(axes.Z, axes.X.Cross(axes.Y));
            Near(axis.Unit, axes.ToBody(axis.Unit)); // the axis itself stays where it was
            double cosine = (axes.X.X + axes.Y.Y + axes.Z.Z - 1) / 2;
            Assert.InRange(cosine - Math.Cos(angle), -Exactly, Exactly);
        });

    [Fact]
    public void An_inertial_antenna_that_looks_away_sees_the_station_behind_it()
    {
        var attitude = new InertialAttitude(new Quaternion(0, 0, 0, 1));
        var outward = new AntennaMounting(new Vector3D(1, 0, 0));
        Assert.Equal(Math.PI, outward.DirectionTo(attitude, Spacecraft, Below).OffAxisRad, 9);
    }

    [Fact]
    public void The_reference_is_body_x_or_body_y_when_x_is_the_boresight()
    {
        Near(new Vector3D(1, 0, 0), Nadir.Reference);
        Near(new Vector3D(0, 1, 0), new AntennaMounting(new Vector3D(1, 0, 0)).Reference);
        Near(new Vector3D(0, 1, 0), new AntennaMounting(new Vector3D(-3, 0, 0)).Reference);
        Near(new Vector3D(1, 0, 0), new AntennaMounting(new Vector3D(0, 2, 0), new Vector3D(0, 1, 0)).Reference);
        Near(new Vector3D(0, 1, 0), new AntennaMounting(new Vector3D(0, 0, 1), new Vector3D(0, 5, 5)).Reference);
    }

    [Fact]
    public void A_direction_survives_the_way_through_antenna_axes() =>
        Gen.Select(AnyVector, AnyVector, AnyVector).Where((boresight, reference, _) => boresight.Cross(reference).Norm > 0.01).Sample((boresight, reference, body) =>
        {
            var mounting = new AntennaMounting(boresight, reference);
            AntennaDirection seen = mounting.DirectionOf(body);
            Vector3D y = mounting.Boresight.Cross(mounting.Reference);
            Vector3D back = (mounting.Boresight * Math.Cos(seen.OffAxisRad))
                + (mounting.Reference * (Math.Sin(seen.OffAxisRad) * Math.Cos(seen.PhiRad)))
                + (y * (Math.Sin(seen.OffAxisRad) * Math.Sin(seen.PhiRad)));
            Near(body.Unit, back);
        });

    [Fact]
    public void Looking_for_a_station_allocates_nothing()
    {
        ControlledAttitude[] laws = [new NadirAttitude(), new StationTrackingAttitude(), new InertialAttitude(new Quaternion(0, 0, 0, 1))];
        double sum = laws.Sum(law => Nadir.DirectionTo(law, Spacecraft, Below).OffAxisRad);
        long before = GC.GetAllocatedBytesForCurrentThread();
        for (int i = 0; i < 300; i++)
        {
            sum += Nadir.DirectionTo(laws[i % 3], Spacecraft, Below).OffAxisRad;
        }

        Assert.Equal(before, GC.GetAllocatedBytesForCurrentThread());
        Assert.True(double.IsFinite(sum));
    }

    [Fact]
    public void An_antenna_updated_each_second_lags_by_half_a_second_of_sky()
    {
        Assert.Equal(0.05 + 0.35, TrackingError.PointingErrorDeg(0.05, 0.7, 1), 12);
        Assert.Equal(0.05, TrackingError.PointingErrorDeg(0.05, 0.7, 0), 12);
    }

    [Fact]
    public void Sky_rate_is_the_speed_across_over_the_distance() =>
        Assert.Equal(double.RadiansToDegrees(7.5 / 600), TrackingError.SkyRateDegPerS(new Vector3D(0, 0, 600), new Vector3D(7.5, 0, 3)), 12);

    [Fact]
    public void Impossible_directions_are_refused_by_name()
    {
        Assert.Equal("boresight", Assert.Throws<ArgumentOutOfRangeException>(() => new AntennaMounting(default)).ParamName);
        Assert.Equal("reference", Assert.Throws<ArgumentOutOfRangeException>(() => new AntennaMounting(new Vector3D(0, 0, 1), new Vector3D(double.NaN, 0, 0))).ParamName);
        Assert.Equal("quaternion", Assert.Throws<ArgumentOutOfRangeException>(() => new InertialAttitude(default)).ParamName);
        Assert.Equal("percentile", Assert.Throws<ArgumentOutOfRangeException>(() => new UncontrolledAttitude(0)).ParamName);
        Assert.Equal(10, new UncontrolledAttitude(10).Percentile);
    }

    private static void Near(Vector3D expected, Vector3D actual) =>
        Assert.InRange((expected - actual).Norm, 0, Exactly);
}
