namespace PassPlanner.Store;

/// <summary>Which profiles a <see cref="ProfileStore"/> keeps.</summary>
public enum ProfileKind
{
    /// <summary>Stations.</summary>
    Station,

    /// <summary>Spacecraft.</summary>
    Spacecraft,
}
