using PassPlanner.Physics.Orbits;

namespace PassPlanner.Store;

/// <summary>An element set as it is stored.</summary>
/// <param name="SpacecraftId">Spacecraft.</param>
/// <param name="ElementSet">Elements.</param>
/// <param name="Source">Where they came from, in words.</param>
/// <param name="ReceivedUtcTicks">When they came, ticks of 100 ns since 1970-01-01T00:00:00Z.</param>
public sealed record StoredElementSet(string SpacecraftId, ElementSet ElementSet, string Source, long ReceivedUtcTicks);
