namespace PassPlanner.Physics.Orbits;

/// <summary>Classes of orbits whose element sets age alike.</summary>
public enum OrbitAgeingClass
{
    /// <summary>Near-circular, mean height below 450 km.</summary>
    Below450Km,

    /// <summary>Near-circular, mean height 450 km to below 600 km.</summary>
    From450To600Km,

    /// <summary>Near-circular, mean height 600 km to below 800 km.</summary>
    From600To800Km,

    /// <summary>Near-circular, mean height 800 km to below 3,000 km.</summary>
    Above800Km,

    /// <summary>Near-circular, from 3,000 km up, other than geosynchronous.</summary>
    Medium,

    /// <summary>Near-circular, 0.95 to 1.05 revolutions a day.</summary>
    Geosynchronous,

    /// <summary>Eccentricity of 0.1 and more.</summary>
    Eccentric,
}
