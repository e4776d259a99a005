namespace PassPlanner.Physics.Antennas;

/// <summary>
/// The gain of an antenna by direction at one frequency; immutable, so threads share it. Directions are in antenna
/// axes: +z is the boresight, phi = 0 the reference direction.
/// </summary>
public abstract class AntennaPattern
{
    /// <summary>The lowest gain ever answered, dBi: nulls are no deeper, so that every budget stays finite.</summary>
    public const double MinimumGainDbi = -100;

    /// <summary>Gain in the direction of greatest gain, dBi, ohmic loss included.</summary>
    public abstract double PeakGainDbi { get; }

    /// <summary>Whether the gain is the same for every phi.</summary>
    public abstract bool IsRotationallySymmetric { get; }

    /// <summary>
    /// Gain over directivity as a ratio, as the description enters or implies it; 1 when it says nothing.
    /// For an aperture it holds all that lowers the gain without shaping the pattern (spillover, scatter by the surface).
    /// </summary>
    public abstract double OhmicEfficiency { get; }

    /// <summary>Off-axis angle over which the gain changes noticeably, rad, above 0; steps of searches and integrals follow from it.</summary>
    public abstract double AngularScaleRad { get; }

    /// <summary>Gain in a direction, dBi, ohmic loss included, never below <see cref="MinimumGainDbi"/>.</summary>
    /// <param name="offAxisRad">Angle from the boresight, rad, 0 to pi.</param>
    /// <param name="phiRad">Angle about the boresight from the reference direction, rad, any finite value.</param>
    public double GainDbi(double offAxisRad, double phiRad) =>
        Math.Max(MinimumGainDbi, EvaluateDbi(offAxisRad, phiRad));

    /// <summary>Off-axis angles at which the gain has a kink or a step, rad, ascending; integrals are split there.</summary>
    internal virtual IReadOnlyList<double> KinkAnglesRad => [];

    /// <summary>Angles about the boresight at which the gain has a kink, rad, ascending from 0 to below 2 pi.</summary>
    internal virtual IReadOnlyList<double> KinkPhisRad => [];

    /// <summary>Gain without an envelope that is no radiated power, dBi; the sphere is integrated over this one.</summary>
    internal virtual double RadiatedGainDbi(double offAxisRad, double phiRad) => GainDbi(offAxisRad, phiRad);

    /// <summary>Gain in a direction, dBi, before the lowest gain is applied; may be negative infinity.</summary>
    /// <param name="offAxisRad">Angle from the boresight, rad, 0 to pi.</param>
    /// <param name="phiRad">Angle about the boresight from the reference direction, rad.</param>
    protected abstract double EvaluateDbi(double offAxisRad, double phiRad);
}
