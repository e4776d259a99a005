namespace PassPlanner.Planning.Profiles;

/// <summary>Pointing errors of an antenna; the default value points perfectly.</summary>
/// <param name="BiasDeg">Steady angle on the sky, in the worst direction, degrees.</param>
/// <param name="JitterRmsDeg">Random angle on the sky, rms over both axes, degrees.</param>
/// <param name="UpdateIntervalS">Time between commanded directions, s; 0 for continuous.</param>
public readonly record struct PointingErrors(double BiasDeg, double JitterRmsDeg, double UpdateIntervalS);
