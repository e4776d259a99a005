using PassPlanner.Physics.Frames;

namespace PassPlanner.Physics.Pointing;

/// <summary>Kind <c>nadir</c>: body +Z to the Earth's centre, +X along the inertial velocity (made perpendicular to +Z).</summary>
public sealed record NadirAttitude : ControlledAttitude
{
    /// <inheritdoc/>
    public override BodyAxes Axes(in TemeState spacecraft, in Vector3D stationPositionKm) =>
        BodyAxes.Along(-spacecraft.PositionKm, spacecraft.VelocityKmPerS);
}
