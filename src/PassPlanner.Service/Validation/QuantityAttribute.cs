namespace PassPlanner.Service.Validation;

/// <summary>
/// Unit and range of a number in a document. One declaration serves three readers: the validator, the OpenAPI
/// description, and the person who reads the code.
/// </summary>
/// <param name="minimum">Least value allowed.</param>
/// <param name="maximum">Greatest value allowed.</param>
/// <param name="unit">Unit in words or symbols; empty for a bare number.</param>
[AttributeUsage(AttributeTargets.Property)]
public sealed class QuantityAttribute(double minimum, double maximum, string unit) : Attribute
{
    /// <summary>Least value.</summary>
    public double Minimum { get; } = minimum;

    /// <summary>Greatest value.</summary>
    public double Maximum { get; } = maximum;

    /// <summary>Unit.</summary>
    public string Unit { get; } = unit;

    /// <summary>Whether the least value itself is refused.</summary>
    public bool AboveMinimum { get; init; }

    /// <summary>Whether the greatest value itself is refused.</summary>
    public bool BelowMaximum { get; init; }

    /// <summary>Whether the member must be there.</summary>
    public bool Required { get; init; }

    /// <summary>For a list: the number of values it must have; 0 for any number.</summary>
    public int Count { get; init; }

    /// <summary>Whether a value lies in the range.</summary>
    public bool Allows(double value) =>
        double.IsFinite(value)
        && (AboveMinimum ? value > Minimum : value >= Minimum)
        && (BelowMaximum ? value < Maximum : value <= Maximum);

    /// <summary>The range in words: "above 0 and at most 100 m".</summary>
    public string RangeInWords
    {
        get
        {
            string unit = Unit.Length == 0 ? "" : " " + Unit;
            return AboveMinimum || BelowMaximum
                ? FormattableString.Invariant($"{(AboveMinimum ? "above" : "at least")} {Minimum} and {(BelowMaximum ? "below" : "at most")} {Maximum}{unit}")
                : FormattableString.Invariant($"from {Minimum} to {Maximum}{unit}");
        }
    }
}
