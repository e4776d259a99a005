using PassPlanner.Physics.Frames;

namespace PassPlanner.Physics.Orbits;

/// <summary>
/// The shadow of a spherical Earth without an atmosphere: as a cylinder, and as cones by the apparent discs of Earth
/// and Sun (Montenbruck and Gill, Satellite Orbits, 2000, section 3.4.2). Both vectors in the same axes, from the Earth's centre.
/// </summary>
public static class EarthShadow
{
    /// <summary>Radius of the sphere that stands for the Earth, km: the equatorial radius of WGS-84.</summary>
    public const double EarthRadiusKm = Wgs84.EquatorialRadiusKm;

    /// <summary>Nominal radius of the Sun, km. IAU 2015 resolution B3.</summary>
    public const double SunRadiusKm = 695700.0;

    /// <summary>How much of the Sun is seen.</summary>
    /// <param name="positionKm">Spacecraft, km from the Earth's centre, outside the Earth.</param>
    /// <param name="sunKm">Sun, km from the Earth's centre.</param>
    public static SunlightState At(in Vector3D positionKm, in Vector3D sunKm)
    {
        Vector3D toSun = sunKm - positionKm;
        double sunDisc = Math.Asin(SunRadiusKm / toSun.Norm);
        double earthDisc = Math.Asin(Math.Min(1.0, EarthRadiusKm / positionKm.Norm));
        double separation = toSun.AngleToRad(-positionKm);
        if (separation >= sunDisc + earthDisc)
        {
            return SunlightState.Sunlit;
        }

        return separation <= earthDisc - sunDisc ? SunlightState.Umbra : SunlightState.Penumbra;
    }

    /// <summary>Whether the spacecraft is behind the Earth, within the cylinder that has the Earth's radius.</summary>
    /// <param name="positionKm">Spacecraft, km from the Earth's centre.</param>
    /// <param name="sunKm">Sun, km from the Earth's centre; its direction alone counts.</param>
    public static bool IsInCylinder(in Vector3D positionKm, in Vector3D sunKm)
        => positionKm.Dot(sunKm) < 0.0 && HeightAboveCylinderKm(positionKm, sunKm) < 0.0;

    /// <summary>Distance from the cylinder's wall, km, negative inside; of use on the night side only.</summary>
    /// <param name="positionKm">Spacecraft, km from the Earth's centre.</param>
    /// <param name="sunKm">Sun, km from the Earth's centre; its direction alone counts.</param>
    public static double HeightAboveCylinderKm(in Vector3D positionKm, in Vector3D sunKm)
        => positionKm.Cross(sunKm.Unit).Norm - EarthRadiusKm;
}
