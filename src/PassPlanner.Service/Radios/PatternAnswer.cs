using PassPlanner.Service.Passes;

namespace PassPlanner.Service.Radios;

/// <summary>The figures of an antenna pattern.</summary>
public sealed record PatternAnswer
{
    /// <summary>Gain at each angle asked for, dBi.</summary>
    public required IReadOnlyList<double> GainDbi { get; init; }

    /// <summary>Greatest gain, dBi.</summary>
    public required double PeakGainDbi { get; init; }

    /// <summary>Greatest directivity, from the integral over the sphere, dBi.</summary>
    public required double DirectivityDbi { get; init; }

    /// <summary>Gain over directivity.</summary>
    public required double EfficiencyRatio { get; init; }

    /// <summary>Full width between the half-power directions, degrees; left out when the pattern has none.</summary>
    public double? HalfPowerBeamwidthDeg { get; init; }

    /// <summary>First sidelobe, dB below the peak; left out when the pattern has none.</summary>
    public double? FirstSidelobeDb { get; init; }

    /// <summary>Angle of the first sidelobe, degrees; left out when the pattern has none.</summary>
    public double? FirstSidelobeAngleDeg { get; init; }

    /// <summary>Why a figure is left out.</summary>
    public required IReadOnlyList<string> LeftOut { get; init; }

    /// <summary>Effective area in the direction of the peak, m^2.</summary>
    public required double EffectiveAreaM2 { get; init; }

    /// <summary>The pattern as understood.</summary>
    public required PatternDocument Pattern { get; init; }

    /// <summary>Frequency, Hz.</summary>
    public required double FrequencyHz { get; init; }

    /// <summary>Models behind the figures.</summary>
    public required IReadOnlyList<ModelUse> Models { get; init; }
}
