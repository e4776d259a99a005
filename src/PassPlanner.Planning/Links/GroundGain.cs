using PassPlanner.Physics.Antennas;

namespace PassPlanner.Planning.Links;

/// <summary>
/// Gain of a ground antenna at an off-axis angle, mean over its jitter, ready to be asked every second: by closed form
/// where there is one, else from a table.
/// </summary>
public sealed class GroundGain
{
    private readonly AntennaPattern? closedForm;
    private readonly PatternTable? table;

    /// <summary>Prepares the gain.</summary>
    /// <param name="pattern">Pattern at the link's frequency.</param>
    /// <param name="jitterRmsRad">Rms of the jitter's angle on the sky, rad, 0 to 0.2.</param>
    public GroundGain(AntennaPattern pattern, double jitterRmsRad)
    {
        PeakGainDbi = pattern.PeakGainDbi;
        bool isCheap = pattern is not TaperedAperturePattern && pattern.IsRotationallySymmetric;
        if (isCheap && (jitterRmsRad == 0 || pattern is GaussianBeamPattern or IsotropicPattern))
        {
            closedForm = jitterRmsRad == 0 || pattern is IsotropicPattern ? pattern : new JitterAveragedPattern(pattern, jitterRmsRad);
        }
        else
        {
            table = new PatternTable(pattern, jitterRmsRad);
        }
    }

    /// <summary>Gain in the direction of greatest gain, without jitter, dBi.</summary>
    public double PeakGainDbi { get; }

    /// <summary>Gain at an off-axis angle, dBi; at its worst about the boresight when the pattern is not symmetrical.</summary>
    public double Dbi(double offAxisRad) => table is null ? closedForm!.GainDbi(offAxisRad, 0) : table.GainDbi(offAxisRad);
}
