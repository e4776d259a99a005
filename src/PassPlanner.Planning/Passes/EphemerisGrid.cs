using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;

namespace PassPlanner.Planning.Passes;

/// <summary>
/// Earth-fixed states of a spacecraft on even nodes over a period: worked out once and shared by every station. The
/// grid ends where the propagation fails. Immutable once built.
/// </summary>
public sealed class EphemerisGrid
{
    private const double StepNearEarthS = 60;
    private const double StepHighS = 300;
    private const double FailureResolutionS = 0.1;

    private readonly EcefState[] nodes;

    private EphemerisGrid(SpacecraftTrajectory trajectory, TimeWindow period, double stepS, EcefState[] nodes, PropagationFailure? failure)
    {
        Trajectory = trajectory;
        Period = period;
        StepS = stepS;
        this.nodes = nodes;
        Failure = failure;
    }

    /// <summary>Trajectory behind the grid.</summary>
    public SpacecraftTrajectory Trajectory { get; }

    /// <summary>Period asked for.</summary>
    public TimeWindow Period { get; }

    /// <summary>Time between nodes, s.</summary>
    public double StepS { get; }

    /// <summary>States; the first at the start of the period, the last at its end or the last node before a failure.</summary>
    public ReadOnlySpan<EcefState> Nodes => nodes;

    /// <summary>Where the propagation fails; nothing when it does not.</summary>
    public PropagationFailure? Failure { get; }

    /// <summary>Propagates a spacecraft over a period.</summary>
    public static EphemerisGrid Build(SpacecraftTrajectory trajectory, TimeWindow period, CancellationToken cancellation)
    {
        int steps = Math.Max(1, (int)Math.Ceiling(period.DurationS / StepFor(trajectory.ServingSet(period.StartUtc))));
        double stepS = period.DurationS / steps;
        var nodes = new EcefState[steps + 1];
        for (int i = 0; i <= steps; i++)
        {
            if (i % 4096 == 0)
            {
                cancellation.ThrowIfCancellationRequested();
            }

            Sgp4Status status = trajectory.TryEcef(period.StartUtc.AddSeconds(i * stepS), out nodes[i]);
            if (status != Sgp4Status.Ok)
            {
                var failure = new PropagationFailure(status, FirstFailure(trajectory, period, stepS, i));
                return new EphemerisGrid(trajectory, period, stepS, nodes[..i], failure);
            }
        }

        return new EphemerisGrid(trajectory, period, stepS, nodes, null);
    }

    /// <summary>
    /// Node spacing: a minute near the Earth and for eccentric orbits, whose perigee is fast; five minutes for high
    /// round ones. Extremes of the elevation between nodes are found from its rate.
    /// </summary>
    private static double StepFor(ElementSet elements) =>
        elements.MeanMotionRevPerDay < 6.4 && elements.Eccentricity < 0.1 ? StepHighS : StepNearEarthS;

    private static UtcInstant FirstFailure(SpacecraftTrajectory trajectory, TimeWindow period, double stepS, int failedNode)
    {
        if (failedNode == 0)
        {
            return period.StartUtc;
        }

        double goodS = (failedNode - 1) * stepS;
        double badS = failedNode * stepS;
        while (badS - goodS > FailureResolutionS)
        {
            double middleS = (goodS + badS) / 2;
            bool fails = trajectory.TryTeme(period.StartUtc.AddSeconds(middleS), out _) != Sgp4Status.Ok;
            (goodS, badS) = fails ? (goodS, middleS) : (middleS, badS);
        }

        return period.StartUtc.AddSeconds(badS);
    }
}
