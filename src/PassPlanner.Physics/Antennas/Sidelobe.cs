namespace PassPlanner.Physics.Antennas;

/// <summary>A sidelobe of a pattern.</summary>
/// <param name="BelowPeakDb">How far its top lies below the greatest gain of the cut plane, dB, positive.</param>
/// <param name="AngleDeg">Off-axis angle of its top, degrees.</param>
public readonly record struct Sidelobe(double BelowPeakDb, double AngleDeg);
