using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;

namespace PassPlanner.Planning.Passes;

/// <summary>
/// Earth-fixed states of a spacecraft over a period, by SGP4 itself on nodes that follow its motion: worked out once
/// and shared by every station. The grid ends where the propagation fails. Immutable once built; any number of threads may use it.
/// </summary>
public sealed class EphemerisGrid
{
    private const int BlocksBetweenCancellationChecks = 256;

    private EphemerisGrid(
        SpacecraftTrajectory trajectory, TimeWindow period, EphemerisNode[] nodes, long firstBlock, long lastBlock, PropagationFailure? failure)
    {
        Trajectory = trajectory;
        Period = period;
        Nodes = nodes;
        FirstBlock = firstBlock;
        LastBlock = lastBlock;
        Failure = failure;
        XKm = Array.ConvertAll(nodes, node => node.State.PositionKm.X);
        YKm = Array.ConvertAll(nodes, node => node.State.PositionKm.Y);
        ZKm = Array.ConvertAll(nodes, node => node.State.PositionKm.Z);
        Segments = new SegmentBounds[Math.Max(0, nodes.Length - 1)];
        for (int i = 0; i < Segments.Length; i++)
        {
            Segments[i] = SegmentBounds.Between(nodes[i], nodes[i + 1]);
        }
    }

    /// <summary>Trajectory behind the grid.</summary>
    public SpacecraftTrajectory Trajectory { get; }

    /// <summary>Period asked for.</summary>
    public TimeWindow Period { get; }

    /// <summary>Number of nodes; 0 when there is no position at the start.</summary>
    public int NodeCount => Nodes.Length;

    /// <summary>Where the propagation ends, a few minutes past the period at most; nothing when it does not.</summary>
    public PropagationFailure? Failure { get; }

    internal EphemerisNode[] Nodes { get; }

    /// <summary>The positions of the nodes once more, as columns, for the test that every station makes of every node.</summary>
    internal double[] XKm { get; }

    internal double[] YKm { get; }

    internal double[] ZKm { get; }

    internal SegmentBounds[] Segments { get; }

    internal long FirstBlock { get; }

    internal long LastBlock { get; }

    /// <summary>Propagates a spacecraft over a period.</summary>
    /// <param name="trajectory">The spacecraft.</param>
    /// <param name="period">Period, not empty, between 1957 and 2100.</param>
    /// <param name="cancellation">Ends the work early.</param>
    /// <exception cref="ArgumentOutOfRangeException">The period is empty or outside the years.</exception>
    public static EphemerisGrid Build(SpacecraftTrajectory trajectory, TimeWindow period, CancellationToken cancellation)
    {
        ArgumentNullException.ThrowIfNull(trajectory);
        if (period.EndUtc <= period.StartUtc || period.StartUtc < UtcInstant.Earliest || period.EndUtc > UtcInstant.Latest)
        {
            throw new ArgumentOutOfRangeException(
                nameof(period), $"{period.StartUtc} to {period.EndUtc}", "period must not be empty and must lie between 1957 and 2100, UTC.");
        }

        var lattice = new EphemerisLattice(trajectory);
        long first = EphemerisLattice.BlockOf(period.StartUtc);
        long last = EphemerisLattice.BlockOf(new UtcInstant(period.EndUtc.Ticks - 1));
        var nodes = new List<EphemerisNode>((int)Math.Min(1 << 20, (last - first + 1) * 8) + 1);
        for (long block = first; block <= last; block++)
        {
            if ((block - first) % BlocksBetweenCancellationChecks == 0)
            {
                cancellation.ThrowIfCancellationRequested();
            }

            if (!lattice.AddBlock(block, nodes))
            {
                break;
            }
        }

        return new EphemerisGrid(trajectory, period, [.. nodes], first, last, lattice.Failure);
    }
}
