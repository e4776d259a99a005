using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Antennas;

/// <summary>Kind <c>gaussianBeam</c>: the same gain and width at every frequency of the chain.</summary>
public sealed record GaussianBeamModel : PatternModel
{
    /// <summary>A beam of a gain and a width; see <see cref="GaussianBeamPattern"/> for what follows from what.</summary>
    /// <param name="gainDbi">Peak gain, dBi, -100 to 100.</param>
    /// <param name="halfPowerBeamwidthDeg">Full width between the points 3 dB below the peak, degrees, 0.001 to 360.</param>
    /// <param name="floorDbi">Lowest gain, dBi, -100 to the peak; left out, 30 dB below the peak.</param>
    /// <param name="ohmicEfficiency">Gain over directivity, above 0 and at most 1; for a beam of which gain or width is left out.</param>
    /// <exception cref="ArgumentException">A value is out of range, neither gain nor width is given, or all three are.</exception>
    public GaussianBeamModel(
        double? gainDbi = null,
        double? halfPowerBeamwidthDeg = null,
        double? floorDbi = null,
        double? ohmicEfficiency = null)
    {
        var pattern = new GaussianBeamPattern(gainDbi, halfPowerBeamwidthDeg, floorDbi, ohmicEfficiency);
        (GainDbi, HalfPowerBeamwidthDeg, FloorDbi) = (pattern.PeakGainDbi, pattern.HalfPowerBeamwidthDeg, pattern.FloorDbi);
    }

    /// <summary>Peak gain, dBi.</summary>
    public double GainDbi { get; }

    /// <summary>Full width between the points 3 dB below the peak, degrees.</summary>
    public double HalfPowerBeamwidthDeg { get; }

    /// <summary>Lowest gain, dBi.</summary>
    public double FloorDbi { get; }

    /// <inheritdoc/>
    public override AntennaPattern At(double frequencyHz)
    {
        Wavelength.CheckFrequency(frequencyHz);
        return new GaussianBeamPattern(GainDbi, HalfPowerBeamwidthDeg, FloorDbi);
    }
}
