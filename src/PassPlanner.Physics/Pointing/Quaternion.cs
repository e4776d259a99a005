using PassPlanner.Physics.Frames;

namespace PassPlanner.Physics.Pointing;

/// <summary>
/// A turn from inertial to body axes, scalar last (as Q1, Q2, Q3, QC of CCSDS 504.0-B): the body axes are the inertial
/// ones turned by an angle a about a unit axis n, (X, Y, Z) = n sin(a/2), W = cos(a/2); components go by
/// v body = q* v inertial q. Any length but zero is accepted and made 1.
/// </summary>
/// <param name="X">First component of the vector part.</param>
/// <param name="Y">Second component of the vector part.</param>
/// <param name="Z">Third component of the vector part.</param>
/// <param name="W">Scalar part.</param>
public readonly record struct Quaternion(double X, double Y, double Z, double W)
{
    /// <summary>Length; 1 for a pure turn.</summary>
    public double Norm => Math.Sqrt((X * X) + (Y * Y) + (Z * Z) + (W * W));

    /// <summary>The axes that the turn leads to.</summary>
    internal BodyAxes Axes()
    {
        double scale = 1 / Norm;
        (double x, double y, double z, double w) = (X * scale, Y * scale, Z * scale, W * scale);
        return new BodyAxes(
            new Vector3D(1 - (2 * ((y * y) + (z * z))), 2 * ((x * y) + (z * w)), 2 * ((x * z) - (y * w))),
            new Vector3D(2 * ((x * y) - (z * w)), 1 - (2 * ((x * x) + (z * z))), 2 * ((y * z) + (x * w))),
            new Vector3D(2 * ((x * z) + (y * w)), 2 * ((y * z) - (x * w)), 1 - (2 * ((x * x) + (y * y)))));
    }
}
