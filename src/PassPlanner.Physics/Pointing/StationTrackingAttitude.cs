using PassPlanner.Physics.Frames;

namespace PassPlanner.Physics.Pointing;

/// <summary>Kind <c>stationTracking</c>: body +Z to the station, +X along the inertial velocity (made perpendicular to +Z).</summary>
public sealed record StationTrackingAttitude : ControlledAttitude
{
    /// <inheritdoc/>
    public override BodyAxes Axes(in TemeState spacecraft, in Vector3D stationPositionKm) =>
        BodyAxes.Along(stationPositionKm - spacecraft.PositionKm, spacecraft.VelocityKmPerS);
}
