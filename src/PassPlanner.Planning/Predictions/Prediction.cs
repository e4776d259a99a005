namespace PassPlanner.Planning.Predictions;

/// <summary>The passes of a period, and what has none.</summary>
/// <param name="Passes">Passes by AOS, then spacecraft, station, antenna and link.</param>
/// <param name="WithoutPasses">Pairs without a pass, each with its reason.</param>
public sealed record Prediction(IReadOnlyList<PredictedPass> Passes, IReadOnlyList<WithoutPasses> WithoutPasses);
