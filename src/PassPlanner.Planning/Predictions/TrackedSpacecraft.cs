using PassPlanner.Physics.Orbits;
using PassPlanner.Planning.Profiles;

namespace PassPlanner.Planning.Predictions;

/// <summary>A spacecraft and where it is.</summary>
/// <param name="Spacecraft">Profile.</param>
/// <param name="Trajectory">Trajectory from all its element sets; nothing while there are none.</param>
public sealed record TrackedSpacecraft(Spacecraft Spacecraft, SpacecraftTrajectory? Trajectory);
