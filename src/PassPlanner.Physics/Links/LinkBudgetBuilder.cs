namespace PassPlanner.Physics.Links;

/// <summary>Writes a budget line by line; sums are computed from the terms, never entered.</summary>
public sealed class LinkBudgetBuilder
{
    private readonly List<BudgetLine> lines = [];

    /// <summary>Total of the terms so far, dB.</summary>
    public double TotalDb { get; private set; }

    /// <summary>Adds a term.</summary>
    /// <param name="id">Short fixed name for programs.</param>
    /// <param name="name">Name for people.</param>
    /// <param name="valueDb">Value, signed as it enters the total: losses are negative.</param>
    /// <param name="unit">Unit of the value.</param>
    /// <param name="source">Where the value came from.</param>
    public LinkBudgetBuilder Term(string id, string name, double valueDb, string unit, string source)
    {
        TotalDb += valueDb;
        lines.Add(new BudgetLine(id, name, valueDb, unit, BudgetLineKind.Term, source));
        return this;
    }

    /// <summary>Adds a line with the total of all terms so far.</summary>
    /// <param name="id">Short fixed name for programs.</param>
    /// <param name="name">Name for people.</param>
    /// <param name="unit">Unit of the total.</param>
    public LinkBudgetBuilder Sum(string id, string name, string unit)
    {
        lines.Add(new BudgetLine(id, name, TotalDb, unit, BudgetLineKind.Sum, "sum of the terms above"));
        return this;
    }

    /// <summary>The budget as written so far.</summary>
    public LinkBudget Build() => new(lines);
}
