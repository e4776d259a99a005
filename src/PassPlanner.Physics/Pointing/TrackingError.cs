using PassPlanner.Physics.Frames;

namespace PassPlanner.Physics.Pointing;

/// <summary>
/// How far a ground antenna that is steered in steps points past the spacecraft. At each update it is sent to the
/// direction that the spacecraft will have in the middle of the interval, so that the two differ most, by the sky rate
/// times half the interval, just after and just before an update. That worst error is used at every second; the mount
/// itself is taken to follow at once.
/// </summary>
public static class TrackingError
{
    /// <summary>Pointing error, degrees: bias + sky rate x update interval / 2.</summary>
    /// <param name="biasDeg">Bias on the sky, in the worst direction, degrees, at least 0.</param>
    /// <param name="skyRateDegPerS">Rate of the spacecraft's direction on the sky, degrees per second, at least 0.</param>
    /// <param name="updateIntervalS">Interval between updates of the antenna's direction, s; 0 for a continuous drive.</param>
    public static double PointingErrorDeg(double biasDeg, double skyRateDegPerS, double updateIntervalS) =>
        biasDeg + (skyRateDegPerS * updateIntervalS / 2);

    /// <summary>Rate of a direction on the sky, degrees per second: |r x v| / r^2.</summary>
    /// <param name="fromStationKm">Spacecraft less station, km, not zero.</param>
    /// <param name="velocityKmPerS">Rate of that vector in axes that turn with the Earth, km/s.</param>
    public static double SkyRateDegPerS(in Vector3D fromStationKm, in Vector3D velocityKmPerS) =>
        double.RadiansToDegrees(fromStationKm.Cross(velocityKmPerS).Norm / fromStationKm.Dot(fromStationKm));
}
