using CsCheck;
using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;

namespace PassPlanner.Physics.Tests.Orbits;

public sealed class ElementSetAgeTests
{
    [Theory]
    [InlineData(15.5, 0.0007, OrbitAgeingClass.Below450Km)]
    [InlineData(15.1, 0.0003, OrbitAgeingClass.From450To600Km)]
    [InlineData(14.6, 0.001, OrbitAgeingClass.From600To800Km)]
    [InlineData(13.2, 0.001, OrbitAgeingClass.Above800Km)]
    [InlineData(2.0057, 0.001, OrbitAgeingClass.Medium)]
    [InlineData(1.0027, 0.0002, OrbitAgeingClass.Geosynchronous)]
    [InlineData(2.0057, 0.7, OrbitAgeingClass.Eccentric)]
    [InlineData(14.0, 0.1, OrbitAgeingClass.Eccentric)]
    public void The_class_follows_height_revolutions_and_eccentricity(double meanMotion, double eccentricity, OrbitAgeingClass expected)
        => Assert.Equal(expected, ElementSetAge.ClassOf(Set(meanMotion, eccentricity)));

    [Fact]
    public void The_error_reaches_its_threshold_at_the_limit_or_the_limit_is_two_weeks()
    {
        foreach (OrbitAgeingClass ageingClass in Enum.GetValues<OrbitAgeingClass>())
        {
            double limitHours = ElementSetAge.LimitHours(ageingClass);
            double thresholdKm = ageingClass == OrbitAgeingClass.Geosynchronous
                ? ElementSetAge.StaleGeosynchronousSigmaKm
                : ElementSetAge.StaleSigmaKm;
            double sigmaKm = ElementSetAge.AlongTrackSigmaKm(ageingClass, limitHours / 24.0);
            if (limitHours < ElementSetAge.LongestLimitHours)
            {
                Assert.Equal(thresholdKm, sigmaKm, 9);
            }
            else
            {
                Assert.True(sigmaKm <= thresholdKm);
            }
        }
    }

    [Fact]
    public void Lower_orbits_go_stale_sooner()
    {
        double[] limits =
        [
            ElementSetAge.LimitHours(OrbitAgeingClass.Below450Km),
            ElementSetAge.LimitHours(OrbitAgeingClass.From450To600Km),
            ElementSetAge.LimitHours(OrbitAgeingClass.From600To800Km),
            ElementSetAge.LimitHours(OrbitAgeingClass.Above800Km),
        ];
        Assert.Equal(limits.Order(), limits);
        Assert.Equal(14.5, limits[0], 0.2);
    }

    [Fact]
    public void The_error_is_the_same_before_and_after_the_epoch_and_grows_away_from_it()
        => Gen.Select(Gen.Enum<OrbitAgeingClass>(), Gen.Double[0.0, 20.0], Gen.Double[0.0, 5.0]).Sample((ageingClass, days, more) =>
        {
            double sigmaKm = ElementSetAge.AlongTrackSigmaKm(ageingClass, days);
            Assert.Equal(sigmaKm, ElementSetAge.AlongTrackSigmaKm(ageingClass, -days));
            Assert.True(ElementSetAge.AlongTrackSigmaKm(ageingClass, days + more) >= sigmaKm);
        });

    private static ElementSet Set(double meanMotion, double eccentricity) => new()
    {
        CatalogNumber = 1,
        EpochUtc = UtcInstant.FromCalendar(2026, 1, 1),
        MeanMotionRevPerDay = meanMotion,
        Eccentricity = eccentricity,
        InclinationDeg = 50,
        RightAscensionOfNodeDeg = 0,
        ArgumentOfPerigeeDeg = 0,
        MeanAnomalyDeg = 0,
    };
}
