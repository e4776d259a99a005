using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Time;

namespace PassPlanner.Physics.Orbits;

/// <summary>
/// Where a spacecraft is, from all its element sets: for each instant the one with the nearest earlier epoch serves,
/// and before the first epoch the first. Immutable; safe to use from many threads.
/// </summary>
public sealed class SpacecraftTrajectory
{
    private readonly ElementSet[] sets;
    private readonly Sgp4Propagator[] propagators;

    /// <summary>Prepares every element set once.</summary>
    /// <param name="elementSets">At least one element set, in any order; of sets with the same epoch the last serves.</param>
    /// <param name="ut1MinusUtcS">UT1-UTC, s; 0 when no table is loaded.</param>
    /// <exception cref="ArgumentException">There is no element set.</exception>
    public SpacecraftTrajectory(IEnumerable<ElementSet> elementSets, double ut1MinusUtcS)
    {
        sets = [.. elementSets.OrderBy(s => s.EpochUtc)];
        if (sets.Length == 0)
        {
            throw new ArgumentException("elementSets is empty; it must have at least one element set", nameof(elementSets));
        }

        propagators = [.. sets.Select(s => new Sgp4Propagator(s))];
        Ut1MinusUtcS = ut1MinusUtcS;
    }

    /// <summary>UT1-UTC, s.</summary>
    public double Ut1MinusUtcS { get; }

    /// <summary>The element set that serves at an instant.</summary>
    public ElementSet ServingSet(UtcInstant utc) => sets[ServingIndex(utc)];

    /// <summary>Position and velocity in TEME axes.</summary>
    public Sgp4Status TryTeme(UtcInstant utc, out TemeState state)
    {
        int index = ServingIndex(utc);
        return propagators[index].TryPropagate(utc.SecondsSince(sets[index].EpochUtc) / 60, out state);
    }

    /// <summary>Position and velocity in Earth-fixed axes.</summary>
    public Sgp4Status TryEcef(UtcInstant utc, out EcefState state)
    {
        Sgp4Status status = TryTeme(utc, out TemeState teme);
        state = status == Sgp4Status.Ok ? EarthRotation.ToEcef(teme, utc.ToUt1(Ut1MinusUtcS)) : default;
        return status;
    }

    private int ServingIndex(UtcInstant utc)
    {
        int low = 0;
        int high = sets.Length;
        while (low < high)
        {
            int middle = (low + high) / 2;
            (low, high) = sets[middle].EpochUtc <= utc ? (middle + 1, high) : (low, middle);
        }

        return Math.Max(0, low - 1);
    }
}
