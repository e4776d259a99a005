namespace PassPlanner.Planning.Predictions;

/// <summary>Why a spacecraft has no pass.</summary>
public enum NoPassReason
{
    /// <summary>There is no element set.</summary>
    NoElementSet,

    /// <summary>No antenna covers a frequency of the spacecraft.</summary>
    NoAntennaForFrequency,

    /// <summary>The spacecraft stays below the station's horizon for the whole period.</summary>
    NeverUp,

    /// <summary>The propagation says that the spacecraft has come down.</summary>
    Decayed,

    /// <summary>The propagation fails for another reason.</summary>
    PropagationFailed,
}
