using MathNet.Numerics;

namespace PassPlanner.Physics.Antennas;

/// <summary>
/// The field over a circular aperture of radius 1: a parabola to the power n on a pedestal,
/// E(r) = C + (1 - C)(1 - r^2)^n, C being the field at the edge
/// (W. L. Stutzman, G. A. Thiele, Antenna Theory and Design, circular apertures with parabolic tapers on a pedestal).
/// </summary>
internal readonly record struct ApertureTaper
{
    private readonly double edgeField;
    private readonly int exponent;

    public ApertureTaper(double edgeTaperDb, int pedestalExponent)
    {
        edgeField = Math.Pow(10, -edgeTaperDb / 20);
        exponent = pedestalExponent;
    }

    /// <summary>Directivity over that of a uniform aperture, 0.5556 to 1.</summary>
    public double Efficiency
    {
        get
        {
            double amplitude = 2 * DiscField(0, 1);
            double rest = 1 - edgeField;
            double power = (edgeField * edgeField)
                + (2 * edgeField * rest / (exponent + 1))
                + (rest * rest / ((2 * exponent) + 1));
            return amplitude * amplitude / power;
        }
    }

    /// <summary>Share of the gain that is left when the middle of the aperture is blocked: the square of the field left.</summary>
    public double BlockageEfficiency(double blockedRadius)
    {
        double left = Field(0, blockedRadius) / DiscField(0, 1);
        return left * left;
    }

    /// <summary>The far field, the integral of E(r) J0(u r) r dr from the blocked radius to 1, with u = (pi D / lambda) sin(angle).</summary>
    public double Field(double u, double blockedRadius) =>
        blockedRadius > 0 ? DiscField(u, 1) - DiscField(u, blockedRadius) : DiscField(u, 1);

    /// <summary>
    /// The far field of the inner disc of radius b alone. With r = b s the taper is again a sum of powers of 1 - s^2:
    /// (1 - r^2)^n = ((1 - b^2) + b^2 (1 - s^2))^n.
    /// </summary>
    private double DiscField(double u, double b)
    {
        double b2 = b * b;
        double outside = 1 - b2;
        double v = u * b;
        double rest = 1 - edgeField;
        double parabola = exponent == 1
            ? (outside * PowerTransform(0, v)) + (b2 * PowerTransform(1, v))
            : (outside * outside * PowerTransform(0, v)) + (2 * outside * b2 * PowerTransform(1, v)) + (b2 * b2 * PowerTransform(2, v));
        return b2 * ((edgeField * PowerTransform(0, v)) + (rest * parabola));
    }

    /// <summary>The integral of (1 - s^2)^k J0(v s) s ds over 0 to 1: 2^k k! J(k+1)(v) / v^(k+1) (Sonine's first integral, NIST DLMF 10.22.19).</summary>
    private static double PowerTransform(int k, double v)
    {
        double atAxis = 1.0 / (2 * (k + 1));
        if (v < 1e-3)
        {
            return atAxis * (1 - (v * v / (4 * (k + 2))));
        }

        double factor = k switch { 0 => 1, 1 => 2, _ => 8 };
        double power = k switch { 0 => v, 1 => v * v, _ => v * v * v };
        return factor * SpecialFunctions.BesselJ(k + 1, v) / power;
    }
}
