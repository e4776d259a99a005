namespace PassPlanner.Planning.Passes;

/// <summary>How a spacecraft stands to a station's horizon mask during a period.</summary>
public enum VisibilityStatus
{
    /// <summary>Below it throughout, or without a position.</summary>
    NeverUp,

    /// <summary>It rises or sets.</summary>
    Passes,

    /// <summary>Above it throughout.</summary>
    AlwaysUp,
}
