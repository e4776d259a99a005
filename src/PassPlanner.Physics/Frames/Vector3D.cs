using System.Globalization;

namespace PassPlanner.Physics.Frames;

/// <summary>A vector of three doubles; the axes and the unit are those of the quantity that it holds.</summary>
/// <param name="X">First component.</param>
/// <param name="Y">Second component.</param>
/// <param name="Z">Third component.</param>
public readonly record struct Vector3D(double X, double Y, double Z)
{
    /// <summary>Euclidean length.</summary>
    public double Norm => Math.Sqrt((X * X) + (Y * Y) + (Z * Z));

    /// <summary>Unit vector along this one; the vector must not be zero.</summary>
    public Vector3D Unit => this * (1 / Norm);

    /// <summary>Scalar product.</summary>
    public double Dot(in Vector3D other) => (X * other.X) + (Y * other.Y) + (Z * other.Z);

    /// <summary>Vector product, right-handed.</summary>
    public Vector3D Cross(in Vector3D other) => new(
        (Y * other.Z) - (Z * other.Y),
        (Z * other.X) - (X * other.Z),
        (X * other.Y) - (Y * other.X));

    /// <summary>Angle to another vector, rad, 0 to pi; exact near 0 and pi too.</summary>
    public double AngleToRad(in Vector3D other) => Math.Atan2(Cross(other).Norm, Dot(other));

    /// <summary>The three components; a record's own text would print <see cref="Unit"/> of <see cref="Unit"/> without end.</summary>
    public override string ToString() => string.Create(CultureInfo.InvariantCulture, $"({X}, {Y}, {Z})");

    /// <summary>Sum.</summary>
    public static Vector3D operator +(in Vector3D left, in Vector3D right) => new(left.X + right.X, left.Y + right.Y, left.Z + right.Z);

    /// <summary>Difference.</summary>
    public static Vector3D operator -(in Vector3D left, in Vector3D right) => new(left.X - right.X, left.Y - right.Y, left.Z - right.Z);

    /// <summary>Opposite vector.</summary>
    public static Vector3D operator -(in Vector3D vector) => new(-vector.X, -vector.Y, -vector.Z);

    /// <summary>Multiple.</summary>
    public static Vector3D operator *(in Vector3D vector, double factor) => new(vector.X * factor, vector.Y * factor, vector.Z * factor);
}
