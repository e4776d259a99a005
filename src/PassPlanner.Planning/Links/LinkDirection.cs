namespace PassPlanner.Planning.Links;

/// <summary>Which way a link goes.</summary>
public enum LinkDirection
{
    /// <summary>Spacecraft to station.</summary>
    Downlink,

    /// <summary>Station to spacecraft.</summary>
    Uplink,
}
