namespace PassPlanner.Physics.Links;

/// <summary>Sense in which the field turns, seen along the direction of travel (IEEE Std 145).</summary>
public enum RotationSense
{
    /// <summary>Clockwise.</summary>
    Right,

    /// <summary>Anticlockwise.</summary>
    Left,
}
