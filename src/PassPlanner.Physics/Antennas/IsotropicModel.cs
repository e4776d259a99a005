using PassPlanner.Physics.Links;

namespace PassPlanner.Physics.Antennas;

/// <summary>Kind <c>isotropic</c>: one gain in every direction, at every frequency.</summary>
public sealed record IsotropicModel : PatternModel
{
    /// <summary>One gain in every direction.</summary>
    /// <param name="gainDbi">Gain, dBi, -100 to 100.</param>
    /// <exception cref="ArgumentOutOfRangeException">The gain is out of range.</exception>
    public IsotropicModel(double gainDbi = 0) => GainDbi = new IsotropicPattern(gainDbi).PeakGainDbi;

    /// <summary>Gain, dBi.</summary>
    public double GainDbi { get; }

    /// <inheritdoc/>
    public override AntennaPattern At(double frequencyHz)
    {
        Wavelength.CheckFrequency(frequencyHz);
        return new IsotropicPattern(GainDbi);
    }
}
