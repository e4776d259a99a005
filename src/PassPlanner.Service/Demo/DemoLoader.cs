using PassPlanner.Physics.Time;
using PassPlanner.Service.Spacecraft;
using PassPlanner.Service.Stations;
using PassPlanner.Store;

namespace PassPlanner.Service.Demo;

/// <summary>Loads the demo scenario into an empty database, gives it element sets for each new day, and removes it.</summary>
public sealed class DemoLoader(PlannerDatabase database, StationProfiles stations, SpacecraftProfiles spacecraft, ElementSetStore elementSets)
{
    private const string Source = "demo scenario, invented";
    private readonly Lock refreshing = new();
    private long freshDay = long.MinValue;

    /// <summary>Whether any demo profile is there.</summary>
    public bool IsLoaded() => stations.Profiles().Any(s => s.IsDemo) || spacecraft.Profiles().Any(s => s.IsDemo);

    /// <summary>Loads the scenario when there is no station and no spacecraft.</summary>
    public void LoadIfEmpty(UtcInstant nowUtc)
    {
        if (stations.Count() > 0 || spacecraft.Count() > 0)
        {
            return;
        }

        foreach (StationDocument station in DemoScenario.Stations)
        {
            stations.Create(station, isDemo: true);
        }

        foreach (SpacecraftDocument craft in DemoScenario.Spacecraft)
        {
            spacecraft.Create(craft, isDemo: true);
        }

        KeepFresh(nowUtc);
    }

    /// <summary>Adds the element sets of the day to the demo spacecraft that are still there; does nothing when they have them.</summary>
    public void KeepFresh(UtcInstant nowUtc)
    {
        long day = nowUtc.Ticks / TimeSpan.TicksPerDay;
        lock (refreshing)
        {
            if (day == freshDay)
            {
                return;
            }

            HashSet<string> present = [.. spacecraft.Profiles().Where(s => s.IsDemo).Select(s => s.Profile.Id)];
            var sets = DemoScenario.ElementSetsFor(nowUtc).Where(s => present.Contains(s.SpacecraftId)).ToList();
            if (sets.Count > 0)
            {
                elementSets.Add(sets, Source, nowUtc);
            }

            freshDay = day;
        }
    }

    /// <summary>Removes the scenario; answers whether there was any.</summary>
    public bool Remove() => ProfileStore.DeleteDemo(database);
}
