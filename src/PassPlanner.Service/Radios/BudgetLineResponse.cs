namespace PassPlanner.Service.Radios;

/// <summary>One line of a link budget.</summary>
public sealed record BudgetLineResponse
{
    /// <summary>Identifier of the line.</summary>
    public required string Id { get; init; }

    /// <summary>Name for people.</summary>
    public required string Name { get; init; }

    /// <summary>Value with its sign: losses are negative; the terms add up to each sum below them.</summary>
    public required double ValueDb { get; init; }

    /// <summary>Unit.</summary>
    public required string Unit { get; init; }

    /// <summary>term or sum.</summary>
    public required string Kind { get; init; }

    /// <summary>Where the value comes from: inputs, model, edition.</summary>
    public required string Source { get; init; }
}
