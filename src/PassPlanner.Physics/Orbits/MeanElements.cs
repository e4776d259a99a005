namespace PassPlanner.Physics.Orbits;

/// <summary>Mean elements in radians and minutes while they are worked on.</summary>
internal struct MeanElements
{
    /// <summary>Eccentricity.</summary>
    public double Eccentricity;

    /// <summary>Inclination, rad.</summary>
    public double InclinationRad;

    /// <summary>Right ascension of the node, rad.</summary>
    public double NodeRad;

    /// <summary>Argument of perigee, rad.</summary>
    public double PerigeeRad;

    /// <summary>Mean anomaly, rad.</summary>
    public double AnomalyRad;

    /// <summary>Mean motion, rad/min.</summary>
    public double MotionRadPerMin;
}
