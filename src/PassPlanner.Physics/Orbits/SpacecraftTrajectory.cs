using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Time;

namespace PassPlanner.Physics.Orbits;

/// <summary>
/// The path of one spacecraft by all its element sets: at each instant the set with the nearest earlier epoch
/// serves, and before the first epoch the first set. Immutable: any number of threads may use it at once.
/// </summary>
public sealed class SpacecraftTrajectory
{
    private readonly Sgp4Propagator[] propagators;
    private readonly long[] epochTicks;

    /// <summary>Prepares the propagation of all sets.</summary>
    /// <param name="elementSets">At least one set, in any order; of several with one epoch the last one serves.</param>
    /// <param name="ut1MinusUtcS">UT1-UTC, s, -1 to 1; 0 when no table is loaded.</param>
    /// <exception cref="ArgumentException">There is no set.</exception>
    /// <exception cref="ArgumentOutOfRangeException">UT1-UTC or an element is outside its range.</exception>
    public SpacecraftTrajectory(IEnumerable<ElementSet> elementSets, double ut1MinusUtcS)
    {
        ArgumentNullException.ThrowIfNull(elementSets);
        if (!(Math.Abs(ut1MinusUtcS) <= 1.0))
        {
            throw new ArgumentOutOfRangeException(nameof(ut1MinusUtcS), ut1MinusUtcS, "ut1MinusUtcS must be s, -1 to 1.");
        }

        Ut1MinusUtcS = ut1MinusUtcS;
        propagators = [.. elementSets
            .GroupBy(set => set.EpochUtc)
            .OrderBy(group => group.Key)
            .Select(group => new Sgp4Propagator(group.Last()))];
        if (propagators.Length == 0)
        {
            throw new ArgumentException("elementSets is empty; it must have at least one element set.", nameof(elementSets));
        }

        epochTicks = [.. propagators.Select(propagator => propagator.Elements.EpochUtc.Ticks)];
    }

    /// <summary>UT1-UTC that turns the Earth, s.</summary>
    public double Ut1MinusUtcS { get; }

    /// <summary>The element set that serves an instant.</summary>
    public ElementSet ServingSet(UtcInstant instant) => Serving(instant).Elements;

    /// <summary>The propagator of the set that serves an instant.</summary>
    public Sgp4Propagator Serving(UtcInstant instant)
    {
        int index = Array.BinarySearch(epochTicks, instant.Ticks);
        return propagators[index >= 0 ? index : Math.Max(0, ~index - 1)];
    }

    /// <summary>State in the TEME frame.</summary>
    /// <param name="instant">Instant, UTC.</param>
    /// <param name="state">Position, km, and velocity, km/s; the default value when the status is not Ok.</param>
    public Sgp4Status TryTeme(UtcInstant instant, out TemeState state)
    {
        Sgp4Sweep sweep = default;
        return TryTeme(instant, ref sweep, out state);
    }

    /// <summary>State in the TEME frame, for a caller who steps through time.</summary>
    /// <param name="instant">Instant, UTC.</param>
    /// <param name="sweep">State of the caller's sweep.</param>
    /// <param name="state">Position, km, and velocity, km/s; the default value when the status is not Ok.</param>
    public Sgp4Status TryTeme(UtcInstant instant, ref Sgp4Sweep sweep, out TemeState state)
    {
        Sgp4Propagator propagator = Serving(instant);
        double minutesSinceEpoch = (instant.Ticks - propagator.Elements.EpochUtc.Ticks) / (double)TimeSpan.TicksPerMinute;
        return propagator.TryPropagate(minutesSinceEpoch, ref sweep, out state);
    }

    /// <summary>State in Earth-fixed axes.</summary>
    /// <param name="instant">Instant, UTC.</param>
    /// <param name="state">Position, km, and velocity relative to the Earth, km/s; the default value when the status is not Ok.</param>
    public Sgp4Status TryEcef(UtcInstant instant, out EcefState state)
    {
        Sgp4Sweep sweep = default;
        return TryEcef(instant, ref sweep, out state);
    }

    /// <summary>State in Earth-fixed axes, for a caller who steps through time.</summary>
    /// <param name="instant">Instant, UTC.</param>
    /// <param name="sweep">State of the caller's sweep.</param>
    /// <param name="state">Position, km, and velocity relative to the Earth, km/s; the default value when the status is not Ok.</param>
    public Sgp4Status TryEcef(UtcInstant instant, ref Sgp4Sweep sweep, out EcefState state)
    {
        Sgp4Status status = TryTeme(instant, ref sweep, out TemeState teme);
        state = status == Sgp4Status.Ok ? EarthRotation.ToEcef(teme, instant.ToUt1(Ut1MinusUtcS)) : default;
        return status;
    }
}
