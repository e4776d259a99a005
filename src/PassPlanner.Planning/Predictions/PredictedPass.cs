using PassPlanner.Physics.Orbits;
using PassPlanner.Planning.Assessments;
using PassPlanner.Planning.Links;
using PassPlanner.Planning.Passes;
using PassPlanner.Planning.Profiles;

namespace PassPlanner.Planning.Predictions;

/// <summary>A pass over a station, by one link.</summary>
/// <param name="Spacecraft">Spacecraft.</param>
/// <param name="Station">Station.</param>
/// <param name="Chain">Link with its tables.</param>
/// <param name="Pass">Geometry.</param>
/// <param name="Assessment">What it carries.</param>
/// <param name="ElementSet">Element set that serves at the greatest elevation.</param>
public sealed record PredictedPass(
    Spacecraft Spacecraft, Station Station, LinkChain Chain, Pass Pass, Assessment Assessment, ElementSet ElementSet);
