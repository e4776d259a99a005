using PassPlanner.Planning.Profiles;

namespace PassPlanner.Planning.Predictions;

/// <summary>A spacecraft, or a pair of spacecraft and station, without a pass in a period.</summary>
/// <param name="Spacecraft">Spacecraft.</param>
/// <param name="Station">Station; nothing when the reason holds for all.</param>
/// <param name="Reason">Reason.</param>
/// <param name="Detail">The reason in words, with its values.</param>
public sealed record WithoutPasses(Spacecraft Spacecraft, Station? Station, NoPassReason Reason, string Detail);
