namespace PassPlanner.Planning.Links;

/// <summary>The terms of the link equation at one instant.</summary>
public readonly record struct LinkSample
{
    /// <summary>Angle between the ground antenna's boresight and the spacecraft, degrees.</summary>
    public required double PointingErrorDeg { get; init; }

    /// <summary>Gain of the ground antenna towards the spacecraft, mean over the jitter, dBi.</summary>
    public required double GroundGainDbi { get; init; }

    /// <summary>Angle between the spacecraft antenna's boresight and the station, degrees; 0 when the attitude is uncontrolled.</summary>
    public required double SpacecraftOffAxisDeg { get; init; }

    /// <summary>Gain of the spacecraft antenna towards the station, dBi.</summary>
    public required double SpacecraftGainDbi { get; init; }

    /// <summary>Free-space loss, dB.</summary>
    public required double FreeSpaceLossDb { get; init; }

    /// <summary>Loss in the atmosphere, dB.</summary>
    public required double AtmosphericLossDb { get; init; }

    /// <summary>Equivalent isotropically radiated power towards the receiver, dBW.</summary>
    public required double EirpDbw { get; init; }

    /// <summary>System noise temperature at the receiving antenna's terminal, K.</summary>
    public required double SystemNoiseTemperatureK { get; init; }

    /// <summary>G/T of the receiving antenna towards the transmitter, dB/K.</summary>
    public required double GOverTDbPerK { get; init; }

    /// <summary>Carrier to noise density, dBHz.</summary>
    public required double COverN0DbHz { get; init; }

    /// <summary>Power flux density at the receiving antenna, free space, dBW/m^2.</summary>
    public required double PowerFluxDensityDbWPerM2 { get; init; }
}
