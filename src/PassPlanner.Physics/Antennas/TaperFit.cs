using MathNet.Numerics.RootFinding;
using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Antennas;

/// <summary>The edge taper that gives a round aperture a known taper efficiency or half-power beamwidth.</summary>
public static class TaperFit
{
    /// <summary>The deepest edge taper that is fitted or accepted, dB: the pedestal has all but vanished.</summary>
    public const double DeepestTaperDb = 60;

    /// <summary>The edge taper of a taper efficiency, dB, to 1e-9.</summary>
    /// <param name="pedestalExponent">Exponent n of the parabola, 1 or 2.</param>
    /// <param name="taperEfficiency">Directivity over that of a uniform aperture; at most 1, and at least 0.7515 (n = 1) or 0.5571 (n = 2).</param>
    /// <exception cref="ArgumentOutOfRangeException">No taper of this family has the efficiency.</exception>
    public static double FromEfficiency(int pedestalExponent, double taperEfficiency)
    {
        CheckExponent(pedestalExponent);
        double least = new ApertureTaper(DeepestTaperDb, pedestalExponent).Efficiency;
        RangeCheck.Within(taperEfficiency, least, 1, nameof(taperEfficiency), "");
        return Brent.FindRoot(
            taperDb => new ApertureTaper(taperDb, pedestalExponent).Efficiency - taperEfficiency, 0, DeepestTaperDb, 1e-12, 200);
    }

    /// <summary>The edge taper of a half-power beamwidth, dB, to 1e-9.</summary>
    /// <param name="pedestalExponent">Exponent n of the parabola, 1 or 2.</param>
    /// <param name="diameterM">Diameter, m, above 0 and at most 100.</param>
    /// <param name="frequencyHz">Frequency at which the width holds, Hz, 30 MHz to 350 GHz.</param>
    /// <param name="halfPowerBeamwidthDeg">Full width between the half-power points, degrees: about 59 to 73 (n = 1) or 84 (n = 2) wavelengths over the diameter.</param>
    /// <exception cref="ArgumentOutOfRangeException">No taper of this family has the width.</exception>
    public static double FromHalfPowerBeamwidth(int pedestalExponent, double diameterM, double frequencyHz, double halfPowerBeamwidthDeg)
    {
        CheckExponent(pedestalExponent);
        RangeCheck.AboveZero(diameterM, 100, nameof(diameterM), "m");
        double sineOverU = Wavelength.InM(Wavelength.CheckFrequency(frequencyHz)) / (Math.PI * diameterM);
        double narrowest = WidthDeg(0);
        double widest = WidthDeg(DeepestTaperDb);
        RangeCheck.Within(halfPowerBeamwidthDeg, narrowest, widest, nameof(halfPowerBeamwidthDeg), "degrees for this diameter");
        return Brent.FindRoot(taperDb => WidthDeg(taperDb) - halfPowerBeamwidthDeg, 0, DeepestTaperDb, 1e-12, 200);

        double WidthDeg(double taperDb)
        {
            double sine = HalfPowerU(new ApertureTaper(taperDb, pedestalExponent)) * sineOverU;
            return 2 * double.RadiansToDegrees(Math.Asin(Math.Min(1, sine)));
        }
    }

    /// <summary>Where the far field has half its power: u between 1.616 (uniform) and 2.3 (n = 2 without a pedestal).</summary>
    private static double HalfPowerU(ApertureTaper taper)
    {
        double half = Math.Sqrt(0.5) * taper.Field(0, 0);
        return Brent.FindRoot(u => taper.Field(u, 0) - half, 1.5, 2.5, 1e-13, 200);
    }

    private static void CheckExponent(int pedestalExponent)
    {
        if (pedestalExponent is not (1 or 2))
        {
            throw RangeCheck.Refusal(pedestalExponent, nameof(pedestalExponent), "", "1 or 2");
        }
    }
}
