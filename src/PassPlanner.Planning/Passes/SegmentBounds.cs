using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Orbits;

namespace PassPlanner.Planning.Passes;

/// <summary>What holds everywhere between two nodes.</summary>
/// <param name="AccelerationKmPerS2">No Earth-fixed acceleration is greater, km/s^2.</param>
/// <param name="SpeedKmPerS">No Earth-fixed speed is greater, km/s.</param>
/// <param name="PathKm">No path from one node to the other is longer, km.</param>
/// <param name="RadiusKm">No distance from the Earth's centre is greater, km.</param>
internal readonly record struct SegmentBounds(double AccelerationKmPerS2, double SpeedKmPerS, double PathKm, double RadiusKm)
{
    /// <summary>The least radius between two nodes is at least this part of the lesser one at the nodes.</summary>
    private const double RadiusFactor = 0.985;

    /// <summary>Room for the harmonics of the field, the Sun, the Moon and drag.</summary>
    private const double AccelerationFactor = 1.02;

    public static SegmentBounds Between(in EphemerisNode start, in EphemerisNode end)
    {
        double startRadiusKm = start.State.PositionKm.Norm;
        double endRadiusKm = end.State.PositionKm.Norm;
        double leastKm = RadiusFactor * Math.Min(startRadiusKm, endRadiusKm);
        double greatestKm = Math.Max(startRadiusKm, endRadiusKm) / RadiusFactor;
        double speed = Math.Max(start.State.VelocityKmPerS.Norm, end.State.VelocityKmPerS.Norm);
        double durationS = start.SecondsTo(end);
        const double Rate = EarthRotation.RateRadPerS;

        // Gravity, Coriolis and centrifugal acceleration; the speed can grow by half the duration's worth of it.
        double acceleration = AccelerationFactor * GravityModel.Wgs72.MuKm3PerS2 / (leastKm * leastKm);
        acceleration += (2.0 * Rate * (speed + (acceleration * durationS / 2.0))) + (Rate * Rate * greatestKm);
        double greatestSpeed = speed + (acceleration * durationS / 2.0);
        return new SegmentBounds(acceleration, greatestSpeed, greatestSpeed * durationS, greatestKm);
    }
}
