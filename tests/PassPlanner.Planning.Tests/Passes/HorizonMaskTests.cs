using CsCheck;
using PassPlanner.Planning.Passes;

namespace PassPlanner.Planning.Tests.Passes;

public sealed class HorizonMaskTests
{
    private static readonly HorizonMask Slope = new([new(90, 8), new(0, 5), new(270, 2)]);

    [Theory]
    [InlineData(0, 5)]
    [InlineData(45, 6.5)]
    [InlineData(90, 8)]
    [InlineData(180, 5)]
    [InlineData(270, 2)]
    [InlineData(315, 3.5)]
    [InlineData(359.999999999, 5)]
    [InlineData(360, 5)]
    public void The_mask_is_linear_between_points_and_wraps_through_north(double azimuthDeg, double elevationDeg)
        => Assert.Equal(elevationDeg, Slope.ElevationDegAt(azimuthDeg), 9);

    [Fact]
    public void A_mask_without_a_point_at_north_wraps_too()
    {
        var mask = new HorizonMask([new(10, 4), new(350, 2)]);
        Assert.Equal(3.0, mask.ElevationDegAt(0), 9);
        Assert.Equal(3.5, mask.ElevationDegAt(5), 9);
        Assert.Equal(2.5, mask.ElevationDegAt(355), 9);
        Assert.Equal(3.0, mask.ElevationDegAt(180), 9);
    }

    [Fact]
    public void One_point_is_a_constant_and_the_default_is_five_degrees()
    {
        Gen.Double[0.0, 359.9].Sample(azimuthDeg =>
        {
            Assert.Equal(7.5, new HorizonMask([new(123, 7.5)]).ElevationDegAt(azimuthDeg));
            Assert.Equal(5.0, HorizonMask.Default.ElevationDegAt(azimuthDeg));
        });
        Assert.True(HorizonMask.Default.IsConstant);
        Assert.False(Slope.IsConstant);
        Assert.Equal((2.0, 8.0), (Slope.MinimumDeg, Slope.MaximumDeg));
    }

    [Fact]
    public void Bounds_over_a_span_hold_every_azimuth_in_it()
        => Gen.Select(
            Gen.Select(Gen.Double[0.0, 359.99], Gen.Double[-5.0, 30.0]).Array[1, 12],
            Gen.Double[0.0, 359.99],
            Gen.Double[0.0, 360.0],
            Gen.Double[0.0, 1.0]).Sample((points, fromDeg, spanDeg, part) =>
            {
                var mask = new HorizonMask([.. points.DistinctBy(point => point.Item1).Select(point => new MaskPoint(point.Item1, point.Item2))]);
                (double leastDeg, double greatestDeg) = mask.BoundsDeg(fromDeg, spanDeg);
                double elevationDeg = mask.ElevationDegAt((fromDeg + (part * spanDeg)) % 360.0);
                Assert.InRange(elevationDeg, leastDeg - 1e-9, greatestDeg + 1e-9);
            });

    [Theory]
    [InlineData(360.0, 5.0, "azimuthDeg is 360")]
    [InlineData(-1.0, 5.0, "azimuthDeg is -1")]
    [InlineData(0.0, -5.1, "elevationDeg is -5.1")]
    [InlineData(0.0, 90.1, "elevationDeg is 90.1")]
    [InlineData(double.NaN, 5.0, "azimuthDeg is NaN")]
    [InlineData(0.0, double.NaN, "elevationDeg is NaN")]
    public void A_point_outside_its_ranges_is_refused_with_name_value_unit_and_range(double azimuthDeg, double elevationDeg, string start)
    {
        var error = Assert.Throws<ArgumentException>(() => new HorizonMask([new(azimuthDeg, elevationDeg)]));
        Assert.StartsWith(start, error.Message, StringComparison.Ordinal);
        Assert.Contains("degrees", error.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_repeated_azimuth_and_an_empty_mask_are_refused()
    {
        Assert.Contains("twice", Assert.Throws<ArgumentException>(() => new HorizonMask([new(10, 5), new(20, 5), new(10, 6)])).Message, StringComparison.Ordinal);
        Assert.Throws<ArgumentException>(() => new HorizonMask([]));
    }
}
