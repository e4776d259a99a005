namespace PassPlanner.Service.Passes;

/// <summary>Which link of a pass is meant.</summary>
public sealed record LinkReference
{
    /// <summary>downlink or uplink.</summary>
    public required string Direction { get; init; }

    /// <summary>The spacecraft's radio.</summary>
    public required string Radio { get; init; }

    /// <summary>The antenna's chain.</summary>
    public required string Chain { get; init; }
}
