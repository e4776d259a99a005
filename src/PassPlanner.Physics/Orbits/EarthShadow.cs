using PassPlanner.Physics.Frames;

namespace PassPlanner.Physics.Orbits;

/// <summary>Shadow of a round Earth of the equatorial radius.</summary>
/// <param name="InCylinder">Behind the Earth and closer to the axis than the Earth's radius.</param>
/// <param name="InUmbra">The Sun's disc is wholly hidden.</param>
/// <param name="InPenumbra">The Sun's disc is hidden in part.</param>
public readonly record struct EarthShadow(bool InCylinder, bool InUmbra, bool InPenumbra)
{
    private const double EarthRadiusKm = 6378.137;
    private const double SunRadiusKm = 695700;
    private const double AstronomicalUnitKm = 149597870.7;

    /// <summary>The shadow at a place, by the apparent discs of the Earth and the Sun (conical) and by the cylinder.</summary>
    /// <param name="positionKm">Spacecraft from the Earth's centre, km, outside the Earth.</param>
    /// <param name="sunDirection">Direction of the Sun in the same axes, of any length.</param>
    public static EarthShadow At(in Vector3D positionKm, in Vector3D sunDirection)
    {
        Vector3D sun = sunDirection.Unit;
        double alongSunKm = positionKm.Dot(sun);
        bool inCylinder = alongSunKm < 0 && (positionKm - (sun * alongSunKm)).Norm < EarthRadiusKm;

        Vector3D toSunKm = (sun * AstronomicalUnitKm) - positionKm;
        double earthRad = Math.Asin(Math.Min(1, EarthRadiusKm / positionKm.Norm));
        double sunRad = Math.Asin(SunRadiusKm / toSunKm.Norm);
        double apartRad = toSunKm.AngleToRad(-positionKm);
        bool inUmbra = apartRad <= earthRad - sunRad;
        return new EarthShadow(inCylinder, inUmbra, !inUmbra && apartRad < earthRad + sunRad);
    }
}
