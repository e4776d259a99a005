using PassPlanner.Physics.Antennas;

namespace PassPlanner.Physics.Pointing;

/// <summary>Kind <c>uncontrolled</c>: every direction is equally likely; the link is worked with the gain at a percentile of the sphere.</summary>
public sealed record UncontrolledAttitude : AttitudeLaw
{
    /// <summary>An attitude that is not controlled.</summary>
    /// <param name="percentile">Percent of directions with less gain than the one that is used, above 0 and below 100.</param>
    /// <exception cref="ArgumentOutOfRangeException">The percentile is out of range.</exception>
    public UncontrolledAttitude(double percentile) => Percentile = SphereStatistics.CheckPercentile(percentile);

    /// <summary>Percent of directions with less gain than the one that is used.</summary>
    public double Percentile { get; }
}
