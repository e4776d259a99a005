namespace PassPlanner.Physics.Links;

/// <summary>Which relative tilt of two polarisation ellipses a mismatch is given for, when the tilt is not known.</summary>
public enum PolarisationCase
{
    /// <summary>Major axes at right angles.</summary>
    Worst,

    /// <summary>The mean of the power over all tilts.</summary>
    Mean,

    /// <summary>Major axes parallel.</summary>
    Best,
}
