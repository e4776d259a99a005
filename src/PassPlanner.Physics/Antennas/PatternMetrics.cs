using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Antennas;

/// <summary>The figures by which an antenna is known, worked out from its pattern.</summary>
/// <param name="PeakGainDbi">Gain in the direction of greatest gain, dBi.</param>
/// <param name="DirectivityDbi">Directivity in that direction, dBi: 4 pi over the integral of the relative pattern over the sphere.</param>
/// <param name="HalfPowerBeamwidthDeg">Full width between the points 3.0103 dB below the greatest gain of the cut plane, degrees.</param>
/// <param name="FirstSidelobe">The first sidelobe of the cut plane.</param>
/// <param name="EffectiveAreaM2">G lambda^2 / 4 pi of the peak gain, m^2.</param>
public sealed record PatternMetrics(
    double PeakGainDbi,
    double DirectivityDbi,
    Finding<double> HalfPowerBeamwidthDeg,
    Finding<Sidelobe> FirstSidelobe,
    double EffectiveAreaM2)
{
    /// <summary>Gain over directivity as a ratio; above 1 only when an entered gain is more than its pattern can have.</summary>
    public double Efficiency => Decibel.ToRatio(PeakGainDbi - DirectivityDbi);

    /// <summary>The figures of a pattern. The integral is good to 0.01 dB for narrow beams and to 0.001 dB for broad ones.</summary>
    /// <param name="pattern">The pattern.</param>
    /// <param name="frequencyHz">Frequency, Hz, 30 MHz to 350 GHz.</param>
    /// <param name="phiRad">The plane of width and sidelobe, rad: the one through the boresight at this phi and its opposite.</param>
    public static PatternMetrics Of(AntennaPattern pattern, double frequencyHz, double phiRad = 0)
    {
        double wavelengthM = Wavelength.InM(Wavelength.CheckFrequency(frequencyHz));
        var plane = new PlaneCut(pattern, phiRad);
        return new PatternMetrics(
            pattern.PeakGainDbi,
            IntegratedDirectivityDbi(pattern),
            plane.HalfPowerBeamwidthDeg(),
            plane.FirstSidelobe(),
            Decibel.ToRatio(pattern.PeakGainDbi) * wavelengthM * wavelengthM / (4 * Math.PI));
    }

    private static double IntegratedDirectivityDbi(AntennaPattern pattern)
    {
        double peakDbi = pattern.PeakGainDbi;
        double integral = pattern.IsRotationallySymmetric
            ? SphereIntegral.OfSymmetric(
                angle => Decibel.ToRatio(pattern.RadiatedGainDbi(angle, 0) - peakDbi), pattern.AngularScaleRad, pattern.KinkAnglesRad)
            : SphereIntegral.Of(
                (angle, phi) => Decibel.ToRatio(pattern.RadiatedGainDbi(angle, phi) - peakDbi), pattern.AngularScaleRad, pattern.KinkAnglesRad, pattern.KinkPhisRad);
        return Decibel.FromRatio(4 * Math.PI / integral);
    }
}
