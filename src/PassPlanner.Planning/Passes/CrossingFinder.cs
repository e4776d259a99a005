using PassPlanner.Physics.Time;

namespace PassPlanner.Planning.Passes;

/// <summary>
/// Finds every crossing of the mask between two nodes. With h = (height above the level) - (range) sin(mask), a
/// bound on the acceleration bounds h'' and with it h from both sides; an interval is passed over only
/// when the bounds show it wholly below or wholly above, solved when they show a single crossing, else halved, down to
/// 1/8 s. So no pass, and no gap, longer than 1/4 s is lost, however coarse the nodes, with masks that vary by
/// azimuth too: there the mask is bounded over the azimuths that the interval can reach.
/// </summary>
internal sealed class CrossingFinder(StationView view)
{
    private const double ShortestS = 0.125;

    private const double EdgeToleranceS = 1e-6;

    /// <summary>How far SGP4's velocity may be from the derivative of its position, km/s.</summary>
    private const double VelocitySlackKmPerS = 0.01;

    private const double RadPerDeg = Math.PI / 180.0;

    private readonly double leastSin = Math.Sin(view.Mask.MinimumDeg * RadPerDeg);
    private readonly double greatestSin = Math.Sin(view.Mask.MaximumDeg * RadPerDeg);

    /// <summary>Adds all crossings on a grid, in order of time.</summary>
    public void FindAll(EphemerisGrid grid, List<Crossing> crossings)
    {
        ReadOnlySpan<double> x = grid.XKm;
        ReadOnlySpan<double> y = grid.YKm;
        ReadOnlySpan<double> z = grid.ZKm;
        ReadOnlySpan<SegmentBounds> segments = grid.Segments;
        (double upX, double upY, double upZ) = (view.Up.X, view.Up.Y, view.Up.Z);
        double levelKm = view.Position.Dot(view.Up);

        // A mask below the level is reached from below the level, the further down the greater the range.
        double depth = Math.Max(0.0, -2.0 * leastSin);
        double startUpKm = (x[0] * upX) + (y[0] * upY) + (z[0] * upZ) - levelKm;
        for (int i = 0; i < segments.Length; i++)
        {
            double endUpKm = (x[i + 1] * upX) + (y[i + 1] * upY) + (z[i + 1] * upZ) - levelKm;

            // On a path no longer than PathKm, the height is at most the mean of both ends plus half of that length.
            double reachKm = segments[i].PathKm + (depth * (segments[i].RadiusKm + view.StationRadiusKm));
            if (startUpKm + endUpKm + reachKm >= 0.0)
            {
                Find(grid.Nodes[i], grid.Nodes[i + 1], segments[i], crossings);
            }

            startUpKm = endUpKm;
        }
    }

    /// <summary>Adds the crossings between two nodes, in order of time.</summary>
    public void Find(in EphemerisNode start, in EphemerisNode end, in SegmentBounds bounds, List<Crossing> crossings)
        => Find(start, view.SightOf(start), end, view.SightOf(end), bounds, crossings);

    private void Find(
        in EphemerisNode start, in Sight startSight, in EphemerisNode end, in Sight endSight, in SegmentBounds bounds, List<Crossing> crossings)
    {
        double durationS = start.SecondsTo(end);
        (double lowSin, double highSin) = MaskSines(startSight, endSight, bounds.SpeedKmPerS * durationS / 2.0);
        var low = new Interval(startSight, endSight, lowSin, durationS, bounds);
        if (low.IsBelow)
        {
            return;
        }

        Interval high = view.Mask.IsConstant ? low : new Interval(startSight, endSight, highSin, durationS, bounds);
        if (high.IsAbove)
        {
            return;
        }

        bool isUpAtStart = view.Clearance(startSight) >= 0.0;
        bool isUpAtEnd = view.Clearance(endSight) >= 0.0;
        bool isSingle = view.Mask.IsConstant && isUpAtStart != isUpAtEnd && low.IsMonotone;
        if (!isSingle && durationS > ShortestS && view.TryNode(HalfWay(start, end), out EphemerisNode middle))
        {
            Sight middleSight = view.SightOf(middle);
            Find(start, startSight, middle, middleSight, bounds, crossings);
            Find(middle, middleSight, end, endSight, bounds, crossings);
        }
        else if (isUpAtStart != isUpAtEnd)
        {
            double rootS = isSingle
                ? LevelCrossing(start.Utc, startSight, endSight, durationS)
                : new ViewFunction(view, ViewQuantity.Clearance, start.Utc).Root(0.0, durationS, EdgeToleranceS);
            crossings.Add(new Crossing(start.Utc.AddSeconds(rootS), isUpAtEnd));
        }
    }

    /// <summary>
    /// The one crossing of a level mask between two nodes: Newton's method with SGP4's velocity as slope, from where
    /// the cubic through both ends crosses; bracketed solving should it not settle.
    /// </summary>
    private double LevelCrossing(UtcInstant startUtc, in Sight startSight, in Sight endSight, double durationS)
    {
        const int Turns = 6;
        double timeS = CubicRoot(
            view.Clearance(startSight), view.Clearance(endSight), durationS * startSight.SinElevationRate, durationS * endSight.SinElevationRate) * durationS;
        for (int turn = 0; turn < Turns && view.TryNode(startUtc.AddSeconds(timeS), out EphemerisNode node); turn++)
        {
            Sight sight = view.SightOf(node);
            double stepS = -view.Clearance(sight) / sight.SinElevationRate;
            timeS += stepS;
            if (!(timeS >= 0.0 && timeS <= durationS))
            {
                break;
            }

            if (Math.Abs(stepS) < EdgeToleranceS)
            {
                return timeS;
            }
        }

        return new ViewFunction(view, ViewQuantity.Clearance, startUtc).Root(0.0, durationS, EdgeToleranceS);
    }

    /// <summary>Where the cubic with given values (of opposite sign) and slopes at 0 and 1 crosses zero, by halving, to 1/1000.</summary>
    private static double CubicRoot(double start, double end, double startSlope, double endSlope)
    {
        double c2 = (3.0 * (end - start)) - (2.0 * startSlope) - endSlope;
        double c3 = (2.0 * (start - end)) + startSlope + endSlope;
        double low = 0.0;
        double high = 1.0;
        for (int k = 0; k < 10; k++)
        {
            double middle = (low + high) / 2.0;
            bool isStartSide = start + (middle * (startSlope + (middle * (c2 + (middle * c3))))) >= 0.0 == start >= 0.0;
            (low, high) = isStartSide ? (middle, high) : (low, middle);
        }

        return (low + high) / 2.0;
    }

    private static UtcInstant HalfWay(in EphemerisNode start, in EphemerisNode end) => new((start.Utc.Ticks + end.Utc.Ticks) / 2);

    /// <summary>Sines of the least and the greatest mask over the azimuths that can be reached within half the path of either end.</summary>
    private (double Low, double High) MaskSines(in Sight start, in Sight end, double halfPathKm)
    {
        if (view.Mask.IsConstant)
        {
            return (leastSin, leastSin);
        }

        double startLevelKm = Math.Sqrt((start.EastKm * start.EastKm) + (start.NorthKm * start.NorthKm));
        double endLevelKm = Math.Sqrt((end.EastKm * end.EastKm) + (end.NorthKm * end.NorthKm));
        double sinSwing = halfPathKm / Math.Min(startLevelKm, endLevelKm);
        if (!(sinSwing < 0.7))
        {
            return (leastSin, greatestSin);
        }

        double swingDeg = Math.Asin(sinSwing) / RadPerDeg;
        double startDeg = start.AzimuthDeg;
        double turnDeg = Math.IEEERemainder(end.AzimuthDeg - startDeg, 360.0);
        double fromDeg = startDeg + Math.Min(0.0, turnDeg) - swingDeg;
        (double leastDeg, double mostDeg) = view.Mask.BoundsDeg(fromDeg < 0.0 ? fromDeg + 360.0 : fromDeg, Math.Abs(turnDeg) + (2.0 * swingDeg));
        return (Math.Sin(leastDeg * RadPerDeg), Math.Sin(mostDeg * RadPerDeg));
    }

    /// <summary>The function h against one constant mask between two nodes, with a bound on its second derivative.</summary>
    private readonly struct Interval
    {
        private readonly double startKm, endKm, startRate, endRate, durationS, curvature;

        public Interval(in Sight start, in Sight end, double sinMask, double durationS, in SegmentBounds bounds)
        {
            this.durationS = durationS;
            startKm = start.UpKm - (start.RangeKm * sinMask);
            endKm = end.UpKm - (end.RangeKm * sinMask);
            startRate = start.UpRateKmPerS - (start.RangeRateKmPerS * sinMask);
            endRate = end.UpRateKmPerS - (end.RangeRateKmPerS * sinMask);

            // up'' <= a; -range'' sin m <= a sin m for a mask above the level, and below it (a + v^2/range) |sin m|.
            curvature = bounds.AccelerationKmPerS2 * (1.0 + Math.Abs(sinMask));
            if (sinMask < 0.0)
            {
                double speed = bounds.SpeedKmPerS;
                double leastRangeKm = Math.Max(1.0, Math.Min(start.RangeKm, end.RangeKm) - (speed * durationS / 2.0));
                curvature -= sinMask * speed * speed / leastRangeKm;
            }
        }

        /// <summary>Whether h stays below 0: two parabolas, through the ends along their tangents, bound it from above.</summary>
        public bool IsBelow
        {
            get
            {
                if (startKm >= 0.0 || endKm >= 0.0)
                {
                    return false;
                }

                double slackKm = VelocitySlackKmPerS * durationS;
                double bend = curvature * durationS;
                double divisor = startRate - endRate + bend;
                if (divisor <= 0.0)
                {
                    return true;
                }

                // The parabolas are equally bent, so they meet once; beyond the ends the lower one is at an end.
                double meetS = (endKm - startKm - (endRate * durationS) + (bend * durationS / 2.0)) / divisor;
                return meetS <= 0.0 || meetS >= durationS
                    || startKm + (startRate * meetS) + (curvature * meetS * meetS / 2.0) + slackKm < 0.0;
            }
        }

        /// <summary>Whether h stays at or above 0: it cannot sag below its chord by more than curvature s (T - s) / 2.</summary>
        public bool IsAbove
        {
            get
            {
                if (startKm < 0.0 || endKm < 0.0)
                {
                    return false;
                }

                double slope = (endKm - startKm) / durationS;
                double lowestS = Math.Clamp((durationS / 2.0) - (slope / curvature), 0.0, durationS);
                return startKm + (slope * lowestS) - (curvature * lowestS * (durationS - lowestS) / 2.0) >= 0.0;
            }
        }

        /// <summary>Whether h only rises or only falls.</summary>
        public bool IsMonotone
        {
            get
            {
                double bend = (curvature * durationS) + VelocitySlackKmPerS;
                return endRate > bend || startRate < -bend;
            }
        }
    }
}
