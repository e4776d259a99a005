namespace PassPlanner.Physics.Orbits;

/// <summary>Long-period terms of the Moon and the Sun at one time, summed over both.</summary>
internal struct LunisolarPeriodics
{
    /// <summary>Of the eccentricity.</summary>
    public double Eccentricity;

    /// <summary>Of the inclination, rad.</summary>
    public double InclinationRad;

    /// <summary>Of the mean anomaly, rad.</summary>
    public double AnomalyRad;

    /// <summary>Of the perigee plus cos i times that of the node, rad.</summary>
    public double PerigeePlusNodeRad;

    /// <summary>Of the node times sin i, rad.</summary>
    public double NodeTimesSineRad;
}
