using System.Globalization;

namespace PassPlanner.Physics.Links;

/// <summary>The lines of a link budget in order: terms, and sums that are the total of all terms above them.</summary>
public sealed class LinkBudget
{
    /// <summary>How closely a budget must add up, dB.</summary>
    public const double ToleranceDb = 1e-9;

    /// <summary>A budget of lines from outside; <see cref="CheckAddsUp"/> tells whether its sums are right.</summary>
    /// <param name="lines">The lines in order.</param>
    public LinkBudget(IEnumerable<BudgetLine> lines) => Lines = [.. lines];

    /// <summary>The lines in order.</summary>
    public IReadOnlyList<BudgetLine> Lines { get; }

    /// <summary>The value of a line.</summary>
    /// <param name="id">The line's id.</param>
    /// <exception cref="ArgumentException">The budget has no such line.</exception>
    public double ValueDb(string id) =>
        Lines.FirstOrDefault(line => line.Id == id)?.ValueDb
        ?? throw new ArgumentException($"the budget has no line {id}", nameof(id));

    /// <summary>Confirms that every sum is the total of the terms above it, to <see cref="ToleranceDb"/>.</summary>
    /// <exception cref="InvalidOperationException">A sum does not add up; the message names it.</exception>
    public void CheckAddsUp()
    {
        double totalDb = 0;
        foreach (BudgetLine line in Lines)
        {
            if (line.Kind == BudgetLineKind.Term)
            {
                totalDb += line.ValueDb;
            }
            else if (!(Math.Abs(line.ValueDb - totalDb) <= ToleranceDb))
            {
                throw new InvalidOperationException(string.Create(
                    CultureInfo.InvariantCulture, $"{line.Id} is {line.ValueDb} {line.Unit} but the terms above it make {totalDb}"));
            }
        }
    }
}
