namespace PassPlanner.Physics.Links;

/// <summary>
/// Power lost because two antennas' polarisations differ (polarisation efficiency, IEEE Std 145): with ellipticity
/// angles x and the angle d between the major axes, (1 + sin 2x1 sin 2x2 + cos 2x1 cos 2x2 cos 2d) / 2, which is the
/// product of the Stokes vectors.
/// </summary>
public static class PolarisationMismatch
{
    /// <summary>
    /// The greatest mismatch answered, dB. Orthogonal polarisations would lose everything; real antennas leak between
    /// them at -20 to -40 dB, and budgets commonly stop there.
    /// </summary>
    public const double GreatestLossDb = 40;

    /// <summary>Share of the power that is received, 0 to 1, at a known angle between the major axes.</summary>
    /// <param name="transmit">Polarisation of the transmitting antenna.</param>
    /// <param name="receive">Polarisation of the receiving antenna.</param>
    /// <param name="majorAxisAngleRad">Angle between the major axes, rad.</param>
    public static double MatchFactor(Polarisation transmit, Polarisation receive, double majorAxisAngleRad) =>
        Match(transmit, receive, Math.Cos(2 * majorAxisAngleRad));

    /// <summary>Share of the power that is received, 0 to 1. Two linear antennas whose tilts are known use them; otherwise the case decides.</summary>
    /// <param name="transmit">Polarisation of the transmitting antenna.</param>
    /// <param name="receive">Polarisation of the receiving antenna.</param>
    /// <param name="tiltCase">Which relative tilt, when it is not known.</param>
    public static double MatchFactor(Polarisation transmit, Polarisation receive, PolarisationCase tiltCase)
    {
        if (transmit is { Kind: PolarisationKind.Linear, TiltDeg: { } transmitDeg }
            && receive is { Kind: PolarisationKind.Linear, TiltDeg: { } receiveDeg })
        {
            return MatchFactor(transmit, receive, double.DegreesToRadians(transmitDeg - receiveDeg));
        }

        return Match(transmit, receive, tiltCase switch
        {
            PolarisationCase.Worst => -1,
            PolarisationCase.Mean => 0,
            PolarisationCase.Best => 1,
            _ => throw new ArgumentOutOfRangeException(nameof(tiltCase), tiltCase, "tiltCase must be worst, mean or best"),
        });
    }

    /// <summary>Loss, dB, 0 to <see cref="GreatestLossDb"/>; symmetrical in the two antennas.</summary>
    /// <param name="transmit">Polarisation of the transmitting antenna.</param>
    /// <param name="receive">Polarisation of the receiving antenna.</param>
    /// <param name="tiltCase">Which relative tilt, when it is not known.</param>
    public static double LossDb(Polarisation transmit, Polarisation receive, PolarisationCase tiltCase = PolarisationCase.Worst) =>
        LossDb(MatchFactor(transmit, receive, tiltCase));

    /// <summary>Loss of a match factor, dB, 0 to <see cref="GreatestLossDb"/>.</summary>
    /// <param name="matchFactor">Share of the power that is received, 0 to 1.</param>
    public static double LossDb(double matchFactor) =>
        Math.Clamp(-Decibel.FromRatio(matchFactor), 0, GreatestLossDb);

    private static double Match(Polarisation a, Polarisation b, double cosTwiceTilt) =>
        Math.Clamp((1 + (a.CircularPart * b.CircularPart) + (a.LinearPart * b.LinearPart * cosTwiceTilt)) / 2, 0, 1);
}
