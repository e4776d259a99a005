using PassPlanner.Physics.Frames;
using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Pointing;

/// <summary>
/// How an antenna sits on the spacecraft. Antenna +z is the boresight; +x (phi = 0) is the reference direction made
/// perpendicular to it; +y completes the right-handed axes. Look-ups allocate nothing.
/// </summary>
public sealed class AntennaMounting
{
    private const double ParallelSine = 1e-6;
    private readonly Vector3D x;
    private readonly Vector3D y;
    private readonly Vector3D z;

    /// <summary>A mounting.</summary>
    /// <param name="boresight">Boresight in body axes, not zero; any length.</param>
    /// <param name="reference">Direction of phi = 0 in body axes, not zero; left out, body +X. When it is parallel to the boresight, body +Y serves (body +X for a boresight along Y).</param>
    /// <exception cref="ArgumentOutOfRangeException">A vector is zero or not finite.</exception>
    public AntennaMounting(Vector3D boresight, Vector3D? reference = null)
    {
        z = Direction(boresight, nameof(boresight));
        Vector3D wanted = Direction(reference ?? new Vector3D(1, 0, 0), nameof(reference));
        if (IsParallel(wanted))
        {
            wanted = new Vector3D(0, 1, 0);
            wanted = IsParallel(wanted) ? new Vector3D(1, 0, 0) : wanted;
        }

        x = (wanted - (z * wanted.Dot(z))).Unit;
        y = z.Cross(x);
    }

    /// <summary>Boresight in body axes, of length 1.</summary>
    public Vector3D Boresight => z;

    /// <summary>Direction of phi = 0 in body axes, of length 1 and perpendicular to the boresight.</summary>
    public Vector3D Reference => x;

    /// <summary>Where the antenna sees a station.</summary>
    /// <param name="attitude">How the spacecraft turns.</param>
    /// <param name="spacecraft">Position and velocity of the spacecraft, km and km/s, inertial.</param>
    /// <param name="stationPositionKm">Position of the station, km, in the same axes.</param>
    public AntennaDirection DirectionTo(ControlledAttitude attitude, in TemeState spacecraft, in Vector3D stationPositionKm)
    {
        BodyAxes axes = attitude.Axes(spacecraft, stationPositionKm);
        return DirectionOf(axes.ToBody(stationPositionKm - spacecraft.PositionKm));
    }

    /// <summary>A body direction in antenna axes.</summary>
    /// <param name="body">Direction in body axes, not zero; any length.</param>
    public AntennaDirection DirectionOf(in Vector3D body)
    {
        double alongX = body.Dot(x);
        double alongY = body.Dot(y);
        return new AntennaDirection(
            Math.Atan2(Math.Sqrt((alongX * alongX) + (alongY * alongY)), body.Dot(z)),
            Math.Atan2(alongY, alongX));
    }

    private static Vector3D Direction(Vector3D vector, string member) =>
        vector.Norm is > 0 and < double.PositiveInfinity
            ? vector.Unit
            : throw RangeCheck.Refusal(vector.Norm, member, "", "a finite vector longer than 0");

    private bool IsParallel(in Vector3D direction) => direction.Cross(z).Norm < ParallelSine;
}
