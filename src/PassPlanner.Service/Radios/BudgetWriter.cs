using PassPlanner.Physics.Links;
using PassPlanner.Service.Passes;

namespace PassPlanner.Service.Radios;

/// <summary>Writes budgets as answers of the API.</summary>
public static class BudgetWriter
{
    /// <summary>The lines of a budget in order.</summary>
    public static IReadOnlyList<BudgetLineResponse> Lines(LinkBudget budget) => [.. budget.Lines.Select(line => new BudgetLineResponse
    {
        Id = line.Id,
        Name = line.Name,
        ValueDb = PassWriter.Decibels(line.ValueDb),
        Unit = line.Unit,
        Kind = line.Kind == BudgetLineKind.Sum ? "sum" : "term",
        Source = line.Source,
    })];
}
