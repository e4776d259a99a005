using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;

namespace PassPlanner.Planning.Passes;

/// <summary>
/// Finds passes. The elevation is compared with the least elevation of the mask on the nodes of a shared grid, and at
/// its extremes between nodes, so that short passes are not lost; where the mask varies with azimuth, each stretch
/// above its least elevation is then sampled every few seconds against the mask itself, so that a gap or a peep
/// shorter than that sampling may be missed. Edges are solved on SGP4 to well under a millisecond.
/// </summary>
public static class PassFinder
{
    private const double ReachS = 86400;
    private const double MaskSampleS = 5;
    private const int MaskSamplesAtMost = 20_000;
    private const double ShortestPassS = 1e-3;

    /// <summary>Passes of which any part lies in the grid's period; a pass that reaches out of it is listed whole, up to a day on either side.</summary>
    public static PassSearch Find(EphemerisGrid grid, TopocentricFrame station, HorizonMask mask, CancellationToken cancellation)
    {
        if (grid.Nodes.Length == 0)
        {
            return new PassSearch(VisibilityStatus.NeverUp, [], grid.Failure);
        }

        cancellation.ThrowIfCancellationRequested();
        var horizon = new Horizon(grid.Trajectory, station, mask, grid.Period.StartUtc);
        double endS = grid.Failure is { } failure ? failure.FirstUtc.SecondsSince(grid.Period.StartUtc) : grid.Period.DurationS;
        List<double> crossingsS = CrossingsOnGrid(grid, horizon, out bool isUpAtStart);
        if (crossingsS.Count == 0 && isUpAtStart && mask.IsConstant && grid.Failure is null)
        {
            return new PassSearch(VisibilityStatus.AlwaysUp, Days(grid, horizon), null);
        }

        List<Stretch> stretches = Stretches(grid, horizon, crossingsS, isUpAtStart, endS);
        if (!mask.IsConstant)
        {
            stretches = [.. stretches.SelectMany(s => AboveMask(horizon, s, grid.StepS))];
            if (stretches is [{ StartIsOpen: true, EndIsOpen: true }] && grid.Failure is null)
            {
                return new PassSearch(VisibilityStatus.AlwaysUp, Days(grid, horizon), null);
            }
        }

        List<Pass> passes = [.. stretches
            .Where(s => s.EndS - s.StartS > ShortestPassS && s.EndS > 0 && s.StartS < grid.Period.DurationS)
            .Select(s => Describe(horizon, s, grid.StepS))];
        return new PassSearch(passes.Count == 0 ? VisibilityStatus.NeverUp : VisibilityStatus.Passes, passes, grid.Failure);
    }

    /// <summary>The pass that contains an instant, or nothing.</summary>
    public static Pass? FindAt(
        SpacecraftTrajectory trajectory, TopocentricFrame station, HorizonMask mask, UtcInstant utc, CancellationToken cancellation)
    {
        UtcInstant midnight = MidnightBefore(utc);
        var grid = EphemerisGrid.Build(trajectory, new TimeWindow(midnight, midnight.AddSeconds(ReachS)), cancellation);
        return Find(grid, station, mask, cancellation).Passes.FirstOrDefault(p => p.Window.Contains(utc));
    }

    private static List<double> CrossingsOnGrid(EphemerisGrid grid, Horizon horizon, out bool isUpAtStart)
    {
        var crossingsS = new List<double>();
        HorizonSample before = horizon.SampleOf(0, grid.Nodes[0]);
        isUpAtStart = before.IsUp;
        for (int i = 1; i < grid.Nodes.Length; i++)
        {
            HorizonSample after = horizon.SampleOf(i * grid.StepS, grid.Nodes[i]);
            horizon.AddCrossings(before, after, crossingsS);
            before = after;
        }

        return crossingsS;
    }

    /// <summary>Pairs rises with sets, going outside the period for those that are missing.</summary>
    private static List<Stretch> Stretches(EphemerisGrid grid, Horizon horizon, List<double> crossingsS, bool isUpAtStart, double endS)
    {
        var stretches = new List<Stretch>();
        int next = 0;
        double riseS = 0;
        bool riseIsOpen = false;
        bool isUp = isUpAtStart;
        if (isUp)
        {
            (riseS, riseIsOpen) = Outside(horizon, 0, -grid.StepS) is { } found ? (found, false) : (DayStartS(horizon, 0), true);
        }

        while (next < crossingsS.Count)
        {
            if (isUp)
            {
                stretches.Add(new Stretch(riseS, crossingsS[next], riseIsOpen, false));
            }
            else
            {
                (riseS, riseIsOpen) = (crossingsS[next], false);
            }

            isUp = !isUp;
            next++;
        }

        if (isUp)
        {
            double? setS = grid.Failure is null ? Outside(horizon, grid.Period.DurationS, grid.StepS) : null;
            double openEndS = grid.Failure is null ? DayEndS(horizon, grid.Period.DurationS) : endS;
            stretches.Add(new Stretch(riseS, setS ?? openEndS, riseIsOpen, setS is null));
        }

        return stretches;
    }

    /// <summary>The first crossing before or after a time at which the spacecraft is up, within reach; nothing when there is none.</summary>
    private static double? Outside(Horizon horizon, double fromS, double stepS)
    {
        var crossingsS = new List<double>(2);
        if (horizon.SampleAt(fromS) is not { } near)
        {
            return null;
        }

        for (double goneS = Math.Abs(stepS); goneS <= ReachS; goneS += Math.Abs(stepS))
        {
            if (horizon.SampleAt(fromS + (Math.Sign(stepS) * goneS)) is not { } far)
            {
                return null;
            }

            horizon.AddCrossings(stepS < 0 ? far : near, stepS < 0 ? near : far, crossingsS);
            if (crossingsS.Count > 0)
            {
                return stepS < 0 ? crossingsS[^1] : crossingsS[0];
            }

            near = far;
        }

        return null;
    }

    /// <summary>The parts of a stretch above the least elevation of the mask that lie above the mask itself.</summary>
    private static IEnumerable<Stretch> AboveMask(Horizon horizon, Stretch stretch, double gridStepS)
    {
        int samples = (int)Math.Clamp(Math.Ceiling((stretch.EndS - stretch.StartS) / Math.Min(MaskSampleS, gridStepS)), 8, MaskSamplesAtMost);
        double stepS = (stretch.EndS - stretch.StartS) / samples;
        double beforeS = stretch.StartS;
        bool wasUp = stretch.StartIsOpen && horizon.ExcessDeg(beforeS) >= 0;
        (double riseS, bool riseIsOpen) = (beforeS, true);
        for (int i = 1; i <= samples; i++)
        {
            double timeS = stretch.StartS + (i * stepS);
            bool isUp = (i < samples || stretch.EndIsOpen) && horizon.ExcessDeg(Math.Min(timeS, stretch.EndS - 1e-6)) >= 0;
            if (isUp && !wasUp)
            {
                (riseS, riseIsOpen) = (Crossing(horizon, beforeS, timeS), false);
            }
            else if (wasUp && !isUp)
            {
                yield return new Stretch(riseS, Crossing(horizon, beforeS, timeS), riseIsOpen, false);
            }

            (wasUp, beforeS) = (isUp, timeS);
        }

        if (wasUp)
        {
            yield return new Stretch(riseS, stretch.EndS, riseIsOpen, true);
        }
    }

    private static double Crossing(Horizon horizon, double beforeS, double afterS) =>
        Math.Sign(horizon.ExcessDeg(beforeS)) * Math.Sign(horizon.ExcessDeg(afterS)) < 0
            ? horizon.MaskCrossing(beforeS, afterS)
            : horizon.ExcessDeg(beforeS) == 0 ? beforeS : afterS;

    /// <summary>A spacecraft that never sets, one pass for each UTC day, so that an address means the same pass whatever was asked.</summary>
    private static List<Pass> Days(EphemerisGrid grid, Horizon horizon)
    {
        var days = new List<Pass>();
        for (double startS = DayStartS(horizon, 0); startS < grid.Period.DurationS; startS += ReachS)
        {
            days.Add(Describe(horizon, new Stretch(startS, startS + ReachS, true, true), grid.StepS));
        }

        return days;
    }

    private static Pass Describe(Horizon horizon, Stretch stretch, double gridStepS)
    {
        double lengthS = stretch.EndS - stretch.StartS;
        int samples = (int)Math.Ceiling(Math.Max(6, lengthS / gridStepS));
        double stepS = lengthS / samples;
        (int highest, int closest, bool crossesNorth) = Scan(horizon, stretch, samples, stepS);
        double halfStepS = Math.Min(gridStepS / 240, stepS / 8);
        double ElevationDeg(double timeS) => horizon.LookAt(timeS).ElevationDeg;
        double RangeKm(double timeS) => horizon.LookAt(timeS).SlantRangeKm;
        double highestS = Within(stretch, Around(ElevationDeg, highest));
        double closestS = Within(stretch, Around(RangeKm, closest));
        LookAngles atHighest = horizon.LookAt(highestS);
        return new Pass
        {
            Window = new TimeWindow(horizon.UtcOf(stretch.StartS), horizon.UtcOf(stretch.EndS)),
            AosIsOpen = stretch.StartIsOpen,
            LosIsOpen = stretch.EndIsOpen,
            MaximumElevationUtc = horizon.UtcOf(highestS),
            MaximumElevationDeg = atHighest.ElevationDeg,
            MaximumElevationAzimuthDeg = atHighest.AzimuthDeg,
            MaximumElevationRangeKm = atHighest.SlantRangeKm,
            ClosestApproachUtc = horizon.UtcOf(closestS),
            ClosestRangeKm = horizon.LookAt(closestS).SlantRangeKm,
            AosAzimuthDeg = horizon.LookAt(stretch.StartS).AzimuthDeg,
            LosAzimuthDeg = horizon.LookAt(stretch.LastS).AzimuthDeg,
            CrossesNorth = crossesNorth,
        };

        double Around(Func<double, double> value, int index)
        {
            double atS = stretch.StartS + (index * stepS);
            double beforeS = Math.Max(stretch.StartS, atS - stepS);
            double afterS = Math.Min(stretch.LastS - halfStepS, atS + stepS);
            return Horizon.Extreme(value, beforeS, afterS, halfStepS, atS);
        }
    }

    private static (int Highest, int Closest, bool CrossesNorth) Scan(Horizon horizon, Stretch stretch, int samples, double stepS)
    {
        (int highest, int closest) = (0, 0);
        bool crossesNorth = false;
        LookAngles before = horizon.LookAt(stretch.StartS);
        (double highestDeg, double closestKm) = (before.ElevationDeg, before.SlantRangeKm);
        for (int i = 1; i <= samples; i++)
        {
            LookAngles look = horizon.LookAt(Within(stretch, stretch.StartS + (i * stepS)));
            (highest, highestDeg) = look.ElevationDeg > highestDeg ? (i, look.ElevationDeg) : (highest, highestDeg);
            (closest, closestKm) = look.SlantRangeKm < closestKm ? (i, look.SlantRangeKm) : (closest, closestKm);

            // The azimuth jumps by most of a turn where it goes through north; a pass near the zenith turns by half of one.
            crossesNorth |= Math.Abs(look.AzimuthDeg - before.AzimuthDeg) > 180;
            before = look;
        }

        return (highest, closest, crossesNorth);
    }

    private static double Within(Stretch stretch, double timeS) => Math.Clamp(timeS, stretch.StartS, stretch.LastS);

    private static UtcInstant MidnightBefore(UtcInstant utc)
    {
        long remainder = utc.Ticks % TimeSpan.TicksPerDay;
        return new UtcInstant(utc.Ticks - (remainder < 0 ? remainder + TimeSpan.TicksPerDay : remainder));
    }

    private static double DayStartS(Horizon horizon, double timeS) =>
        MidnightBefore(horizon.UtcOf(timeS)).SecondsSince(horizon.UtcOf(0));

    private static double DayEndS(Horizon horizon, double timeS)
    {
        UtcInstant at = horizon.UtcOf(timeS);
        UtcInstant midnight = MidnightBefore(at);
        return (midnight == at ? at : midnight.AddSeconds(ReachS)).SecondsSince(horizon.UtcOf(0));
    }

    /// <summary>Time above the horizon, s from the origin.</summary>
    private readonly record struct Stretch(double StartS, double EndS, bool StartIsOpen, bool EndIsOpen)
    {
        private const double InsideS = 1e-4;

        /// <summary>A time just inside the end: where the propagation fails, there is no position at the end itself.</summary>
        public double LastS => EndIsOpen ? EndS - InsideS : EndS;
    }
}
