using PassPlanner.Physics.Frames;

namespace PassPlanner.Physics.Pointing;

/// <summary>The spacecraft's axes as unit vectors in inertial axes; right-handed.</summary>
/// <param name="X">Body +X.</param>
/// <param name="Y">Body +Y.</param>
/// <param name="Z">Body +Z.</param>
public readonly record struct BodyAxes(Vector3D X, Vector3D Y, Vector3D Z)
{
    private const double ParallelSine = 1e-6;

    /// <summary>Axes with +Z along a direction and +X as near as can be to another.</summary>
    /// <param name="z">Direction of +Z, not zero.</param>
    /// <param name="nearX">Direction that +X comes near to; when it is parallel to +Z (to a millionth of a radian), any perpendicular one serves.</param>
    public static BodyAxes Along(in Vector3D z, in Vector3D nearX)
    {
        Vector3D zUnit = z.Unit;
        Vector3D x = nearX - (zUnit * nearX.Dot(zUnit));
        if (x.Norm <= ParallelSine * nearX.Norm)
        {
            Vector3D other = Math.Abs(zUnit.X) < 0.5 ? new Vector3D(1, 0, 0) : new Vector3D(0, 1, 0);
            x = other - (zUnit * other.Dot(zUnit));
        }

        Vector3D xUnit = x.Unit;
        return new BodyAxes(xUnit, zUnit.Cross(xUnit), zUnit);
    }

    /// <summary>An inertial vector in body axes.</summary>
    /// <param name="inertial">Vector in inertial axes.</param>
    public Vector3D ToBody(in Vector3D inertial) => new(X.Dot(inertial), Y.Dot(inertial), Z.Dot(inertial));
}
