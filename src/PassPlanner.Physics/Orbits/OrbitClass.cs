namespace PassPlanner.Physics.Orbits;

/// <summary>Kinds of orbit whose element sets age alike.</summary>
public enum OrbitClass
{
    /// <summary>Near-circular, mean height below 450 km.</summary>
    LowBelow450Km,

    /// <summary>Near-circular, mean height 450 to 600 km.</summary>
    Low450To600Km,

    /// <summary>Near-circular, mean height 600 to 800 km.</summary>
    Low600To800Km,

    /// <summary>Near-circular, mean height 800 to 2,000 km.</summary>
    LowAbove800Km,

    /// <summary>Near-circular, between low and geosynchronous.</summary>
    Medium,

    /// <summary>Within 200 minutes of a day's period.</summary>
    Geosynchronous,

    /// <summary>Eccentricity of 0.1 or more.</summary>
    Eccentric,
}
