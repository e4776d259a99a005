using PassPlanner.Physics.Orbits;
using PassPlanner.Physics.Time;
using PassPlanner.Planning.Predictions;
using PassPlanner.Service.Demo;
using PassPlanner.Service.Spacecraft;
using PassPlanner.Service.Stations;
using PassPlanner.Store;

namespace PassPlanner.Service.Profiles;

/// <summary>
/// The planning model of what is stored now. It is built again when anything has been written since, so an answer is
/// never older than the last write.
/// </summary>
public sealed class ModelCache(
    PlannerDatabase database,
    StationProfiles stations,
    SpacecraftProfiles spacecraft,
    ElementSetStore elementSets,
    DemoLoader demo,
    IConfiguration configuration,
    TimeProvider clock)
{
    private readonly Lock building = new();
    private long builtVersion = -1;
    private PlanningModel? built;

    /// <summary>UT1-UTC in use, s: from the configuration (EarthOrientation:Ut1MinusUtcS), else 0.</summary>
    public double Ut1MinusUtcS { get; } = configuration.GetValue("EarthOrientation:Ut1MinusUtcS", 0.0);

    /// <summary>The model.</summary>
    public PlanningModel Current()
    {
        demo.KeepFresh(UtcInstant.From(clock.GetUtcNow()));
        lock (building)
        {
            long version = database.ContentVersion();
            if (built is null || version != builtVersion)
            {
                built = Build();
                builtVersion = version;
            }

            return built;
        }
    }

    private PlanningModel Build()
    {
        ILookup<string, ElementSet> sets = elementSets.All();
        return new PlanningModel(
            stations.Profiles().Select(s => s.Profile),
            spacecraft.Profiles().Select(s => new TrackedSpacecraft(
                s.Profile,
                sets.Contains(s.Profile.Id) ? new SpacecraftTrajectory([.. sets[s.Profile.Id]], Ut1MinusUtcS) : null)));
    }
}
