namespace PassPlanner.Planning.Assessments;

/// <summary>What limits a pass.</summary>
public enum CauseKind
{
    /// <summary>Nothing: the pass closes.</summary>
    None,

    /// <summary>Free-space loss at long range.</summary>
    Range,

    /// <summary>The spacecraft antenna's gain towards the station.</summary>
    SpacecraftAntenna,

    /// <summary>The ground antenna's pointing.</summary>
    Pointing,

    /// <summary>Loss in the atmosphere.</summary>
    Atmosphere,

    /// <summary>Polarisation mismatch.</summary>
    Polarisation,

    /// <summary>System noise that rises towards the horizon.</summary>
    Noise,

    /// <summary>The link closes for less than the acquisition time.</summary>
    Acquisition,

    /// <summary>Too little power: the link would not close with every other loss at its least.</summary>
    Power,
}
