using CsCheck;
using PassPlanner.Physics.Antennas;

namespace PassPlanner.Physics.Tests.Antennas;

public class MeasuredPatternTests
{
    private const double ExactlyDb = 1e-9;
    private static readonly MeasuredCut Single = new(0, [0, 30, 60, 75], [4, 5, 6, 1]);

    [Theory]
    [InlineData(0, 4)]
    [InlineData(15, 4.5)]
    [InlineData(30, 5)]
    [InlineData(67.5, 3.5)]
    [InlineData(75, 1)]
    [InlineData(76, 1)]
    [InlineData(180, 1)]
    public void One_cut_is_linear_in_decibels_constant_past_its_end_and_the_same_all_round(double angleDeg, double gainDbi)
    {
        var pattern = new MeasuredPattern([Single]);
        Assert.True(pattern.IsRotationallySymmetric);
        Assert.Equal(6, pattern.PeakGainDbi);
        for (double phiRad = -7; phiRad < 7; phiRad++)
        {
            Assert.Equal(gainDbi, pattern.GainDbi(double.DegreesToRadians(angleDeg), phiRad), 9);
        }
    }

    [Theory]
    [InlineData(0, 0)]
    [InlineData(45, 5)]
    [InlineData(90, 10)]
    [InlineData(135, 15)]
    [InlineData(180, 20)]
    [InlineData(270, 10)]
    [InlineData(359.999, 0.0001)]
    [InlineData(-90, 10)]
    [InlineData(720 + 45, 5)]
    public void Several_cuts_are_interpolated_in_phi_and_wrap(double phiDeg, double gainDbi)
    {
        var pattern = new MeasuredPattern([Flat(180, 20), Flat(0, 0), Flat(90, 10)]);
        Assert.Equal(gainDbi, pattern.GainDbi(1, double.DegreesToRadians(phiDeg)), 3);
    }

    [Fact]
    public void Cuts_at_phi_and_phi_plus_180_are_the_two_sides_of_a_plane()
    {
        var pattern = new MeasuredPattern([Flat(30, 2), Flat(210, -4)]);
        Assert.Equal(2, pattern.GainDbi(1, double.DegreesToRadians(30)), 9);
        Assert.Equal(-4, pattern.GainDbi(1, double.DegreesToRadians(210)), 9);
        Assert.Equal(-1, pattern.GainDbi(1, double.DegreesToRadians(120)), 9);
        Assert.Equal(-1, pattern.GainDbi(1, double.DegreesToRadians(300)), 9);
        Assert.Equal(1, pattern.GainDbi(1, 0), 9); // past the turn: 150 of the 180 degrees from 210 to 390
    }

    [Fact]
    public void Interpolation_never_leaves_the_range_of_the_four_points_around_it() =>
        Gen.Select(Gen.Double[-20, 10].Array[12], Gen.Double[0, Math.PI], Gen.Double[-10, 10]).Sample((gains, angle, phi) =>
        {
            MeasuredCut[] cuts = [.. Enumerable.Range(0, 4).Select(i => new MeasuredCut(i * 90, [0, 60, 150], gains[(3 * i)..(3 * i + 3)]))];
            var pattern = new MeasuredPattern(cuts);
            Assert.InRange(pattern.GainDbi(angle, phi), gains.Min() - ExactlyDb, gains.Max() + ExactlyDb);
            Assert.InRange(pattern.GainDbi(angle, phi) - pattern.GainDbi(angle, phi + (2 * Math.PI)), -ExactlyDb, ExactlyDb);
            Assert.Equal(gains.Max(), pattern.PeakGainDbi);
        });

    [Fact]
    public void Bad_cuts_are_refused_by_name()
    {
        Refused(() => new MeasuredCut(0, [0], [4]), "angleDeg");
        Refused(() => new MeasuredCut(0, [0, 30], [4]), "gainDbi");
        Refused(() => new MeasuredCut(0, [0, 30, 30], [4, 5, 6]), "angleDeg");
        Refused(() => new MeasuredCut(0, [0, 181], [4, 5]), "angleDeg");
        Refused(() => new MeasuredCut(0, [-1, 30], [4, 5]), "angleDeg");
        Refused(() => new MeasuredCut(0, [0, 30], [4, double.NaN]), "gainDbi");
        Refused(() => new MeasuredCut(360, [0, 30], [4, 5]), "phiDeg");
        Refused(() => new MeasuredModel([]), "cuts");
        Refused(() => new MeasuredModel([Flat(90, 1), Flat(90, 2)]), "cuts");

        static void Refused(Func<object> make, string member) =>
            Assert.Equal(member, Assert.ThrowsAny<ArgumentException>(make).ParamName);
    }

    private static MeasuredCut Flat(double phiDeg, double gainDbi) => new(phiDeg, [0, 180], [gainDbi, gainDbi]);
}
