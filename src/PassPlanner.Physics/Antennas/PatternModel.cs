namespace PassPlanner.Physics.Antennas;

/// <summary>What an antenna's pattern is described by, without a frequency; the kinds are the derived records.</summary>
public abstract record PatternModel
{
    private protected PatternModel()
    {
    }

    /// <summary>The pattern at a frequency.</summary>
    /// <param name="frequencyHz">Frequency, Hz, 30 MHz to 350 GHz.</param>
    /// <exception cref="ArgumentOutOfRangeException">The frequency is out of range, or the antenna too small for it.</exception>
    public abstract AntennaPattern At(double frequencyHz);
}
