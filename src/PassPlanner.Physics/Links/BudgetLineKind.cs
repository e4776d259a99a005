namespace PassPlanner.Physics.Links;

/// <summary>What a line of a budget does.</summary>
public enum BudgetLineKind
{
    /// <summary>It enters the total with its sign: gains and powers are positive, losses negative.</summary>
    Term,

    /// <summary>It shows the total of all terms above it.</summary>
    Sum,
}
