namespace PassPlanner.Physics.Orbits;

/// <summary>What came of a propagation. The order of the failures is that of the published error codes 1, 2, 3, 4 and 6.</summary>
public enum Sgp4Status
{
    /// <summary>A position and a velocity.</summary>
    Ok,

    /// <summary>Code 1: the mean eccentricity leaves the range of 0 to 1.</summary>
    MeanEccentricityOutOfRange,

    /// <summary>Code 2: the mean motion is not positive.</summary>
    MeanMotionNotPositive,

    /// <summary>Code 3: the eccentricity with the Moon's and the Sun's periodics leaves the range of 0 to 1.</summary>
    PerturbedEccentricityOutOfRange,

    /// <summary>Code 4: the semi-latus rectum is negative.</summary>
    SemiLatusRectumNegative,

    /// <summary>Code 6: the radius is below one Earth radius: the object has come down.</summary>
    Decayed,
}
