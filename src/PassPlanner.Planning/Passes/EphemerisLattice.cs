using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;

namespace PassPlanner.Planning.Passes;

/// <summary>
/// The nodes of a spacecraft's ephemeris, on a lattice of absolute time: blocks of 960 s since 1970, halved until a
/// node interval is short against the motion (120 s in low orbit and at the perigee of eccentric ones, 480 s or
/// 960 s in medium and geosynchronous orbits). As the lattice does not depend on the period asked for, neither do the events
/// that are refined between its nodes: a pass is the same, to the tick, whatever search found it.
/// </summary>
internal sealed class EphemerisLattice(SpacecraftTrajectory trajectory)
{
    /// <summary>Length of a block, s.</summary>
    public const int BlockS = 960;

    private const long BlockTicks = BlockS * UtcInstant.TicksPerSecond;

    /// <summary>Longest node interval as a part of r/v and of the circular time constant: 120 s at 200 km height.</summary>
    private const double StepPerTimeConstant = 0.144;

    /// <summary>A failing interval is halved down to this before the failure is bracketed.</summary>
    private const long ShortestTicks = BlockTicks / 128;

    /// <summary>The failure itself is found to this.</summary>
    private const long FailureTicks = UtcInstant.TicksPerSecond / 1000;

    /// <summary>Below this radius an object may fall under one Earth radius and rise again between nodes.</summary>
    private const double FinalRevolutionsRadiusKm = 6378.135 + 15.0;

    private Sgp4Sweep sweep;

    /// <summary>The failure that ended the last block; nothing when it did not fail.</summary>
    public PropagationFailure? Failure { get; private set; }

    /// <summary>Number of the block that contains an instant.</summary>
    public static long BlockOf(UtcInstant instant) => Math.DivRem(instant.Ticks, BlockTicks) is var (block, rest) && rest < 0 ? block - 1 : block;

    /// <summary>Start of a block.</summary>
    public static UtcInstant StartOf(long block) => new(block * BlockTicks);

    /// <summary>
    /// Adds the nodes of a block, both ends included, the first one only where the list does not end with it. Where
    /// the propagation fails, the last node stands just before the failure, and <see cref="Failure"/> says why.
    /// </summary>
    /// <returns>Whether the block is whole.</returns>
    public bool AddBlock(long block, List<EphemerisNode> nodes)
    {
        Failure = null;
        UtcInstant startUtc = StartOf(block);
        EphemerisNode start;
        if (nodes.Count > 0 && nodes[^1].Utc == startUtc)
        {
            start = nodes[^1];
        }
        else
        {
            Sgp4Status status = At(startUtc, out start);
            if (status != Sgp4Status.Ok)
            {
                Failure = new PropagationFailure(status, startUtc);
                return false;
            }

            nodes.Add(start);
        }

        UtcInstant endUtc = StartOf(block + 1);
        Sgp4Status endStatus = At(endUtc, out EphemerisNode end);
        return AddInterval(start, LongestStepTicks(start.State), end, LongestStepTicks(end.State), endUtc, endStatus, nodes);
    }

    /// <summary>The state at an instant.</summary>
    public Sgp4Status At(UtcInstant instant, out EphemerisNode node)
    {
        Sgp4Status status = trajectory.TryEcef(instant, ref sweep, out EcefState state);
        node = new EphemerisNode(instant, state);
        return status;
    }

    /// <summary>Halves an interval until it is no longer than the steps that the motion at its ends asks for.</summary>
    private bool AddInterval(
        in EphemerisNode start,
        double startStepTicks,
        in EphemerisNode end,
        double endStepTicks,
        UtcInstant endUtc,
        Sgp4Status endStatus,
        List<EphemerisNode> nodes)
    {
        long ticks = endUtc.Ticks - start.Utc.Ticks;
        bool fails = endStatus != Sgp4Status.Ok;
        if (ticks > ShortestTicks && (fails || ticks > startStepTicks || ticks > endStepTicks))
        {
            var middleUtc = new UtcInstant(start.Utc.Ticks + (ticks / 2));
            Sgp4Status middleStatus = At(middleUtc, out EphemerisNode middle);
            double middleStepTicks = LongestStepTicks(middle.State);
            return AddInterval(start, startStepTicks, middle, middleStepTicks, middleUtc, middleStatus, nodes)
                && AddInterval(middle, middleStepTicks, end, endStepTicks, endUtc, endStatus, nodes);
        }

        if (fails)
        {
            AddLastBefore(start, endUtc, endStatus, nodes);
            return false;
        }

        if (Math.Min(start.State.PositionKm.Norm, end.State.PositionKm.Norm) < FinalRevolutionsRadiusKm && DipsBetween(start, endUtc, nodes))
        {
            return false;
        }

        nodes.Add(end);
        return true;
    }

    /// <summary>Looks at every second between two good nodes of a last revolution.</summary>
    private bool DipsBetween(in EphemerisNode start, UtcInstant endUtc, List<EphemerisNode> nodes)
    {
        EphemerisNode good = start;
        for (long ticks = start.Utc.Ticks + UtcInstant.TicksPerSecond; ticks < endUtc.Ticks; ticks += UtcInstant.TicksPerSecond)
        {
            Sgp4Status status = At(new UtcInstant(ticks), out EphemerisNode node);
            if (status != Sgp4Status.Ok)
            {
                AddLastBefore(good, new UtcInstant(ticks), status, nodes);
                return true;
            }

            good = node;
        }

        return false;
    }

    private void AddLastBefore(EphemerisNode good, UtcInstant badUtc, Sgp4Status status, List<EphemerisNode> nodes)
    {
        while (badUtc.Ticks - good.Utc.Ticks > FailureTicks)
        {
            var middleUtc = new UtcInstant((badUtc.Ticks + good.Utc.Ticks) / 2);
            Sgp4Status middleStatus = At(middleUtc, out EphemerisNode middle);
            if (middleStatus == Sgp4Status.Ok)
            {
                good = middle;
            }
            else
            {
                (badUtc, status) = (middleUtc, middleStatus);
            }
        }

        if (nodes[^1].Utc != good.Utc)
        {
            nodes.Add(good);
        }

        Failure = new PropagationFailure(status, badUtc);
    }

    /// <summary>The shorter of r/v and sqrt(r^3/mu), both inertial, scaled.</summary>
    private static double LongestStepTicks(in EcefState state)
    {
        Vector3D r = state.PositionKm;
        Vector3D v = state.VelocityKmPerS;
        var inertial = new Vector3D(v.X - (EarthRotation.RateRadPerS * r.Y), v.Y + (EarthRotation.RateRadPerS * r.X), v.Z);
        double radiusKm = r.Norm;
        double timeConstantS = Math.Min(radiusKm / inertial.Norm, Math.Sqrt(radiusKm / GravityModel.Wgs72.MuKm3PerS2) * radiusKm);
        return StepPerTimeConstant * timeConstantS * UtcInstant.TicksPerSecond;
    }
}
