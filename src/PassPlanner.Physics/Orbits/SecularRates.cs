namespace PassPlanner.Physics.Orbits;

/// <summary>Secular rates of the angles, rad/min.</summary>
/// <param name="AnomalyRadPerMin">Of the mean anomaly.</param>
/// <param name="PerigeeRadPerMin">Of the argument of perigee.</param>
/// <param name="NodeRadPerMin">Of the node.</param>
internal readonly record struct SecularRates(double AnomalyRadPerMin, double PerigeeRadPerMin, double NodeRadPerMin);
