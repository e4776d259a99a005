namespace PassPlanner.Physics.Orbits;

/// <summary>
/// How a propagation ended. The order is that of the published error codes 0, 1, 2, 3, 4 and 6 of
/// AIAA 2006-6753 (code 5 is no longer in use).
/// </summary>
public enum Sgp4Status
{
    /// <summary>The state is valid.</summary>
    Ok,

    /// <summary>The mean eccentricity has left -0.001 to 1 by drag or by the secular effect of Sun and Moon (code 1).</summary>
    MeanEccentricityOutOfRange,

    /// <summary>The mean motion has become zero or negative (code 2).</summary>
    MeanMotionNotPositive,

    /// <summary>The eccentricity has left 0 to 1 by the periodic effects of Sun and Moon (code 3).</summary>
    PerturbedEccentricityOutOfRange,

    /// <summary>The semi-latus rectum has become negative (code 4).</summary>
    SemiLatusRectumNegative,

    /// <summary>The object is below one Earth radius: it has decayed (code 6).</summary>
    Decayed,
}
