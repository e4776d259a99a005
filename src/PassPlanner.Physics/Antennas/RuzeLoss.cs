using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Antennas;

/// <summary>Loss of gain by random errors of a reflector's surface (J. Ruze, Proc. IEEE 54, 1966: exp(-(4 pi e / lambda)^2)).</summary>
public static class RuzeLoss
{
    /// <summary>Loss, dB; 685.81 (e / lambda)^2. Good for errors small against the wavelength (below about a tenth).</summary>
    /// <param name="surfaceErrorRmsMm">Rms of half the path error, mm, at least 0: for a shallow dish, the error of the surface.</param>
    /// <param name="frequencyHz">Frequency, Hz, 30 MHz to 350 GHz.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value is out of range.</exception>
    public static double Db(double surfaceErrorRmsMm, double frequencyHz)
    {
        RangeCheck.Within(surfaceErrorRmsMm, 0, 100, nameof(surfaceErrorRmsMm), "mm");
        double phaseRad = 4 * Math.PI * surfaceErrorRmsMm / 1000 / Wavelength.InM(Wavelength.CheckFrequency(frequencyHz));
        return 10 / Math.Log(10) * phaseRad * phaseRad;
    }
}
