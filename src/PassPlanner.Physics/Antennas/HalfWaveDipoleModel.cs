using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Antennas;

/// <summary>Kind <c>halfWaveDipole</c>: cut to half a wavelength at whatever frequency is asked.</summary>
public sealed record HalfWaveDipoleModel : PatternModel
{
    /// <summary>A half-wave dipole; one of the members may be given.</summary>
    /// <param name="gainDbi">Peak gain, dBi, -100 to 2.16 (the loss-free dipole has 2.151).</param>
    /// <param name="ohmicEfficiency">Gain over directivity, above 0 and at most 1.</param>
    /// <exception cref="ArgumentException">Both are given, or one is out of range.</exception>
    public HalfWaveDipoleModel(double? gainDbi = null, double? ohmicEfficiency = null) =>
        GainDbi = new HalfWaveDipolePattern(gainDbi, ohmicEfficiency).PeakGainDbi;

    /// <summary>Peak gain, dBi.</summary>
    public double GainDbi { get; }

    /// <inheritdoc/>
    public override AntennaPattern At(double frequencyHz)
    {
        Wavelength.CheckFrequency(frequencyHz);
        return new HalfWaveDipolePattern(GainDbi);
    }
}
