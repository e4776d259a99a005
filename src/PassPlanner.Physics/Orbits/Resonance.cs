using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Time;

namespace PassPlanner.Physics.Orbits;

/// <summary>
/// Resonance of an orbit with the Earth's gravity, integrated in steps of half a day by a second-order Taylor series
/// (section 6 of Spacetrack Report #3). One kind for orbits of a day, one for eccentric orbits of half a day.
/// </summary>
internal abstract class Resonance
{
    /// <summary>Rotation of the Earth, rad/min, as the theory has it.</summary>
    protected const double EarthRateRadPerMin = 4.37526908801129966e-3;

    private const double StepMin = 720;
    private const double HalfStepSquared = 259200;

    private readonly double motionAtEpochRadPerMin;
    private readonly double siderealTimeAtEpochRad;

    /// <summary>Sets what both kinds share.</summary>
    protected Resonance(double motionAtEpochRadPerMin, double siderealTimeAtEpochRad)
    {
        (this.motionAtEpochRadPerMin, this.siderealTimeAtEpochRad) = (motionAtEpochRadPerMin, siderealTimeAtEpochRad);
    }

    /// <summary>Resonant longitude at the epoch, rad.</summary>
    protected double LongitudeAtEpochRad { get; init; }

    /// <summary>Rate of the resonant longitude less the mean motion, rad/min.</summary>
    protected double LongitudeRateRadPerMin { get; init; }

    /// <summary>The resonance of an orbit; nothing when it has none.</summary>
    /// <param name="gravity">Gravity constants.</param>
    /// <param name="epochDate">Epoch.</param>
    /// <param name="epoch">Mean elements at the epoch.</param>
    /// <param name="rates">Secular rates: anomaly and node with the Moon's and the Sun's, perigee without.</param>
    /// <param name="lunisolarPerigeeRate">The Moon's and the Sun's rate of the perigee, rad/min.</param>
    public static Resonance? For(
        GravityModel gravity, JulianDateUt1 epochDate, in MeanElements epoch, in SecularRates rates, double lunisolarPerigeeRate)
    {
        double siderealTimeRad = EarthRotation.Gmst82Rad(epochDate);
        return epoch.MotionRadPerMin switch
        {
            > 0.0034906585 and < 0.0052359877 => new OneDayResonance(gravity, siderealTimeRad, epoch, rates, lunisolarPerigeeRate),
            >= 8.26e-3 and <= 9.24e-3 when epoch.Eccentricity >= 0.5 => new HalfDayResonance(gravity, siderealTimeRad, epoch, rates),
            _ => null,
        };
    }

    /// <summary>Sets mean anomaly and mean motion at a time.</summary>
    public void Apply(double minutes, ref MeanElements elements)
    {
        double step = minutes > 0 ? StepMin : -StepMin;
        double atMin = 0;
        double longitudeRad = LongitudeAtEpochRad;
        double motion = motionAtEpochRadPerMin;
        while (true)
        {
            (double motionRate, double motionRateRate) = Derivatives(longitudeRad, atMin);
            double longitudeRate = motion + LongitudeRateRadPerMin;
            motionRateRate *= longitudeRate;
            double leftMin = minutes - atMin;
            if (Math.Abs(leftMin) < StepMin)
            {
                elements.MotionRadPerMin = motion + (motionRate * leftMin) + (motionRateRate * leftMin * leftMin * 0.5);
                double atEndRad = longitudeRad + (longitudeRate * leftMin) + (motionRate * leftMin * leftMin * 0.5);
                double siderealTimeRad = (siderealTimeAtEpochRad + (minutes * EarthRateRadPerMin)) % (2 * Math.PI);
                elements.AnomalyRad = AnomalyRad(atEndRad, siderealTimeRad, elements);
                return;
            }

            longitudeRad += (longitudeRate * step) + (motionRate * HalfStepSquared);
            motion += (motionRate * step) + (motionRateRate * HalfStepSquared);
            atMin += step;
        }
    }

    /// <summary>Rate of the mean motion, and its derivative with respect to the resonant longitude.</summary>
    protected abstract (double MotionRate, double MotionRateByLongitude) Derivatives(double longitudeRad, double minutes);

    /// <summary>Mean anomaly from the resonant longitude.</summary>
    protected abstract double AnomalyRad(double longitudeRad, double siderealTimeRad, in MeanElements elements);
}
