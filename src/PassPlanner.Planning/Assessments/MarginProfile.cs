using PassPlanner.Physics.Time;

namespace PassPlanner.Planning.Assessments;

/// <summary>The margin of the most robust waveform along a pass at a coarse step, for drawing.</summary>
/// <param name="StartUtc">Instant of the first sample.</param>
/// <param name="StepS">Time between samples, s.</param>
/// <param name="MarginDb">Margin, dB.</param>
/// <param name="Usable">Whether the second is usable.</param>
public sealed record MarginProfile(UtcInstant StartUtc, int StepS, IReadOnlyList<double> MarginDb, IReadOnlyList<bool> Usable);
