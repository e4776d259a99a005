using PassPlanner.Service.Passes;

namespace PassPlanner.Service.Radios;

/// <summary>The budget of a link with fixed geometry; a figure that its members do not lead to is left out.</summary>
public sealed record BudgetAnswer
{
    /// <summary>Lines in order; the terms add up to each sum below them.</summary>
    public required IReadOnlyList<BudgetLineResponse> Lines { get; init; }

    /// <summary>Radiated power, dBW.</summary>
    public double? EirpDbw { get; init; }

    /// <summary>Power at the receiver, dBW.</summary>
    public double? ReceivedPowerDbw { get; init; }

    /// <summary>C/N0, dBHz.</summary>
    public double? COverN0DbHz { get; init; }

    /// <summary>C/N in the noise bandwidth, dB.</summary>
    public double? COverNDb { get; init; }

    /// <summary>Eb/N0, dB.</summary>
    public double? EbN0Db { get; init; }

    /// <summary>Margin, dB.</summary>
    public double? MarginDb { get; init; }

    /// <summary>Power flux density at the receiver in free space, dBW/m^2.</summary>
    public required double PowerFluxDensityDbWPerM2 { get; init; }

    /// <summary>Why a figure is left out.</summary>
    public required IReadOnlyList<string> LeftOut { get; init; }

    /// <summary>Models behind the figures.</summary>
    public required IReadOnlyList<ModelUse> Models { get; init; }
}
