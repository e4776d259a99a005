namespace PassPlanner.Physics.Links;

/// <summary>How a polarisation was described.</summary>
public enum PolarisationKind
{
    /// <summary>Right-hand circular, or nearly so.</summary>
    RightCircular,

    /// <summary>Left-hand circular, or nearly so.</summary>
    LeftCircular,

    /// <summary>Linear.</summary>
    Linear,

    /// <summary>Elliptical.</summary>
    Elliptical,
}
