using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Radios;

/// <summary>A loss under a name of its own.</summary>
public sealed record LossDocument
{
    /// <summary>Name.</summary>
    [Label(120, Required = true)]
    public string? Name { get; init; }

    /// <summary>Loss, positive when power is lost.</summary>
    [Quantity(-100, 400, "dB", Required = true)]
    public double? ValueDb { get; init; }
}
