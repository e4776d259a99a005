using PassPlanner.Physics.Time;
using PassPlanner.Planning.Links;
using PassPlanner.Planning.Profiles;

namespace PassPlanner.Planning.Predictions;

/// <summary>Which passes to predict.</summary>
public sealed record PredictionRequest
{
    /// <summary>Period; passes that reach into it are listed whole.</summary>
    public required TimeWindow Period { get; init; }

    /// <summary>Stations wanted.</summary>
    public required IReadOnlyList<Station> Stations { get; init; }

    /// <summary>Spacecraft wanted.</summary>
    public required IReadOnlyList<TrackedSpacecraft> Spacecraft { get; init; }

    /// <summary>Links wanted.</summary>
    public required Func<Link, bool> WantsLink { get; init; }

    /// <summary>Step of the margin profiles, s; 0 for none.</summary>
    public int ProfileStepS { get; init; }
}
