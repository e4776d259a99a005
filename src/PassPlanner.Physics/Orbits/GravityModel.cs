namespace PassPlanner.Physics.Orbits;

/// <summary>Constants of the Earth's gravity in the units of SGP4: Earth radii and minutes.</summary>
/// <param name="EarthRadiusKm">Equatorial radius, km.</param>
/// <param name="GravityKm3PerS2">Gravitational parameter, km^3/s^2.</param>
/// <param name="J2">Second zonal harmonic.</param>
/// <param name="J3">Third zonal harmonic.</param>
/// <param name="J4">Fourth zonal harmonic.</param>
public sealed record GravityModel(double EarthRadiusKm, double GravityKm3PerS2, double J2, double J3, double J4)
{
    /// <summary>WGS-72, for which element sets are made (AIAA 2006-6753, table 1).</summary>
    public static readonly GravityModel Wgs72 = new(6378.135, 398600.8, 0.001082616, -0.00000253881, -0.00000165597);

    /// <summary>Square root of the gravitational parameter, (Earth radii)^1.5 per minute: k_e of Spacetrack Report #3.</summary>
    public double Ke { get; } = 60 / Math.Sqrt(EarthRadiusKm * EarthRadiusKm * EarthRadiusKm / GravityKm3PerS2);

    /// <summary>J3 over J2.</summary>
    public double J3OverJ2 => J3 / J2;

    /// <summary>Kilometres per second in one Earth radius per minute over <see cref="Ke"/>.</summary>
    public double VelocityUnitKmPerS => EarthRadiusKm * Ke / 60;
}
