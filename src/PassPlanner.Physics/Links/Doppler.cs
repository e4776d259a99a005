using PassPlanner.Physics.Constants;

namespace PassPlanner.Physics.Links;

/// <summary>Doppler shift to first order in v/c, f (1 - v/c) - f; the second order is below 4 Hz at 8 GHz for low orbits.</summary>
public static class Doppler
{
    /// <summary>Received minus transmitted frequency, Hz; negative when receding.</summary>
    /// <param name="frequencyHz">Transmitted frequency, Hz.</param>
    /// <param name="rangeRateKmPerS">Range rate, km/s, positive when receding.</param>
    public static double ShiftHz(double frequencyHz, double rangeRateKmPerS) =>
        -frequencyHz * rangeRateKmPerS / PhysicalConstants.SpeedOfLightKmPerS;

    /// <summary>Rate of the received frequency, Hz/s.</summary>
    /// <param name="frequencyHz">Transmitted frequency, Hz.</param>
    /// <param name="rangeAccelerationKmPerS2">Rate of the range rate, km/s^2.</param>
    public static double RateHzPerS(double frequencyHz, double rangeAccelerationKmPerS2) =>
        -frequencyHz * rangeAccelerationKmPerS2 / PhysicalConstants.SpeedOfLightKmPerS;
}
