namespace PassPlanner.Planning.Passes;

/// <summary>A spacecraft against the least elevation of a mask at one time.</summary>
/// <param name="TimeS">Time, s from the origin.</param>
/// <param name="Excess">Sine of the elevation less that of the mask's least elevation.</param>
/// <param name="Rate">Rate of the sine of the elevation, 1/s.</param>
internal readonly record struct HorizonSample(double TimeS, double Excess, double Rate)
{
    /// <summary>Whether the spacecraft is up.</summary>
    public bool IsUp => Excess >= 0;
}
