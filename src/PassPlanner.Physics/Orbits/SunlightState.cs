namespace PassPlanner.Physics.Orbits;

/// <summary>How much of the Sun's disc a spacecraft sees.</summary>
public enum SunlightState
{
    /// <summary>All of it.</summary>
    Sunlit,

    /// <summary>Part of it: the Earth hides the rest.</summary>
    Penumbra,

    /// <summary>None of it.</summary>
    Umbra,
}
