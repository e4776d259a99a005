using PassPlanner.Service.Validation;

namespace PassPlanner.Service.Spacecraft;

/// <summary>What a spacecraft must get; kept with the profile, used by plans.</summary>
public sealed record NeedDocument
{
    /// <summary>Kind of need.</summary>
    [Choice("contactsPerDay", "bytesPerDay", "longestGap", Required = true)]
    public string? Kind { get; init; }

    /// <summary>Contacts a day (contactsPerDay).</summary>
    [Quantity(1, 100, "contacts")]
    public int? Count { get; init; }

    /// <summary>Bytes a day (bytesPerDay).</summary>
    [Quantity(0, 1e18, "bytes", AboveMinimum = true)]
    public double? Bytes { get; init; }

    /// <summary>Longest time between contacts (longestGap).</summary>
    [Quantity(0, 720, "h", AboveMinimum = true)]
    public double? Hours { get; init; }
}
