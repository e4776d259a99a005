namespace PassPlanner.Service.Passes;

/// <summary>A pass as columns: one value in each for every sample.</summary>
public sealed record TimelineResponse
{
    /// <summary>Instant of the first sample: the first whole second of the pass.</summary>
    public required string StartUtc { get; init; }

    /// <summary>Time between samples, s.</summary>
    public required int StepS { get; init; }

    /// <summary>Azimuth, degrees.</summary>
    public required double[] AzimuthDeg { get; init; }

    /// <summary>Geometric elevation, degrees.</summary>
    public required double[] ElevationDeg { get; init; }

    /// <summary>Elevation as seen through the air, degrees (ITU-R P.834-9).</summary>
    public required double[] ApparentElevationDeg { get; init; }

    /// <summary>Slant range, km.</summary>
    public required double[] SlantRangeKm { get; init; }

    /// <summary>Range rate, km/s, positive when receding.</summary>
    public required double[] RangeRateKmPerS { get; init; }

    /// <summary>Received minus transmitted frequency, Hz.</summary>
    public required double[] DopplerHz { get; init; }

    /// <summary>Rate of the Doppler shift, Hz/s.</summary>
    public required double[] DopplerRateHzPerS { get; init; }

    /// <summary>Angle between the ground antenna's boresight and the spacecraft, degrees.</summary>
    public required double[] PointingErrorDeg { get; init; }

    /// <summary>Gain of the ground antenna towards the spacecraft, dBi.</summary>
    public required double[] GroundGainDbi { get; init; }

    /// <summary>Angle between the spacecraft antenna's boresight and the station, degrees.</summary>
    public required double[] SpacecraftOffAxisDeg { get; init; }

    /// <summary>Gain of the spacecraft antenna towards the station, dBi.</summary>
    public required double[] SpacecraftGainDbi { get; init; }

    /// <summary>Free-space loss, dB.</summary>
    public required double[] FreeSpaceLossDb { get; init; }

    /// <summary>Loss in the atmosphere, dB.</summary>
    public required double[] AtmosphericLossDb { get; init; }

    /// <summary>Polarisation loss, dB.</summary>
    public required double[] PolarisationLossDb { get; init; }

    /// <summary>System noise temperature at the receiving antenna's terminal, K.</summary>
    public required double[] SystemNoiseTemperatureK { get; init; }

    /// <summary>G/T towards the transmitter, dB/K.</summary>
    public required double[] GOverTDbPerK { get; init; }

    /// <summary>C/N0, dBHz.</summary>
    public required double[] COverN0DbHz { get; init; }

    /// <summary>Power flux density at the receiving antenna, free space, dBW/m^2.</summary>
    public required double[] PowerFluxDensityDbWPerM2 { get; init; }

    /// <summary>Index of the best waveform.</summary>
    public required int[] Waveform { get; init; }

    /// <summary>Margin of the best waveform, dB.</summary>
    public required double[] MarginDb { get; init; }

    /// <summary>1 where the second is usable, else 0.</summary>
    public required int[] Usable { get; init; }

    /// <summary>Information bit rate of the best waveform where usable, else 0, bit/s.</summary>
    public required double[] BitRateBps { get; init; }

    /// <summary>Margin of each waveform, slowest first.</summary>
    public required IReadOnlyList<TimelineWaveform> Waveforms { get; init; }
}
