namespace PassPlanner.Physics.Orbits;

/// <summary>The gravity constants that a set of mean elements was fitted with.</summary>
/// <param name="MuKm3PerS2">Gravitational parameter of the Earth, km^3/s^2.</param>
/// <param name="EarthRadiusKm">Equatorial radius, km.</param>
/// <param name="J2">Second zonal harmonic, un-normalised.</param>
/// <param name="J3">Third zonal harmonic, un-normalised.</param>
/// <param name="J4">Fourth zonal harmonic, un-normalised.</param>
public sealed record GravityModel(double MuKm3PerS2, double EarthRadiusKm, double J2, double J3, double J4)
{
    /// <summary>
    /// WGS-72, the model that public element sets are made with. AIAA 2006-6753, appendix B ("low precision"
    /// STR#3 digits replaced by the full ones).
    /// </summary>
    public static readonly GravityModel Wgs72 = new(398600.8, 6378.135, 0.001082616, -0.00000253881, -0.00000165597);

    /// <summary>Square root of the gravitational parameter in canonical units, Earth radii^1.5 per minute (k_e of STR#3).</summary>
    public double RootMuPerMin { get; } = 60.0 / Math.Sqrt(EarthRadiusKm * EarthRadiusKm * EarthRadiusKm / MuKm3PerS2);

    /// <summary>J3 over J2.</summary>
    public double J3OverJ2 { get; } = J3 / J2;

    /// <summary>Speed of a circular orbit of one Earth radius, km/s: the unit of speed in SGP4.</summary>
    public double CanonicalSpeedKmPerS => EarthRadiusKm * RootMuPerMin / 60.0;
}
