using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Time;

namespace PassPlanner.Planning.Passes;

/// <summary>Finds what a pass is described by: greatest elevation, least range, azimuths.</summary>
internal sealed class PassDescriber(StationView view)
{
    /// <summary>Half the base of the parabola that polishes an extreme, as a part of the node interval.</summary>
    private const double PolishPart = 1.0 / 120.0;
    private const int PolishTurns = 5;

    /// <summary>Describes the pass that fills a window.</summary>
    /// <param name="window">From AOS to LOS.</param>
    /// <param name="nodes">The nodes strictly inside the window, in order; states at the window's ends are added here.</param>
    /// <param name="aosIsOpen">Whether it is up before.</param>
    /// <param name="losIsOpen">Whether it is up after.</param>
    /// <param name="cutBy">The failure that ends it, if one does.</param>
    public Pass Describe(TimeWindow window, List<EphemerisNode> nodes, bool aosIsOpen, bool losIsOpen, PropagationFailure? cutBy)
    {
        _ = view.TryNode(window.StartUtc, out EphemerisNode first);
        nodes.Insert(0, first);

        // A failure leaves no position at its own instant; its last good one is within a millisecond.
        UtcInstant lastUtc = cutBy is null ? window.EndUtc : nodes[^1].Utc;
        if (cutBy is null)
        {
            _ = view.TryNode(lastUtc, out EphemerisNode last);
            nodes.Add(last);
        }

        (UtcInstant highestUtc, UtcInstant closestUtc, bool crossesNorth) = Extremes(nodes);
        LookAngles highest = view.LookAt(highestUtc);
        return new Pass
        {
            Window = window,
            AosIsOpen = aosIsOpen,
            LosIsOpen = losIsOpen,
            CutBy = cutBy,
            MaximumElevationUtc = highestUtc,
            MaximumElevationDeg = highest.ElevationDeg,
            MaximumElevationAzimuthDeg = highest.AzimuthDeg,
            MaximumElevationRangeKm = highest.SlantRangeKm,
            ClosestApproachUtc = closestUtc,
            ClosestRangeKm = view.LookAt(closestUtc).SlantRangeKm,
            AosAzimuthDeg = view.LookAt(window.StartUtc).AzimuthDeg,
            LosAzimuthDeg = view.LookAt(lastUtc).AzimuthDeg,
            CrossesNorth = crossesNorth,
        };
    }

    private (UtcInstant HighestUtc, UtcInstant ClosestUtc, bool CrossesNorth) Extremes(List<EphemerisNode> nodes)
    {
        Sight before = view.SightOf(nodes[0]);
        (UtcInstant highestUtc, double highestSin) = (nodes[0].Utc, before.SinElevation);
        (UtcInstant closestUtc, double closestKm) = (nodes[0].Utc, before.RangeKm);
        bool crossesNorth = false;
        for (int i = 1; i < nodes.Count; i++)
        {
            Sight after = view.SightOf(nodes[i]);
            double durationS = nodes[i - 1].SecondsTo(nodes[i]);
            Take(nodes[i].Utc, after);
            if (before.SinElevationRate > 0.0 && after.SinElevationRate <= 0.0)
            {
                TakeAt(Extreme(ViewQuantity.ElevationRate, nodes[i - 1].Utc, durationS));
            }

            if (before.RangeRateKmPerS < 0.0 && after.RangeRateKmPerS >= 0.0)
            {
                TakeAt(Extreme(ViewQuantity.RangeRate, nodes[i - 1].Utc, durationS));
            }

            if (before.EastKm < 0.0 != after.EastKm < 0.0)
            {
                crossesNorth |= GoesThroughNorth(before, after, nodes[i - 1].Utc, durationS);
            }

            before = after;
        }

        return (highestUtc, closestUtc, crossesNorth);

        void TakeAt(UtcInstant instant)
        {
            if (view.TryNode(instant, out EphemerisNode node))
            {
                Take(instant, view.SightOf(node));
            }
        }

        void Take(UtcInstant instant, in Sight sight)
        {
            (highestUtc, highestSin) = sight.SinElevation > highestSin ? (instant, sight.SinElevation) : (highestUtc, highestSin);
            (closestUtc, closestKm) = sight.RangeKm < closestKm ? (instant, sight.RangeKm) : (closestUtc, closestKm);
        }
    }

    /// <summary>
    /// Whether the meridian is crossed on its northern side: told by the nodes alone where they lie further to one side
    /// than the path between them can bend. Within a ten-thousandth of a degree of the zenith the
    /// side is a matter of rounding, and the azimuth is taken to turn the shorter way.
    /// </summary>
    private bool GoesThroughNorth(in Sight before, in Sight after, UtcInstant startUtc, double durationS)
    {
        const double ZenithRad = 1e-4 * Math.PI / 180.0;
        const double GreatestSagKm = 50.0;
        if (Math.Min(Math.Abs(before.NorthKm), Math.Abs(after.NorthKm)) > GreatestSagKm && before.NorthKm > 0.0 == after.NorthKm > 0.0)
        {
            return before.NorthKm > 0.0;
        }

        double rootS = new ViewFunction(view, ViewQuantity.East, startUtc).Root(0.0, durationS, 1e-6);
        if (!view.TryNode(startUtc.AddSeconds(rootS), out EphemerisNode node))
        {
            return false;
        }

        Sight meridian = view.SightOf(node);
        return Math.Abs(meridian.NorthKm) > ZenithRad * meridian.RangeKm
            ? meridian.NorthKm > 0.0
            : Math.Abs(after.AzimuthDeg - before.AzimuthDeg) > 180.0;
    }

    /// <summary>
    /// The extreme between two nodes: first the root of the rate by SGP4's velocity, then the vertex of a parabola
    /// through three positions, as that velocity is not exactly the derivative; again from there while it moves far
    /// (by seconds where a distant spacecraft's elevation hardly changes).
    /// </summary>
    private UtcInstant Extreme(ViewQuantity rate, UtcInstant startUtc, double durationS)
    {
        double baseS = durationS * PolishPart;
        double rootS = new ViewFunction(view, rate, startUtc).Root(0.0, durationS, baseS / 100.0);
        for (int turn = 0; turn < PolishTurns; turn++)
        {
            double shiftS = Vertex(rate, startUtc.AddSeconds(rootS), baseS, durationS / 4.0);
            rootS = Math.Clamp(rootS + shiftS, 0.0, durationS);
            if (Math.Abs(shiftS) < baseS / 4.0)
            {
                break;
            }
        }

        return startUtc.AddSeconds(rootS);
    }

    /// <summary>Seconds from an instant to the vertex of the parabola through it and two neighbours.</summary>
    private double Vertex(ViewQuantity rate, UtcInstant instant, double baseS, double farthestS)
    {
        if (!view.TryNode(instant.AddSeconds(-baseS), out EphemerisNode before)
            || !view.TryNode(instant, out EphemerisNode middle)
            || !view.TryNode(instant.AddSeconds(baseS), out EphemerisNode after))
        {
            return 0.0;
        }

        double left = Value(before) - Value(middle);
        double right = Value(after) - Value(middle);
        double bend = left + right;
        return bend != 0.0 ? Math.Clamp(baseS / 2.0 * (left - right) / bend, -farthestS, farthestS) : 0.0;

        double Value(in EphemerisNode node)
        {
            Sight sight = view.SightOf(node);
            return rate == ViewQuantity.ElevationRate ? sight.SinElevation : sight.RangeKm * sight.RangeKm;
        }
    }
}
