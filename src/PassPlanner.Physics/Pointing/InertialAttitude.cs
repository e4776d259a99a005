using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Pointing;

/// <summary>Kind <c>inertial</c>: axes that stand still among the stars.</summary>
public sealed record InertialAttitude : ControlledAttitude
{
    private readonly BodyAxes axes;

    /// <summary>Axes from a quaternion.</summary>
    /// <param name="quaternion">Turn from inertial to body axes, scalar last, of a length from 0.5 to 2.</param>
    /// <exception cref="ArgumentOutOfRangeException">The length is out of range or a component is no number.</exception>
    public InertialAttitude(Quaternion quaternion)
    {
        RangeCheck.Within(quaternion.Norm, 0.5, 2, nameof(quaternion), "in length");
        Quaternion = quaternion;
        axes = quaternion.Axes();
    }

    /// <summary>Turn from inertial to body axes, scalar last.</summary>
    public Quaternion Quaternion { get; }

    /// <inheritdoc/>
    public override BodyAxes Axes(in TemeState spacecraft, in Vector3D stationPositionKm) => axes;
}
